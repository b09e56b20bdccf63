// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cassert>
#include <cstddef>
#include <optional>
#include <string>
#include <utility>
#include <variant>

namespace rotcore {

/// A place in a text, both counted from 1; columns count bytes.
struct TextPlace {
    std::size_t line = 1;
    std::size_t column = 1;
    friend bool operator==(const TextPlace&, const TextPlace&) = default;
};

/// Why there is no value: said for people and, as `kind`, for code.
struct Fault {
    enum class Kind {
        notFinite,       ///< not a number, or infinite
        zeroLength,      ///< an axis or quaternion with no direction
        notOrthonormal,  ///< a matrix that stretches or shears
        leftHanded,      ///< a matrix that mirrors
        singular,        ///< the asked-for numbers do not exist at this pose
        wrongCount,      ///< too few or too many numbers
        badText,         ///< text that cannot be understood
        badField,        ///< a field of a file that is missing, unknown or out of range
    };
    Kind kind = Kind::badText;
    std::string message;  ///< what was given, the measure, the limit, what to do
    std::optional<TextPlace> place = std::nullopt;
    friend bool operator==(const Fault&, const Fault&) = default;
};

/// A value, or why there is none. Members are named as in std::expected, which C++20 does not have.
template <class T>
class [[nodiscard]] Result {
public:
    Result(T value) : m_state(std::in_place_index<0>, std::move(value)) {}
    Result(Fault fault) : m_state(std::in_place_index<1>, std::move(fault)) {}

    bool has_value() const { return m_state.index() == 0; }
    explicit operator bool() const { return has_value(); }

    const T& value() const
    {
        assert(has_value());
        return *std::get_if<0>(&m_state);
    }
    T& value()
    {
        assert(has_value());
        return *std::get_if<0>(&m_state);
    }
    const T& operator*() const { return value(); }
    const T* operator->() const { return &value(); }

    const Fault& error() const
    {
        assert(!has_value());
        return *std::get_if<1>(&m_state);
    }

private:
    std::variant<T, Fault> m_state;
};

}  // namespace rotcore
