// The ledger: figures that close as printed, rows that open, the envelope's drawer.

#include "open_window.h"
#include "ui/fields/text_field.h"

#include <QPushButton>

using namespace quasistat;
using namespace quasistat::ui;

class LedgerTest : public QObject
{
    Q_OBJECT
private slots:
    void initTestCase() { isolateSettings(m_folder); }
    void init();
    void cleanup() { m_window.reset(); }

    void the_account_closes_as_printed_data();
    void the_account_closes_as_printed();
    void a_click_on_a_row_selects_its_segment();
    void a_figure_opens_to_formula_routes_and_source();
    void a_path_figure_opens_too();
    void the_sign_turns_work_and_heat_but_no_energy_change();
    void a_failed_segment_says_why_and_the_rest_stands();
    void the_verdict_says_where_the_limit_is_exceeded();
    void limits_are_added_changed_and_removed_in_the_drawer();
    void further_figures_of_the_selected_segment_unfold();
    void the_ideal_gas_stands_beside_the_real_one();
    void an_ideal_gas_has_no_spread();
    void a_vapour_fraction_is_among_the_figures_of_its_state();
    void a_long_name_stands_above_its_figures();
    void keys_walk_and_open();

private:
    LedgerView &ledger() { return m_window->ledger().ledger(); }
    Session &session() { return m_window->session(); }
    void clickFigure(const QString &row, int column);
    [[nodiscard]] const LedgerRow *row(const QString &id);

    QTemporaryDir m_folder;
    std::unique_ptr<MainWindow> m_window;
};

void LedgerTest::init()
{
    m_window = std::make_unique<MainWindow>(m_folder.filePath(QStringLiteral("recovery")));
    showWith(*m_window, sampleDesign("air-two-stage"));
}

void LedgerTest::clickFigure(const QString &id, int column)
{
    QTest::mouseClick(&ledger(), Qt::LeftButton, {}, ledger().placeOfFigure(id, column).center());
}

const LedgerRow *LedgerTest::row(const QString &id)
{
    for (const LedgerRow &row : ledger().rows())
        if (row.id == id) return &row;
    return nullptr;
}

namespace
{

double numberOf(QString figure)
{
    return figure.replace(QChar(0x2212), QLatin1Char('-')).toDouble();
}

} // namespace

void LedgerTest::the_account_closes_as_printed_data()
{
    QTest::addColumn<QString>("sample");
    for (const char *name :
         {"air-two-stage", "engine-cycle", "letdown-slow", "letdown-sudden", "stepped-lift", "sun-warmed-vessel"})
        QTest::newRow(name) << QString::fromLatin1(name);
}

void LedgerTest::the_account_closes_as_printed()
{
    QFETCH(QString, sample);
    session().open(sampleDesign(sample.toLatin1().constData()), QString());
    double sums[3] = {0, 0, 0};
    for (const LedgerRow &row : ledger().rows()) {
        if (row.kind == LedgerRowKind::segment)
            for (int column = 0; column < 3; ++column) sums[column] += numberOf(row.figures[column]);
        if (row.kind != LedgerRowKind::segment && row.kind != LedgerRowKind::total) continue;
        // Less than half a unit of the last decimal ever printed (3 decimals and more).
        QVERIFY(std::abs(numberOf(row.figures[0]) + numberOf(row.figures[1]) - numberOf(row.figures[2])) < 4e-6);
    }
    for (int column = 0; column < 3; ++column)
        QVERIFY(std::abs(sums[column] - numberOf(row(QStringLiteral("total"))->figures[column])) < 4e-6);
}

void LedgerTest::a_click_on_a_row_selects_its_segment()
{
    QTest::mouseClick(&ledger(), Qt::LeftButton, {}, ledger().placeOf(QStringLiteral("2")).center() - QPoint(120, 0));
    QCOMPARE(session().selected(), 1);
}

void LedgerTest::a_figure_opens_to_formula_routes_and_source()
{
    const qsizetype before = static_cast<qsizetype>(ledger().rows().size());
    clickFigure(QStringLiteral("3"), 0);
    QCOMPARE(session().selected(), 2);
    QVERIFY(static_cast<qsizetype>(ledger().rows().size()) > before);
    int routes = 0;
    bool formula = false;
    bool source = false;
    for (const LedgerRow &row : ledger().rows()) {
        routes += row.kind == LedgerRowKind::route && row.opened;
        formula = formula || row.kind == LedgerRowKind::formula;
        source =
            source || (row.kind == LedgerRowKind::source && row.label.unstyled().startsWith(QStringLiteral("source")));
    }
    QCOMPARE(routes, 3);
    QVERIFY(formula && source);
    clickFigure(QStringLiteral("3"), 0);
    for (const LedgerRow &row : ledger().rows()) QVERIFY(row.kind != LedgerRowKind::formula);
}

