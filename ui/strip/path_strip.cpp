#include "ui/strip/path_strip.h"

#include "ui/strip/kind_menu.h"
#include "ui/strip/segment_edits.h"
#include "ui/strip/start_form.h"
#include "ui/strip/strip_card.h"

#include <QKeyEvent>
#include <QScrollBar>

namespace quasistat::ui
{

namespace
{

constexpr int margin = 12;
constexpr int gap = 8;
constexpr int widest = 168;
constexpr int narrowest = 148;
constexpr int unfoldedWidth = 264;
constexpr int startWidth = 84;
constexpr int nextWidth = 86;

/// Leaves the arrow keys to the strip: they go from card to card, the row follows.
class CardScroll : public QScrollArea
{
public:
    using QScrollArea::QScrollArea;

protected:
    void keyPressEvent(QKeyEvent *event) override { event->ignore(); }
};

} // namespace

PathStrip::PathStrip(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light))
{
    setFixedHeight(height);
    setAccessibleName(tr("Path"));
    createViews();
    connect(&session, &Session::snapshotChanged, this, &PathStrip::refresh);
    connect(&session, &Session::selectionChanged, this, [this] {
        layOut();
        showSelected();
    });
    connect(&session, &Session::hoverChanged, m_row, qOverload<>(&QWidget::update));
    refresh();
}

void PathStrip::createViews()
{
    m_scroll = new CardScroll(this);
    m_scroll->setFrameShape(QFrame::NoFrame);
    m_scroll->setVerticalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
    m_scroll->setFocusPolicy(Qt::NoFocus);
    m_scroll->viewport()->setAutoFillBackground(false);
    m_row = new QWidget;
    m_row->setAutoFillBackground(false);
    m_scroll->setWidget(m_row);
    m_start = new StripCard([this](StripCard &card) { paintStart(card); }, m_row);
    m_start->setObjectName(QStringLiteral("startCard"));
    connect(m_start, &StripCard::clicked, this, [this](const QPoint &at) { click(startSelected, at); });
    m_next = new StripCard([this](StripCard &card) { paintPlaceNext(card); }, m_row);
    m_next->setObjectName(QStringLiteral("placeNext"));
    m_next->setAccessibleName(tr("place next"));
    connect(m_next, &StripCard::clicked, this, &PathStrip::showKinds);
    connect(m_scroll->horizontalScrollBar(), &QScrollBar::valueChanged, this, &PathStrip::placed);
}

QWidget *PathStrip::placeNext() const
{
    return m_next;
}

void PathStrip::setLook(const Palette &look)
{
    m_look = look;
    m_row->update();
    update();
}

void PathStrip::refresh()
{
    m_faces = stripFaces(m_session.now());
    matchCards();
    for (std::size_t k = 0; k < m_cards.size(); ++k) {
        m_cards[k]->setAccessibleName(m_faces.cards[k].spoken());
        m_cards[k]->setToolTip(m_faces.cards[k].sentence);
    }
    m_start->setAccessibleName(
        tr("start state: %1").arg(startWords(m_session.now().design).join(QStringLiteral(", "))));
    m_start->setToolTip(startFault(m_session.now()));
    layOut();
}

void PathStrip::matchCards()
{
    while (m_cards.size() > m_faces.cards.size()) {
        m_cards.back()->hide();
        m_cards.back()->deleteLater();
        m_cards.pop_back();
    }
    while (m_cards.size() < m_faces.cards.size()) m_cards.push_back(createCard(static_cast<int>(m_cards.size())));
}

StripCard *PathStrip::createCard(int segment)
{
    auto *made = new StripCard([this, segment](StripCard &card) { paintSegment(card, segment); }, m_row);
    made->setObjectName(QStringLiteral("card%1").arg(segment + 1));
    made->setDraggable(true);
    connect(made, &StripCard::clicked, this, [this, segment](const QPoint &at) { click(segment, at); });
    connect(made, &StripCard::menuRequested, this, [this, segment](const QPoint &at) { showMenu(segment, at); });
    connect(made, &StripCard::hoverChanged, this,
            [this, segment](bool hovered) { m_session.hover(hovered ? segment : -1); });
    connect(made, &StripCard::dragged, this, [this, segment](int dx) { drag(segment, dx); });
    connect(made, &StripCard::dropped, this, [this, segment](int dx) { drop(segment, dx); });
    connect(made, &StripCard::dragCancelled, this, &PathStrip::endDrag);
    made->show();
    return made;
}

