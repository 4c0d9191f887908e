#pragma once
// The limits of the equipment, to add, change and take away: slides over the ledger.

#include "ui/fields/form_view.h"
#include "ui/session/session.h"

#include <QPushButton>
#include <QVBoxLayout>

namespace quasistat::ui
{

class EnvelopeDrawer : public QWidget
{
    Q_OBJECT
public:
    explicit EnvelopeDrawer(Session &session, QWidget *parent = nullptr);

    void setLook(const Palette &look);
    /// The form of a limit, from 0; null where there is none.
    [[nodiscard]] FormView *form(int limit) const;

signals:
    void closed();

protected:
    void paintEvent(QPaintEvent *event) override;
    void keyPressEvent(QKeyEvent *event) override;

private:
    void refresh();
    void matchForms(int count);
    QWidget *createLimit(int limit);
    void add();
    void remove(int limit);
    void choose(int limit, const QString &key);
    void enter(int limit, const QString &id, const QString &text, bool previewOnly);

    Session &m_session;
    Palette m_look;
    QVBoxLayout *m_list = nullptr;
    std::vector<FormView *> m_forms;
};

} // namespace quasistat::ui
