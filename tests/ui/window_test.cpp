// The window: header fields, files, closing, recovery, colours.

#include "open_window.h"
#include "ui/fields/text_field.h"

#include <QFile>
#include <QPushButton>

using namespace quasistat;
using namespace quasistat::ui;

class WindowTest : public QObject
{
    Q_OBJECT
private slots:
    void initTestCase() { isolateSettings(m_folder); }
    void init();
    void cleanup() { m_window.reset(); }

    void without_a_design_the_welcome_page_offers_every_sample();
    void a_blank_start_opens_with_its_start_state_to_edit();
    void drawing_starts_in_place_mode();
    void the_title_is_edited_in_place();
    void the_gas_is_edited_in_place();
    void a_gas_that_does_not_exist_is_refused_with_its_sentence();
    void units_of_the_display_follow_the_choice();
    void surroundings_and_rate_are_edited();
    void the_scheme_turns_every_part();
    void a_saved_design_opens_again_the_same();
    void a_file_that_cannot_be_written_stays_changed_and_says_so();
    void a_file_that_is_no_design_says_line_and_column();
    void closing_with_changes_asks_and_cancel_keeps_everything();
    void closing_with_changes_saves_when_told();
    void discarding_changes_closes();
    void unsaved_work_of_a_crash_is_offered_and_recovered();
    void every_key_of_the_table_is_its_own();
    void the_smallest_window_shows_everything();
    void the_report_is_written();

private:
    Session &session() { return m_window->session(); }
    QString file(const char *name) { return m_folder.filePath(QLatin1String(name)); }
    QString recovery() { return m_folder.filePath(QStringLiteral("recovery")); }
    void edit();
    void openPart(HeaderPart part, const QPoint &at = QPoint(20, 30));
    FormView &form() { return m_window->popover().form(); }

    QTemporaryDir m_folder;
    std::unique_ptr<MainWindow> m_window;
};

void WindowTest::init()
{
    QSettings().clear();
    m_window = std::make_unique<MainWindow>(recovery());
    showWith(*m_window, sampleDesign("air-two-stage"));
}

void WindowTest::edit()
{
    session().apply(withValue(session().now().design, "/title", "Changed"), QStringLiteral("edit"));
}

void WindowTest::openPart(HeaderPart part, const QPoint &at)
{
    QTest::mouseClick(&m_window->header().field(part), Qt::LeftButton, {}, at);
    QVERIFY(m_window->popover().isVisible());
}

void WindowTest::without_a_design_the_welcome_page_offers_every_sample()
{
    session().close();
    QVERIFY(m_window->welcome().isVisible());
    QVERIFY(!m_window->workspace().isVisible());
    QCOMPARE(samples().size(), std::size_t(10));
    for (const Sample &sample : samples()) {
        QVERIFY(!sample.title.isEmpty());
        QPushButton *button = m_window->welcome().sampleButton(sample.name);
        QVERIFY(button);
    }
    QTest::mouseClick(m_window->welcome().sampleButton(QStringLiteral("engine-cycle")), Qt::LeftButton);
    QVERIFY(session().hasDesign());
    QVERIFY(session().now().design == sampleDesign("engine-cycle"));
    QVERIFY(m_window->workspace().isVisible());
    QVERIFY(session().filePath().isEmpty()); // a sample is never written over
}

void WindowTest::a_blank_start_opens_with_its_start_state_to_edit()
{
    session().close();
    QTest::mouseClick(m_window->welcome().findChild<QPushButton *>(QStringLiteral("welcome.blank")), Qt::LeftButton);
    QCOMPARE(session().selected(), startSelected);
    QVERIFY(session().now().evaluation);
    QVERIFY(!session().now().evaluation->path.startFailure);
    QTRY_VERIFY(m_window->workspace().panel().isVisible());
}

void WindowTest::drawing_starts_in_place_mode()
{
    session().close();
    QTest::mouseClick(m_window->welcome().findChild<QPushButton *>(QStringLiteral("welcome.draw")), Qt::LeftButton);
    QVERIFY(!m_window->workspace().canvas().isSelecting());
}

void WindowTest::the_title_is_edited_in_place()
{
    QTest::mouseClick(&m_window->header().field(HeaderPart::title), Qt::LeftButton, {}, QPoint(30, 32));
    TextField &title = m_window->header().titleField();
    QVERIFY(title.isVisible());
    typeInto(&title, QStringLiteral("Another title"));
    QTest::keyClick(&title, Qt::Key_Return);
    QVERIFY(!title.isVisible());
    QCOMPARE(typedAt(session().now().design.json, "/title"), QStringLiteral("Another title"));
    QCOMPARE(m_window->header().field(HeaderPart::title).text(), QStringLiteral("Another title"));
    openPart(HeaderPart::title, QPoint(30, 8)); // the caption: number and revision
    typeInto(form().valueOf(QStringLiteral("number")), QStringLiteral("GW-099"));
    QTest::keyClick(form().valueOf(QStringLiteral("number")), Qt::Key_Return);
    QVERIFY(m_window->header().field(HeaderPart::title).caption().startsWith(QStringLiteral("GW-099")));
    QCOMPARE(session().undoStack().count(), 2);
}

