#pragma once
// A choice among a few words, with a drawn arrow head in the ink of the text.

#include <QComboBox>

namespace quasistat::ui
{

class ChoiceField : public QComboBox
{
    Q_OBJECT
public:
    using QComboBox::QComboBox;

protected:
    void paintEvent(QPaintEvent *event) override;
    /// Only a choice that has the focus turns with the wheel: scrolling past one must not edit the design.
    void wheelEvent(QWheelEvent *event) override;
};

} // namespace quasistat::ui
