#pragma once
// The row of cards under the canvas: the start, one card a segment in path order, and the place for the next.

#include "ui/session/session.h"
#include "ui/strip/card_face.h"

#include <QMenu>
#include <QScrollArea>
#include <QWidget>

namespace quasistat::ui
{

class StripCard;

class PathStrip : public QWidget
{
    Q_OBJECT
public:
    static constexpr int height = 132;
    static constexpr int cardHeight = 116;

    explicit PathStrip(Session &session, QWidget *parent = nullptr);

    void setLook(const Palette &look);

    /// Whether the selected card stands open, its fields above it.
    [[nodiscard]] bool isUnfolded() const { return m_unfolded && m_session.selected() != -1 && !m_dragging; }
    void setUnfolded(bool unfolded);

    /// The selected card in this widget's coordinates; empty if none is selected or it is scrolled out of sight.
    [[nodiscard]] QRect selectedPlace() const;
    /// The card of a segment (from 0), of the start (startSelected); null where there is none.
    [[nodiscard]] StripCard *card(int segment) const;
    [[nodiscard]] const StripFaces &faces() const { return m_faces; }
    [[nodiscard]] QWidget *placeNext() const;

    /// The menu of a card's actions, made anew; owned by the caller's `menu`.
    void fillCardMenu(QMenu &menu, int segment);
    /// The card of the selected segment takes the keys.
    void focusSelected();

signals:
    void placed();          ///< cards have moved or (un)folded: the fields over them must follow
    void fieldsRequested(); ///< Enter on a card: the first field takes the keys
    void placeRequested(path::Kind kind);

protected:
    void resizeEvent(QResizeEvent *event) override;
    void paintEvent(QPaintEvent *event) override;
    void keyPressEvent(QKeyEvent *event) override;

private:
    void createViews();
    void refresh();
    void matchCards();
    StripCard *createCard(int segment);
    void layOut();
    void paintSegment(StripCard &card, int segment);
    void paintStart(StripCard &card);
    void paintPlaceNext(StripCard &card);
    void click(int segment, const QPoint &at);
    void showMenu(int segment, const QPoint &globalAt);
    void showKinds();
    void drag(int segment, int dx);
    void drop(int segment, int dx);
    void endDrag();
    [[nodiscard]] int dropIndex(int segment, int dx) const;
    [[nodiscard]] int cardWidth() const;
    [[nodiscard]] CardPose poseOf(const StripCard &card, int segment) const;
    void step(int by);
    void showSelected();

    Session &m_session;
    Palette m_look;
    StripFaces m_faces;
    QScrollArea *m_scroll = nullptr;
    QWidget *m_row = nullptr;
    StripCard *m_start = nullptr;
    StripCard *m_next = nullptr;
    std::vector<StripCard *> m_cards;
    bool m_unfolded = true;
    bool m_dragging = false;
};

} // namespace quasistat::ui
