// The gas of a design in the window: models exchanged under a path, mixtures written row by row, gases of one's own.

#include "open_window.h"
#include "ui/fields/text_field.h"
#include "ui/gas/gas_words.h"
#include "ui/gas/model_spread.h"

#include <QAbstractItemView>
#include <QCompleter>

using namespace quasistat;
using namespace quasistat::ui;

class GasTest : public QObject
{
    Q_OBJECT
private slots:
    void initTestCase() { isolateSettings(m_folder); }
    void init();
    void cleanup() { m_window.reset(); }

    void another_model_keeps_the_path_and_says_what_it_changed();
    void going_to_a_model_and_back_changes_nothing();
    void a_mixture_becomes_the_text_of_a_fluid_and_comes_back();
    void air_stays_air_in_every_model();
    void a_model_that_lacks_a_gas_says_which_and_keeps_the_text();
    void a_row_is_added_by_keys_alone_with_type_ahead();
    void a_formula_stands_for_its_gas();
    void fractions_go_into_the_design_only_when_they_sum_to_one();
    void what_is_wrong_with_a_row_is_said_under_it();
    void fractions_are_divided_by_their_sum_when_told();
    void a_row_is_removed_by_its_button();
    void mass_fractions_stand_under_their_own_key();
    void an_unfinished_mixture_waits_until_the_editor_opens_again();
    void escape_gives_an_unfinished_mixture_up();
    void a_suggestion_is_taken_by_a_click();
    void pairs_of_a_cubic_equation_take_their_interaction();
    void a_gas_of_ones_own_goes_into_the_design_when_it_is_whole();
    void differences_are_given_in_percent_and_kelvin();

private:
    Session &session() { return m_window->session(); }
    GasEditor &gas() { return m_window->popover().gas(); }
    CompositionEditor &rows() { return gas().composition(); }
    const document::Json &json() { return session().now().design.json; }
    void openGas();
    void useMixture();
    void choose(const char *model);
    void type(QWidget *field, const char *text, Qt::Key end = Qt::Key_Tab);

    QTemporaryDir m_folder;
    std::unique_ptr<MainWindow> m_window;
};

void GasTest::init()
{
    QSettings().clear();
    m_window = std::make_unique<MainWindow>(m_folder.filePath(QStringLiteral("recovery")));
    showWith(*m_window, sampleDesign("air-two-stage"));
}

void GasTest::openGas()
{
    QTest::mouseClick(&m_window->header().field(HeaderPart::gas), Qt::LeftButton, {}, QPoint(20, 30));
    QVERIFY(m_window->popover().isVisible());
}

void GasTest::useMixture()
{
    const document::Json mixture{{"model", "ideal"}, {"composition", {{"nitrogen", 0.78}, {"oxygen", 0.22}}}};
    session().apply(withValue(session().now().design, "/gas", mixture), QStringLiteral("edit"));
    openGas();
    QCOMPARE(rows().rowCount(), 2);
}

/// With the keys: a letter would find the choice too, but several begin alike.
void GasTest::choose(const char *model)
{
    QComboBox *choice = gas().form().choiceOf(QStringLiteral("model"));
    choice->setFocus();
    while (choice->currentData().toString() != QLatin1String(model)) {
        const int before = choice->currentIndex();
        const int wanted = choice->findData(QLatin1String(model));
        QVERIFY(wanted >= 0);
        QTest::keyClick(choice, wanted > before ? Qt::Key_Down : Qt::Key_Up);
        QVERIFY(choice->currentIndex() != before);
    }
    QCOMPARE(typedAt(json(), "/gas/model"), QLatin1String(model));
}

void GasTest::type(QWidget *field, const char *text, Qt::Key end)
{
    field->setFocus();
    typeInto(field, QString::fromUtf8(text));
    // An open list of suggestions has the keys, as on a screen.
    QWidget *list = QApplication::activePopupWidget();
    QTest::keyClick(list ? list : field, end);
}

