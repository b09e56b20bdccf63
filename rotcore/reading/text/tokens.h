// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>
#include <string_view>
#include <vector>

#include "rotcore/reading/text/number_literal.h"

namespace rotcore {

/// The smallest piece of a pasted text. Blanks and newlines are not tokens; what they say is kept
/// with the token that follows them.
struct Token {
    enum class Kind {
        number,   ///< an unsigned decimal literal
        word,     ///< an identifier with its qualifiers (`np.pi`, `Eigen::Quaterniond`), or a unit
                  ///< sign
        symbol,   ///< one other character
        clock,    ///< a time of day or a date, never part of an orientation
        garbled,  ///< starts like a number and is none: `0x1F`, `1_000`, `1.2.3`, `000123.png`
    };
    Kind kind = Kind::symbol;
    char symbol = '\0';        ///< of a symbol; full-width forms as their plain ones
    bool blankBefore = false;  ///< at the start of the text too
    bool lineStart = false;
    std::size_t begin = 0;   ///< bytes [begin, end) of the text
    std::size_t end = 0;     ///< without a C suffix such as the f of 0.1f
    double number = 0.0;     ///< infinite if too large for a double, zero if too small
    double halfDigit = 0.0;  ///< half a unit of the last digit; zero if printed without a fraction
    int significant = 0;     ///< significant digits, as printed
};

/// Cuts a text of any bytes into tokens; work and memory grow linearly with its length.
std::vector<Token> tokensOf(std::string_view text, DecimalMark mark);

/// Whether commas may be decimal marks: a comma stands between two digits, no point does, no
/// stretch of digits has two commas, and something else separates the numbers.
bool mayHaveDecimalCommas(std::string_view text);

}  // namespace rotcore
