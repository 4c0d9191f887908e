// The path strip and the fields of a card, by real mouse and keys.

#include "open_window.h"
#include "ui/fields/text_field.h"
#include "ui/strip/strip_card.h"

#include <QComboBox>

using namespace quasistat;
using namespace quasistat::ui;

class StripTest : public QObject
{
    Q_OBJECT
private slots:
    void initTestCase() { isolateSettings(m_folder); }
    void init();
    void cleanup() { m_window.reset(); }

    void a_click_selects_and_unfolds();
    void an_end_typed_in_another_unit_is_kept_and_one_undo_step();
    void typing_previews_and_esc_takes_it_back();
    void a_text_that_is_no_quantity_fails_its_own_card_alone();
    void later_segments_wait_for_the_failed_one();
    void a_card_dragged_past_its_neighbour_is_reordered();
    void a_drag_given_up_by_esc_changes_nothing();
    void keys_move_select_duplicate_and_delete();
    void enter_unfolds_and_takes_the_first_field();
    void the_kind_is_changed_in_the_fields();
    void the_end_quantity_is_changed_keeping_the_state();
    void the_three_dots_open_the_actions();
    void place_next_offers_every_kind();
    void the_start_state_is_edited();
    void a_start_that_cannot_be_is_refused_with_its_sentence();
    void text_typed_for_one_card_is_entered_when_another_is_selected();
    void cards_are_never_narrower_than_they_may_be();
    void the_limit_exceeded_is_named_on_its_card();

private:
    Session &session() { return m_window->session(); }
    PathStrip &strip() { return m_window->workspace().strip(); }
    FormView &form() { return m_window->workspace().panel().form(); }
    void click(int segment);

    QTemporaryDir m_folder;
    std::unique_ptr<MainWindow> m_window;
};

void StripTest::init()
{
    m_window = std::make_unique<MainWindow>(m_folder.filePath(QStringLiteral("recovery")));
    showWith(*m_window, sampleDesign("air-two-stage"));
}

void StripTest::click(int segment)
{
    StripCard *card = strip().card(segment);
    QTest::mouseClick(card, Qt::LeftButton, {}, QPoint(60, 20));
    QTest::qWait(20);
}

void StripTest::a_click_selects_and_unfolds()
{
    click(2);
    QCOMPARE(session().selected(), 2);
    QVERIFY(strip().isUnfolded());
    QVERIFY(m_window->workspace().panel().isVisible());
    QCOMPARE(strip().card(2)->width(), 264);
    // The fields stand on their card.
    const QRect card(strip().card(2)->mapTo(&m_window->workspace(), QPoint(0, 0)), strip().card(2)->size());
    const QRect panel = m_window->workspace().panel().geometry();
    QCOMPARE(panel.left(), card.left());
    QCOMPARE(panel.bottom() + 1, card.top() + 1);
    click(2);
    QVERIFY(!m_window->workspace().panel().isVisible());
}

void StripTest::an_end_typed_in_another_unit_is_kept_and_one_undo_step()
{
    const document::Design before = session().now().design;
    click(0);
    TextField *end = form().valueOf(QStringLiteral("end"));
    QVERIFY(end);
    typeInto(end, QStringLiteral("58 psi"));
    QTest::keyClick(end, Qt::Key_Return);
    QCOMPARE(typedEnd(*m_window, 0, "pressure"), QStringLiteral("58 psi"));
    // 1 psi = 6894.757 Pa (NIST SP 811, appendix B.8)
    const double reached = session().now().evaluation->path.states[1].state.pressure();
    QVERIFY(std::abs(reached - 58 * 6894.757) < 1.0);
    QCOMPARE(session().undoStack().count(), 1);
    session().undo();
    QVERIFY(session().now().design == before);
}

