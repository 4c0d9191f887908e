#include "ui/strip/card_panel.h"

#include "ui/ledger/verdict_words.h"
#include "ui/look/type.h"
#include "ui/session/sentences.h"
#include "ui/strip/end_field.h"
#include "ui/strip/segment_edits.h"
#include "ui/strip/segment_form.h"
#include "ui/strip/start_form.h"

#include <QEvent>
#include <QMouseEvent>
#include <QPainter>
#include <QPainterPath>
#include <QVBoxLayout>

namespace quasistat::ui
{

namespace
{

constexpr double radius = 6.0;
constexpr int narrow = 264;
constexpr int wide = 620;
constexpr std::size_t linesInOneColumn = 3;

const path::SegmentResult *resultOf(const Snapshot &snapshot, int segment)
{
    if (!snapshot.evaluation || segment < 0) return nullptr;
    const auto &segments = snapshot.evaluation->path.segments;
    const auto at = static_cast<std::size_t>(segment);
    return at < segments.size() ? &segments[at] : nullptr;
}

const Failure *failureOf(const Snapshot &snapshot, int segment)
{
    if (!snapshot.evaluation || segment < 0) return nullptr;
    const auto &failures = snapshot.evaluation->path.failures;
    const auto at = static_cast<std::size_t>(segment);
    return at < failures.size() && failures[at] ? &*failures[at] : nullptr;
}

QString endSentence(const path::SegmentResult &result, const std::vector<path::EndKey> &given,
                    const units::DisplayUnits &units)
{
    QStringList figures;
    const auto isGiven = [&](path::EndKey key) { return std::find(given.begin(), given.end(), key) != given.end(); };
    if (!isGiven(path::EndKey::pressure))
        figures << shownFigure(result.to.pressure(), units::Quantity::pressure, units);
    if (!isGiven(path::EndKey::temperature) && result.to.temperature())
        figures << shownFigure(*result.to.temperature(), units::Quantity::temperature, units);
    if (!isGiven(path::EndKey::volume)) figures << shownFigure(result.to.volume(), units::Quantity::volume, units);
    return CardPanel::tr("Ends at %1.").arg(figures.join(QStringLiteral(", ")));
}

QString startSentence(const Snapshot &snapshot)
{
    if (!snapshot.evaluation || snapshot.evaluation->path.states.empty()) return {};
    const gas::State &state = snapshot.evaluation->path.states.front().state;
    return CardPanel::tr("Holds %1, %2.")
        .arg(shownFigure(state.amount(), units::Quantity::amount, snapshot.units),
             shownFigure(state.mass(), units::Quantity::mass, snapshot.units));
}

QString warningsOf(const Snapshot &snapshot, int segment)
{
    QStringList sentences;
    for (const analysis::Verdict &verdict : snapshot.evaluation->verdicts)
        sentences << passingSentence(*snapshot.evaluation, verdict, segment, snapshot.units);
    if (const auto *result = resultOf(snapshot, segment)) {
        if (!result->audit.ok) sentences << CardPanel::tr("The two routes to its heat differ; the ledger shows both.");
        for (const Message &warning : result->warnings) sentences << sentenceOf(warning, snapshot.units);
    }
    sentences.removeAll(QString());
    return sentences.join(QLatin1Char(' '));
}

/// The field a failure belongs to: the one whose value lies at, above or below the pointer; empty if none does.
QString fieldAt(const std::vector<FormField> &form, const std::string &prefix, const std::string &pointer)
{
    for (const FormField &field : form) {
        const std::string place = prefix + field.pointer;
        if (!field.pointer.empty() && (pointer.rfind(place, 0) == 0)) return QString::fromStdString(field.id);
    }
    for (const FormField &field : form)
        if (!field.pointer.empty() && pointer == prefix + "/end" && field.pointer.rfind("/end", 0) == 0)
            return QString::fromStdString(field.id);
    return {};
}

QLabel *noteLabel(QWidget *parent, const QString &role)
{
    auto *label = new QLabel(parent);
    label->setWordWrap(true);
    label->setFont(role == QLatin1String("warning") ? face(12, QFont::DemiBold) : labelFace());
    label->setProperty("role", role);
    label->hide();
    return label;
}

void say(QLabel *label, const QString &text)
{
    label->setText(text);
    label->setVisible(!text.isEmpty());
}

} // namespace

CardPanel::CardPanel(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light)), m_form(new FormView(this)),
      m_error(noteLabel(this, QStringLiteral("error"))), m_warning(noteLabel(this, QStringLiteral("warning"))),
      m_remark(noteLabel(this, QString()))
{
    auto *column = new QVBoxLayout(this);
    column->setContentsMargins(12, 8, 12, 8);
    column->setSpacing(1);
    column->addWidget(m_form);
    column->addSpacing(3);
    column->addWidget(m_error);
    column->addWidget(m_warning);
    column->addWidget(m_remark);
    connect(&session, &Session::snapshotChanged, this, &CardPanel::refresh);
    connect(&session, &Session::selectionChanged, this, &CardPanel::turnTo);
    connect(m_form, &FormView::chosen, this, &CardPanel::choose);
    connect(m_form, &FormView::typed, this, &CardPanel::type);
    connect(m_form, &FormView::entered, this, &CardPanel::enter);
    connect(m_form, &FormView::restored, &session, &Session::cancelPreview);
    connect(m_form, &FormView::escaped, this, &CardPanel::foldRequested);
    refresh();
}

void CardPanel::setLook(const Palette &look)
{
    m_look = look;
    m_form->setLook(look);
    update();
}

void CardPanel::turnTo(int segment)
{
    m_form->finishTyping(); // what was typed belongs to the card left behind
    m_form->forgetTyping();
    m_segment = segment;
    refresh();
}

