// The report as its reader gets it: read back with tools that know nothing of the program.

#include "core/document/design.h"
#include "core/document/file.h"
#include "core/document/interpret.h"
#include "ui/report/block.h"
#include "ui/report/report.h"

#include <QFile>
#include <QProcess>
#include <QTemporaryDir>
#include <QTest>

namespace quasistat::ui
{

namespace
{

Snapshot snapshotOf(document::Design design)
{
    static const gas::Library library;
    auto evaluation = document::evaluate(design, library);
    Snapshot snapshot{
        .design = design, .evaluation = nullptr, .failure = std::nullopt, .units = document::displayUnits(design)};
    if (evaluation)
        snapshot.evaluation = std::make_shared<const analysis::Evaluation>(std::move(*evaluation));
    else
        snapshot.failure = evaluation.failure();
    return snapshot;
}

document::Design sample(const char *name)
{
    const auto text = document::fileText(std::string(SAMPLES_DIR) + "/" + name + ".qpath");
    document::Position position;
    return *document::read(*text, position);
}

QByteArray output(const QString &program, const QStringList &words)
{
    QProcess process;
    process.start(program, words);
    process.waitForFinished();
    return process.exitStatus() == QProcess::NormalExit && process.exitCode() == 0 ? process.readAllStandardOutput()
                                                                                   : QByteArray();
}

} // namespace

class ReportTest : public QObject
{
    Q_OBJECT
private slots:
    void its_text_holds_the_figures_of_the_evaluation();
    void a_real_gas_is_named_with_source_range_and_uncertainty();
    void its_fonts_are_embedded_and_its_diagram_is_vectors();
    void the_design_comes_back_out_of_it();
    void letter_paper_is_letter_paper();
    void forty_segments_run_over_pages_with_the_head_repeated();
    void a_path_that_is_not_whole_is_not_reported();
    void a_block_is_never_cut_and_headings_stay_with_their_text();

private:
    /// Writes the report to a file of the test's folder.
    QString written(const document::Design &design, PageSize size = PageSize::a4)
    {
        const auto bytes =
            report(snapshotOf(design), {size, QStringLiteral("0.1.0"), QStringLiteral("a design.qpath")});
        if (!bytes) return {};
        QFile file(m_folder.filePath(QStringLiteral("report%1.pdf").arg(++m_count)));
        if (!file.open(QIODevice::WriteOnly)) return {};
        file.write(*bytes);
        return file.fileName();
    }
    QString textOf(const QString &file)
    {
        return QString::fromUtf8(
            output(QStringLiteral("pdftotext"), {QStringLiteral("-layout"), file, QStringLiteral("-")}));
    }

