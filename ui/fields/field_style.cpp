#include "ui/fields/field_style.h"

namespace quasistat::ui
{

namespace
{

/// The style sheet; @name stands for a colour.
constexpr const char *sheet = R"(
QLineEdit, QComboBox { background: @field; color: @ink; border: 1px solid @edge; border-radius: 4px; padding: 0 7px;
    selection-background-color: @accent; selection-color: @onAccent; }
QLineEdit:hover, QComboBox:hover { border-color: @edgeHover; }
QLineEdit:focus, QComboBox:focus { border: 2px solid @accent; padding: 0 6px; }
QComboBox::drop-down { border: none; width: 18px; subcontrol-position: center right; }
QComboBox::down-arrow { image: none; width: 0; height: 0; }
QComboBox QAbstractItemView { background: @ground; color: @ink; border: 1px solid @edge; outline: none;
    selection-background-color: @tint; selection-color: @ink; }
QLabel { color: @ink; background: transparent; }
QLabel[role="secondary"] { color: @secondary; }
QLabel[role="error"] { color: @error; }
QLabel[role="warning"] { color: @warning; }
QPushButton { background: transparent; color: @ink; border: 1px solid @edge; border-radius: 6px; padding: 4px 12px; min-height: 18px; }
QPushButton:hover { border-color: @edgeHover; }
QPushButton:focus { border: 2px solid @accent; padding: 3px 11px; }
QPushButton:disabled { color: @secondary; }
QPushButton[role="primary"] { background: @accent; color: @onAccent; border: none; padding: 5px 13px; font-weight: 600; }
QPushButton[role="primary"]:focus { border: 2px solid @ink; padding: 3px 11px; }
QPushButton[role="quiet"] { border: none; color: @accent; padding: 2px 4px; text-align: left; }
QPushButton[role="quiet"]:focus { border: 1px solid @accent; padding: 1px 3px; }
QScrollArea, QScrollArea > QWidget > QWidget { background: transparent; }
QPushButton[role="sample"] { border: none; min-height: 88px; padding: 0; }
QMenu { background: @ground; color: @ink; border: 1px solid @edge; padding: 4px 0; }
QMenu::item { padding: 5px 28px 5px 24px; }
QMenu::item:selected { background: @tint; }
QMenu::item:disabled { color: @secondary; }
QMenu::separator { height: 1px; background: @rule; margin: 4px 0; }
QScrollBar:vertical { background: transparent; width: 8px; margin: 0; }
QScrollBar:horizontal { background: transparent; height: 6px; margin: 0; }
QScrollBar::handle { background: @scroll; border-radius: 3px; min-width: 24px; min-height: 24px; }
QScrollBar::add-line, QScrollBar::sub-line { width: 0; height: 0; }
QScrollBar::add-page, QScrollBar::sub-page { background: transparent; }
QToolTip { background: @ground; color: @ink; border: 1px solid @edge; padding: 3px; }
)";

QString css(const QColor &colour)
{
    return QStringLiteral("rgba(%1,%2,%3,%4)")
        .arg(colour.red())
        .arg(colour.green())
        .arg(colour.blue())
        .arg(colour.alpha());
}

} // namespace

QString fieldStyle(const Palette &look)
{
    // Longer names first: "@edge" is the beginning of "@edgeHover".
    const std::pair<const char *, QColor> colours[] = {
        {"@edgeHover", faded(look.ink, 0.45)},
        {"@edge", faded(look.ink, 0.22)},
        {"@onAccent", look.onAccent},
        {"@accent", look.accent},
        {"@field", look.field},
        {"@ground", look.ground},
        {"@ink", look.ink},
        {"@secondary", look.secondary()},
        {"@error", look.error},
        {"@warning", look.warning},
        {"@tint", faded(look.accent, 0.14)},
        {"@rule", look.rule()},
        {"@scroll", faded(look.ink, 0.22)},
    };
    QString result = QString::fromLatin1(sheet);
    for (const auto &[name, colour] : colours) result.replace(QLatin1String(name), css(colour));
    return result;
}

} // namespace quasistat::ui
