#include "ui/window/main_window.h"

#include "ui/fields/field_style.h"
#include "ui/look/type.h"

#include <QApplication>
#include <QCloseEvent>
#include <QDragEnterEvent>
#include <QFileInfo>
#include <QMimeData>

namespace quasistat::ui
{
namespace
{

constexpr int leastLedger = 280;
constexpr int mostLedger = 520;
constexpr int leastWorkspace = 780;

} // namespace

MainWindow::MainWindow(const QString &recoveryFolder, QWidget *parent)
    : QWidget(parent), m_recovery(recoveryFolder), m_look(ui::palette(Scheme::light)), m_actions(createActions(this))
{
    setMinimumSize(1100, 700);
    setAcceptDrops(true);
    setFont(bodyFace());
    createViews();
    connectViews();
    connectActions();
    resize(1440, 900);
    restoreGeometry(m_settings.value(settings::windowGeometry));
    applyScheme();
    enableActions();
    layOut();
    setFocusPolicy(Qt::ClickFocus);
    setFocus();
    offerRecovery();
}

MainWindow::~MainWindow()
{
    // The views read the session until their end, so they go before it; and nobody listens to its own going.
    m_session.disconnect();
    qDeleteAll(findChildren<QWidget *>(QString(), Qt::FindDirectChildrenOnly));
}

void MainWindow::createViews()
{
    m_header = new HeaderBar(m_session, this);
    m_workspace = new Workspace(m_session, this);
    m_ledger = new LedgerPanel(m_session, this);
    m_edge = new EdgeGrip(this);
    m_edge->setObjectName(QStringLiteral("ledgerEdge"));
    m_status = new StatusLine(m_session, this);
    m_welcome = new Welcome(m_session.library(), this);
    m_welcome->setRecentFiles(m_settings.value(settings::recentFiles));
    m_notice = new NoticeBar(this);
    m_popover = new HeaderPopover(m_session, this);
    for (QAction *action : std::as_const(m_actions)) addAction(action);
}

void MainWindow::connectViews()
{
    connect(m_header, &HeaderBar::partRequested, this, &MainWindow::openPart);
    connect(m_header, &HeaderBar::menuRequested, this, &MainWindow::showMenu);
    connect(&m_header->report(), &QPushButton::clicked, action(ActionId::reportA4), &QAction::trigger);
    connect(m_edge, &EdgeGrip::dragged, this, [this](int x) {
        m_settings.set(settings::ledgerWidth, std::clamp(width() - x, leastLedger, mostLedger));
        layOut();
    });
    connect(m_notice, &NoticeBar::changed, this, &MainWindow::layOut);
    connect(m_workspace, &Workspace::hinted, m_status, &StatusLine::setHint);
    connect(&m_workspace->canvas(), &Canvas::remarked, m_status, &StatusLine::say);
    connect(m_welcome, &Welcome::sampleChosen, this, &MainWindow::start);
    connect(m_welcome, &Welcome::blankChosen, this, [this] {
        start(blankDesign());
        m_session.select(startSelected);
    });
    connect(m_welcome, &Welcome::drawChosen, this, [this] {
        start(blankDesign());
        m_workspace->place(path::Kind::isentropic);
    });
    connect(m_welcome, &Welcome::openChosen, this, &MainWindow::chooseFile);
    connect(m_welcome, &Welcome::fileChosen, this, &MainWindow::openFile);

    m_autosave.setSingleShot(true);
    m_autosave.setInterval(800);
    connect(&m_autosave, &QTimer::timeout, this, &MainWindow::keepRecovery);
    connect(&m_session, &Session::snapshotChanged, &m_autosave, qOverload<>(&QTimer::start));
    connect(&m_session, &Session::fileChanged, &m_autosave, qOverload<>(&QTimer::start));
    connect(&m_session, &Session::fileChanged, this, &MainWindow::enableActions);
    connect(&m_session, &Session::snapshotChanged, this, &MainWindow::enableActions);
    connect(&m_session, &Session::selectionChanged, this, &MainWindow::enableActions);
}

void MainWindow::enableActions()
{
    const bool design = m_session.hasDesign();
    for (const ActionFacts &entry : actionTable) {
        const bool able = (!entry.needsDesign || design) && (!entry.needsSegment || m_session.selected() >= 0);
        action(entry.id)->setEnabled(able);
    }
    const QUndoStack &stack = m_session.undoStack();
    action(ActionId::undo)->setEnabled(stack.canUndo());
    action(ActionId::redo)->setEnabled(stack.canRedo());
    action(ActionId::undo)->setText(stack.canUndo() ? tr("Undo: %1").arg(stack.undoText()) : tr("Undo"));
    action(ActionId::redo)->setText(stack.canRedo() ? tr("Redo: %1").arg(stack.redoText()) : tr("Redo"));
    const bool report = design && m_session.now().evaluation;
    for (const ActionId id : {ActionId::reportA4, ActionId::reportLetter}) action(id)->setEnabled(report);
    m_header->report().setEnabled(report);

    const QString name = QFileInfo(m_session.filePath()).fileName();
    setWindowTitle(!design ? QStringLiteral("Quasistat")
                           : (name.isEmpty() ? tr("unsaved design") : name) + QStringLiteral("[*]"));
    setWindowModified(m_session.isModified());
    const bool wasWelcome = m_welcome->isVisibleTo(this);
    if (wasWelcome == design) layOut();
}

void MainWindow::layOut()
{
    const bool design = m_session.hasDesign();
    m_header->setGeometry(0, 0, width(), HeaderBar::height);
    int top = HeaderBar::height;
    if (m_notice->isVisibleTo(this)) {
        m_notice->setGeometry(0, top, width(), 40);
        top += 40;
    }
    const int bottom = height() - StatusLine::height;
    const int ledger = std::clamp(m_settings.value(settings::ledgerWidth), leastLedger,
                                  std::clamp(width() - leastWorkspace, leastLedger, mostLedger));
    m_header->setLedgerWidth(ledger);
    m_workspace->setGeometry(0, top, width() - ledger, bottom - top);
    m_ledger->setGeometry(width() - ledger, top, ledger, bottom - top);
    m_status->setGeometry(0, bottom, width(), StatusLine::height);
    m_welcome->setGeometry(0, top, width(), bottom - top);
    m_workspace->setVisible(design);
    m_edge->setGeometry(width() - ledger - EdgeGrip::width / 2, top, EdgeGrip::width, bottom - top);
    m_edge->setVisible(design);
    m_ledger->setVisible(design);
    m_welcome->setVisible(!design);
    if (!design) m_welcome->raise();
    m_edge->raise();
    m_notice->raise();
    m_popover->raise();
}

void MainWindow::resizeEvent(QResizeEvent *event)
{
    QWidget::resizeEvent(event);
    layOut();
}

void MainWindow::setScheme(const QString &scheme)
{
    m_settings.set(settings::scheme, scheme);
    applyScheme();
}

void MainWindow::applyScheme()
{
    const QString wanted = m_settings.value(settings::scheme);
    const Scheme scheme = wanted == QLatin1String("dark")    ? Scheme::dark
                          : wanted == QLatin1String("light") ? Scheme::light
                                                             : systemScheme();
    m_look = ui::palette(scheme);
    setPalette(widgetPalette(m_look));
    setStyleSheet(fieldStyle(m_look));
    m_header->setLook(m_look);
    m_popover->setLook(m_look);
    m_notice->setLook(m_look);
    m_workspace->setLook(m_look);
    m_ledger->setLook(m_look);
    m_status->setLook(m_look);
    m_welcome->setLook(m_look);
}

void MainWindow::changeEvent(QEvent *event)
{
    QWidget::changeEvent(event);
    // The desktop has turned light or dark; the window's own palette is set apart from it.
    if (event->type() == QEvent::ApplicationPaletteChange && m_welcome) applyScheme();
}

void MainWindow::openPart(HeaderPart part)
{
    const HeaderField &field = m_header->field(part);
    m_popover->openFor(part, field.mapTo(this, QPoint(-14, HeaderBar::height + 2)));
}

void MainWindow::closeEvent(QCloseEvent *event)
{
    m_popover->finish();
    if (m_session.isModified() && !m_mayClose) {
        event->ignore();
        askAndDo([this] {
            m_mayClose = true;
            close();
        });
        return;
    }
    m_settings.set(settings::windowGeometry, saveGeometry());
    m_autosave.stop();
    m_recovery.discard();
    event->accept();
}

void MainWindow::dragEnterEvent(QDragEnterEvent *event)
{
    if (event->mimeData()->hasUrls()) event->acceptProposedAction();
}

void MainWindow::dropEvent(QDropEvent *event)
{
    const QList<QUrl> urls = event->mimeData()->urls();
    if (!urls.isEmpty() && urls.first().isLocalFile()) openFile(urls.first().toLocalFile());
}

} // namespace quasistat::ui
