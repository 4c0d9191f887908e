#include "ui/window/header_bar.h"

#include "ui/fields/text_field.h"
#include "ui/look/type.h"
#include "ui/session/design_reading.h"

#include <QPainter>

namespace quasistat::ui
{
namespace
{

constexpr HeaderPart parts[] = {HeaderPart::title, HeaderPart::gas,   HeaderPart::surroundings,
                                HeaderPart::sign,  HeaderPart::units, HeaderPart::rate};
constexpr int firstLeft = 52;

QString nameOf(HeaderPart part)
{
    static const QMap<HeaderPart, QString> names{
        {HeaderPart::title, QStringLiteral("header.title")},
        {HeaderPart::gas, QStringLiteral("header.gas")},
        {HeaderPart::surroundings, QStringLiteral("header.surroundings")},
        {HeaderPart::sign, QStringLiteral("header.sign")},
        {HeaderPart::units, QStringLiteral("header.units")},
        {HeaderPart::rate, QStringLiteral("header.rate")},
    };
    return names.value(part);
}

/// Three lines, drawn.
class MenuButton : public QPushButton
{
public:
    using QPushButton::QPushButton;

protected:
    void paintEvent(QPaintEvent *event) override
    {
        QPushButton::paintEvent(event);
        QPainter painter(this);
        painter.setRenderHint(QPainter::Antialiasing);
        painter.setPen(QPen(palette().color(QPalette::WindowText), 1.75, Qt::SolidLine, Qt::RoundCap));
        const QPointF middle = QRectF(rect()).center();
        for (const double y : {-5.0, 0.0, 5.0})
            painter.drawLine(middle + QPointF(-7, y), middle + QPointF(y > 0 ? 3 : 7, y));
    }
};

} // namespace

HeaderBar::HeaderBar(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light))
{
    setFixedHeight(height);
    createFields();
    connect(&session, &Session::snapshotChanged, this, &HeaderBar::refresh);
    connect(&session, &Session::fileChanged, this, &HeaderBar::refresh);
    refresh();
}

void HeaderBar::createFields()
{
    m_menu = new MenuButton(this);
    m_menu->setObjectName(QStringLiteral("menuButton"));
    m_menu->setAccessibleName(tr("Menu"));
    m_menu->setProperty("role", QStringLiteral("quiet"));
    connect(m_menu, &QPushButton::clicked, this, &HeaderBar::menuRequested);
    for (const HeaderPart part : parts) {
        auto *made = new HeaderField(this);
        made->setObjectName(nameOf(part));
        made->setBold(part == HeaderPart::title);
        connect(made, &HeaderField::clicked, this, [this, part](bool onCaption) { click(part, onCaption); });
        m_fields.insert(part, made);
    }
    m_document = new HeaderField(this);
    m_document->setObjectName(QStringLiteral("header.document"));
    m_document->setCursor(Qt::ArrowCursor);
    m_document->setFocusPolicy(Qt::NoFocus);
    m_report = new QPushButton(tr("Report"), this);
    m_report->setObjectName(QStringLiteral("reportButton"));
    m_report->setProperty("role", QStringLiteral("primary"));
    m_report->setFont(titleFace());
    m_title = new TextField(this);
    m_title->setObjectName(QStringLiteral("titleField"));
    m_title->setFont(titleFace());
    m_title->hide();
    connect(m_title, &QLineEdit::textEdited, this,
            [this](const QString &text) { m_session.preview(withText(m_session.base().design, "/title", text)); });
    connect(m_title, &TextField::entered, this, [this](const QString &text) {
        m_session.apply(withText(m_session.base().design, "/title", text), tr("Change title"));
    });
    connect(m_title, &TextField::restored, &m_session, &Session::cancelPreview);
    connect(m_title, &TextField::escaped, m_title, &QWidget::hide);
    connect(m_title, &TextField::confirmed, m_title, &QWidget::hide);
    connect(m_title, &QLineEdit::editingFinished, m_title, &QWidget::hide);
}