void CardPanel::refresh()
{
    const Snapshot &now = m_session.now();
    const int segment = m_segment;
    if (isStart()) {
        m_form->setRejectsInvalid(true);
        m_form->setForm(startForm(now), 1);
        showNotes();
        return;
    }
    const document::Json *json = segmentAt(now.design, segment);
    if (!json) return;
    const Failure *failure = failureOf(now, segment);
    const auto form = segmentForm(*json, failure && failure->reason == Reason::ambiguous);
    m_form->setRejectsInvalid(false);
    m_form->setForm(form, form.size() > linesInOneColumn ? 2 : 1);
    showNotes();
}

void CardPanel::showNotes()
{
    const Snapshot &now = m_session.now();
    const int segment = m_segment;
    QMap<QString, QString> atFields;
    QString error, warning, remark;
    if (isStart()) {
        error = startFault(now);
        remark = startSentence(now);
    } else if (const Failure *failure = failureOf(now, segment)) {
        const auto form = segmentForm(*segmentAt(now.design, segment), failure->reason == Reason::ambiguous);
        const QString field = fieldAt(form, segmentPointer(segment), failure->pointer);
        if (field.isEmpty())
            error = sentenceOf(*failure, now.units);
        else
            atFields.insert(field, sentenceOf(*failure, now.units));
    } else if (const auto *result = resultOf(now, segment)) {
        warning = warningsOf(now, segment);
        remark = endSentence(*result, endKeysOf(*segmentAt(now.design, segment)), now.units);
    }
    m_form->setSentences(atFields);
    say(m_error, error);
    say(m_warning, warning);
    say(m_remark, remark);
}

QStringList CardPanel::notes() const
{
    QStringList all{m_error->text(), m_warning->text(), m_remark->text()};
    all.removeAll(QString());
    return all;
}

document::Design CardPanel::edited(const QString &id, const QString &text) const
{
    const document::Design &base = m_session.base().design;
    const FormField *field = m_form->field(id);
    if (isStart()) return startEntered(base, *field, text);
    const int segment = m_segment;
    return withValue(base, segmentPointer(segment), segmentEntered(*segmentAt(base, segment), *field, text));
}

void CardPanel::type(const QString &id, const QString &text)
{
    const document::Design design = edited(id, text);
    if (isStart() && m_session.faultIn(design)) return; // without a start nothing of the path would be left to see
    m_session.preview(design);
}

void CardPanel::enter(const QString &id, const QString &text)
{
    const FormField *field = m_form->field(id);
    const document::Design design = edited(id, text);
    if (isStart())
        if (const auto fault = m_session.faultIn(design)) {
            m_form->refuse(id, sentenceOf(*fault, m_session.now().units));
            return;
        }
    const QString what = field->choices.empty()
                             ? field->caption
                             : tr("%1 of %2").arg(QString::fromStdString(field->chosen), field->caption);
    m_session.apply(design, tr("Change %1").arg(what));
}

void CardPanel::choose(const QString &id, const QString &key)
{
    const FormField field = *m_form->field(id);
    if (key.toStdString() == field.chosen) return;
    m_session.cancelPreview();
    const Snapshot &base = m_session.base();
    if (isStart()) {
        m_session.apply(startChosen(base, field, key.toStdString()), tr("Change given quantity"));
        return;
    }
    const int segment = m_segment;
    if (id == QLatin1String("kind")) {
        if (const auto kind = path::kindFromKey(key.toStdString())) changeKind(m_session, segment, *kind);
        return;
    }
    const FormContext context{resultOf(base, segment), base.units};
    const auto changed = segmentChosen(*segmentAt(base.design, segment), field, key.toStdString(), context);
    m_session.apply(withValue(base.design, segmentPointer(segment), changed), tr("Change %1").arg(field.caption));
}

void CardPanel::standOn(const QRect &card, const QRect &bounds)
{
    m_card = card;
    const bool two = !isStart() && layout() && m_form->columns() == 2;
    const int wanted = std::max(card.width(), two ? wide : narrow);
    const int high = layout()->hasHeightForWidth() ? layout()->heightForWidth(wanted) : layout()->sizeHint().height();
    const int left = std::clamp(card.left(), bounds.left(), std::max(bounds.left(), bounds.right() + 1 - wanted));
    setGeometry(left, card.top() - high, wanted, high + 1);
    update();
}

bool CardPanel::event(QEvent *event)
{
    if (event->type() == QEvent::LayoutRequest) emit resized();
    return QWidget::event(event);
}

void CardPanel::mousePressEvent(QMouseEvent *event)
{
    event->accept();
}

void CardPanel::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.setRenderHint(QPainter::Antialiasing);
    painter.setPen(QPen(m_look.accent, 2));
    painter.setBrush(m_look.ground);
    // Rounded above; below the sides run on into the card.
    const QRectF box = QRectF(rect()).adjusted(1, 1, -1, m_card.width() < width() ? -1 : 12);
    QPainterPath outline(box.bottomLeft());
    outline.lineTo(box.left(), box.top() + radius);
    outline.arcTo(QRectF(box.left(), box.top(), 2 * radius, 2 * radius), 180, -90);
    outline.lineTo(box.right() - radius, box.top());
    outline.arcTo(QRectF(box.right() - 2 * radius, box.top(), 2 * radius, 2 * radius), 90, -90);
    outline.lineTo(box.bottomRight());
    outline.closeSubpath();
    painter.drawPath(outline);
    if (m_card.width() >= width()) return;
    // Wider than its card: the lower edge is open where the card goes on.
    const int from = m_card.left() - x();
    painter.fillRect(QRectF(from + 2, height() - 2, m_card.width() - 4, 2), m_look.ground);
}

} // namespace quasistat::ui
