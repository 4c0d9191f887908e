#include "ui/fields/form_view.h"

#include "ui/fields/choice_field.h"
#include "ui/fields/text_field.h"
#include "ui/look/glyph.h"
#include "ui/look/type.h"

#include <QAbstractItemView>
#include <QApplication>
#include <QGridLayout>
#include <QSignalBlocker>

namespace quasistat::ui
{

namespace
{

constexpr int fieldHeight = 28;
constexpr int lineGap = 4; // 32 px from line to line
constexpr int captionWidth = 44;

bool sameShape(const FormField &a, const FormField &b)
{
    const auto sameKeys = [](const FieldChoice &x, const FieldChoice &y) { return x.key == y.key; };
    return a.id == b.id && a.content == b.content &&
           std::equal(a.choices.begin(), a.choices.end(), b.choices.begin(), b.choices.end(), sameKeys);
}

int indexOf(const FormField &field)
{
    for (std::size_t i = 0; i < field.choices.size(); ++i)
        if (field.choices[i].key == field.chosen) return static_cast<int>(i);
    return -1;
}

} // namespace

FormView::FormView(QWidget *parent) : QWidget(parent), m_look(ui::palette(Scheme::light)) {}

void FormView::setForm(const std::vector<FormField> &fields, int columns)
{
    const auto same = [](const Line &line, const FormField &field) { return sameShape(line.field, field); };
    const bool fits =
        columns == m_columns && std::equal(m_lines.begin(), m_lines.end(), fields.begin(), fields.end(), same);
    if (!fits) build(fields, columns);
    update(fields);
}

void FormView::build(const std::vector<FormField> &fields, int columns)
{
    const QWidget *focus = isAncestorOf(QApplication::focusWidget()) ? QApplication::focusWidget() : nullptr;
    const QString focused = focus ? focus->objectName() : QString();
    clear();
    m_columns = columns;

    auto *grid = new QGridLayout(this);
    grid->setContentsMargins(0, 0, 0, 0);
    grid->setHorizontalSpacing(6);
    grid->setVerticalSpacing(lineGap);
    const int rows = (static_cast<int>(fields.size()) + columns - 1) / columns;
    m_lines.resize(fields.size());
    for (std::size_t i = 0; i < fields.size(); ++i) {
        m_lines[i].field = fields[i];
        const int place = static_cast<int>(i);
        buildLine(m_lines[i], *grid, place % rows, place / rows);
    }
    for (int column = 0; column < columns; ++column) {
        grid->setColumnMinimumWidth(4 * column, captionWidth);
        grid->setColumnStretch(4 * column + 1, 7);
        grid->setColumnStretch(4 * column + 2, 5);
        if (column + 1 < columns) grid->setColumnMinimumWidth(4 * column + 3, 8);
    }
    for (const Line &line : m_lines) {
        line.caption->show();
        if (line.choice) line.choice->show();
        if (line.value) line.value->QWidget::show();
    }
    if (focused.isEmpty()) return;
    if (auto *again = findChild<QWidget *>(focused)) again->setFocus(Qt::OtherFocusReason);
}

void FormView::clear()
{
    for (Line &line : m_lines) // a field that goes away must not enter its text as its focus leaves
        if (line.value) line.value->setModified(false);
    m_lines.clear();
    // Later: the form may be built anew by a signal of one of these.
    for (auto *child : findChildren<QWidget *>(QString(), Qt::FindDirectChildrenOnly)) {
        child->hide();
        child->setParent(nullptr);
        child->deleteLater();
    }
    delete layout();
}

void FormView::finishTyping()
{
    for (const Line &line : m_lines)
        if (line.value && line.value->isBeingTyped()) {
            line.value->enter();
            return;
        }
}

void FormView::buildLine(Line &line, QGridLayout &grid, int row, int column)
{
    const QString id = QString::fromStdString(line.field.id);
    line.caption = new QLabel(line.field.caption, this);
    line.caption->setFont(bodyFace());
    line.caption->setProperty("role", QStringLiteral("secondary"));
    grid.addWidget(line.caption, 2 * row, 4 * column);
    const bool both = !line.field.choices.empty() && line.field.content != FieldContent::none;
    if (!line.field.choices.empty()) {
        buildChoice(line);
        grid.addWidget(line.choice, 2 * row, 4 * column + 1, 1, both ? 1 : 2);
    }
    if (line.field.content != FieldContent::none) {
        buildValue(line);
        grid.addWidget(line.value, 2 * row, 4 * column + (both ? 2 : 1), 1, both ? 1 : 2);
        line.caption->setBuddy(line.value);
    }
    line.sentence = new QLabel(this);
    line.sentence->setObjectName(id + QStringLiteral(".sentence"));
    line.sentence->setFont(labelFace());
    line.sentence->setWordWrap(true);
    line.sentence->setProperty("role", QStringLiteral("error"));
    line.sentence->hide();
    grid.addWidget(line.sentence, 2 * row + 1, 4 * column, 1, 3);
}

void FormView::buildChoice(Line &line)
{
    const QString id = QString::fromStdString(line.field.id);
    line.choice = new ChoiceField(this);
    line.choice->setObjectName(id + QStringLiteral(".choice"));
    line.choice->setAccessibleName(line.field.caption);
    line.choice->setFont(bodyFace());
    line.choice->setFixedHeight(fieldHeight);
    line.choice->setMinimumContentsLength(4);
    line.choice->setSizeAdjustPolicy(QComboBox::AdjustToMinimumContentsLengthWithIcon);
    for (const FieldChoice &choice : line.field.choices) {
        const QIcon icon = choice.glyph ? glyphIcon(*choice.glyph, m_look) : QIcon();
        line.choice->addItem(icon, choice.words, QString::fromStdString(choice.key));
    }
    // The list opens as wide as its longest words, though the closed field is narrow.
    line.choice->view()->setMinimumWidth(line.choice->view()->sizeHintForColumn(0) + 32);
    connect(line.choice, &QComboBox::activated, this,
            [this, id, choice = line.choice](int index) { emit chosen(id, choice->itemData(index).toString()); });
}

void FormView::buildValue(Line &line)
{
    const QString id = QString::fromStdString(line.field.id);
    line.value = new TextField(this);
    line.value->setObjectName(id);
    line.value->setAccessibleName(line.field.caption);
    line.value->setFont(bodyFace());
    line.value->setFixedHeight(fieldHeight);
    connect(line.value, &QLineEdit::textEdited, this, [this, id](const QString &text) {
        Line *edited = lineOf(id);
        const QString complaint = complaintOf(edited->field, text);
        say(*edited, complaint);
        if (complaint.isEmpty()) emit typed(id, text);
    });
    connect(line.value, &TextField::entered, this, [this, id](const QString &text) {
        Line *left = lineOf(id);
        if (m_rejectsInvalid && !complaintOf(left->field, text).isEmpty())
            left->value->setModified(true);
        else
            emit entered(id, text);
    });
    connect(line.value, &TextField::restored, this, [this, id] {
        say(*lineOf(id), {});
        emit restored(id);
    });
    connect(line.value, &TextField::escaped, this, &FormView::escaped);
}

void FormView::update(const std::vector<FormField> &fields)
{
    for (std::size_t i = 0; i < fields.size(); ++i) {
        Line &line = m_lines[i];
        line.field = fields[i];
        line.caption->setText(fields[i].caption);
        if (line.choice) {
            const QSignalBlocker quiet(line.choice);
            line.choice->setCurrentIndex(indexOf(fields[i]));
        }
        if (!line.value) continue;
        line.value->show(fields[i].value);
        line.value->setPlaceholderText(fields[i].placeholder);
        if (!fields[i].suggestions.empty()) line.value->setSuggestions(fields[i].suggestions);
    }
}

void FormView::setLook(const Palette &look)
{
    m_look = look;
    for (Line &line : m_lines)
        if (line.choice)
            for (std::size_t i = 0; i < line.field.choices.size(); ++i)
                if (const auto &glyph = line.field.choices[i].glyph)
                    line.choice->setItemIcon(static_cast<int>(i), glyphIcon(*glyph, look));
}

void FormView::refuse(const QString &id, const QString &sentence)
{
    Line *line = lineOf(id);
    if (!line) return;
    say(*line, sentence);
    if (line->value) line->value->setModified(true);
}

void FormView::forgetTyping()
{
    for (const Line &line : m_lines)
        if (line.value) line.value->setModified(false);
}

void FormView::setSentences(const QMap<QString, QString> &byId)
{
    for (Line &line : m_lines) {
        const bool typing = line.value && line.value->isBeingTyped();
        const QString own = typing ? complaintOf(line.field, line.value->text()) : QString();
        say(line, own.isEmpty() ? byId.value(QString::fromStdString(line.field.id)) : own);
    }
}

void FormView::say(Line &line, const QString &sentence)
{
    line.sentence->setText(sentence);
    line.sentence->setVisible(!sentence.isEmpty());
    if (QWidget *input = line.value) input->setAccessibleDescription(sentence);
}

void FormView::focusFirst()
{
    for (const Line &line : m_lines)
        if (line.value) {
            line.value->setFocus(Qt::OtherFocusReason);
            line.value->selectAll();
            return;
        }
}

TextField *FormView::valueOf(const QString &id) const
{
    const Line *line = lineOf(id);
    return line ? line->value : nullptr;
}

QComboBox *FormView::choiceOf(const QString &id) const
{
    const Line *line = lineOf(id);
    return line ? line->choice : nullptr;
}

QString FormView::sentenceOf(const QString &id) const
{
    const Line *line = lineOf(id);
    return line ? line->sentence->text() : QString();
}

const FormField *FormView::field(const QString &id) const
{
    const Line *line = lineOf(id);
    return line ? &line->field : nullptr;
}

FormView::Line *FormView::lineOf(const QString &id)
{
    return const_cast<Line *>(std::as_const(*this).lineOf(id));
}

const FormView::Line *FormView::lineOf(const QString &id) const
{
    for (const Line &line : m_lines)
        if (QString::fromStdString(line.field.id) == id) return &line;
    return nullptr;
}

} // namespace quasistat::ui
