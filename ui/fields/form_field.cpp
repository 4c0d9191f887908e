#include "ui/fields/form_field.h"

#include "core/units/display.h"
#include "core/units/measure.h"

#include <QCoreApplication>
#include <QRegularExpression>

namespace quasistat::ui
{

namespace
{

QString sentenceOf(const Failure &failure)
{
    return QString::fromStdString(units::sentence(failure.message, units::DisplayUnits{}));
}

bool isReference(const QString &text)
{
    static const QRegularExpression reference(QStringLiteral("^@[1-9][0-9]*$"));
    return reference.match(text).hasMatch();
}

} // namespace

QString complaintOf(const FormField &field, const QString &text)
{
    const QString trimmed = text.trimmed();
    if (field.optional && trimmed.isEmpty()) return {};
    switch (field.content) {
    case FieldContent::none:
    case FieldContent::text: return {};
    case FieldContent::quantityOrAt:
        if (isReference(trimmed)) return {};
        [[fallthrough]];
    case FieldContent::quantity: {
        const auto measure = units::measured(trimmed.toStdString(), field.quantity);
        return measure ? QString() : sentenceOf(measure.failure());
    }
    case FieldContent::number: {
        const auto number = units::plainNumber(trimmed.toStdString());
        return number ? QString() : sentenceOf(number.failure());
    }
    case FieldContent::count: {
        bool whole = false;
        const int count = trimmed.toInt(&whole);
        if (whole && count >= 1) return {};
        return QCoreApplication::translate("FormField", "A whole number from 1 is expected, such as 5.");
    }
    }
    return {};
}

QString asPrinted(const QString &text)
{
    static const QRegularExpression gap(QStringLiteral("(?<=[0-9.])\\s+(?=[^0-9\\s±+(])"));
    QString result = text.trimmed();
    result.replace(gap, QString(QChar(0x202F)));
    if (result.startsWith(QLatin1Char('-'))) result[0] = QChar(0x2212);
    return result;
}

} // namespace quasistat::ui