void StripTest::typing_previews_and_esc_takes_it_back()
{
    const document::Design before = session().now().design;
    click(0);
    TextField *end = form().valueOf(QStringLiteral("end"));
    typeInto(end, QStringLiteral("4 bar"));
    QVERIFY(session().isPreviewing());
    QVERIFY(std::abs(session().now().evaluation->path.states[1].state.pressure() - 4e5) < 1e-3);
    QTest::keyClick(end, Qt::Key_Escape);
    QVERIFY(!session().isPreviewing());
    QVERIFY(session().now().design == before);
    QCOMPARE(end->text(), typedEnd(*m_window, 0, "pressure"));
    QVERIFY(!session().undoStack().canUndo());
}

void StripTest::a_text_that_is_no_quantity_fails_its_own_card_alone()
{
    click(2);
    TextField *end = form().valueOf(QStringLiteral("end"));
    typeInto(end, QStringLiteral("ten bar"));
    QVERIFY(!form().sentenceOf(QStringLiteral("end")).isEmpty());
    QVERIFY(!session().isPreviewing()); // the picture of the last text that could stand stays
    QTest::keyClick(end, Qt::Key_Return);
    const auto &cards = strip().faces().cards;
    QCOMPARE(cards[2].standing, CardStanding::error);
    QVERIFY(!cards[2].sentence.isEmpty());
    QVERIFY(cards[0].hasFigures() && cards[1].hasFigures());
    QVERIFY(!form().sentenceOf(QStringLiteral("end")).isEmpty());
}

void StripTest::later_segments_wait_for_the_failed_one()
{
    session().apply(withValue(session().now().design, "/segments/1/end/temperature", "−500 °C"),
                    QStringLiteral("edit"));
    const auto &cards = strip().faces().cards;
    QCOMPARE(cards[1].standing, CardStanding::error);
    QCOMPARE(cards[2].standing, CardStanding::waiting);
    QCOMPARE(cards[2].sentence, QStringLiteral("Waits for segment 2."));
}

void StripTest::a_card_dragged_past_its_neighbour_is_reordered()
{
    const QString moved = strip().faces().cards[0].title;
    const QString passed = strip().faces().cards[1].title;
    StripCard *card = strip().card(0);
    const QPoint grip(60, 20);
    const int way = strip().card(1)->x() - card->x() + 40;
    QTest::mousePress(card, Qt::LeftButton, {}, grip);
    for (int step = 1; step <= 8; ++step) { // the card moves under the mouse: aim from where it is now
        const int wanted = way * step / 8;
        const QPoint at = card->mapFromGlobal(strip().card(1)->parentWidget()->mapToGlobal(QPoint(0, 0))) +
                          QPoint(strip().card(startSelected)->geometry().right() + 9 + grip.x() + wanted, grip.y());
        QMouseEvent move(QEvent::MouseMove, at, card->mapToGlobal(at), Qt::NoButton, Qt::LeftButton, Qt::NoModifier);
        QApplication::sendEvent(card, &move);
    }
    const QPoint end = card->mapFromGlobal(card->parentWidget()->mapToGlobal(
        QPoint(strip().card(startSelected)->geometry().right() + 9 + grip.x() + way, grip.y() + 8)));
    QTest::mouseRelease(card, Qt::LeftButton, {}, end);
    QCOMPARE(strip().faces().cards[0].title, passed);
    QCOMPARE(strip().faces().cards[1].title, moved);
    QCOMPARE(session().selected(), 1);
    QCOMPARE(session().undoStack().count(), 1);
    session().undo();
    QCOMPARE(strip().faces().cards[0].title, moved);
}

void StripTest::a_drag_given_up_by_esc_changes_nothing()
{
    StripCard *card = strip().card(0);
    const int home = card->x();
    QTest::mousePress(card, Qt::LeftButton, {}, QPoint(60, 20));
    const QPoint at(260, 20);
    QMouseEvent move(QEvent::MouseMove, at, card->mapToGlobal(at), Qt::NoButton, Qt::LeftButton, Qt::NoModifier);
    QApplication::sendEvent(card, &move);
    QVERIFY(card->isDragged());
    QTest::keyClick(card, Qt::Key_Escape);
    QTest::mouseRelease(card, Qt::LeftButton, {}, QPoint(60, 20));
    QCOMPARE(card->x(), home);
    QVERIFY(!session().undoStack().canUndo());
}

