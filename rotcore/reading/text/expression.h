// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <optional>
#include <string_view>
#include <vector>

#include "rotcore/reading/text/tokens.h"
#include "rotcore/rotation/angle.h"

namespace rotcore {

/// One number of a text, after the arithmetic.
struct Value {
    double number = 0.0;
    std::size_t begin = 0;          ///< byte where it starts, sign included
    std::optional<AngleUnit> unit;  ///< written at it (`30deg`), or implied by a factor pi
    double halfDigit = 0.0;  ///< half a unit of the last digit; zero for expressions and integers
    int significant = 0;     ///< significant digits; zero for expressions
    char imaginary = '\0';   ///< 'i', 'j' or 'k' if that letter follows

    /// A zero that stands for a number left out here.
    Value zeroHere() const
    {
        Value zero;
        zero.begin = begin;
        return zero;
    }
};

/// A text after the arithmetic: numbers, words and what stands between them.
struct Item {
    enum class Kind { value, word, symbol, clock, garbled } kind = Kind::symbol;
    char symbol = '\0';
    bool blankBefore = false;
    bool lineStart = false;
    std::size_t begin = 0;
    std::size_t end = 0;
    std::size_t value = 0;  ///< of a value: its place in `Items::values`
};
struct Items {
    std::vector<Item> items;
    std::vector<Value> values;
};

/// Does the arithmetic of a text: signs, + - * / ** and parentheses, pi and its relatives (pi,
/// M_PI, Math.PI, np.pi, tau, M_PI_2, DEG2RAD, ...), sqrt, sin, cos, radians(), degrees().
/// `*`, `/` and `**` always join two numbers. `+` and `-` join them inside parentheses, and
/// elsewhere only if one side has one of the other operators, a constant or a function; a sign with
/// a blank before it and none after starts a new number. So `1 -2 3` and `1 - 2 3` are three
/// numbers, `pi/2 - 0.1` is one. Nothing is joined across the start of a line. A `-` alone before
/// the only number of a line is a bullet.
Items itemsOf(std::string_view text, const std::vector<Token>& tokens);

/// Degrees or radians, if the word is a unit of angle ("deg", "rad", the degree sign, ...).
std::optional<AngleUnit> unitOfWord(std::string_view word);

/// Whether `word` is `plain` (lower case) in any case of letters.
bool isSameWord(std::string_view word, std::string_view plain);

/// What follows the last qualifier: `pi` of `std::numbers::pi`.
std::string_view lastName(std::string_view word);

}  // namespace rotcore
