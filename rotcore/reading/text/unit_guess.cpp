// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/unit_guess.h"

#include <algorithm>
#include <cmath>

#include "rotcore/number_text.h"

namespace rotcore {
namespace {

constexpr double kFullTurn = 2.0 * kPi + 0.005;  // 6.28 printed as 6.29 is still one

/// The units written at the numbers: one of them, or both at once.
struct Written {
    bool degrees = false;
    bool radians = false;
    bool missing = false;  ///< some number other than zero has none
};

Written writtenUnits(std::span<const Value> values)
{
    Written units;
    for (const Value& value : values) {
        units.degrees = units.degrees || value.unit == AngleUnit::degrees;
        units.radians = units.radians || value.unit == AngleUnit::radians;
        units.missing = units.missing || (!value.unit && value.number != 0.0);
    }
    return units;
}

UnitDecision statedUnit(AngleUnit stated, const Written& written)
{
    if (stated == AngleUnit::degrees && written.radians)
        return {stated, false, "the text has radians, but degrees were stated and are used"};
    if (stated == AngleUnit::radians && written.degrees)
        return {stated, false, "the text has degrees, but radians were stated and are used"};
    return {stated, false, {}};
}

UnitDecision writtenUnit(std::span<Value> angles, std::optional<AngleUnit> said,
                         const Written& written)
{
    const bool both = written.degrees && written.radians;
    const AngleUnit first = written.degrees ? AngleUnit::degrees : AngleUnit::radians;
    const AngleUnit missing = said.value_or(both ? AngleUnit::radians : first);
    if (!both && !(written.missing && missing != first)) return {first, false, {}};
    for (Value& angle : angles)
        if (angle.unit.value_or(missing) == AngleUnit::degrees) {
            angle.number = fromDegrees(angle.number);
            angle.halfDigit = fromDegrees(angle.halfDigit);
        }
    return {AngleUnit::radians, false,
            "degrees and radians are mixed; all were brought to radians"};
}

/// Radians, unless the vector is longer than a turn.
UnitDecision vectorUnit(std::span<const Value> angles, UnitGuess guess)
{
    double squares = 0.0;
    for (const Value& angle : angles)
        squares += angle.number * angle.number;
    if (std::sqrt(squares) <= kFullTurn) return {AngleUnit::radians, true, "assumed: radians"};
    if (guess == UnitGuess::fromValues)
        return {AngleUnit::degrees, true, "longer than a full turn in radians: taken in degrees"};
    return {AngleUnit::radians, true,
            "assumed: radians, though longer than a full turn; it looks like degrees"};
}

/// Degrees, unless the angles look like radians.
UnitDecision angleUnit(std::span<const Value> angles, UnitGuess guess)
{
    const Value* sign = looksLikeRadians(angles);
    if (!sign) return {AngleUnit::degrees, true, "assumed: degrees"};
    const std::string multiple =
        roundedText(sign->number, std::min(sign->significant, 17)) + " is a multiple of pi/12";
    if (guess == UnitGuess::fromValues)
        return {AngleUnit::radians, true, "taken in radians: " + multiple};
    return {AngleUnit::degrees, true,
            "assumed: degrees, though it looks like radians: " + multiple};
}

}  // namespace

const Value* looksLikeRadians(std::span<const Value> angles)
{
    constexpr double kStep = kPi / 12.0;
    const Value* found = nullptr;
    for (const Value& angle : angles) {
        if (std::abs(angle.number) > kFullTurn) return nullptr;
        if (found || angle.significant < 3 || angle.halfDigit == 0.0) continue;
        const double steps = std::round(angle.number / kStep);
        // digits cut off instead of rounded leave the number too small by up to two half digits
        const double missing = std::abs(steps * kStep) - std::abs(angle.number);
        const bool multiple = missing >= -angle.halfDigit && missing <= 2.0 * angle.halfDigit;
        if (steps != 0.0 && multiple && 2.0 * angle.halfDigit < 0.05) found = &angle;
    }
    return found;
}

UnitDecision decideUnit(std::span<Value> angles, std::optional<AngleUnit> said,
                        std::optional<AngleUnit> stated, AngleUnit usual, UnitGuess guess)
{
    const Written written = writtenUnits(angles);
    if (stated) return statedUnit(*stated, written);
    if (written.degrees || written.radians) return writtenUnit(angles, said, written);
    if (said) return {*said, false, {}};
    return usual == AngleUnit::radians ? vectorUnit(angles, guess) : angleUnit(angles, guess);
}

double resolutionOf(std::span<const Value> values)
{
    double coarsest = 0.0;
    double finest = 0.0;
    int mostDigits = 0;
    for (const Value& value : values) {
        if (value.halfDigit == 0.0) continue;
        coarsest = std::max(coarsest, value.halfDigit);
        finest = finest == 0.0 ? value.halfDigit : std::min(finest, value.halfDigit);
        mostDigits = std::max(mostDigits, value.significant);
    }
    // units brought together leave rounding behind: equal counts of decimals, within a part in a
    // million
    if (coarsest <= finest * (1.0 + 1e-6) || mostDigits == 0) return coarsest;
    double resolution = finest;
    for (const Value& value : values) {
        if (value.halfDigit == 0.0 || value.number == 0.0) continue;
        const double dropped = std::pow(10.0, value.significant - mostDigits);
        resolution = std::max(resolution, value.halfDigit * dropped);
    }
    return resolution;
}

}  // namespace rotcore