void GasTest::another_model_keeps_the_path_and_says_what_it_changed()
{
    const document::Design before = session().now().design;
    openGas();
    choose("ideal");
    QCOMPARE(session().undoStack().count(), 1);
    QVERIFY(json().at("segments") == before.json.at("segments"));
    QVERIFY(json().at("start") == before.json.at("start"));
    QVERIFY(json().at("gas") == (document::Json{{"model", "ideal"}, {"composition", {{"air", 1}}}}));
    QCOMPARE(m_window->header().field(HeaderPart::gas).text(), QStringLiteral("air, ideal gas"));
    const QRect said = m_window->ledger().ledger().placeOf(QStringLiteral("modelChange"));
    QVERIFY(!said.isEmpty());
    const QString spoken = m_window->ledger().ledger().spoken();
    QVERIFY2(spoken.contains(QStringLiteral("Ideal gas instead of perfect gas: W ")), qPrintable(spoken));
    QVERIFY(spoken.contains(QStringLiteral(" → ")));
    QVERIFY(gas().noteWords().startsWith(QStringLiteral("Ideal gas instead of perfect gas")));
    // The next edit takes it away; undoing that edit does not bring it back, undoing the model says the way back.
    session().apply(withValue(session().now().design, "/title", "Another"), QStringLiteral("edit"));
    QVERIFY(m_window->ledger().ledger().placeOf(QStringLiteral("modelChange")).isEmpty());
    session().undo();
    session().undo();
    QVERIFY(session().now().design == before);
    QVERIFY(m_window->ledger().ledger().spoken().contains(QStringLiteral("Perfect gas instead of ideal gas")));
}

void GasTest::going_to_a_model_and_back_changes_nothing()
{
    openGas();
    const document::Design before = session().now().design;
    choose("ideal");
    choose("perfect");
    QVERIFY(session().now().design == before);
    choose("ideal");
    type(rows().nameField(0), "argon");
    QCOMPARE(typedAt(json(), "/gas/composition/argon"), QStringLiteral("1"));
    choose("perfect"); // another gas now: γ and molar mass follow it
    QCOMPARE(typedAt(json(), "/gas/name"), QStringLiteral("argon"));
    // 5/3 for every monatomic gas
    QCOMPARE(typedAt(json(), "/gas/heat_capacity_ratio"), QStringLiteral("1.6667"));
    QVERIFY(typedAt(json(), "/gas/molar_mass").startsWith(QStringLiteral("39.9")));
}

void GasTest::a_mixture_becomes_the_text_of_a_fluid_and_comes_back()
{
    useMixture();
    const document::Json before = json().at("gas");
    choose("reference");
    QCOMPARE(typedAt(json(), "/gas/fluid"), QStringLiteral("nitrogen 0.78, oxygen 0.22"));
    QVERIFY2(gas().noteWords().contains(QStringLiteral("one gas")), qPrintable(gas().noteWords()));
    QVERIFY(!rows().isVisible());
    choose("ideal");
    QVERIFY(json().at("gas") == before);
    QVERIFY(session().now().evaluation);
}

void GasTest::air_stays_air_in_every_model()
{
    openGas();
    for (const char *model : {"ideal", "peng-robinson", "gerg-2008", "soave-redlich-kwong", "reference"}) {
        choose(model);
        QCOMPARE(gasName(session().now().design), QStringLiteral("air"));
    }
}

void GasTest::a_model_that_lacks_a_gas_says_which_and_keeps_the_text()
{
    const document::Json mixture{{"model", "ideal"}, {"composition", {{"nitrogen", 0.5}, {"neon", 0.5}}}};
    session().apply(withValue(session().now().design, "/gas", mixture), QStringLiteral("edit"));
    openGas();
    choose("gerg-2008");
    QCOMPARE(typedAt(json(), "/gas/composition/neon"), QStringLiteral("0.5"));
    QVERIFY2(gas().noteWords().contains(QStringLiteral("no neon")), qPrintable(gas().noteWords()));
    QVERIFY(rows().rowWords(1).contains(QStringLiteral("neon")));
    QCOMPARE(rows().rowWords(0), QString());
}