StripCard *PathStrip::card(int segment) const
{
    if (segment == startSelected) return m_start;
    const bool exists = segment >= 0 && segment < static_cast<int>(m_cards.size());
    return exists ? m_cards[static_cast<std::size_t>(segment)] : nullptr;
}

int PathStrip::cardWidth() const
{
    const int count = static_cast<int>(m_cards.size());
    if (count == 0) return widest;
    const bool open = isUnfolded();
    const bool openStart = open && m_session.selected() == startSelected;
    const int fixed = 2 * margin + (openStart ? unfoldedWidth : startWidth) + nextWidth + (count + 1) * gap;
    const int normal = open && !openStart ? count - 1 : count;
    if (normal == 0) return widest;
    const int room = width() - fixed - (normal < count ? unfoldedWidth : 0);
    return std::clamp(room / normal, narrowest, widest);
}

void PathStrip::layOut()
{
    m_scroll->setGeometry(0, 0, width(), height);
    const int ordinary = cardWidth();
    const auto widthOf = [&](int segment, int plain) {
        return isUnfolded() && m_session.selected() == segment ? unfoldedWidth : plain;
    };
    int x = margin;
    const auto put = [&](QWidget *card, int cardWide, int cardHigh) {
        card->setGeometry(x, 8, cardWide, cardHigh);
        x += cardWide + gap;
    };
    put(m_start, widthOf(startSelected, startWidth), cardHeight);
    for (std::size_t k = 0; k < m_cards.size(); ++k)
        put(m_cards[k], widthOf(static_cast<int>(k), ordinary), cardHeight);
    put(m_next, nextWidth, cardHeight);
    m_row->resize(x - gap + margin, height - 8);
    m_row->update();
    emit placed();
}

void PathStrip::showSelected()
{
    if (QWidget *selected = card(m_session.selected())) m_scroll->ensureWidgetVisible(selected, margin, 0);
}

QRect PathStrip::selectedPlace() const
{
    const QWidget *selected = card(m_session.selected());
    if (!selected) return {};
    const QRect place(selected->mapTo(this, QPoint(0, 0)), selected->size());
    return place.left() < 0 || place.right() > width() ? QRect() : place;
}

void PathStrip::setUnfolded(bool unfolded)
{
    if (unfolded == m_unfolded) return;
    m_unfolded = unfolded;
    layOut();
    showSelected();
}

void PathStrip::focusSelected()
{
    if (QWidget *selected = card(m_session.selected())) selected->setFocus(Qt::OtherFocusReason);
}

void PathStrip::click(int segment, const QPoint &at)
{
    const StripCard *clicked = card(segment);
    const bool onDots = segment >= 0 && dotsPlace(clicked->rect()).contains(at);
    if (onDots && m_faces.cards[static_cast<std::size_t>(segment)].standing == CardStanding::good) {
        showMenu(segment, clicked->mapToGlobal(dotsPlace(clicked->rect()).bottomLeft().toPoint()));
        return;
    }
    const bool again = m_session.selected() == segment && m_unfolded;
    m_unfolded = !again;
    if (m_session.selected() == segment)
        layOut();
    else
        m_session.select(segment);
}

void PathStrip::showMenu(int segment, const QPoint &globalAt)
{
    auto *menu = new QMenu(this);
    menu->setAttribute(Qt::WA_DeleteOnClose);
    menu->setObjectName(QStringLiteral("cardMenu"));
    fillCardMenu(*menu, segment);
    menu->popup(globalAt);
}

