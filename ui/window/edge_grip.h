#pragma once
// The edge between canvas and ledger, to drag.

#include <QWidget>

namespace quasistat::ui
{

class EdgeGrip : public QWidget
{
    Q_OBJECT
public:
    static constexpr int width = 7;

    explicit EdgeGrip(QWidget *parent);

signals:
    void dragged(int x); ///< where the edge shall be, in the parent's coordinates

protected:
    void mouseMoveEvent(QMouseEvent *event) override;
};

} // namespace quasistat::ui
