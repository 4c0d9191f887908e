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

QString firstSentence(const QString &text)
{
    const qsizetype end = text.indexOf(QLatin1String(". "));
    return end < 0 ? text : text.left(end + 1);
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
                         firstSentence(typedAt(design->json, "/notes")), *design});
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