    QTemporaryDir m_folder;
    int m_count = 0;
};

void ReportTest::its_text_holds_the_figures_of_the_evaluation()
{
    const QString text = textOf(written(sample("air-two-stage")));
    // The picture of the report that the page follows has these, computed independently: dry air, γ 1.4, 5 L at 1 bar,
    // 20 °C.
    for (const char *figure :
         {"480.93", "120.23", "539.47", "844.80", "701.29", "161.52", "930.47", "Two-stage air, shutter drive",
          "GW-021", "second stage", "Exceeded", "Caution", "1 of "})
        QVERIFY2(text.contains(QString::fromUtf8(figure)),
                 qPrintable(QString::fromUtf8(figure) + QLatin1Char('\n') + text));
}

void ReportTest::a_real_gas_is_named_with_source_range_and_uncertainty()
{
    Snapshot snapshot = snapshotOf(sample("nitrogen-letdown"));
    QVERIFY(snapshot.evaluation);
    analysis::Evaluation evaluation = *snapshot.evaluation;
    evaluation.path.segments[0].idealGas = path::IdealGasFigures{-1.2345e6, 0.0, 65.43};
    snapshot.evaluation = std::make_shared<const analysis::Evaluation>(evaluation);
    const auto bytes = report(snapshot, {PageSize::a4, QStringLiteral("0.1.0"), QStringLiteral("a design.qpath")});
    QVERIFY(bytes);
    QFile file(m_folder.filePath(QStringLiteral("real.pdf")));
    QVERIFY(file.open(QIODevice::WriteOnly));
    file.write(*bytes);
    file.close();
    const QString text = textOf(file.fileName()).normalized(QString::NormalizationForm_KC).simplified(); // no ligatures
    for (const char *words :
         {"nitrogen, reference equation", "Span", "Published range", "Model spread", "off by", "vapour x", "0.89"})
        QVERIFY2(text.contains(QString::fromUtf8(words)), qPrintable(QString::fromUtf8(words) + text));
}

void ReportTest::its_fonts_are_embedded_and_its_diagram_is_vectors()
{
    const QString file = written(sample("letdown-sudden"));
    const QStringList fonts =
        QString::fromUtf8(output(QStringLiteral("pdffonts"), {file})).split(QLatin1Char('\n'), Qt::SkipEmptyParts);
    QVERIFY(fonts.size() > 2);
    for (const QString &line : fonts.mid(2))
        QVERIFY2(line.contains(QRegularExpression(QStringLiteral("yes\\s+(yes|no)\\s+yes"))), qPrintable(line));
    const QByteArray images = output(QStringLiteral("pdfimages"), {QStringLiteral("-list"), file});
    QCOMPARE(images.split('\n').size(), 3); // two lines of heading and the last line's end: no picture is a bitmap
    const QByteArray open =
        output(QStringLiteral("qpdf"),
               {QStringLiteral("--qdf"), QStringLiteral("--stream-data=uncompress"), file, QStringLiteral("-")});
    QVERIFY(open.count(" l\n") > 100); // lines drawn as lines
}

void ReportTest::the_design_comes_back_out_of_it()
{
    const document::Design design = sample("engine-cycle");
    const QString file = written(design);
    const QString out = m_folder.filePath(QStringLiteral("attached.qpath"));
    output(QStringLiteral("pdfdetach"),
           {QStringLiteral("-save"), QStringLiteral("1"), QStringLiteral("-o"), out, file});
    const auto text = document::fileText(out.toStdString());
    QVERIFY(text);
    QCOMPARE(*text, document::written(design));
    QVERIFY(!output(QStringLiteral("qpdf"), {QStringLiteral("--check"), file}).isEmpty());
}

void ReportTest::letter_paper_is_letter_paper()
{
    const QByteArray info = output(QStringLiteral("pdfinfo"), {written(sample("letdown-slow"), PageSize::letter)});
    QVERIFY2(info.contains("612 x 792"), info.constData());
    QVERIFY(info.contains("PDF version:     1.6"));
}

void ReportTest::forty_segments_run_over_pages_with_the_head_repeated()
{
    document::Design design = sample("letdown-slow");
    document::Json segments = document::Json::array();
    for (int i = 0; i < 40; ++i)
        segments.push_back({{"kind", "isothermal"},
                            {"end", {{"volume_ratio", i % 2 == 0 ? 0.9 : 1.12}}},
                            {"label", "step " + std::to_string(i + 1) +
                                          ", with a name that is rather long for the column it has to go into"}});
    design.json["segments"] = segments;
    design.json["title"] =
        std::string("A title that is much longer than any title block has room for, and then goes on for a while");
    const QString file = written(design);
    const QString text = textOf(file);
    QVERIFY(text.count(QStringLiteral("end, as given")) >= 2);
    QVERIFY(text.contains(QStringLiteral("step 40")));
}

void ReportTest::a_path_that_is_not_whole_is_not_reported()
{
    document::Design design = sample("letdown-slow");
    design.json["segments"][0]["end"] = {{"pressure", "a lot"}};
    const auto bytes = report(snapshotOf(design), {});
    QVERIFY(!bytes);
    QCOMPARE(bytes.failure().pointer, std::string("/segments/0/end/pressure"));
}

void ReportTest::a_block_is_never_cut_and_headings_stay_with_their_text()
{
    const QRectF area(0, 0, 100, 100);
    const auto paint = [](QPainter &, QPointF) {};
    const std::vector<Block> blocks{{70, paint}, {20, paint, true}, {30, paint}, {60, paint}, {200, paint}};
    const auto pages = paginated(blocks, area);
    QCOMPARE(pages.size(), std::size_t(4));
    QCOMPARE(pages[0].size(), std::size_t(1)); // the heading went on with its text
    QCOMPARE(pages[1].size(), std::size_t(2));
    QCOMPARE(pages[1][1].at.y(), 20.0);
    QCOMPARE(pages[2].size(), std::size_t(1));
    QCOMPARE(pages[3].size(), std::size_t(1)); // higher than a page: one of its own
}

} // namespace quasistat::ui

QTEST_MAIN(quasistat::ui::ReportTest)
#include "report_test.moc"