void WindowTest::the_gas_is_edited_in_place()
{
    openPart(HeaderPart::gas);
    const double before = session().now().evaluation->path.states[3].state.temperature().value();
    TextField *ratio = form().valueOf(QStringLiteral("heat_capacity_ratio"));
    typeInto(ratio, QStringLiteral("1.30"));
    QTest::keyClick(ratio, Qt::Key_Return);
    QCOMPARE(typedAt(session().now().design.json, "/gas/heat_capacity_ratio"), QStringLiteral("1.30"));
    QVERIFY(session().now().evaluation->path.states[3].state.temperature().value() < before);
}

void WindowTest::a_gas_that_does_not_exist_is_refused_with_its_sentence()
{
    openPart(HeaderPart::gas);
    QComboBox *model = form().choiceOf(QStringLiteral("model"));
    model->setFocus();
    QTest::keyClick(model, Qt::Key_Down);
    QCOMPARE(typedAt(session().now().design.json, "/gas/model"), QStringLiteral("ideal"));
    QVERIFY(session().now().evaluation);
    const document::Design good = session().now().design;
    CompositionEditor &rows = m_window->popover().gas().composition();
    typeInto(rows.nameField(0), QStringLiteral("unobtainium"));
    QTest::keyClick(rows.nameField(0), Qt::Key_Return);
    QVERIFY(rows.rowWords(0).contains(QStringLiteral("unobtainium")));
    QVERIFY(session().now().design == good);
}

void WindowTest::units_of_the_display_follow_the_choice()
{
    openPart(HeaderPart::units);
    QComboBox *pressure = form().choiceOf(QStringLiteral("pressure"));
    pressure->setFocus();
    QTest::keyClicks(pressure, QStringLiteral("k")); // kPa
    QCOMPARE(session().now().units.pressure, std::string("kPa"));
    QVERIFY(m_window->header().field(HeaderPart::units).text().startsWith(QStringLiteral("kPa")));
}

void WindowTest::surroundings_and_rate_are_edited()
{
    openPart(HeaderPart::surroundings);
    TextField *temperature = form().valueOf(QStringLiteral("temperature"));
    typeInto(temperature, QStringLiteral("77 °F"));
    QTest::keyClick(temperature, Qt::Key_Return);
    // 77 °F is 25 °C exactly
    QVERIFY(std::abs(session().now().evaluation->input.surroundings.temperature - 298.15) < 1e-9);
    openPart(HeaderPart::rate);
    TextField *rate = form().valueOf(QStringLiteral("rate"));
    typeInto(rate, QStringLiteral("2 Hz"));
    QTest::keyClick(rate, Qt::Key_Return);
    QVERIFY(std::abs(*session().now().evaluation->input.rate - 2.0) < 1e-12);
    // A click elsewhere closes the editor.
    QTest::mouseClick(&m_window->workspace().canvas(), Qt::LeftButton, {}, QPoint(300, 300));
    QVERIFY(!m_window->popover().isVisible());
}

void WindowTest::the_scheme_turns_every_part()
{
    m_window->action(ActionId::schemeLight)->trigger();
    const QColor light = m_window->grab().toImage().pixelColor(m_window->width() - 20, 400);
    m_window->action(ActionId::schemeDark)->trigger();
    const QColor dark = m_window->grab().toImage().pixelColor(m_window->width() - 20, 400);
    QVERIFY(light.lightnessF() > 0.8F);
    QVERIFY(dark.lightnessF() < 0.2F);
    QCOMPARE(m_window->look().scheme, Scheme::dark);
    QCOMPARE(Settings().value(settings::scheme), QStringLiteral("dark"));
}

void WindowTest::a_saved_design_opens_again_the_same()
{
    edit();
    const document::Design design = session().now().design;
    QVERIFY(m_window->saveTo(file("saved.qpath")));
    QVERIFY(!session().isModified());
    QCOMPARE(m_window->header().document().text(), QStringLiteral("saved"));
    session().close();
    m_window->openFile(file("saved.qpath"));
    QVERIFY(session().now().design == design);
    QCOMPARE(session().filePath(), file("saved.qpath"));
    QCOMPARE(Settings().value(settings::recentFiles).first(), file("saved.qpath"));
    session().undo();
    QVERIFY(session().now().design == design); // nothing from before the file
}

