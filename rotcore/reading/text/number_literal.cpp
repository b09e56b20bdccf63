// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/number_literal.h"

#include <algorithm>
#include <array>
#include <charconv>
#include <cmath>
#include <cstdint>
#include <limits>
#include <string>
#include <system_error>

namespace rotcore {
namespace {

bool isDigit(char c)
{
    return c >= '0' && c <= '9';
}

char lowered(char c)
{
    return c >= 'A' && c <= 'Z' ? static_cast<char>(c + 32) : c;
}

// Ten to these powers is a double without rounding.
constexpr std::array<double, 23> kExactPowers{1e0,  1e1,  1e2,  1e3,  1e4,  1e5,  1e6,  1e7,
                                              1e8,  1e9,  1e10, 1e11, 1e12, 1e13, 1e14, 1e15,
                                              1e16, 1e17, 1e18, 1e19, 1e20, 1e21, 1e22};

bool isExactPower(int exponent)
{
    return exponent > -static_cast<int>(kExactPowers.size()) &&
           exponent < static_cast<int>(kExactPowers.size());
}

/// `number` times ten to a power: correctly rounded if both are exact, for there is one operation
/// only.
double scaledByTen(double number, int exponent)
{
    const auto power = kExactPowers[static_cast<std::size_t>(exponent < 0 ? -exponent : exponent)];
    return exponent < 0 ? number / power : number * power;
}

/// Ten to a power, for the size of a digit only; values never pass through it.
double powerOfTen(int exponent)
{
    return isExactPower(exponent) ? scaledByTen(1.0, exponent) : std::pow(10.0, exponent);
}

/// The parts of a decimal literal, found before its value is.
struct LiteralShape {
    std::size_t mantissaEnd = 0;
    std::size_t end = 0;
    int wholeDigits = 0;  ///< from the first digit that is not zero
    int fractionDigits = 0;
    int leadingZeros = 0;  ///< of the fraction, if the whole part is zero
    int significant = 0;
    int exponent = 0;
    std::uint64_t digits = 0;  ///< all of them as a whole number, if `significant` is 18 or less
    bool hasMark = false;
    bool fortran = false;  ///< exponent written with d
};

void scanExponent(std::string_view text, LiteralShape& shape)
{
    std::size_t at = shape.mantissaEnd;
    if (at >= text.size()) return;
    const char letter = lowered(text[at]);
    if (letter != 'e' && !(letter == 'd' && shape.hasMark)) return;
    ++at;
    const bool negative = at < text.size() && text[at] == '-';
    if (at < text.size() && (text[at] == '-' || text[at] == '+')) ++at;
    if (at >= text.size() || !isDigit(text[at])) return;
    int exponent = 0;
    for (; at < text.size() && isDigit(text[at]); ++at)
        exponent = std::min(exponent * 10 + (text[at] - '0'), 100000);
    shape.exponent = negative ? -exponent : exponent;
    shape.fortran = letter == 'd';
    shape.end = at;
}

LiteralShape shapeOf(std::string_view text, DecimalMark mark)
{
    constexpr int kMostDigits = 1'000'000;
    const char point = mark == DecimalMark::comma ? ',' : '.';
    LiteralShape shape;
    std::size_t at = 0;
    bool digits = false;
    for (; at < text.size(); ++at) {
        if (text[at] == point && !shape.hasMark) {
            // a decimal comma needs digits on both sides; a point may end or begin a number
            const bool digitAfter = at + 1 < text.size() && isDigit(text[at + 1]);
            if (!digitAfter && (mark == DecimalMark::comma || !digits)) break;
            shape.hasMark = true;
            continue;
        }
        if (!isDigit(text[at])) break;
        digits = true;
        const bool counts = text[at] != '0' || shape.significant > 0;
        if (shape.significant < kMostDigits && counts) ++shape.significant;
        if (shape.significant <= 18)
            shape.digits = 10 * shape.digits + static_cast<unsigned>(text[at] - '0');
        if (shape.hasMark && shape.fractionDigits < kMostDigits) ++shape.fractionDigits;
        if (shape.hasMark && !counts) ++shape.leadingZeros;
        if (!shape.hasMark && counts && shape.wholeDigits < kMostDigits) ++shape.wholeDigits;
    }
    if (!digits) return {};
    shape.mantissaEnd = at;
    shape.end = at;
    scanExponent(text, shape);
    return shape;
}

/// from_chars tells neither overflow from underflow nor what to put instead.
double outOfRange(const LiteralShape& shape)
{
    const int magnitude =
        shape.exponent + (shape.wholeDigits > 0 ? shape.wholeDigits : -shape.leadingZeros);
    return magnitude > 0 ? std::numeric_limits<double>::infinity() : 0.0;
}

double valueOf(std::string_view literal, const LiteralShape& shape, DecimalMark mark)
{
    constexpr std::uint64_t kExactIntegers = std::uint64_t{1} << 53U;
    const int power = shape.exponent - shape.fractionDigits;
    if (shape.significant <= 18 && shape.digits <= kExactIntegers && isExactPower(power))
        return scaledByTen(static_cast<double>(shape.digits), power);
    std::string copy;
    if (shape.fortran || (mark == DecimalMark::comma && shape.hasMark)) {
        copy = literal;
        std::replace(copy.begin(), copy.end(), ',', '.');
        if (shape.fortran) copy[shape.mantissaEnd] = 'e';
        literal = copy;
    }
    double value = 0.0;
    const auto read = std::from_chars(literal.data(), literal.data() + literal.size(), value);
    return read.ec == std::errc::result_out_of_range ? outOfRange(shape) : value;
}

}  // namespace

NumberLiteral numberAt(std::string_view text, DecimalMark mark)
{
    const LiteralShape shape = shapeOf(text, mark);
    if (shape.end == 0) return {};
    NumberLiteral literal;
    literal.length = shape.end;
    literal.number = valueOf(text.substr(0, shape.end), shape, mark);
    literal.significant = shape.significant;
    // a point without digits after it ("0.") is how arrays are printed, and says nothing of
    // precision
    if (shape.fractionDigits > 0)
        literal.halfDigit = 0.5 * powerOfTen(shape.exponent - shape.fractionDigits);
    return literal;
}

}  // namespace rotcore
