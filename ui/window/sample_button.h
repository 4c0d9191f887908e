#pragma once
// One sample on the welcome page: its path drawn small, its title and what it is about.

#include "core/gas/library/library.h"
#include "core/path/result.h"
#include "ui/look/palette.h"
#include "ui/window/samples.h"

#include <QPushButton>

namespace quasistat::ui
{

class SampleButton : public QPushButton
{
    Q_OBJECT
public:
    SampleButton(Sample sample, const gas::Library &library, QWidget *parent);
    void setLook(const Palette &look);
    [[nodiscard]] const Sample &sample() const { return m_sample; }

protected:
    void paintEvent(QPaintEvent *event) override;

private:
    void drawPath(QPainter &painter, const QRectF &box) const;

    Sample m_sample;
    path::PathResult m_path;
    Palette m_look;
};

} // namespace quasistat::ui
