#pragma once
// A form of small fields, drawn from a list of lines, in one column or two.

#include "ui/fields/form_field.h"
#include "ui/look/palette.h"

#include <QComboBox>

#include <QLabel>
#include <QMap>
#include <QWidget>

class QGridLayout;

namespace quasistat::ui
{

class TextField;

class FormView : public QWidget
{
    Q_OBJECT
public:
    explicit FormView(QWidget *parent = nullptr);

    /// Shows `fields`: widgets are made anew only where the form has another shape, so that typing goes on undisturbed.
    void setForm(const std::vector<FormField> &fields, int columns = 1);
    void setLook(const Palette &palette);
    /// A text that cannot stand is not entered: it stays in its field with the sentence.
    void setRejectsInvalid(bool rejects) { m_rejectsInvalid = rejects; }
    /// Sentences under their fields, by id; others are cleared. A text being typed that cannot stand keeps its own.
    void setSentences(const QMap<QString, QString> &byId);
    void focusFirst();
    /// Enters the text that is being typed, as if its field were left.
    void finishTyping();
    void forgetTyping(); ///< the next setForm shows what the document holds
    /// The text of this field does not do: it stays with the sentence, as if still being typed.
    void refuse(const QString &id, const QString &sentence);
    [[nodiscard]] int columns() const { return m_columns; }

    [[nodiscard]] TextField *valueOf(const QString &id) const;
    [[nodiscard]] QComboBox *choiceOf(const QString &id) const;
    [[nodiscard]] QString sentenceOf(const QString &id) const;
    [[nodiscard]] const FormField *field(const QString &id) const;

signals:
    void chosen(const QString &id, const QString &key);
    void typed(const QString &id, const QString &text); ///< while typing, if the text can stand
    void entered(const QString &id, const QString &text);
    void restored(const QString &id);
    void escaped();

private:
    struct Line {
        FormField field;
        QLabel *caption = nullptr;
        QComboBox *choice = nullptr;
        TextField *value = nullptr;
        QLabel *sentence = nullptr;
    };
    void clear();
    void build(const std::vector<FormField> &fields, int columns);
    void buildLine(Line &line, QGridLayout &grid, int row, int column);
    void buildChoice(Line &line);
    void buildValue(Line &line);
    void update(const std::vector<FormField> &fields);
    void say(Line &line, const QString &sentence);
    [[nodiscard]] Line *lineOf(const QString &id);
    [[nodiscard]] const Line *lineOf(const QString &id) const;

    std::vector<Line> m_lines;
    Palette m_look;
    int m_columns = 1;
    bool m_rejectsInvalid = false;
};

} // namespace quasistat::ui
