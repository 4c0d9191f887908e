#include "ui/gas/composition_editor.h"

#include "ui/fields/choice_field.h"
#include "ui/fields/text_field.h"
#include "ui/look/type.h"

#include <QGridLayout>
#include <QHBoxLayout>
#include <QSignalBlocker>
#include <QVBoxLayout>

namespace quasistat::ui
{
namespace
{

constexpr int fieldHeight = 28;
constexpr int shareWidth = 112;

TextField *fieldIn(QWidget *parent, const QString &spoken)
{
    auto *field = new TextField(parent);
    field->setFont(bodyFace());
    field->setFixedHeight(fieldHeight);
    field->setAccessibleName(spoken);
    return field;
}

QPushButton *quietButton(QWidget *parent, const QString &text, const QString &name)
{
    auto *button = new QPushButton(text, parent);
    button->setObjectName(name);
    button->setProperty("role", QStringLiteral("quiet"));
    button->setFont(bodyFace());
    return button;
}

} // namespace

CompositionEditor::CompositionEditor(QWidget *parent) : QWidget(parent)
{
    auto *column = new QVBoxLayout(this);
    column->setContentsMargins(0, 0, 0, 0);
    column->setSpacing(4);
    auto *head = new QHBoxLayout;
    auto *caption = new QLabel(tr("made of"), this);
    caption->setFont(bodyFace());
    caption->setProperty("role", QStringLiteral("secondary"));
    m_basis = new ChoiceField(this);
    m_basis->setObjectName(QStringLiteral("basis.choice"));
    m_basis->setAccessibleName(tr("Basis of the fractions"));
    m_basis->setFont(bodyFace());
    m_basis->setFixedHeight(fieldHeight);
    m_basis->setFixedWidth(shareWidth + fieldHeight + 4);
    m_basis->addItems({tr("mole fraction"), tr("mass fraction")});
    connect(m_basis, &QComboBox::activated, this, [this] { take(false); });
    head->addWidget(caption);
    head->addStretch();
    head->addWidget(m_basis);
    column->addLayout(head);
    createFoot();
}

void CompositionEditor::createFoot()
{
    auto *foot = new QHBoxLayout;
    foot->setContentsMargins(0, 2, 0, 0);
    m_add = quietButton(this, tr("Add a gas"), QStringLiteral("addGas"));
    connect(m_add, &QPushButton::clicked, this, [this] {
        m_draft = draftAsTyped();
        m_draft.rows.push_back({});
        fitLines();
        judge();
        m_lines.back().name->setFocus(Qt::OtherFocusReason);
        emit changed();
    });
    m_divide = quietButton(this, tr("Divide by the sum"), QStringLiteral("divideBySum"));
    m_divide->hide();
    connect(m_divide, &QPushButton::clicked, this, [this] {
        forgetTyping();
        setDraft(dividedBySum(draftAsTyped()));
        emit changed();
    });
    m_sum = new QLabel(this);
    m_sum->setObjectName(QStringLiteral("sumOfFractions"));
    m_sum->setFont(labelFace());
    m_sum->setAlignment(Qt::AlignRight | Qt::AlignVCenter);
    m_sum->setWordWrap(true);
    foot->addWidget(m_add);
    foot->addWidget(m_divide);
    foot->addWidget(m_sum, 1);
    qobject_cast<QVBoxLayout *>(layout())->addLayout(foot);
}

void CompositionEditor::setGases(const std::vector<GasEntry> &gases, const QStringList &own)
{
    if (gases == m_gases && own == m_own) return;
    m_gases = gases;
    m_own = own;
    m_suggestions = suggestionsOf(gases);
    for (const QString &name : own) m_suggestions.push_back({name, tr("%1, your own").arg(name), {}});
    for (const Line &line : m_lines) line.name->setSuggestions(m_suggestions);
    judge();
}

void CompositionEditor::setDraft(const MixtureDraft &draft)
{
    m_draft = draft;
    fitLines();
    for (std::size_t i = 0; i < m_lines.size(); ++i) {
        m_lines[i].name->show(draft.rows[i].name);
        m_lines[i].share->show(draft.rows[i].share);
    }
    const QSignalBlocker quiet(m_basis);
    m_basis->setCurrentIndex(draft.byMass ? 1 : 0);
    judge();
}

void CompositionEditor::fitLines()
{
    while (m_lines.size() > m_draft.rows.size()) {
        Line &line = m_lines.back();
        line.name->setModified(false); // a field that goes away must not enter its text
        line.share->setModified(false);
        line.holder->hide();
        line.holder->deleteLater();
        m_lines.pop_back();
    }
    while (m_lines.size() < m_draft.rows.size()) addLine();
}

void CompositionEditor::addLine()
{
    Line line;
    line.holder = new QWidget(this);
    auto *grid = new QGridLayout(line.holder);
    grid->setContentsMargins(0, 0, 0, 0);
    grid->setHorizontalSpacing(4);
    grid->setVerticalSpacing(2);
    const int number = static_cast<int>(m_lines.size()) + 1;
    line.name = fieldIn(line.holder, tr("Gas %1").arg(number));
    line.name->setObjectName(QStringLiteral("gas%1.name").arg(number));
    line.name->setPlaceholderText(tr("name or formula"));
    line.name->setSuggestions(m_suggestions);
    line.share = fieldIn(line.holder, tr("Fraction of gas %1").arg(number));
    line.share->setObjectName(QStringLiteral("gas%1.share").arg(number));
    line.share->setFixedWidth(shareWidth);
    line.remove = quietButton(line.holder, QStringLiteral("×"), QStringLiteral("gas%1.remove").arg(number));
    line.remove->setFixedSize(fieldHeight, fieldHeight);
    line.remove->setToolTip(tr("Remove this gas"));
    line.remove->setAccessibleName(tr("Remove gas %1").arg(number));
    line.words = new QLabel(line.holder);
    line.words->setFont(labelFace());
    line.words->setWordWrap(true);
    line.words->setProperty("role", QStringLiteral("error"));
    line.words->hide();
    grid->addWidget(line.name, 0, 0);
    grid->addWidget(line.share, 0, 1);
    grid->addWidget(line.remove, 0, 2);
    grid->addWidget(line.words, 1, 0, 1, 3);
    connectField(line.name);
    connectField(line.share);
    connect(line.remove, &QPushButton::clicked, this, [this, holder = line.holder] { removeRow(holder); });
    auto *column = qobject_cast<QVBoxLayout *>(layout());
    column->insertWidget(column->count() - 1, line.holder);
    line.holder->show();
    // Tab walks down the rows before it comes to the buttons.
    QWidget *before = m_lines.empty() ? static_cast<QWidget *>(m_basis) : m_lines.back().remove;
    setTabOrder(before, line.name);
    setTabOrder(line.name, line.share);
    setTabOrder(line.share, line.remove);
    setTabOrder(line.remove, m_add);
    setTabOrder(m_add, m_divide);
    m_lines.push_back(line);
}

void CompositionEditor::connectField(TextField *field)
{
    connect(field, &QLineEdit::textEdited, this, [this] { take(true); });
    connect(field, &TextField::entered, this, [this] { take(false); });
    connect(field, &TextField::restored, this, [this] {
        m_draft = draftAsTyped();
        judge();
        emit restored();
    });
    connect(field, &TextField::escaped, this, &CompositionEditor::escaped);
}

MixtureDraft CompositionEditor::draftAsTyped() const
{
    MixtureDraft draft{.byMass = m_basis->currentIndex() == 1, .rows = {}};
    for (const Line &line : m_lines) draft.rows.push_back({line.name->text(), line.share->text()});
    return draft;
}

void CompositionEditor::take(bool isTyping)
{
    m_draft = draftAsTyped();
    judge();
    if (isTyping)
        emit typed();
    else
        emit changed();
}

void CompositionEditor::removeRow(const QWidget *holder)
{
    MixtureDraft draft = draftAsTyped();
    for (std::size_t i = 0; i < m_lines.size(); ++i)
        if (m_lines[i].holder == holder) draft.rows.erase(draft.rows.begin() + static_cast<std::ptrdiff_t>(i));
    forgetTyping();
    setDraft(draft);
    (m_lines.empty() ? static_cast<QWidget *>(m_add) : m_lines.back().name)->setFocus(Qt::OtherFocusReason);
    emit changed();
}

void CompositionEditor::judge()
{
    const MixtureVerdict verdict = this->verdict();
    for (std::size_t i = 0; i < m_lines.size(); ++i) {
        const QString words = verdict.rowWords.value(static_cast<int>(i));
        m_lines[i].words->setText(words);
        m_lines[i].words->setVisible(!words.isEmpty());
        m_lines[i].name->setAccessibleDescription(words);
    }
    const bool isOff = verdict.sum && *verdict.sum > 0.0 && !verdict.isWhole && verdict.rowWords.isEmpty();
    m_divide->setVisible(isOff);
    m_sum->setText(verdict.words);
    const QString role = verdict.isWhole ? QStringLiteral("secondary") : QStringLiteral("error");
    if (m_sum->property("role") == role) return;
    m_sum->setProperty("role", role);
    m_sum->setStyleSheet(m_sum->styleSheet()); // the sheet of the window asks for the role anew
}

void CompositionEditor::forgetTyping()
{
    for (const Line &line : m_lines) {
        line.name->setModified(false);
        line.share->setModified(false);
    }
}

void CompositionEditor::finishTyping()
{
    for (const Line &line : m_lines)
        for (TextField *field : {line.name, line.share})
            if (field->isBeingTyped()) field->enter();
}

TextField *CompositionEditor::nameField(int row) const
{
    return row >= 0 && row < rowCount() ? m_lines[static_cast<std::size_t>(row)].name : nullptr;
}

TextField *CompositionEditor::shareField(int row) const
{
    return row >= 0 && row < rowCount() ? m_lines[static_cast<std::size_t>(row)].share : nullptr;
}

QPushButton *CompositionEditor::removeButton(int row) const
{
    return row >= 0 && row < rowCount() ? m_lines[static_cast<std::size_t>(row)].remove : nullptr;
}

QString CompositionEditor::rowWords(int row) const
{
    return row >= 0 && row < rowCount() ? m_lines[static_cast<std::size_t>(row)].words->text() : QString();
}

std::vector<Suggestion> suggestionsOf(const std::vector<GasEntry> &gases)
{
    std::vector<Suggestion> suggestions;
    for (const GasEntry &gas : gases) {
        const bool hasFormula = !gas.formula.isEmpty() && gas.formula != gas.name;
        const QString words = hasFormula ? QStringLiteral("%1  %2").arg(gas.name, gas.formula) : gas.name;
        QString keys = gas.aliases;
        keys.replace(QLatin1Char('\n'), QLatin1Char(' '));
        suggestions.push_back({gas.name, words, gas.formula + QLatin1Char(' ') + keys});
    }
    return suggestions;
}

} // namespace quasistat::ui
