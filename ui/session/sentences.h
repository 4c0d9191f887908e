#pragma once
// Figures and sentences of the core in Qt's strings and the units of the display.

#include "core/analysis/envelope.h"
#include "core/gas/state.h"
#include "core/outcome/outcome.h"
#include "core/units/display.h"

#include <QString>

namespace quasistat::ui
{

[[nodiscard]] QString sentenceOf(const Failure &failure, const units::DisplayUnits &units);
[[nodiscard]] QString sentenceOf(const Message &message, const units::DisplayUnits &units);

/// +1: work and heat are shown positive into the gas, −1: by the gas.
[[nodiscard]] double shownSign(const units::DisplayUnits &units);

/// Entropy of `to` less that of `from` [J/K]; 0 where nothing is left but the rounding of both.
[[nodiscard]] double entropyChange(const gas::State &from, const gas::State &to);

/// The digits of `value` [SI] at the scale's decimals.
[[nodiscard]] QString figure(double value, const units::Scale &scale);
/// With a narrow space and the unit.
[[nodiscard]] QString figureWithUnit(double value, const units::Scale &scale);
/// `value` [SI] in a scale of its own; `significant` > 0 rounds the digits to so many.
[[nodiscard]] QString shownFigure(double value, units::Quantity quantity, const units::DisplayUnits &units,
                                  int significant = 0);

/// What a limit is called: its label, else its quantity.
[[nodiscard]] QString limitName(const analysis::Limit &limit);
/// "temperature", "pressure ratio", …
[[nodiscard]] QString limitQuantityWords(analysis::LimitQuantity quantity);
/// The quantity a limit's values are measured in.
[[nodiscard]] units::Quantity limitUnitQuantity(analysis::LimitQuantity quantity);
/// Symbol with its markup: "<i>T</i>".
[[nodiscard]] QString limitSymbol(analysis::LimitQuantity quantity);

} // namespace quasistat::ui
