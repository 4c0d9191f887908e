#pragma once
// What a user can cause by typing or dragging is an ordinary result: a value, or a Failure that says why not.

#include "core/outcome/message.h"

#include <cassert>
#include <string>
#include <utility>
#include <variant>

namespace quasistat
{

/// Why something could not be done. Closed: whoever reacts to a reason can name them all.
enum class Reason {
    syntax,        ///< the text is not JSON, not a quantity, not a number
    wrongType,     ///< a value of another kind was expected at this place
    missing,       ///< a required key is absent
    unknownName,   ///< a kind, model, component or quantity that does not exist
    contradiction, ///< keys that exclude or do not fix each other
    outOfRange,    ///< a number outside what has a meaning here
    notComputed,   ///< part of the format, but not computed by this version
    unreachable,   ///< the end cannot be reached on this segment
    ambiguous,     ///< more than one answer; the user must choose
    undetermined,  ///< the end does not depend on where the segment stops
    outsideModel,  ///< beyond the hard limits of the gas model
    condenses,     ///< the gas would be in two phases, which its model does not compute
    notConverged,  ///< a numerical method gave up; never expected, always reported
    notReached,    ///< an earlier segment failed, so this one has no start
    unreadable,    ///< a file cannot be read
    unwritable,    ///< a file cannot be written
};

struct Failure {
    Reason reason = Reason::syntax;
    std::string pointer; ///< JSON Pointer of the value at fault; relative while it travels outwards
    Message message;
};

/// A value of type T or the Failure that took its place.
template <class T>
class [[nodiscard]] Outcome
{
public:
    Outcome(T value) : m_content(std::move(value)) {} // NOLINT(google-explicit-constructor): reads as a return
    Outcome(Failure failure) : m_content(std::move(failure)) {} // NOLINT(google-explicit-constructor)

    [[nodiscard]] bool ok() const { return m_content.index() == 0; }
    explicit operator bool() const { return ok(); }

    /// Precondition: ok().
    [[nodiscard]] const T &value() const &
    {
        assert(ok());
        return std::get<0>(m_content);
    }
    [[nodiscard]] T &value() &
    {
        assert(ok());
        return std::get<0>(m_content);
    }
    [[nodiscard]] T &&value() &&
    {
        assert(ok());
        return std::get<0>(std::move(m_content));
    }
    const T &operator*() const & { return value(); }
    T &operator*() & { return value(); }
    const T *operator->() const { return &value(); }
    T *operator->() { return &value(); }

    /// Precondition: !ok().
    [[nodiscard]] const Failure &failure() const
    {
        assert(!ok());
        return std::get<1>(m_content);
    }

private:
    std::variant<T, Failure> m_content;
};

/// The same failure, at `prefix` + its own pointer: for passing a failure outwards to whoever knows the place.
[[nodiscard]] inline Failure at(std::string prefix, Failure failure)
{
    failure.pointer = std::move(prefix) + failure.pointer;
    return failure;
}

} // namespace quasistat
