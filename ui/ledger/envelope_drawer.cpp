#include "ui/ledger/envelope_drawer.h"

#include "ui/look/type.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"
#include "ui/strip/end_field.h"
#include "ui/strip/segment_form.h"

#include <QKeyEvent>
#include <QPainter>
#include <QScrollArea>

namespace quasistat::ui
{

using analysis::LimitQuantity;
using document::Json;

namespace
{

struct LimitKey {
    const char *key;
    LimitQuantity quantity;
};
constexpr LimitKey limitKeys[] = {
    {"pressure", LimitQuantity::pressure}, {"temperature", LimitQuantity::temperature},
    {"volume", LimitQuantity::volume},     {"pressure_ratio", LimitQuantity::pressureRatio},
    {"work", LimitQuantity::work},         {"heat", LimitQuantity::heat},
    {"amount", LimitQuantity::amount},     {"stored_energy", LimitQuantity::storedEnergy},
};

int limitCount(const document::Design &design)
{
    const Json *limits = valueAt(design.json, "/limits");
    return limits && limits->is_array() ? static_cast<int>(limits->size()) : 0;
}

std::string pointerOf(int limit, const std::string &key = {})
{
    return "/limits/" + std::to_string(limit) + key;
}

LimitQuantity quantityOf(const std::string &key)
{
    for (const LimitKey &entry : limitKeys)
        if (key == entry.key) return entry.quantity;
    return LimitQuantity::pressure;
}

FormField boundField(const char *key, const QString &caption, const Json &limit, LimitQuantity quantity)
{
    FormField field{.id = key, .caption = caption};
    field.content = quantity == LimitQuantity::pressureRatio ? FieldContent::number : FieldContent::quantity;
    field.quantity = limitUnitQuantity(quantity);
    field.pointer = std::string("/") + key;
    field.value = typedAt(limit, field.pointer);
    field.placeholder = EnvelopeDrawer::tr("none");
    field.optional = true;
    return field;
}

std::vector<FormField> limitForm(const Json &limit)
{
    FormField what{.id = "quantity", .caption = EnvelopeDrawer::tr("limit on")};
    for (const LimitKey &entry : limitKeys) what.choices.push_back({entry.key, limitQuantityWords(entry.quantity)});
    what.chosen = typedAt(limit, "/quantity").toStdString();
    const LimitQuantity quantity = quantityOf(what.chosen);
    FormField label{.id = "label", .caption = EnvelopeDrawer::tr("called")};
    label.content = FieldContent::text;
    label.pointer = "/label";
    label.value = typedAt(limit, "/label");
    std::vector<FormField> form{what, label};
    if (valueAt(limit, "/max_at")) return form; // a rating table is kept as the file states it
    form.push_back(boundField("max", EnvelopeDrawer::tr("highest"), limit, quantity));
    form.push_back(boundField("min", EnvelopeDrawer::tr("lowest"), limit, quantity));
    return form;
}

QLabel *wrapped(const QString &text, QWidget *parent)
{
    auto *label = new QLabel(text, parent);
    label->setWordWrap(true);
    label->setFont(labelFace());
    label->setProperty("role", QStringLiteral("secondary"));
    return label;
}

} // namespace

EnvelopeDrawer::EnvelopeDrawer(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light))
{
    setFocusPolicy(Qt::StrongFocus);
    auto *column = new QVBoxLayout(this);
    column->setContentsMargins(16, 10, 16, 12);
    column->setSpacing(8);
    auto *head = new QHBoxLayout;
    auto *title = new QLabel(tr("Envelope"), this);
    title->setFont(headingFace());
    auto *close = new QPushButton(tr("Back to the ledger"), this);
    close->setFont(labelFace());
    close->setObjectName(QStringLiteral("closeEnvelope"));
    close->setProperty("role", QStringLiteral("quiet"));
    connect(close, &QPushButton::clicked, this, &EnvelopeDrawer::closed);
    head->addWidget(title, 1);
    head->addWidget(close);
    column->addLayout(head);

    auto *scroll = new QScrollArea(this);
    scroll->setFrameShape(QFrame::NoFrame);
    scroll->setWidgetResizable(true);
    scroll->setFocusPolicy(Qt::NoFocus);
    scroll->viewport()->setAutoFillBackground(false);
    auto *inside = new QWidget;
    inside->setAutoFillBackground(false);
    m_list = new QVBoxLayout(inside);
    m_list->setContentsMargins(0, 0, 4, 0);
    m_list->setSpacing(12);
    m_list->addStretch(1);
    scroll->setWidget(inside);
    column->addWidget(scroll, 1);

    auto *another = new QPushButton(tr("Add a limit"), this);
    another->setFont(bodyFace());
    another->setObjectName(QStringLiteral("addLimit"));
    connect(another, &QPushButton::clicked, this, &EnvelopeDrawer::add);
    column->addWidget(another);
    column->addWidget(
        wrapped(tr("Results are estimates for planning. Pressure equipment, relief and oxygen service are "
                   "governed by local codes and must be reviewed by a competent person."),
                this));
    connect(&session, &Session::snapshotChanged, this, &EnvelopeDrawer::refresh);
    refresh();
}

void EnvelopeDrawer::setLook(const Palette &look)
{
    m_look = look;
    for (FormView *form : m_forms) form->setLook(look);
    update();
}

FormView *EnvelopeDrawer::form(int limit) const
{
    const bool exists = limit >= 0 && limit < static_cast<int>(m_forms.size());
    return exists ? m_forms[static_cast<std::size_t>(limit)] : nullptr;
}

