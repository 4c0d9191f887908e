#include "ui/look/figure_text.h"
#include "ui/look/mark.h"
#include "ui/look/type.h"
#include "ui/strip/path_strip.h"
#include "ui/strip/start_form.h"
#include "ui/strip/strip_card.h"

namespace quasistat::ui
{

namespace
{

void paintArrow(QPainter &painter, QPointF tail, double length)
{
    const QPointF tip = tail + QPointF(length, 0);
    const double back = length > 0 ? -3 : 3;
    painter.drawLine(tail, tip);
    painter.drawPolyline(QPolygonF{tip + QPointF(back, -3), tip, tip + QPointF(back, 3)});
}

} // namespace

void PathStrip::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.fillRect(rect(), m_look.panel);
    painter.fillRect(QRect(0, 0, width(), 1), m_look.rule());
}

void PathStrip::paintSegment(StripCard &card, int segment)
{
    const auto at = static_cast<std::size_t>(segment);
    if (at >= m_faces.cards.size()) return;
    QPainter painter(&card);
    paintCard(painter, card.rect(), m_faces.cards[at], poseOf(card, segment), m_faces.scale, m_look);
}

void PathStrip::paintStart(StripCard &card)
{
    QPainter painter(&card);
    painter.setRenderHint(QPainter::Antialiasing);
    const QRectF place = card.rect();
    const CardPose pose = poseOf(card, startSelected);
    const bool faulty = !startFault(m_session.now()).isEmpty();
    const QColor edge = faulty && !pose.unfolded ? m_look.error
                        : pose.selected          ? m_look.accent
                                                 : faded(m_look.ink, pose.hovered ? 0.45 : 0.12);
    paintCardGround(painter, place, pose, edge, m_look);
    painter.setPen(Qt::NoPen);
    painter.setBrush(m_look.ink);
    painter.drawEllipse(QPointF(19, 19), 8.5, 8.5);
    painter.setPen(m_look.ground);
    drawText(painter, {19, 23}, QStringLiteral("1"), face(11, QFont::DemiBold), Align::centre);
    painter.setPen(m_look.ink);
    drawText(painter, {34, 23.5}, tr("start"), face(13, QFont::DemiBold));
    if (faulty) drawMark(painter, StateMark::cross, {place.right() - 14, 19}, m_look.error, m_look.ground);
    double y = 56;
    for (const QString &words : startWords(m_session.now().design)) {
        drawText(painter, {10, y}, elided(words, bodyFace(), place.width() - 20), bodyFace());
        y += 20;
    }
}

void PathStrip::paintPlaceNext(StripCard &card)
{
    QPainter painter(&card);
    painter.setRenderHint(QPainter::Antialiasing);
    const QRectF box(0.5, 0.5, card.width() - 1.0, 77);
    const bool lively = card.isHovered() || card.hasFocus();
    painter.setPen(QPen(lively ? m_look.accent : faded(m_look.ink, 0.4), 1, Qt::DashLine));
    painter.drawRoundedRect(box, 6, 6);
    painter.setPen(QPen(m_look.accent, 1.75, Qt::SolidLine, Qt::RoundCap));
    const QPointF cross(box.center().x(), 26);
    painter.drawLine(cross - QPointF(6, 0), cross + QPointF(6, 0));
    painter.drawLine(cross - QPointF(0, 6), cross + QPointF(0, 6));
    painter.setPen(m_look.ink);
    drawText(painter, {box.center().x(), 58}, tr("place next"), face(13, QFont::Medium), Align::centre);
    if (m_faces.scale.caption.isEmpty()) return;
    painter.setPen(m_look.secondary());
    const double middle = box.center().x();
    drawText(painter, {middle, 98}, tr("out | in"), captionFace(), Align::centre);
    const double side = textWidth(tr("out | in"), captionFace()) / 2 + 6;
    paintArrow(painter, {middle - side, 94}, -9);
    paintArrow(painter, {middle + side, 94}, 9);
    drawText(painter, {middle, 113}, m_faces.scale.caption, captionFace(), Align::centre);
}

} // namespace quasistat::ui