void GasTest::a_row_is_added_by_keys_alone_with_type_ahead()
{
    useMixture();
    rows().addButton().setFocus();
    QTest::keyClick(&rows().addButton(), Qt::Key_Space);
    QCOMPARE(rows().rowCount(), 3);
    TextField *name = rows().nameField(2);
    QVERIFY(name->hasFocus());
    QTest::keyClicks(name, QStringLiteral("arg"));
    QTRY_VERIFY(name->completer()->popup()->isVisible());
    QTest::keyClick(name->completer()->popup(), Qt::Key_Down);
    QTest::keyClick(name->completer()->popup(), Qt::Key_Return);
    QCOMPARE(name->text(), QStringLiteral("argon"));
    QVERIFY(!name->completer()->popup()->isVisible());
    QTest::keyClick(name, Qt::Key_Tab);
    TextField *share = rows().shareField(2);
    QVERIFY(share->hasFocus());
    QTest::keyClicks(share, QStringLiteral("0.01"));
    QTest::keyClick(share, Qt::Key_Tab);
    QVERIFY(rows().removeButton(2)->hasFocus());
    QVERIFY(json().at("gas").at("composition").size() == 2); // 1.01 is no whole
    type(rows().shareField(0), "0.77");
    QCOMPARE(typedAt(json(), "/gas/composition/argon"), QStringLiteral("0.01"));
    QCOMPARE(typedAt(json(), "/gas/composition/nitrogen"), QStringLiteral("0.77"));
    QCOMPARE(session().undoStack().count(), 2); // the mixture of the test and this
    QVERIFY(session().now().evaluation);
}

void GasTest::a_formula_stands_for_its_gas()
{
    useMixture();
    type(rows().nameField(1), "CO2");
    QCOMPARE(typedAt(json(), "/gas/composition/CO2"), QStringLiteral("0.22"));
    QVERIFY(session().now().evaluation);
    QCOMPARE(session().now().evaluation->path.gas->composition().front().component, std::string("carbon dioxide"));
}

void GasTest::fractions_go_into_the_design_only_when_they_sum_to_one()
{
    useMixture();
    const document::Design before = session().now().design;
    type(rows().shareField(0), "0.70");
    QVERIFY(session().now().design == before);
    QVERIFY2(rows().sumWords().contains(QStringLiteral("0.92")), qPrintable(rows().sumWords()));
    QVERIFY(rows().sumWords().contains(QStringLiteral("0.08 is missing")));
    QVERIFY(rows().divideButton().isVisible());
    type(rows().shareField(1), "0.30");
    QCOMPARE(typedAt(json(), "/gas/composition/nitrogen"), QStringLiteral("0.70")); // as typed
    QCOMPARE(rows().sumWords(), QStringLiteral("sum 1"));
    QVERIFY(!rows().divideButton().isVisible());
    session().undo();
    QVERIFY(session().now().design == before);
    QCOMPARE(rows().shareField(0)->text(), QStringLiteral("0.78"));
}

void GasTest::what_is_wrong_with_a_row_is_said_under_it()
{
    useMixture();
    type(rows().nameField(1), "oxigen");
    QVERIFY2(rows().rowWords(1).contains(QStringLiteral("oxigen")), qPrintable(rows().rowWords(1)));
    QVERIFY(rows().rowWords(1).contains(QStringLiteral("oxygen"))); // near it
    type(rows().nameField(1), "N2");
    QVERIFY(rows().rowWords(1).contains(QStringLiteral("twice")));
    type(rows().nameField(1), "oxygen");
    QCOMPARE(rows().rowWords(1), QString());
    type(rows().shareField(1), "a lot");
    QVERIFY(rows().rowWords(1).contains(QStringLiteral("number")));
    type(rows().shareField(1), "22");
    QVERIFY(rows().rowWords(1).contains(QStringLiteral("between 0 and 1")));
}