void HeaderBar::setLook(const Palette &look)
{
    m_look = look;
    for (HeaderField *field : std::as_const(m_fields)) field->setLook(look);
    m_document->setLook(look);
    update();
}

void HeaderBar::setLedgerWidth(int width)
{
    m_ledgerWidth = width;
    layOut();
}

void HeaderBar::refresh()
{
    const bool design = m_session.hasDesign();
    for (auto field = m_fields.begin(); field != m_fields.end(); ++field) {
        field.value()->setVisible(design);
        if (!design) continue;
        const HeaderText text = headerText(field.key(), m_session.now());
        field.value()->setText(text.caption, text.value);
    }
    m_document->setVisible(design);
    m_report->setVisible(design);
    const bool saved = !m_session.isModified() && !m_session.filePath().isEmpty();
    const QString state = saved ? tr("saved") : m_session.isModified() ? tr("changed") : tr("not saved yet");
    m_document->setDot(saved ? HeaderField::Dot::filled : HeaderField::Dot::ring);
    m_document->setText(tr("document"), RichText::plain(state));
    m_document->setToolTip(m_session.filePath());
    layOut();
}

void HeaderBar::layOut()
{
    m_menu->setGeometry(12, 8, 30, 28);
    const QSize report(std::max(88, m_report->sizeHint().width()), 30);
    m_report->setGeometry(width() - 16 - report.width(), 7, report.width(), report.height());
    const int documentLeft = width() - m_ledgerWidth + 16;
    m_document->setGeometry(documentLeft, 0, std::max(40, m_report->x() - documentLeft - 8), height - 1);

    // What is left is shared out as gaps; where it is too little, the gas and then the title give way.
    const int room = documentLeft - 24 - firstLeft;
    QMap<HeaderPart, int> widths;
    int wanted = 0;
    for (const HeaderPart part : parts) wanted += widths[part] = m_fields.value(part)->naturalWidth();
    constexpr int count = static_cast<int>(std::size(parts));
    constexpr int leastGap = 14;
    int excess = wanted + leastGap * (count - 1) - room;
    for (const auto &[part, least] : {std::pair(HeaderPart::gas, 90), std::pair(HeaderPart::title, 120),
                                      std::pair(HeaderPart::units, 60), std::pair(HeaderPart::sign, 80)}) {
        const int taken = std::clamp(excess, 0, std::max(0, widths[part] - least));
        widths[part] -= taken;
        excess -= taken;
        wanted -= taken;
    }
    const int gap = std::clamp((room - wanted) / (count - 1), leastGap, 64);
    int x = firstLeft;
    for (const HeaderPart part : parts) {
        m_fields.value(part)->setGeometry(x, 0, widths[part], height - 1);
        x += widths[part] + gap;
    }
}

void HeaderBar::click(HeaderPart part, bool onCaption)
{
    if (part == HeaderPart::sign)
        m_session.apply(signTurned(m_session.base()), tr("Turn the sign of work and heat"));
    else if (part == HeaderPart::title && !onCaption)
        editTitle();
    else
        emit partRequested(part);
}

void HeaderBar::editTitle()
{
    const HeaderField *field = m_fields.value(HeaderPart::title);
    m_title->show(typedAt(m_session.now().design.json, "/title"));
    m_title->setGeometry(field->x() - 8, 17, std::max(field->width() + 40, 240), 26);
    m_title->QWidget::show();
    m_title->raise();
    m_title->setFocus(Qt::OtherFocusReason);
    m_title->selectAll();
}

void HeaderBar::resizeEvent(QResizeEvent *event)
{
    QWidget::resizeEvent(event);
    layOut();
}

void HeaderBar::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.fillRect(rect(), m_look.panel);
    painter.fillRect(QRect(0, height - 1, width(), 1), m_look.rule());
}

} // namespace quasistat::ui
