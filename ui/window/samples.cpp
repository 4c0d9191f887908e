#include "ui/window/samples.h"

#include "ui/session/design_reading.h"

#include <QCoreApplication>
#include <QDir>

// The resource sits in a static library: without this call the linker would leave it out.
static void loadResources()
{
    Q_INIT_RESOURCE(samples);
}

namespace quasistat::ui
{

using document::Design;
using document::Json;

namespace
{

/// The notes without the remark that all samples share.
QString aboutFrom(const QString &notes)
{
    const QLatin1String remark("Invented data. ");
    return notes.startsWith(remark) ? notes.mid(remark.size()) : notes;
}

} // namespace

std::vector<Sample> samples()
{
    loadResources();
    std::vector<Sample> found;
    const QDir folder(QStringLiteral(":/samples"));
    for (const QString &name : folder.entryList({QStringLiteral("*.qpath")}, QDir::Files, QDir::Name)) {
        QFile file(folder.filePath(name));
        if (!file.open(QIODevice::ReadOnly)) continue;
        document::Position position;
        const Outcome<Design> design = document::read(file.readAll().toStdString(), position);
        if (!design) continue;
        found.push_back({QFileInfo(name).completeBaseName(), typedAt(design->json, "/title"),
                         aboutFrom(typedAt(design->json, "/notes")), *design});
    }
    return found;
}

Design blankDesign()
{
    Design design;
    design.json = Json{{"quasistat", 1},
                       {"title", QCoreApplication::translate("Samples", "New design").toStdString()},
                       {"gas", {{"model", "ideal"}, {"composition", {{"air", 1}}}}},
                       {"surroundings", {{"pressure", "1 bar"}, {"temperature", "20 °C"}}},
                       {"start", {{"pressure", "1 bar"}, {"temperature", "20 °C"}, {"volume", "1 L"}}},
                       {"segments", Json::array()}};
    return design;
}

} // namespace quasistat::ui