void PathStrip::fillCardMenu(QMenu &menu, int segment)
{
    menu.addAction(tr("Duplicate"), this, [this, segment] { duplicateSegment(m_session, segment); })
        ->setObjectName(QStringLiteral("duplicate"));
    menu.addAction(tr("Delete"), this, [this, segment] { deleteSegment(m_session, segment); })
        ->setObjectName(QStringLiteral("delete"));
    menu.addSeparator();
    addKinds(*menu.addMenu(tr("Insert before")), m_look,
             [this, segment](path::Kind kind) { insertSegment(m_session, segment, kind); });
    addKinds(*menu.addMenu(tr("Insert after")), m_look,
             [this, segment](path::Kind kind) { insertSegment(m_session, segment + 1, kind); });
    addKinds(*menu.addMenu(tr("Change kind")), m_look,
             [this, segment](path::Kind kind) { changeKind(m_session, segment, kind); });
}

void PathStrip::showKinds()
{
    auto *menu = new QMenu(this);
    menu->setAttribute(Qt::WA_DeleteOnClose);
    menu->setObjectName(QStringLiteral("placeMenu"));
    addKinds(*menu, m_look, [this](path::Kind kind) { emit placeRequested(kind); });
    menu->popup(m_next->mapToGlobal(QPoint(0, -menu->sizeHint().height())));
}

int PathStrip::dropIndex(int segment, int dx) const
{
    const int centre = m_cards[static_cast<std::size_t>(segment)]->geometry().center().x();
    static_cast<void>(dx);
    int index = 0;
    for (std::size_t k = 0; k < m_cards.size(); ++k)
        if (static_cast<int>(k) != segment && m_cards[k]->geometry().center().x() < centre) ++index;
    return index;
}

void PathStrip::drag(int segment, int dx)
{
    StripCard *moved = card(segment);
    if (!m_dragging) { // the fields fold away, so that only cards of one width move
        m_dragging = true;
        layOut();
        moved->raise();
    }
    const int pitch = moved->width() + gap;
    const int home = margin + startWidth + gap + segment * pitch;
    moved->move(home + dx, 8);
    const int target = dropIndex(segment, dx);
    for (int k = 0; k < static_cast<int>(m_cards.size()); ++k) {
        if (k == segment) continue;
        const int rank = k < segment ? k : k - 1; // the row without the card that is in the hand
        card(k)->move(margin + startWidth + gap + (rank >= target ? rank + 1 : rank) * pitch, 8);
    }
}

void PathStrip::drop(int segment, int dx)
{
    const int target = dropIndex(segment, dx);
    endDrag();
    moveSegment(m_session, segment, target);
}

void PathStrip::endDrag()
{
    m_dragging = false;
    layOut();
}

void PathStrip::resizeEvent(QResizeEvent *event)
{
    QWidget::resizeEvent(event);
    layOut();
}

void PathStrip::keyPressEvent(QKeyEvent *event)
{
    switch (event->key()) {
    case Qt::Key_Left: step(-1); return;
    case Qt::Key_Right: step(+1); return;
    case Qt::Key_Return:
    case Qt::Key_Enter:
    case Qt::Key_Space:
        if (m_next->hasFocus())
            showKinds();
        else {
            setUnfolded(true);
            emit fieldsRequested();
        }
        return;
    case Qt::Key_Escape: setUnfolded(false); return;
    default: QWidget::keyPressEvent(event);
    }
}

void PathStrip::step(int by)
{
    // Places in a row: start, segments, [place next].
    const int count = static_cast<int>(m_cards.size());
    const int here = m_next->hasFocus() ? count + 1 : m_session.selected() >= 0 ? m_session.selected() + 1 : 0;
    const int there = std::clamp(here + by, 0, count + 1);
    if (there == count + 1) {
        m_next->setFocus(Qt::OtherFocusReason);
        return;
    }
    m_session.select(there == 0 ? startSelected : there - 1);
    focusSelected();
}

CardPose PathStrip::poseOf(const StripCard &card, int segment) const
{
    CardPose pose;
    pose.selected = m_session.selected() == segment;
    pose.hovered = card.isHovered() || (segment >= 0 && m_session.hovered() == segment);
    pose.unfolded = pose.selected && isUnfolded();
    pose.focused = card.hasFocus();
    pose.halfBar = 38.0 - (widest - cardWidth()) / 2.0;
    return pose;
}

} // namespace quasistat::ui
