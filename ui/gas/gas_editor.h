#pragma once
// The editor of the gas: its model, what it is made of, and for cubic equations pairs and gases of the user's own.

#include "ui/fields/form_view.h"
#include "ui/gas/composition_editor.h"
#include "ui/gas/model_switch.h"
#include "ui/gas/own_gas.h"

namespace quasistat::ui
{

class GasEditor : public QWidget
{
    Q_OBJECT
public:
    explicit GasEditor(Session &session, QWidget *parent = nullptr);

    void setLook(const Palette &look);
    void refresh();
    void finishTyping();
    /// One undo step to the same gas in another model.
    void chooseModel(const std::string &model);

    /// Model and single values; whoever owns the editor enters them as of any other form.
    [[nodiscard]] FormView &form() { return *m_form; }
    [[nodiscard]] CompositionEditor &composition() { return *m_composition; }
    [[nodiscard]] FormView &interactions() { return *m_interactions; }
    [[nodiscard]] QPushButton &interactionsButton() { return *m_showInteractions; }
    [[nodiscard]] QPushButton &addOwnButton() { return *m_addOwn; }
    [[nodiscard]] FormView *ownForm(int index);
    [[nodiscard]] QString noteWords() const { return m_note->text(); }

signals:
    void escaped();

private:
    struct OwnLine {
        QWidget *holder = nullptr;
        FormView *form = nullptr;
        QLabel *words = nullptr;
    };
    void createCubicPart();
    void refreshMixture();
    void refreshOwn();
    void refreshNote();
    void fitOwnLines();
    void addOwnLine();
    void showOwn(std::size_t index);
    [[nodiscard]] bool isKnown(const OwnGas &gas) const; ///< to the library
    void takeMixture(bool isTyping);
    void takeOwn(std::size_t index, const QString &id, const QString &text);
    void removeOwn(std::size_t index);
    void applyOwn(const QString &renamedFrom = {}, const QString &renamedTo = {});
    [[nodiscard]] bool isOnPath(const document::Design &design) const;

    Session &m_session;
    Palette m_look;
    ModelSwitch m_switch;
    FormView *m_form = nullptr;
    QLabel *m_note = nullptr;
    CompositionEditor *m_composition = nullptr;
    QPushButton *m_showInteractions = nullptr;
    FormView *m_interactions = nullptr;
    QPushButton *m_addOwn = nullptr;
    std::vector<OwnGas> m_own;      ///< as typed, some perhaps not in the document yet
    std::vector<OwnGas> m_shownOwn; ///< what the document held when they were shown
    std::vector<OwnLine> m_ownLines;
    MixtureDraft m_shownMixture; ///< what the document held when the rows were shown
};

/// Model and, where the model has them, the single values of the gas: γ, molar mass, name, fluid.
[[nodiscard]] std::vector<FormField> gasForm(const document::Design &design, const gas::Library &library);

} // namespace quasistat::ui
