// The session: undo steps, previews, and what outlives the program.

#include "open_window.h"

using namespace quasistat;
using namespace quasistat::ui;

class SessionTest : public QObject
{
    Q_OBJECT
private slots:
    void initTestCase();
    void cleanup() { QSettings().clear(); }

    void an_edit_is_one_step_and_one_signal();
    void an_edit_that_changes_nothing_is_no_step();
    void steps_of_one_merge_id_become_one();
    void merged_steps_that_end_where_they_began_go_away();
    void a_preview_is_no_step_and_is_the_base_of_none();
    void undo_during_a_preview_ends_it_first();
    void selection_stays_inside_the_path();
    void a_faulty_document_says_why_and_keeps_its_design();
    void recent_files_are_newest_first_without_doubles();
    void work_left_behind_is_found_by_another_window_only_after_its_own_has_gone();

private:
    QTemporaryDir m_folder;
};

void SessionTest::initTestCase()
{
    isolateSettings(m_folder);
}

namespace
{

document::Design withEnd(const document::Design &design, const char *pressure)
{
    return withValue(design, "/segments/0/end/pressure", pressure);
}

} // namespace

void SessionTest::an_edit_is_one_step_and_one_signal()
{
    Session session;
    session.open(sampleDesign("air-two-stage"), QString());
    const document::Design before = session.now().design;
    QSignalSpy changed(&session, &Session::snapshotChanged);
    session.apply(withEnd(before, "4 bar"), QStringLiteral("edit"));
    QCOMPARE(changed.count(), 1);
    QVERIFY(session.isModified());
    session.undo();
    QCOMPARE(changed.count(), 2);
    QVERIFY(session.now().design == before);
    QVERIFY(!session.isModified());
    session.redo();
    QCOMPARE(typedAt(session.now().design.json, "/segments/0/end/pressure"), QStringLiteral("4 bar"));
}

void SessionTest::an_edit_that_changes_nothing_is_no_step()
{
    Session session;
    session.open(sampleDesign("air-two-stage"), QString());
    session.apply(session.now().design, QStringLiteral("nothing"));
    QVERIFY(!session.undoStack().canUndo());
}

void SessionTest::steps_of_one_merge_id_become_one()
{
    Session session;
    session.open(sampleDesign("air-two-stage"), QString());
    const document::Design before = session.now().design;
    for (const char *pressure : {"4 bar", "5 bar", "6 bar"})
        session.apply(withEnd(before, pressure), QStringLiteral("nudge"), 7);
    QCOMPARE(session.undoStack().count(), 1);
    session.undo();
    QVERIFY(session.now().design == before);
}

void SessionTest::merged_steps_that_end_where_they_began_go_away()
{
    Session session;
    session.open(sampleDesign("air-two-stage"), QString());
    const document::Design before = session.now().design;
    session.apply(withEnd(before, "4 bar"), QStringLiteral("nudge"), 7);
    session.apply(before, QStringLiteral("nudge"), 7);
    QCOMPARE(session.undoStack().count(), 0);
    QVERIFY(!session.isModified());
}

void SessionTest::a_preview_is_no_step_and_is_the_base_of_none()
{
    Session session;
    session.open(sampleDesign("air-two-stage"), QString());
    const document::Design before = session.now().design;
    session.preview(withEnd(before, "4 bar"));
    session.preview(withEnd(before, "5 bar"));
    QVERIFY(session.isPreviewing());
    QVERIFY(!session.undoStack().canUndo());
    QVERIFY(session.base().design == before);
    session.apply(withEnd(before, "6 bar"), QStringLiteral("edit"));
    QVERIFY(!session.isPreviewing());
    session.undo();
    QVERIFY(session.now().design == before);
    session.preview(withEnd(before, "4 bar"));
    session.cancelPreview();
    QVERIFY(session.now().design == before);
}

void SessionTest::undo_during_a_preview_ends_it_first()
{
    Session session;
    session.open(sampleDesign("air-two-stage"), QString());
    const document::Design before = session.now().design;
    session.apply(withEnd(before, "4 bar"), QStringLiteral("edit"));
    session.preview(withEnd(before, "9 bar"));
    session.undo();
    QVERIFY(!session.isPreviewing());
    QVERIFY(session.now().design == before);
}

void SessionTest::selection_stays_inside_the_path()
{
    Session session;
    session.open(sampleDesign("air-two-stage"), QString());
    const int last = segmentCount(session.now().design) - 1;
    session.select(last);
    session.apply(withoutValue(session.now().design, segmentPointer(last)), QStringLiteral("delete"));
    QCOMPARE(session.selected(), last - 1);
}

void SessionTest::a_faulty_document_says_why_and_keeps_its_design()
{
    Session session;
    session.open(withValue(sampleDesign("air-two-stage"), "/gas/model", "phlogiston"), QString());
    QVERIFY(!session.now().evaluation);
    QVERIFY(session.now().failure);
    QCOMPARE(typedAt(session.now().design.json, "/gas/model"), QStringLiteral("phlogiston"));
}

void SessionTest::recent_files_are_newest_first_without_doubles()
{
    Settings settings;
    for (const char *file : {"/tmp/a.qpath", "/tmp/b.qpath", "/tmp/a.qpath"})
        settings.rememberFile(QLatin1String(file));
    QCOMPARE(settings.value(settings::recentFiles),
             QStringList({QStringLiteral("/tmp/a.qpath"), QStringLiteral("/tmp/b.qpath")}));
    QCOMPARE(settings.value(settings::lastFolder), QStringLiteral("/tmp"));
    for (int i = 0; i < 20; ++i) settings.rememberFile(QStringLiteral("/tmp/%1.qpath").arg(i));
    QCOMPARE(settings.value(settings::recentFiles).size(), 10);
}

void SessionTest::work_left_behind_is_found_by_another_window_only_after_its_own_has_gone()
{
    QTemporaryDir folder;
    const document::Design design = sampleDesign("engine-cycle");
    auto first = std::make_unique<Recovery>(folder.path());
    QVERIFY(first->keep(design, QStringLiteral("/tmp/mine.qpath")));
    Recovery second(folder.path());
    QVERIFY(second.leftBehind().empty()); // its window is still open
    first.reset();
    const auto found = second.leftBehind();
    QCOMPARE(found.size(), std::size_t(1));
    QVERIFY(found.front().design == design);
    QCOMPARE(found.front().path, QStringLiteral("/tmp/mine.qpath"));
    Recovery::remove(found.front());
    QVERIFY(second.leftBehind().empty());
}

QTEST_MAIN(SessionTest)
#include "session_test.moc"