void EnvelopeDrawer::refresh()
{
    const Snapshot &now = m_session.now();
    const int count = limitCount(now.design);
    matchForms(count);
    for (int i = 0; i < count; ++i) form(i)->setForm(limitForm(now.design.json["limits"][static_cast<std::size_t>(i)]));
}

void EnvelopeDrawer::matchForms(int count)
{
    while (static_cast<int>(m_forms.size()) > count) {
        QWidget *block = m_forms.back()->parentWidget();
        m_forms.pop_back();
        block->hide();
        block->deleteLater();
    }
    while (static_cast<int>(m_forms.size()) < count) {
        const int limit = static_cast<int>(m_forms.size());
        m_list->insertWidget(limit, createLimit(limit));
    }
}

QWidget *EnvelopeDrawer::createLimit(int limit)
{
    auto *block = new QWidget;
    auto *column = new QVBoxLayout(block);
    column->setContentsMargins(0, 0, 0, 0);
    column->setSpacing(4);
    auto *fields = new FormView(block);
    fields->setRejectsInvalid(true);
    fields->setLook(m_look);
    auto *gone = new QPushButton(tr("Remove this limit"), block);
    gone->setFont(labelFace());
    gone->setObjectName(QStringLiteral("removeLimit%1").arg(limit + 1));
    gone->setProperty("role", QStringLiteral("quiet"));
    column->addWidget(fields);
    column->addWidget(gone, 0, Qt::AlignRight);
    connect(gone, &QPushButton::clicked, this, [this, limit] { remove(limit); });
    connect(fields, &FormView::chosen, this,
            [this, limit](const QString &, const QString &key) { choose(limit, key); });
    connect(fields, &FormView::typed, this,
            [this, limit](const QString &id, const QString &text) { enter(limit, id, text, true); });
    connect(fields, &FormView::entered, this,
            [this, limit](const QString &id, const QString &text) { enter(limit, id, text, false); });
    connect(fields, &FormView::restored, &m_session, &Session::cancelPreview);
    connect(fields, &FormView::escaped, this, &EnvelopeDrawer::closed);
    m_forms.push_back(fields);
    return block;
}

void EnvelopeDrawer::add()
{
    const document::Design &base = m_session.base().design;
    Json limits = limitCount(base) > 0 ? base.json["limits"] : Json::array();
    double highest = 0.0;
    if (m_session.base().evaluation)
        for (const auto &state : m_session.base().evaluation->path.states)
            highest = std::max(highest, state.state.pressure());
    Json limit{{"quantity", "pressure"}, {"max", "10 bar"}};
    if (highest > 0.0) // a limit that says something about this path: its own highest pressure
        limit["max"] = typedValue(highest, units::Quantity::pressure, m_session.base().units).toStdString();
    limits.push_back(limit);
    m_session.apply(withValue(base, "/limits", limits), tr("Add a limit"));
}

void EnvelopeDrawer::remove(int limit)
{
    m_session.apply(withoutValue(m_session.base().design, pointerOf(limit)), tr("Remove a limit"));
}

void EnvelopeDrawer::choose(int limit, const QString &key)
{
    const document::Design &base = m_session.base().design;
    Json changed = *valueAt(base.json, pointerOf(limit));
    if (typed(valueAt(changed, "/quantity")) == key) return;
    changed["quantity"] = key.toStdString();
    for (const char *bound : {"min", "max", "max_at"}) changed.erase(bound); // in another unit they mean nothing
    const LimitQuantity quantity = quantityOf(key.toStdString());
    switch (quantity) { // a bound to start from, as a limit needs one
    case LimitQuantity::pressure: changed["max"] = "10 bar"; break;
    case LimitQuantity::temperature: changed["max"] = "150 °C"; break;
    case LimitQuantity::volume: changed["max"] = "10 L"; break;
    case LimitQuantity::pressureRatio: changed["max"] = 4; break;
    case LimitQuantity::work:
    case LimitQuantity::heat:
    case LimitQuantity::storedEnergy: changed["max"] = "1 kJ"; break;
    case LimitQuantity::amount: changed["max"] = "1 mol"; break;
    }
    m_session.apply(withValue(base, pointerOf(limit), changed), tr("Change a limit"));
}

void EnvelopeDrawer::enter(int limit, const QString &id, const QString &text, bool previewOnly)
{
    const std::string pointer = pointerOf(limit, std::string(1, '/').append(id.toStdString()));
    const bool number = form(limit)->field(id)->content == FieldContent::number && !text.trimmed().isEmpty();
    const document::Design &base = m_session.base().design;
    const document::Design changed =
        number ? withValue(base, pointer, numberAsTyped(text)) : withText(base, pointer, text);
    if (const auto fault = m_session.faultIn(changed)) {
        if (!previewOnly) form(limit)->refuse(id, sentenceOf(*fault, m_session.now().units));
        return;
    }
    if (previewOnly)
        m_session.preview(changed);
    else
        m_session.apply(changed, tr("Change a limit"));
}

void EnvelopeDrawer::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.fillRect(rect(), m_look.panel);
    painter.fillRect(QRect(0, 0, 1, height()), m_look.rule());
}

void EnvelopeDrawer::keyPressEvent(QKeyEvent *event)
{
    if (event->key() == Qt::Key_Escape)
        emit closed();
    else
        QWidget::keyPressEvent(event);
}

} // namespace quasistat::ui
