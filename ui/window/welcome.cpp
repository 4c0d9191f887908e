#include "ui/window/welcome.h"

#include "ui/look/figure_text.h"
#include "ui/look/type.h"
#include "ui/window/sample_button.h"

#include <QFileInfo>
#include <QGridLayout>
#include <QLabel>
#include <QPainter>
#include <QScrollArea>

namespace quasistat::ui
{
namespace
{

QLabel *words(const QString &text, const QFont &font, bool secondary, QWidget *parent)
{
    auto *label = new QLabel(text, parent);
    label->setFont(font);
    label->setWordWrap(true);
    if (secondary) label->setProperty("role", QStringLiteral("secondary"));
    return label;
}

QPushButton *button(const QString &text, const QString &name, bool primary, QWidget *parent)
{
    auto *made = new QPushButton(text, parent);
    made->setObjectName(name);
    made->setFont(bodyFace());
    if (primary) made->setProperty("role", QStringLiteral("primary"));
    return made;
}

} // namespace

Welcome::Welcome(const gas::Library &library, QWidget *parent)
    : QWidget(parent), m_library(library), m_look(ui::palette(Scheme::light))
{
    createViews();
}

void Welcome::createViews()
{
    auto *outer = new QVBoxLayout(this);
    outer->setContentsMargins(0, 0, 0, 0);
    auto *scroll = new QScrollArea(this);
    scroll->setFrameShape(QFrame::NoFrame);
    scroll->setWidgetResizable(true);
    scroll->viewport()->setAutoFillBackground(false);
    auto *page = new QWidget;
    page->setAutoFillBackground(false);
    page->setMaximumWidth(1200);
    scroll->setWidget(page);
    outer->addWidget(scroll);

    auto *column = new QVBoxLayout(page);
    column->setContentsMargins(96, 56, 64, 40);
    column->setSpacing(10);
    column->addWidget(
        words(tr("Take a charge of gas from one state to another"), face(24, QFont::DemiBold), false, page));
    column->addWidget(
        words(tr("Chain segments on the p–V plane; read work, heat and lost work of each, checked two ways, and "
                 "hand on a report that can be verified."),
              bodyFace(), true, page));
    column->addSpacing(10);

    auto *starts = new QHBoxLayout;
    starts->setSpacing(8);
    auto *draw = button(tr("Draw a path"), QStringLiteral("welcome.draw"), true, page);
    auto *blank = button(tr("Start from a blank state"), QStringLiteral("welcome.blank"), false, page);
    auto *open = button(tr("Open a design…"), QStringLiteral("welcome.open"), false, page);
    starts->addWidget(draw);
    starts->addWidget(blank);
    starts->addWidget(open);
    starts->addStretch(1);
    column->addLayout(starts);
    connect(draw, &QPushButton::clicked, this, &Welcome::drawChosen);
    connect(blank, &QPushButton::clicked, this, &Welcome::blankChosen);
    connect(open, &QPushButton::clicked, this, &Welcome::openChosen);

    m_recent = new QWidget(page);
    new QVBoxLayout(m_recent);
    m_recent->layout()->setContentsMargins(0, 8, 0, 0);
    m_recent->layout()->setSpacing(2);
    column->addWidget(m_recent);

    column->addSpacing(8);
    column->addWidget(words(tr("Or take a sample and change it: a fictitious gas workshop, invented data"), titleFace(),
                            false, page));
    auto *grid = new QGridLayout;
    grid->setSpacing(8);
    int place = 0;
    for (Sample &sample : samples()) {
        auto *made = new SampleButton(std::move(sample), m_library, page);
        connect(made, &QPushButton::clicked, this, [this, made] { emit sampleChosen(made->sample().design); });
        m_samples.push_back(made);
        grid->addWidget(made, place / 2, place % 2);
        ++place;
    }
    grid->setColumnStretch(0, 1);
    grid->setColumnStretch(1, 1);
    column->addLayout(grid);
    column->addStretch(1);
}

void Welcome::setLook(const Palette &look)
{
    m_look = look;
    for (SampleButton *sample : m_samples) sample->setLook(look);
    update();
}

void Welcome::setRecentFiles(const QStringList &files)
{
    QLayout *rows = m_recent->layout();
    while (QLayoutItem *item = rows->takeAt(0)) {
        if (QWidget *widget = item->widget()) widget->deleteLater();
        delete item;
    }
    m_recent->setVisible(!files.isEmpty());
    if (files.isEmpty()) return;
    rows->addWidget(words(tr("Recent designs"), titleFace(), false, m_recent));
    for (const QString &file : files.mid(0, 4)) {
        const QFileInfo info(file);
        auto *made = button(tr("%1 in %2").arg(info.fileName(), info.absolutePath()),
                            QStringLiteral("recent.") + info.fileName(), false, m_recent);
        made->setProperty("role", QStringLiteral("quiet"));
        connect(made, &QPushButton::clicked, this, [this, file] { emit fileChosen(file); });
        rows->addWidget(made);
        rows->setAlignment(made, Qt::AlignLeft);
    }
}

QPushButton *Welcome::sampleButton(const QString &name) const
{
    for (SampleButton *sample : m_samples)
        if (sample->sample().name == name) return sample;
    return nullptr;
}

void Welcome::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.fillRect(rect(), m_look.ground);
    // The axes of the empty plane the first segment will be drawn on.
    const QRect plane = rect().adjusted(64, 16, -16, -44);
    painter.setPen(QPen(m_look.grid(), 1));
    for (int x = plane.left() + 189; x < plane.right(); x += 189)
        painter.drawLine(x, plane.bottom() - 6, x, plane.bottom());
    for (int y = plane.bottom() - 107; y > plane.top(); y -= 107)
        painter.drawLine(plane.left(), y, plane.left() + 6, y);
    painter.setPen(QPen(faded(m_look.ink, 0.4), 1.25));
    painter.drawLine(plane.topLeft(), plane.bottomLeft());
    painter.drawLine(plane.bottomLeft(), plane.bottomRight());
    painter.setPen(faded(m_look.ink, 0.66));
    drawText(painter, {38, plane.top() + 10.0}, RichText::marked(QStringLiteral("<i>p</i>")), bodyFace());
    drawText(painter, {plane.right() - 10.0, plane.bottom() + 24.0}, RichText::marked(QStringLiteral("<i>V</i>")),
             bodyFace());
}

} // namespace quasistat::ui
