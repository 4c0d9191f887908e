#include "ui/report/report.h"

#include "app/command_line/picture.h"
#include "app/command_line/streams.h"
#include "app/command_line/subcommands.h"

#include <QFileInfo>

namespace quasistat::app
{

ExitStatus report(const Options &options)
{
    const std::string paper = options.last("--paper").value_or("A4");
    if (paper != "A4" && paper != "Letter")
        return wrongUsage({.text = "--paper is A4 or Letter, not “{0}”", .arguments = {paper}}, "report");
    const std::string file = options.operands().empty() ? std::string() : options.operands().front();
    const ui::ReportOrder order{.pageSize = paper == "A4" ? ui::PageSize::a4 : ui::PageSize::letter,
                                .programVersion = QStringLiteral(QUASISTAT_VERSION),
                                .fileName =
                                    file == "-" ? QString() : QFileInfo(QString::fromStdString(file)).fileName()};
    return pictured(options, "report", [&](const ui::Snapshot &snapshot) { return ui::report(snapshot, order); });
}

} // namespace quasistat::app
