// What the actions of the window do.

#include "ui/session/design_reading.h"
#include "ui/strip/kind_menu.h"
#include "ui/strip/segment_edits.h"
#include "ui/window/main_window.h"

#include <QApplication>
#include <QFileInfo>

namespace quasistat::ui
{

void MainWindow::connectActions()
{
    connectFileActions();
    connectSegmentActions();
    const auto on = [this](ActionId id, auto act) { connect(action(id), &QAction::triggered, this, act); };
    on(ActionId::undo, [this] { m_session.undo(); });
    on(ActionId::redo, [this] { m_session.redo(); });
    on(ActionId::zoomToPath, [this] { m_workspace->canvas().zoomToPath(); });
    on(ActionId::zoomIn, [this] { m_workspace->canvas().zoomIn(); });
    on(ActionId::zoomOut, [this] { m_workspace->canvas().zoomOut(); });
    on(ActionId::envelope, [this] { m_ledger->setEnvelopeOpen(!m_ledger->isEnvelopeOpen()); });
    on(ActionId::schemeSystem, [this] { setScheme(QStringLiteral("system")); });
    on(ActionId::schemeLight, [this] { setScheme(QStringLiteral("light")); });
    on(ActionId::schemeDark, [this] { setScheme(QStringLiteral("dark")); });
}

void MainWindow::connectFileActions()
{
    const auto on = [this](ActionId id, auto act) { connect(action(id), &QAction::triggered, this, act); };
    on(ActionId::newDesign, [this] {
        askAndDo([this] {
            start(blankDesign());
            m_session.select(startSelected);
        });
    });
    on(ActionId::open, [this] { chooseFile(); });
    on(ActionId::save, [this] { save(); });
    on(ActionId::saveAs, [this] { saveAs(); });
    on(ActionId::closeDesign, [this] {
        askAndDo([this] {
            m_session.close();
            m_welcome->setRecentFiles(m_settings.value(settings::recentFiles));
        });
    });
    on(ActionId::reportA4, [this] { chooseReport(PageSize::a4); });
    on(ActionId::reportLetter, [this] { chooseReport(PageSize::letter); });
    on(ActionId::quit, [this] { close(); });
}

void MainWindow::connectSegmentActions()
{
    const auto on = [this](ActionId id, auto act) { connect(action(id), &QAction::triggered, this, act); };
    on(ActionId::placeNext, [this] {
        auto *menu = new QMenu(this);
        menu->setAttribute(Qt::WA_DeleteOnClose);
        menu->setObjectName(QStringLiteral("placeMenu"));
        addKinds(*menu, m_look, [this](path::Kind kind) { m_workspace->place(kind); });
        menu->popup(m_workspace->mapToGlobal(QPoint(m_workspace->width() / 2, m_workspace->height() / 3)));
    });
    on(ActionId::duplicate, [this] { duplicateSegment(m_session, m_session.selected()); });
    on(ActionId::remove, [this] { deleteSegment(m_session, m_session.selected()); });
    on(ActionId::moveLeft, [this] { moveSegment(m_session, m_session.selected(), m_session.selected() - 1); });
    on(ActionId::moveRight, [this] { moveSegment(m_session, m_session.selected(), m_session.selected() + 1); });
}

void MainWindow::showMenu()
{
    auto *menu = new QMenu(this);
    menu->setAttribute(Qt::WA_DeleteOnClose);
    menu->setObjectName(QStringLiteral("mainMenu"));
    const auto add = [&](QMenu *to, std::initializer_list<ActionId> ids) {
        for (const ActionId id : ids) to->addAction(action(id));
    };
    add(menu, {ActionId::newDesign, ActionId::open});
    fillRecent(*menu->addMenu(tr("Open recent")));
    add(menu, {ActionId::save, ActionId::saveAs, ActionId::closeDesign});
    menu->addSeparator();
    add(menu, {ActionId::undo, ActionId::redo});
    menu->addSeparator();
    QMenu *insert = menu->addMenu(tr("Insert segment"));
    const int at = m_session.selected() >= 0 ? m_session.selected() + 1 : segmentCount(m_session.now().design);
    addKinds(*insert, m_look, [this, at](path::Kind kind) { insertSegment(m_session, at, kind); });
    insert->setEnabled(m_session.hasDesign());
    QMenu *kinds = menu->addMenu(tr("Change kind"));
    addKinds(*kinds, m_look, [this](path::Kind kind) { changeKind(m_session, m_session.selected(), kind); });
    kinds->setEnabled(m_session.selected() >= 0);
    add(menu, {ActionId::placeNext, ActionId::duplicate, ActionId::remove, ActionId::moveLeft, ActionId::moveRight});
    menu->addSeparator();
    add(menu, {ActionId::zoomToPath, ActionId::zoomIn, ActionId::zoomOut, ActionId::envelope});
    menu->addSeparator();
    add(menu, {ActionId::reportA4, ActionId::reportLetter});
    menu->addSeparator();
    add(menu->addMenu(tr("Colours")), {ActionId::schemeSystem, ActionId::schemeLight, ActionId::schemeDark});
    menu->addSeparator();
    add(menu, {ActionId::quit});
    menu->popup(m_header->menuButton().mapToGlobal(QPoint(0, HeaderBar::height - 8)));
}

void MainWindow::fillRecent(QMenu &menu)
{
    const QStringList files = m_settings.value(settings::recentFiles);
    for (const QString &file : files)
        menu.addAction(QFileInfo(file).fileName(), this, [this, file] { openFile(file); })->setToolTip(file);
    menu.setEnabled(!files.isEmpty());
}

} // namespace quasistat::ui
