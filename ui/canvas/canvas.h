#pragma once
// The p–V plane of the window: the diagram and what can be done on it.

#include "ui/canvas/diagram.h"
#include "ui/canvas/mode.h"
#include "ui/session/session.h"

#include <QWidget>

#include <memory>

namespace quasistat::ui
{

class Canvas : public QWidget
{
    Q_OBJECT
public:
    Canvas(Session &session, Scheme scheme, QWidget *parent = nullptr);
    ~Canvas() override;

    [[nodiscard]] Session &session() const { return m_session; }
    [[nodiscard]] Diagram &diagram() const { return *m_diagram; }

    void setScheme(Scheme scheme);
    /// Keeps the view clear of what covers `pixels` at the lower edge (the unfolded card).
    void setInset(int pixels);
    /// Begins to place a segment of `kind` after the last state; a click sets it, Esc leaves.
    void place(path::Kind kind);
    [[nodiscard]] bool isSelecting() const { return m_isSelecting; }
    void zoomToPath();
    void zoomIn();
    void zoomOut();

    /// For the modes: another mode until it is finished or left by Esc.
    void enter(std::unique_ptr<Mode> mode);
    void finishMode(); ///< back to selecting, what was done stands
    void leaveMode();  ///< back to selecting, what was begun is undone
    void pan(QPointF pixels);

signals:
    void remarked(const QString &sentence);

protected:
    void mousePressEvent(QMouseEvent *event) override;
    void mouseMoveEvent(QMouseEvent *event) override;
    void mouseReleaseEvent(QMouseEvent *event) override;
    void wheelEvent(QWheelEvent *event) override;
    void keyPressEvent(QKeyEvent *event) override;
    void keyReleaseEvent(QKeyEvent *event) override;
    void leaveEvent(QEvent *event) override;
    void resizeEvent(QResizeEvent *event) override;

private:
    void showSnapshot();
    void showEmphasis();
    void showFile();
    void dropMode(std::unique_ptr<Mode> next, bool selecting);

    Session &m_session;
    Diagram *m_diagram;
    std::unique_ptr<Mode> m_mode;
    std::unique_ptr<Mode> m_finished; ///< kept until its own event handler has returned
    bool m_isSelecting = true;
    bool m_isSpaceHeld = false;
    bool m_isPanning = false;
    bool m_followsPath = true; ///< until the user has chosen a view
    QPointF m_panLast;
    QString m_file;
};

} // namespace quasistat::ui
