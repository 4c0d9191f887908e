#include "ui/gas/gas_editor.h"

#include "ui/fields/text_field.h"
#include "ui/gas/gas_words.h"
#include "ui/gas/interaction_form.h"
#include "ui/gas/model_spread.h"
#include "ui/look/type.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"

#include <QHBoxLayout>
#include <QVBoxLayout>

namespace quasistat::ui
{
namespace
{

std::string modelOf(const document::Design &design)
{
    return typedAt(design.json, "/gas/model").toStdString();
}

bool isCubic(const std::string &model)
{
    return model == "peng-robinson" || model == "soave-redlich-kwong";
}

bool takesMixture(const std::string &model)
{
    return model != "perfect" && model != "reference";
}

QLabel *wordsIn(QWidget *parent, const char *role)
{
    auto *label = new QLabel(parent);
    label->setFont(labelFace());
    label->setWordWrap(true);
    label->setProperty("role", QLatin1String(role));
    label->hide();
    return label;
}

void show(QLabel &label, const QString &words)
{
    label.setText(words);
    label.setVisible(!words.isEmpty());
}

} // namespace

GasEditor::GasEditor(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light)), m_form(new FormView(this)),
      m_note(wordsIn(this, "secondary")), m_composition(new CompositionEditor(this))
{
    m_form->setRejectsInvalid(true);
    m_note->setObjectName(QStringLiteral("gasNote"));
    m_note->setTextFormat(Qt::PlainText);
    auto *column = new QVBoxLayout(this);
    column->setContentsMargins(0, 0, 0, 0);
    column->setSpacing(6);
    column->addWidget(m_form);
    column->addWidget(m_note);
    column->addWidget(m_composition);
    createCubicPart();
    connect(m_form, &FormView::escaped, this, &GasEditor::escaped);
    connect(m_composition, &CompositionEditor::typed, this, [this] { takeMixture(true); });
    connect(m_composition, &CompositionEditor::changed, this, [this] { takeMixture(false); });
    connect(m_composition, &CompositionEditor::restored, &session, &Session::cancelPreview);
    connect(m_composition, &CompositionEditor::escaped, this, [this] {
        // What was not finished is given up, as in any field.
        m_composition->setDraft(m_shownMixture);
        emit escaped();
    });
}

void GasEditor::createCubicPart()
{
    auto *column = qobject_cast<QVBoxLayout *>(layout());
    const auto quiet = [&](const QString &name) {
        auto *button = new QPushButton(this);
        button->setObjectName(name);
        button->setProperty("role", QStringLiteral("quiet"));
        button->setFont(bodyFace());
        return button;
    };
    m_showInteractions = quiet(QStringLiteral("showInteractions"));
    m_showInteractions->setCheckable(true);
    m_interactions = new FormView(this);
    m_interactions->setRejectsInvalid(true);
    m_interactions->hide();
    m_addOwn = quiet(QStringLiteral("addOwnGas"));
    m_addOwn->setText(tr("Add a gas of your own"));
    column->addWidget(m_showInteractions, 0, Qt::AlignLeft);
    column->addWidget(m_interactions);
    column->addWidget(m_addOwn, 0, Qt::AlignLeft);
    connect(m_showInteractions, &QPushButton::toggled, this, &GasEditor::refresh);
    connect(m_interactions, &FormView::entered, this, [this](const QString &id, const QString &text) {
        m_session.apply(interactionEntered(m_session.base().design, *m_interactions->field(id), text),
                        tr("Change interaction %1").arg(m_interactions->field(id)->caption));
    });
    connect(m_interactions, &FormView::escaped, this, &GasEditor::escaped);
    connect(m_addOwn, &QPushButton::clicked, this, [this] {
        m_own.push_back({});
        fitOwnLines();
        m_ownLines.back().form->focusFirst();
    });
}

void GasEditor::setLook(const Palette &look)
{
    m_look = look;
    m_form->setLook(look);
}

void GasEditor::refresh()
{
    const document::Design &design = m_session.now().design;
    m_form->setForm(gasForm(design, m_session.library()));
    refreshMixture();
    refreshOwn();
    refreshNote();
}

