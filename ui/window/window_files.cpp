// Opening, saving, asking and keeping: what the window does with files.

#include "core/document/file.h"
#include "ui/report/report.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"
#include "ui/window/main_window.h"

#include <QFileDialog>
#include <QFileInfo>

namespace quasistat::ui
{
namespace
{

constexpr const char *ending = "qpath";

QString filter()
{
    return MainWindow::tr("Designs (*.qpath);;All files (*)");
}

} // namespace

void MainWindow::start(const document::Design &design)
{
    m_session.open(design, QString());
    m_workspace->canvas().zoomToPath();
}

void MainWindow::openFile(const QString &path)
{
    askAndDo([this, path] { readFile(path); });
}

void MainWindow::readFile(const QString &path)
{
    const QString name = QFileInfo(path).fileName();
    const Outcome<std::string> text = document::fileText(path.toStdString());
    if (!text) {
        m_notice->say(tr("%1 cannot be opened. %2").arg(name, sentenceOf(text.failure(), units::DisplayUnits{})));
        return;
    }
    document::Position position;
    const Outcome<document::Design> design = document::read(*text, position);
    if (!design) {
        m_notice->say(tr("%1 is not a design: line %2, column %3. %4")
                          .arg(name)
                          .arg(position.line)
                          .arg(position.column)
                          .arg(sentenceOf(design.failure(), units::DisplayUnits{})));
        return;
    }
    m_notice->close();
    m_session.open(*design, QFileInfo(path).absoluteFilePath());
    m_settings.rememberFile(path);
    m_workspace->canvas().zoomToPath();
}

void MainWindow::chooseFile()
{
    auto *chooser = new QFileDialog(this, tr("Open a design"), m_settings.value(settings::lastFolder), filter());
    chooser->setObjectName(QStringLiteral("openChooser"));
    chooser->setAttribute(Qt::WA_DeleteOnClose);
    chooser->setFileMode(QFileDialog::ExistingFile);
    connect(chooser, &QFileDialog::fileSelected, this, &MainWindow::openFile);
    chooser->open();
}

bool MainWindow::saveTo(const QString &path)
{
    m_session.cancelPreview();
    const auto outcome = document::writeWhole(path.toStdString(), document::written(m_session.now().design));
    if (!outcome) {
        m_notice->say(tr("The design is not saved. %1").arg(sentenceOf(outcome.failure(), units::DisplayUnits{})));
        return false;
    }
    m_session.markSaved(QFileInfo(path).absoluteFilePath());
    m_settings.rememberFile(path);
    m_recovery.discard();
    m_status->say(tr("Saved to %1.").arg(path));
    return true;
}

void MainWindow::save(std::function<void()> then)
{
    m_workspace->panel().form().finishTyping();
    if (m_session.filePath().isEmpty()) {
        saveAs(std::move(then));
        return;
    }
    if (saveTo(m_session.filePath()) && then) then();
}

void MainWindow::saveAs(std::function<void()> then)
{
    m_workspace->panel().form().finishTyping();
    auto *chooser = new QFileDialog(this, tr("Save the design"), m_settings.value(settings::lastFolder), filter());
    chooser->setObjectName(QStringLiteral("saveChooser"));
    chooser->setAttribute(Qt::WA_DeleteOnClose);
    chooser->setAcceptMode(QFileDialog::AcceptSave);
    chooser->setDefaultSuffix(QLatin1String(ending));
    const QString title = typedAt(m_session.now().design.json, "/title");
    chooser->selectFile(m_session.filePath().isEmpty() ? title : QFileInfo(m_session.filePath()).fileName());
    connect(chooser, &QFileDialog::fileSelected, this, [this, then](const QString &path) {
        if (saveTo(path) && then) then();
    });
    chooser->open();
}

void MainWindow::askAndDo(std::function<void()> then)
{
    m_workspace->panel().form().finishTyping();
    if (!m_session.isModified()) {
        then();
        return;
    }
    m_notice->say(tr("This design has changes that are not saved."),
                  {{QStringLiteral("noticeSave"), tr("Save"), [this, then] { save(then); }, true},
                   {QStringLiteral("noticeDiscard"), tr("Discard the changes"),
                    [this, then] {
                        m_recovery.discard();
                        m_session.close();
                        then();
                    }},
                   {QStringLiteral("noticeCancel"), tr("Cancel"), [] {}}});
}

void MainWindow::chooseReport(PageSize paper)
{
    auto *chooser =
        new QFileDialog(this, tr("Save the report"), m_settings.value(settings::lastFolder), tr("PDF (*.pdf)"));
    chooser->setObjectName(QStringLiteral("reportChooser"));
    chooser->setAttribute(Qt::WA_DeleteOnClose);
    chooser->setAcceptMode(QFileDialog::AcceptSave);
    chooser->setDefaultSuffix(QStringLiteral("pdf"));
    const QString name =
        m_session.filePath().isEmpty() ? tr("report") : QFileInfo(m_session.filePath()).completeBaseName();
    chooser->selectFile(name + QStringLiteral(".pdf"));
    connect(chooser, &QFileDialog::fileSelected, this,
            [this, paper](const QString &path) { writeReport(path, paper); });
    chooser->open();
}

bool MainWindow::writeReport(const QString &path, PageSize paper)
{
    m_session.cancelPreview();
    const QString design = QFileInfo(m_session.filePath()).fileName();
    const ReportOrder order{.pageSize = paper,
                            .programVersion = QCoreApplication::applicationVersion(),
                            .fileName = design.isEmpty() ? QStringLiteral("design.qpath") : design};
    const Outcome<QByteArray> pdf = report(m_session.now(), order);
    if (!pdf) {
        m_notice->say(tr("There is no report yet. %1").arg(sentenceOf(pdf.failure(), m_session.now().units)));
        return false;
    }
    const auto bytes = std::string_view(pdf->constData(), static_cast<std::size_t>(pdf->size()));
    const auto written = document::writeWhole(path.toStdString(), bytes);
    if (!written) {
        m_notice->say(tr("The report is not written. %1").arg(sentenceOf(written.failure(), m_session.now().units)));
        return false;
    }
    m_status->say(tr("Report written to %1.").arg(path));
    return true;
}

void MainWindow::keepRecovery()
{
    if (!m_session.isModified()) {
        m_recovery.discard();
        return;
    }
    const bool kept = m_recovery.keep(m_session.base().design, m_session.filePath());
    if (!kept) m_status->say(tr("Unsaved changes cannot be kept for recovery: the disk refuses."));
}

void MainWindow::offerRecovery()
{
    const auto found = m_recovery.leftBehind();
    if (found.empty()) return;
    const LeftBehind work = found.front();
    const QString title = typedAt(work.design.json, "/title");
    m_notice->say(tr("“%1” was not saved when the program last ended.").arg(title),
                  {{QStringLiteral("noticeRecover"), tr("Recover it"),
                    [this, work] {
                        m_session.openUnsaved(work.design, work.path);
                        m_workspace->canvas().zoomToPath();
                        keepRecovery();
                        Recovery::remove(work);
                    },
                    true},
                   {QStringLiteral("noticeForget"), tr("Throw it away"), [work] { Recovery::remove(work); }}});
}

} // namespace quasistat::ui