void StripTest::keys_move_select_duplicate_and_delete()
{
    const int count = segmentCount(session().now().design);
    click(1);
    strip().card(1)->setFocus();
    QTest::keyClick(strip().card(1), Qt::Key_Right);
    QCOMPARE(session().selected(), 2);
    QTest::keyClick(strip().card(2), Qt::Key_Left);
    QCOMPARE(session().selected(), 1);
    QTest::keyClick(strip().card(1), Qt::Key_D, Qt::ControlModifier);
    QCOMPARE(segmentCount(session().now().design), count + 1);
    QCOMPARE(session().selected(), 2);
    QTest::keyClick(strip().card(2), Qt::Key_Delete);
    QCOMPARE(segmentCount(session().now().design), count);
    session().select(1);
    const QString title = strip().faces().cards[1].title;
    QTest::keyClick(strip().card(1), Qt::Key_Right, Qt::AltModifier);
    QCOMPARE(strip().faces().cards[2].title, title);
}

void StripTest::enter_unfolds_and_takes_the_first_field()
{
    click(1);
    click(1); // folded
    QVERIFY(!strip().isUnfolded());
    strip().card(1)->setFocus();
    QTest::keyClick(strip().card(1), Qt::Key_Return);
    QVERIFY(strip().isUnfolded());
    QVERIFY(qobject_cast<TextField *>(QApplication::focusWidget()));
    QTest::keyClick(QApplication::focusWidget(), Qt::Key_Escape);
    QVERIFY(!strip().isUnfolded());
}

void StripTest::the_kind_is_changed_in_the_fields()
{
    click(2);
    QComboBox *kind = form().choiceOf(QStringLiteral("kind"));
    QCOMPARE(kind->currentData().toString(), QStringLiteral("isentropic"));
    kind->setFocus();
    QTest::keyClick(kind, Qt::Key_Up); // polytropic stands above
    QCOMPARE(typedAt(session().now().design.json, "/segments/2/kind"), QStringLiteral("polytropic"));
    QVERIFY(form().valueOf(QStringLiteral("law")));
    QVERIFY(session().now().evaluation->path.complete());
    session().undo();
    QCOMPARE(typedAt(session().now().design.json, "/segments/2/kind"), QStringLiteral("isentropic"));
}

void StripTest::the_end_quantity_is_changed_keeping_the_state()
{
    click(2);
    const double before = session().now().evaluation->path.states[3].state.volume();
    QComboBox *end = form().choiceOf(QStringLiteral("end"));
    end->setFocus();
    QTest::keyClick(end, Qt::Key_Down); // from pressure to volume
    QVERIFY(!typedEnd(*m_window, 2, "volume").isEmpty());
    QVERIFY(typedEnd(*m_window, 2, "pressure").isEmpty());
    const double after = session().now().evaluation->path.states[3].state.volume();
    QVERIFY(std::abs(after - before) < 1e-4 * before); // five digits are typed
}

void StripTest::the_three_dots_open_the_actions()
{
    StripCard *card = strip().card(0);
    QTest::mouseMove(card, QPoint(60, 20));
    QTest::mouseClick(card, Qt::LeftButton, {}, dotsPlace(card->rect()).center().toPoint());
    auto *menu = strip().findChild<QMenu *>(QStringLiteral("cardMenu"));
    QVERIFY(menu);
    const int count = segmentCount(session().now().design);
    menu->findChild<QAction *>(QStringLiteral("duplicate"))->trigger();
    menu->close();
    QCOMPARE(segmentCount(session().now().design), count + 1);
}

