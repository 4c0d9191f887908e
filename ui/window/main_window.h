#pragma once
// The one window of one design: header, canvas, strip, ledger, status line, and what stands over them.

#include "ui/ledger/ledger_panel.h"
#include "ui/report/page.h"
#include "ui/session/recovery.h"
#include "ui/session/settings.h"
#include "ui/window/action_table.h"
#include "ui/window/edge_grip.h"
#include "ui/window/header_bar.h"
#include "ui/window/header_popover.h"
#include "ui/window/notice_bar.h"
#include "ui/window/status_line.h"
#include "ui/window/welcome.h"
#include "ui/window/workspace.h"

#include <QMenu>

#include <functional>

namespace quasistat::ui
{

class MainWindow : public QWidget
{
    Q_OBJECT
public:
    explicit MainWindow(const QString &recoveryFolder = Recovery::defaultFolder(), QWidget *parent = nullptr);
    ~MainWindow() override;

    /// Opens the file; a sentence says why if it cannot. Unsaved changes are asked about first.
    void openFile(const QString &path);
    /// Saves to `path`. False if the disk refuses; the bar then says why and the design stays changed.
    bool saveTo(const QString &path);
    /// Writes the report as a PDF. False if it cannot be made or written; the bar then says why.
    bool writeReport(const QString &path, PageSize paper);
    void setScheme(const QString &scheme); ///< "light", "dark" or "system"

    [[nodiscard]] Session &session() { return m_session; }
    [[nodiscard]] QAction *action(ActionId id) const { return m_actions.value(id); }
    [[nodiscard]] HeaderBar &header() { return *m_header; }
    [[nodiscard]] HeaderPopover &popover() { return *m_popover; }
    [[nodiscard]] Workspace &workspace() { return *m_workspace; }
    [[nodiscard]] LedgerPanel &ledger() { return *m_ledger; }
    [[nodiscard]] NoticeBar &notice() { return *m_notice; }
    [[nodiscard]] StatusLine &status() { return *m_status; }
    [[nodiscard]] Welcome &welcome() { return *m_welcome; }
    [[nodiscard]] const Palette &look() const { return m_look; }

protected:
    void closeEvent(QCloseEvent *event) override;
    void resizeEvent(QResizeEvent *event) override;
    void changeEvent(QEvent *event) override;
    void dragEnterEvent(QDragEnterEvent *event) override;
    void dropEvent(QDropEvent *event) override;

private:
    void createViews();
    void connectViews();
    void connectActions();
    void connectFileActions();
    void connectSegmentActions();
    void layOut();
    void applyScheme();
    void enableActions();
    void showMenu();
    void fillRecent(QMenu &menu);
    void openPart(HeaderPart part);

    void start(const document::Design &design); ///< an unsaved design: blank or a sample
    void readFile(const QString &path);
    void chooseFile();
    void save(std::function<void()> then = {});
    void saveAs(std::function<void()> then = {});
    void askAndDo(std::function<void()> then); ///< at once, or after the answer on unsaved changes
    void chooseReport(PageSize paper);
    void keepRecovery();
    void offerRecovery();

    Session m_session;
    Settings m_settings;
    Recovery m_recovery;
    Palette m_look;
    QMap<ActionId, QAction *> m_actions;
    HeaderBar *m_header = nullptr;
    HeaderPopover *m_popover = nullptr;
    NoticeBar *m_notice = nullptr;
    Workspace *m_workspace = nullptr;
    LedgerPanel *m_ledger = nullptr;
    StatusLine *m_status = nullptr;
    Welcome *m_welcome = nullptr;
    EdgeGrip *m_edge = nullptr;
    QTimer m_autosave;
    bool m_mayClose = false;
};

} // namespace quasistat::ui
