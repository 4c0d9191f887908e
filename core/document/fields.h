#pragma once
// An object of the document with its place: values by key, and a word about keys that are not known.

#include "core/document/design.h"
#include "core/document/format_keys.h"
#include "core/units/measure.h"

#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace quasistat::document
{

/// A value of the document and where it stands.
struct Place {
    const Json *value;
    std::string pointer;
};

class Fields
{
public:
    /// Fails with Reason::wrongType where `place` is no object.
    [[nodiscard]] static Outcome<Fields> of(const Place &place);

    [[nodiscard]] const std::string &pointer() const { return m_pointer; }
    [[nodiscard]] std::string pointerTo(std::string_view key) const;
    [[nodiscard]] bool has(std::string_view key) const;
    [[nodiscard]] std::optional<Place> find(std::string_view key) const;
    /// Fails with Reason::missing at this object.
    [[nodiscard]] Outcome<Place> required(std::string_view key) const;
    /// The text at `key`; none where the key is absent. Fails with Reason::wrongType.
    [[nodiscard]] Outcome<std::optional<std::string>> text(std::string_view key) const;
    /// Warns about every key that is in none of `known`.
    void warnOfUnknown(std::initializer_list<Keys> known, std::vector<Warning> &warnings) const;

private:
    Fields(const Json &object, std::string pointer) : m_object(&object), m_pointer(std::move(pointer)) {}
    const Json *m_object;
    std::string m_pointer;
};

/// "a number", "a text", "a list", "an object", "true or false", "null".
[[nodiscard]] std::string typeWords(const Json &value);

/// A text. Fails with Reason::wrongType.
[[nodiscard]] Outcome<std::string> textAt(const Place &place);

/// A plain number: JSON's own, or a text such as "1.30 ± 0.02". Fails with Reason::wrongType or syntax.
[[nodiscard]] Outcome<double> numberAt(const Place &place);

/// A whole number from `least` to `most`. Fails with Reason::wrongType or outOfRange.
[[nodiscard]] Outcome<int> wholeNumberAt(const Place &place, int least, int most);

/// A quantity [SI]. Fails as units::measured does, or with Reason::wrongType where no text stands.
[[nodiscard]] Outcome<double> quantityAt(const Place &place, units::Quantity quantity,
                                         const units::Conversion &conversion);

/// As quantityAt; a value of zero or below fails with Reason::outOfRange.
[[nodiscard]] Outcome<double> positiveQuantityAt(const Place &place, units::Quantity quantity,
                                                 const units::Conversion &conversion);

} // namespace quasistat::document