void StripTest::place_next_offers_every_kind()
{
    QTest::mouseClick(strip().placeNext(), Qt::LeftButton);
    auto *menu = strip().findChild<QMenu *>(QStringLiteral("placeMenu"));
    QVERIFY(menu);
    QCOMPARE(menu->actions().size(), static_cast<qsizetype>(path::kindTable.size()));
    menu->findChild<QAction *>(QStringLiteral("isobaric"))->trigger();
    menu->close();
    QVERIFY(!m_window->workspace().canvas().isSelecting());
    QVERIFY(!m_window->status().sentence().isEmpty());
}

void StripTest::the_start_state_is_edited()
{
    QTest::mouseClick(strip().card(startSelected), Qt::LeftButton, {}, QPoint(40, 60));
    QTest::qWait(20);
    QCOMPARE(session().selected(), startSelected);
    TextField *pressure = form().valueOf(QStringLiteral("start1"));
    typeInto(pressure, QStringLiteral("30 psi"));
    QTest::keyClick(pressure, Qt::Key_Return);
    QCOMPARE(typedAt(session().now().design.json, "/start/pressure"), QStringLiteral("30 psi"));
    QCOMPARE(session().undoStack().count(), 1);
}

void StripTest::a_start_that_cannot_be_is_refused_with_its_sentence()
{
    const document::Design before = session().now().design;
    QTest::mouseClick(strip().card(startSelected), Qt::LeftButton, {}, QPoint(40, 60));
    QTest::qWait(20);
    TextField *pressure = form().valueOf(QStringLiteral("start1"));
    typeInto(pressure, QStringLiteral("-2 bar"));
    QTest::keyClick(pressure, Qt::Key_Return);
    QVERIFY(!form().sentenceOf(QStringLiteral("start1")).isEmpty());
    QVERIFY(session().now().design == before);
    QVERIFY(session().now().evaluation->path.complete());
    QCOMPARE(pressure->text(), QStringLiteral("-2 bar"));
}

void StripTest::text_typed_for_one_card_is_entered_when_another_is_selected()
{
    click(0);
    typeInto(form().valueOf(QStringLiteral("end")), QStringLiteral("3.5 bar"));
    session().select(2); // as a click on the canvas does
    QCOMPARE(typedEnd(*m_window, 0, "pressure"), QStringLiteral("3.5 bar"));
    QCOMPARE(typedEnd(*m_window, 2, "pressure"),
             typedAt(sampleDesign("air-two-stage").json, "/segments/2/end/pressure"));
}

void StripTest::cards_are_never_narrower_than_they_may_be()
{
    m_window->resize(1100, 700);
    for (int i = 0; i < 4; ++i) {
        session().select(0);
        m_window->action(ActionId::duplicate)->trigger();
    }
    QTest::qWait(20);
    for (int k = 0; k < segmentCount(session().now().design); ++k) QVERIFY(strip().card(k)->width() >= 148);
    session().select(segmentCount(session().now().design) - 1);
    QTest::qWait(20);
    QVERIFY(!strip().selectedPlace().isEmpty()); // scrolled into sight
}

void StripTest::the_limit_exceeded_is_named_on_its_card()
{
    document::Json limits = document::Json::array();
    limits.push_back({{"quantity", "temperature"}, {"max", "140 °C"}, {"label", "discharge"}});
    session().apply(withValue(session().now().design, "/limits", limits), QStringLiteral("edit"));
    const CardFace &card = strip().faces().cards[2];
    QCOMPARE(card.standing, CardStanding::warned);
    QCOMPARE(card.mark, QStringLiteral("discharge"));
    click(2);
    QVERIFY(m_window->workspace().panel().notes().join(QLatin1Char(' ')).contains(QStringLiteral("Passes 140")));
}

QTEST_MAIN(StripTest)
#include "strip_test.moc"