void WindowTest::a_file_that_cannot_be_written_stays_changed_and_says_so()
{
    edit();
    QVERIFY(!m_window->saveTo(m_folder.filePath(QStringLiteral("no/such/folder/x.qpath"))));
    QVERIFY(session().isModified());
    QVERIFY(m_window->notice().isVisible());
    QVERIFY(m_window->notice().sentence().startsWith(QStringLiteral("The design is not saved.")));
}

void WindowTest::a_file_that_is_no_design_says_line_and_column()
{
    QFile broken(file("broken.qpath"));
    QVERIFY(broken.open(QIODevice::WriteOnly));
    broken.write("{\n  \"quasistat\": 1,,\n}\n");
    broken.close();
    const document::Design before = session().now().design;
    m_window->openFile(file("broken.qpath"));
    QVERIFY2(m_window->notice().sentence().contains(QStringLiteral("line 2")),
             qPrintable(m_window->notice().sentence()));
    QVERIFY(session().now().design == before);
}

void WindowTest::closing_with_changes_asks_and_cancel_keeps_everything()
{
    edit();
    m_window->close();
    QVERIFY(m_window->isVisible());
    QPushButton *cancel = m_window->notice().choice(QStringLiteral("noticeCancel"));
    QVERIFY(cancel);
    QTest::mouseClick(cancel, Qt::LeftButton);
    QVERIFY(m_window->isVisible());
    QVERIFY(session().isModified());
    QVERIFY(!m_window->notice().isVisible());
}

void WindowTest::closing_with_changes_saves_when_told()
{
    QVERIFY(m_window->saveTo(file("closing.qpath")));
    edit();
    m_window->close();
    QTest::mouseClick(m_window->notice().choice(QStringLiteral("noticeSave")), Qt::LeftButton);
    QVERIFY(!m_window->isVisible());
    document::Position position;
    const auto text = document::fileText(file("closing.qpath").toStdString());
    QCOMPARE(typedAt(document::read(*text, position)->json, "/title"), QStringLiteral("Changed"));
}

void WindowTest::discarding_changes_closes()
{
    edit();
    m_window->close();
    QTest::mouseClick(m_window->notice().choice(QStringLiteral("noticeDiscard")), Qt::LeftButton);
    QVERIFY(!m_window->isVisible());
    QVERIFY(Recovery(recovery()).leftBehind().empty());
}

void WindowTest::unsaved_work_of_a_crash_is_offered_and_recovered()
{
    const QString folder = m_folder.filePath(QStringLiteral("crash"));
    {
        Recovery crashed(folder);
        edit();
        QVERIFY(crashed.keep(session().now().design, file("mine.qpath")));
    }
    MainWindow next(folder);
    next.show();
    QVERIFY(next.notice().isVisible());
    QVERIFY(next.notice().sentence().contains(QStringLiteral("Changed")));
    QTest::mouseClick(next.notice().choice(QStringLiteral("noticeRecover")), Qt::LeftButton);
    QVERIFY(next.session().now().design == session().now().design);
    QVERIFY(next.session().isModified());
    QCOMPARE(next.session().filePath(), file("mine.qpath"));
}

void WindowTest::every_key_of_the_table_is_its_own()
{
    QSet<QString> keys;
    for (const ActionFacts &entry : actionTable) {
        const QAction *action = m_window->action(entry.id);
        QVERIFY(action);
        QVERIFY(!action->text().isEmpty());
        const QString key = action->shortcut().toString();
        if (key.isEmpty()) continue;
        QVERIFY2(!keys.contains(key), qPrintable(key));
        keys.insert(key);
    }
}

void WindowTest::the_smallest_window_shows_everything()
{
    m_window->resize(1100, 700);
    QTest::qWait(20);
    HeaderBar &header = m_window->header();
    int right = 0;
    for (const HeaderPart part : {HeaderPart::title, HeaderPart::gas, HeaderPart::surroundings, HeaderPart::sign,
                                  HeaderPart::units, HeaderPart::rate}) {
        QVERIFY(header.field(part).x() >= right); // none over another
        right = header.field(part).geometry().right();
    }
    QVERIFY(header.document().x() >= right);
    QVERIFY(header.report().geometry().right() < header.width());
    QVERIFY(m_window->ledger().width() >= 280);
    QCOMPARE(m_window->ledger().geometry().right() + 1, 1100);
}

void WindowTest::the_report_is_written()
{
    QVERIFY(m_window->header().report().isEnabled());
    QVERIFY(m_window->writeReport(file("report.pdf"), PageSize::a4));
    QFile pdf(file("report.pdf"));
    QVERIFY(pdf.open(QIODevice::ReadOnly));
    QVERIFY(pdf.read(5) == "%PDF-");
}

QTEST_MAIN(WindowTest)
#include "window_test.moc"