void LedgerTest::a_path_figure_opens_too()
{
    const QRect place = ledger().placeOf(QStringLiteral("path.lost_work"));
    QVERIFY(!place.isEmpty());
    QTest::mouseClick(&ledger(), Qt::LeftButton, {}, place.center());
    QVERIFY(ledger().spoken().contains(QStringLiteral("Gouy")));
}

void LedgerTest::the_sign_turns_work_and_heat_but_no_energy_change()
{
    const QStringList into = row(QStringLiteral("1"))->figures;
    QTest::mouseClick(&m_window->header().field(HeaderPart::sign), Qt::LeftButton, {}, QPoint(20, 30));
    const QStringList by = row(QStringLiteral("1"))->figures;
    QCOMPARE(numberOf(by[0]), -numberOf(into[0]));
    QCOMPARE(numberOf(by[1]), -numberOf(into[1]));
    QCOMPARE(by[2], into[2]);
    QVERIFY(m_window->header().field(HeaderPart::sign).text().contains(QStringLiteral("by the gas")));
    // The file says how it is shown; what is computed never turns.
    QVERIFY(session().now().evaluation->path.segments[0].work > 0.0);
    QVERIFY(session().undoStack().canUndo());
}

void LedgerTest::a_failed_segment_says_why_and_the_rest_stands()
{
    session().apply(withValue(session().now().design, "/segments/2/end/pressure", "ten bar"), QStringLiteral("edit"));
    QVERIFY(row(QStringLiteral("2"))->mark == StateMark::tick);
    QVERIFY(row(QStringLiteral("3"))->mark == StateMark::cross);
    bool said = false;
    for (const LedgerRow &row : ledger().rows())
        said =
            said || (row.kind == LedgerRowKind::fault && row.label.unstyled().startsWith(QStringLiteral("Segment 3")));
    QVERIFY(said);
}

void LedgerTest::the_verdict_says_where_the_limit_is_exceeded()
{
    document::Json limits = document::Json::array();
    limits.push_back({{"quantity", "temperature"}, {"max", "140 °C"}, {"label", "discharge"}});
    session().apply(withValue(session().now().design, "/limits", limits), QStringLiteral("edit"));
    const QString spoken = ledger().spoken();
    QVERIFY2(spoken.contains(QStringLiteral("above 8.37")), qPrintable(spoken));
    QVERIFY(spoken.contains(QStringLiteral("on segment 3")));
    QVERIFY(spoken.contains(QStringLiteral("worst at state 4")));
    QVERIFY(m_window->status().envelopeWords().contains(QStringLiteral("1 of 1")));
}

void LedgerTest::limits_are_added_changed_and_removed_in_the_drawer()
{
    session().apply(withoutValue(session().now().design, "/limits"), QStringLiteral("edit"));
    QTest::mouseClick(&ledger(), Qt::LeftButton, {}, ledger().placeOf(QStringLiteral("envelope")).center());
    EnvelopeDrawer &drawer = m_window->ledger().envelope();
    QTRY_VERIFY(drawer.isVisible());
    QTest::mouseClick(drawer.findChild<QPushButton *>(QStringLiteral("addLimit")), Qt::LeftButton);
    QVERIFY(drawer.form(0));
    TextField *highest = drawer.form(0)->valueOf(QStringLiteral("max"));
    typeInto(highest, QStringLiteral("8 bar"));
    QTest::keyClick(highest, Qt::Key_Return);
    QCOMPARE(typedAt(session().now().design.json, "/limits/0/max"), QStringLiteral("8 bar"));
    QVERIFY(!session().now().evaluation->envelopeHolds());
    typeInto(highest, QStringLiteral("8 L")); // not a pressure
    QTest::keyClick(highest, Qt::Key_Return);
    QVERIFY(!drawer.form(0)->sentenceOf(QStringLiteral("max")).isEmpty());
    QCOMPARE(typedAt(session().now().design.json, "/limits/0/max"), QStringLiteral("8 bar"));
    QTest::mouseClick(drawer.findChild<QPushButton *>(QStringLiteral("removeLimit1")), Qt::LeftButton);
    QVERIFY(session().now().evaluation->limits.empty());
    session().undo();
    QCOMPARE(session().now().evaluation->limits.size(), std::size_t(1));
}

