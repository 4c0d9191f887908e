#pragma once
// What the window shows before there is a design: a sample to start from, a blank start state, or the pen.

#include "core/gas/library/library.h"
#include "ui/look/palette.h"
#include "ui/window/samples.h"

#include <QPushButton>
#include <QWidget>

namespace quasistat::ui
{

class SampleButton;

class Welcome : public QWidget
{
    Q_OBJECT
public:
    Welcome(const gas::Library &library, QWidget *parent);

    void setLook(const Palette &look);
    void setRecentFiles(const QStringList &files);
    [[nodiscard]] QPushButton *sampleButton(const QString &name) const;

signals:
    void sampleChosen(const document::Design &design);
    void blankChosen();
    void drawChosen();
    void openChosen();
    void fileChosen(const QString &path);

protected:
    void paintEvent(QPaintEvent *event) override;

private:
    void createViews();

    const gas::Library &m_library;
    Palette m_look;
    std::vector<SampleButton *> m_samples;
    QWidget *m_recent = nullptr;
};

} // namespace quasistat::ui