void GasEditor::refreshMixture()
{
    // Not the design shown: what is previewed while a fraction is typed comes from the rows themselves.
    const document::Design &design = m_session.base().design;
    const std::string model = modelOf(design);
    m_composition->setVisible(takesMixture(model));
    if (takesMixture(model)) {
        m_composition->setGases(gasesOf(model, m_session.library()),
                                isCubic(model) ? ownGasNames(design) : QStringList());
        const MixtureDraft now = mixtureDraft(design);
        // A draft that is not whole yet stays until the document's own composition becomes another one.
        if (now != m_shownMixture || m_composition->rowCount() == 0) {
            MixtureDraft shown = now;
            if (shown.rows.empty()) shown.rows.push_back({});
            m_composition->setDraft(shown);
        }
        m_shownMixture = now;
    }
    const auto pairs = isCubic(model) ? interactionForm(design) : std::vector<FormField>();
    const auto stated = std::ranges::count_if(pairs, [](const FormField &pair) { return !pair.value.isEmpty(); });
    m_showInteractions->setVisible(!pairs.empty());
    m_showInteractions->setText(stated > 0 ? tr("Interaction of pairs: %1 of %2 given").arg(stated).arg(pairs.size())
                                           : tr("Interaction of pairs: none given, 0 holds"));
    m_interactions->setVisible(!pairs.empty() && m_showInteractions->isChecked());
    m_interactions->setForm(pairs);
}

void GasEditor::refreshOwn()
{
    const document::Design &design = m_session.now().design;
    const bool isOffered = isCubic(modelOf(design));
    m_addOwn->setVisible(isOffered);
    const std::vector<OwnGas> now = isOffered ? ownGases(design) : std::vector<OwnGas>();
    if (now != m_shownOwn || !isOffered) m_own = now;
    m_shownOwn = now;
    fitOwnLines();
}

void GasEditor::refreshNote()
{
    const Snapshot &now = m_session.now();
    QString words = lackingWords(now.design, m_session.library());
    const bool isLacking = !words.isEmpty();
    if (const Snapshot *before = m_session.beforeModelChange(); before && !isLacking)
        words = modelChangeWords(*before, now).unstyled();
    else if (now.failure && !isLacking && now.failure->pointer.rfind("/gas", 0) == 0)
        words = sentenceOf(*now.failure, now.units);
    else if (now.evaluation && !isLacking && !now.evaluation->path.gas->isIdeal())
        words = validityWords(now.evaluation->path.gas->validity(), now.units);
    const bool isWrong = isLacking || (now.failure && now.failure->pointer.rfind("/gas", 0) == 0);
    m_note->setProperty("role", isWrong ? QStringLiteral("error") : QStringLiteral("secondary"));
    m_note->setStyleSheet(m_note->styleSheet()); // the sheet of the window asks for the role anew
    ::quasistat::ui::show(*m_note, words);
}

void GasEditor::chooseModel(const std::string &model)
{
    m_session.cancelPreview();
    m_session.apply(m_switch.switched(m_session.base(), model, m_session.library()),
                    tr("Change the model to %1").arg(modelName(model)));
}

void GasEditor::finishTyping()
{
    m_form->finishTyping();
    if (m_composition->isVisible()) m_composition->finishTyping();
    m_interactions->finishTyping();
    for (std::size_t i = 0; i < m_ownLines.size(); ++i) m_ownLines[i].form->finishTyping();
}

bool GasEditor::isOnPath(const document::Design &design) const
{
    const auto fault = m_session.faultIn(design);
    return !fault || fault->pointer.rfind("/gas", 0) != 0;
}

void GasEditor::takeMixture(bool isTyping)
{
    if (!m_composition->verdict().isWhole) {
        m_session.cancelPreview(); // the picture of the last one that was whole stays
        return;
    }
    const document::Design design = withMixture(m_session.base().design, m_composition->draft());
    if (!isTyping)
        m_session.apply(design, tr("Change the composition"));
    else if (isOnPath(design))
        m_session.preview(design);
}

FormView *GasEditor::ownForm(int index)
{
    const auto place = static_cast<std::size_t>(index);
    return index >= 0 && place < m_ownLines.size() ? m_ownLines[place].form : nullptr;
}

} // namespace quasistat::ui