void GasTest::fractions_are_divided_by_their_sum_when_told()
{
    useMixture();
    type(rows().shareField(0), "0.44");
    QTest::mouseClick(&rows().divideButton(), Qt::LeftButton);
    QCOMPARE(rows().shareField(0)->text(), QStringLiteral("0.666667")); // 0.44 of 0.66
    QCOMPARE(typedAt(json(), "/gas/composition/oxygen"), QStringLiteral("0.333333"));
}

void GasTest::a_row_is_removed_by_its_button()
{
    useMixture();
    QTest::mouseClick(rows().removeButton(0), Qt::LeftButton);
    QCOMPARE(rows().rowCount(), 1);
    QCOMPARE(rows().nameField(0)->text(), QStringLiteral("oxygen"));
    type(rows().shareField(0), "1");
    QVERIFY(json().at("gas").at("composition") == (document::Json{{"oxygen", 1}}));
    QTest::mouseClick(rows().removeButton(0), Qt::LeftButton);
    QVERIFY(rows().sumWords().contains(QStringLiteral("at least one")));
    QVERIFY(json().at("gas").at("composition").contains("oxygen")); // the last whole one stands
}

void GasTest::mass_fractions_stand_under_their_own_key()
{
    useMixture();
    const double before = session().now().evaluation->path.gas->molarMass();
    rows().basisChoice().setFocus();
    QTest::keyClick(&rows().basisChoice(), Qt::Key_Down);
    QVERIFY(json().at("gas").contains("composition_by_mass"));
    QVERIFY(!json().at("gas").contains("composition"));
    // Of the same figures by mass more is nitrogen, the lighter gas: 1/(0.78/28.013 + 0.22/31.999) g/mol.
    const double after = session().now().evaluation->path.gas->molarMass();
    QVERIFY(after < before);
    QVERIFY(std::abs(after - 0.028802) < 2e-6);
    QVERIFY(m_window->header().field(HeaderPart::gas).text().contains(QStringLiteral("by mass")));
}

void GasTest::an_unfinished_mixture_waits_until_the_editor_opens_again()
{
    useMixture();
    type(rows().shareField(0), "0.5");
    QTest::mouseClick(&m_window->workspace().canvas(), Qt::LeftButton, {}, QPoint(300, 300));
    QVERIFY(!m_window->popover().isVisible());
    openGas();
    QCOMPARE(rows().shareField(0)->text(), QStringLiteral("0.5"));
    type(rows().shareField(1), "0.5");
    QCOMPARE(typedAt(json(), "/gas/composition/nitrogen"), QStringLiteral("0.5"));
}

void GasTest::escape_gives_an_unfinished_mixture_up()
{
    useMixture();
    type(rows().shareField(0), "0.5");
    QTest::keyClick(rows().shareField(0), Qt::Key_Escape);
    QVERIFY(!m_window->popover().isVisible());
    openGas();
    QCOMPARE(rows().shareField(0)->text(), QStringLiteral("0.78"));
}

void GasTest::a_suggestion_is_taken_by_a_click()
{
    useMixture();
    TextField *name = rows().nameField(1);
    name->setFocus();
    typeInto(name, QStringLiteral("neo"));
    QAbstractItemView *list = name->completer()->popup();
    QTRY_VERIFY(list->isVisible());
    const QModelIndex first = list->model()->index(0, 0);
    QTest::mouseClick(list->viewport(), Qt::LeftButton, {}, list->visualRect(first).center());
    QTRY_COMPARE(typedAt(json(), "/gas/composition/neon"), QStringLiteral("0.22"));
    QVERIFY(m_window->popover().isVisible()); // the list belongs to the editor
}

