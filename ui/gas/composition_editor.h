#pragma once
// The rows of a mixture: each gas with its fraction, the sum under them and what is wrong in words.

#include "ui/fields/suggestion.h"
#include "ui/gas/mixture_draft.h"

#include <QComboBox>
#include <QLabel>
#include <QPushButton>
#include <QWidget>

namespace quasistat::ui
{

class TextField;

/// Shows a draft and changes it; whoever owns it decides when it goes into the document.
class CompositionEditor : public QWidget
{
    Q_OBJECT
public:
    explicit CompositionEditor(QWidget *parent = nullptr);

    /// The gases on offer; `own`: the user's.
    void setGases(const std::vector<GasEntry> &gases, const QStringList &own);
    /// A text being typed stays.
    void setDraft(const MixtureDraft &draft);
    [[nodiscard]] const MixtureDraft &draft() const { return m_draft; }
    [[nodiscard]] MixtureVerdict verdict() const { return verdictOn(m_draft, m_gases, m_own); }
    void forgetTyping();
    void finishTyping();

    [[nodiscard]] int rowCount() const { return static_cast<int>(m_lines.size()); }
    [[nodiscard]] TextField *nameField(int row) const;
    [[nodiscard]] TextField *shareField(int row) const;
    [[nodiscard]] QPushButton *removeButton(int row) const;
    [[nodiscard]] QPushButton &addButton() const { return *m_add; }
    [[nodiscard]] QPushButton &divideButton() const { return *m_divide; }
    [[nodiscard]] QComboBox &basisChoice() const { return *m_basis; }
    [[nodiscard]] QString sumWords() const { return m_sum->text(); }
    [[nodiscard]] QString rowWords(int row) const;

signals:
    void typed();    ///< the draft is another one, while a text is being typed
    void changed();  ///< the draft is another one and stands
    void restored(); ///< Esc in a changed text
    void escaped();

private:
    struct Line {
        QWidget *holder = nullptr;
        TextField *name = nullptr;
        TextField *share = nullptr;
        QPushButton *remove = nullptr;
        QLabel *words = nullptr;
    };
    void createFoot();
    void addLine();
    void connectField(TextField *field);
    void fitLines();
    void judge();
    [[nodiscard]] MixtureDraft draftAsTyped() const;
    void take(bool isTyping);
    void removeRow(const QWidget *holder);

    std::vector<GasEntry> m_gases;
    QStringList m_own;
    std::vector<Suggestion> m_suggestions;
    MixtureDraft m_draft;
    std::vector<Line> m_lines;
    QComboBox *m_basis = nullptr;
    QPushButton *m_add = nullptr;
    QPushButton *m_divide = nullptr;
    QLabel *m_sum = nullptr;
};

/// `gases` as a field offers them: found by name, formula and alias.
[[nodiscard]] std::vector<Suggestion> suggestionsOf(const std::vector<GasEntry> &gases);

} // namespace quasistat::ui