void LedgerTest::further_figures_of_the_selected_segment_unfold()
{
    session().select(4);
    QTest::mouseClick(&ledger(), Qt::LeftButton, {}, ledger().placeOf(QStringLiteral("segment")).center());
    QVERIFY(!ledger().placeOf(QStringLiteral("segment.delta_entropy")).isEmpty());
    QVERIFY(!ledger().placeOf(QStringLiteral("segment.lost_work")).isEmpty());
}

void LedgerTest::the_ideal_gas_stands_beside_the_real_one()
{
    session().open(sampleDesign("hydrogen-store"), QString());
    Snapshot snapshot = session().now();
    QVERIFY(snapshot.evaluation);
    analysis::Evaluation evaluation = *snapshot.evaluation;
    for (path::SegmentResult &segment : evaluation.path.segments)
        segment.idealGas =
            path::IdealGasFigures{0.9 * segment.work, 1.2 * segment.heat, *segment.to.temperature() + 4.0};
    snapshot.evaluation = std::make_shared<const analysis::Evaluation>(evaluation);

    const std::vector<LedgerRow> closed = spreadRows(snapshot, {});
    QCOMPARE(closed.size(), std::size_t(2));
    QVERIFY(closed[1].label.unstyled().contains(QStringLiteral("off by up to")));
    const std::vector<LedgerRow> rows = spreadRows(snapshot, {.figure = {}, .spread = true});
    QCOMPARE(rows.size(), std::size_t(3 + 3)); // heading, sentence, columns and three segments
    const LedgerRow &first = rows[3];
    const QString minus(QChar(0x2212));
    const QString space(QChar(0x202F));
    QCOMPARE(first.remarks[0], minus + QStringLiteral("10") + space + QStringLiteral("%"));
    QCOMPARE(first.remarks[1], QStringLiteral("+20") + space + QStringLiteral("%"));
    QCOMPARE(first.remarks[2], QStringLiteral("+4.0") + space + QStringLiteral("K"));
    const units::Scale scale = accountScale(evaluation.path, snapshot.units);
    QVERIFY(std::abs(numberOf(first.figures[0]) - 0.9 * evaluation.path.segments[0].work * scale.factor) <
            std::pow(10.0, -scale.decimals));
    // Beside the further figures of the selected segment too.
    QString spoken;
    for (const LedgerRow &row : segmentFigureRows(snapshot, 0, {.figure = {}, .segmentFigures = true}))
        spoken += row.spoken() + QLatin1Char('\n');
    QVERIFY2(spoken.contains(QStringLiteral("as an ideal gas: end T (+4.0")), qPrintable(spoken));
}

void LedgerTest::an_ideal_gas_has_no_spread()
{
    QVERIFY(ledger().placeOf(QStringLiteral("spread")).isEmpty());
    QVERIFY(spreadRows(session().now(), {.figure = {}, .spread = true}).empty());
}

void LedgerTest::a_vapour_fraction_is_among_the_figures_of_its_state()
{
    session().open(sampleDesign("nitrogen-letdown"), QString());
    QVERIFY(session().now().evaluation && session().now().evaluation->path.complete());
    session().select(0);
    QTest::mouseClick(&ledger(), Qt::LeftButton, {}, ledger().placeOf(QStringLiteral("segment")).center());
    const LedgerRow *fraction = row(QStringLiteral("segment.vapour_fraction"));
    QVERIFY(fraction);
    // An isentrope of nitrogen from 200 bar, 20 °C to 1 atm: about 0.89.
    QVERIFY(std::abs(numberOf(fraction->figures[0]) - 0.89) < 0.01);
}

void LedgerTest::a_long_name_stands_above_its_figures()
{
    const int one = ledger().placeOf(QStringLiteral("1")).height();
    const std::string name = "first stage, with the small piston, before the filter";
    session().apply(withValue(session().now().design, "/segments/0/label", name), QStringLiteral("edit"));
    QVERIFY(ledger().placeOf(QStringLiteral("1")).height() > one);
    QCOMPARE(ledger().placeOf(QStringLiteral("2")).height(), one);
}

void LedgerTest::keys_walk_and_open()
{
    ledger().setFocus();
    QTest::keyClick(&ledger(), Qt::Key_Down);
    QTest::keyClick(&ledger(), Qt::Key_Down);
    QTest::keyClick(&ledger(), Qt::Key_Return);
    QCOMPARE(session().selected(), 1);
    QVERIFY(ledger().spoken().contains(QStringLiteral("by quadrature")));
}

QTEST_MAIN(LedgerTest)
#include "ledger_test.moc"