void GasTest::pairs_of_a_cubic_equation_take_their_interaction()
{
    useMixture();
    choose("peng-robinson");
    QVERIFY(gas().interactionsButton().isVisible());
    QTest::mouseClick(&gas().interactionsButton(), Qt::LeftButton);
    TextField *pair = gas().interactions().valueOf(QStringLiteral("nitrogen/oxygen"));
    QVERIFY(pair && pair->isVisible());
    type(pair, "-0.012");
    QCOMPARE(typedAt(json(), "/gas/binary_interaction/nitrogen~1oxygen"), QStringLiteral("-0.012"));
    QVERIFY(gas().interactionsButton().text().contains(QStringLiteral("1 of 1")));
    choose("soave-redlich-kwong");
    QCOMPARE(typedAt(json(), "/gas/binary_interaction/nitrogen~1oxygen"), QStringLiteral("-0.012"));
    choose("ideal");
    QVERIFY(!json().at("gas").contains("binary_interaction"));
    choose("soave-redlich-kwong"); // back: it was not forgotten
    QCOMPARE(typedAt(json(), "/gas/binary_interaction/nitrogen~1oxygen"), QStringLiteral("-0.012"));
    type(gas().interactions().valueOf(QStringLiteral("nitrogen/oxygen")), " ");
    QVERIFY(!json().at("gas").contains("binary_interaction"));
}

void GasTest::a_gas_of_ones_own_goes_into_the_design_when_it_is_whole()
{
    useMixture();
    choose("peng-robinson");
    const int steps = session().undoStack().count();
    QTest::mouseClick(&gas().addOwnButton(), Qt::LeftButton);
    FormView *own = gas().ownForm(0);
    QVERIFY(own && own->isVisible());
    const auto enter = [&](const char *id, const char *text) { type(own->valueOf(QString::fromLatin1(id)), text); };
    enter("name", "seal gas");
    enter("/critical_temperature", "305 K");
    enter("/critical_pressure", "48.7 bar");
    enter("/acentric_factor", "0.0995");
    QVERIFY(!json().at("gas").contains("components")); // the molar mass is missing still
    QCOMPARE(session().undoStack().count(), steps);
    enter("/molar_mass", "30.07 g/mol");
    QCOMPARE(typedAt(json(), "/gas/components/seal gas/critical_pressure"), QStringLiteral("48.7 bar"));
    QCOMPARE(session().undoStack().count(), steps + 1);
    enter("/heat_capacity/cp_over_R", "4.18, 0.0055");
    enter("/heat_capacity/from", "200 K");
    QVERIFY(!json().at("gas").at("components").at("seal gas").contains("heat_capacity")); // two of three
    enter("/heat_capacity/to", "1000 K");
    QCOMPARE(json().at("gas").at("components").at("seal gas").at("heat_capacity").at("cp_over_R").size(),
             std::size_t(2));
    // A component like any other now.
    type(rows().nameField(1), "seal gas");
    QCOMPARE(rows().rowWords(1), QString());
    QCOMPARE(typedAt(json(), "/gas/composition/seal gas"), QStringLiteral("0.22"));
    enter("name", "barrier gas");
    QCOMPARE(typedAt(json(), "/gas/composition/barrier gas"), QStringLiteral("0.22"));
    QVERIFY(json().at("gas").at("components").contains("barrier gas"));
}

void GasTest::differences_are_given_in_percent_and_kelvin()
{
    const QString minus(QChar(0x2212));
    const QString space(QChar(0x202F));
    QCOMPARE(percentOff(101.3, 100.0, 100.0), QStringLiteral("+1.3") + space + QStringLiteral("%"));
    QCOMPARE(percentOff(-110.0, -100.0, 100.0), QStringLiteral("+10") + space + QStringLiteral("%")); // larger
    QCOMPARE(percentOff(50.0, 100.0, 100.0), minus + QStringLiteral("50") + space + QStringLiteral("%"));
    QCOMPARE(percentOff(3.0, 0.0, 100.0), QStringLiteral("–")); // nothing to be a percentage of
    units::DisplayUnits units;
    QCOMPARE(degreesOff(303.2, 300.0, units), QStringLiteral("+3.2") + space + QStringLiteral("K"));
    units.temperature = "°F";
    QCOMPARE(degreesOff(301.0, 300.0, units), QStringLiteral("+1.8") + space + QStringLiteral("°F"));
}

QTEST_MAIN(GasTest)
#include "gas_test.moc"
