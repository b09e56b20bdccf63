// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <string_view>

namespace rotcore {

/// What stands between the whole part and the fraction of a decimal number.
enum class DecimalMark { point, comma };

/// A decimal literal at the start of `text`, and where it ends; nothing read if `length` is zero.
/// The value is the double nearest to the decimal, whatever the locale.
struct NumberLiteral {
    std::size_t length = 0;
    double number = 0.0;
    double halfDigit = 0.0;
    int significant = 0;
};
NumberLiteral numberAt(std::string_view text, DecimalMark mark);

}  // namespace rotcore
