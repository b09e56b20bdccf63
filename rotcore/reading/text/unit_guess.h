// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <string>

#include "rotcore/reading/text/expression.h"
#include "rotcore/reading/text_input.h"

namespace rotcore {

/// The number that makes angles look like radians: all are within a full turn, and this one,
/// printed with a fraction and three digits or more, is a multiple of pi/12 to its last digit
/// (rounded or cut off). Null if none does.
const Value* looksLikeRadians(std::span<const Value> angles);

/// The unit of some angles, and what is to be said of it.
struct UnitDecision {
    AngleUnit unit = AngleUnit::degrees;
    bool guessed = false;  ///< neither stated nor said by the text
    std::string warning;   ///< empty if all is clear
};

/// What is stated wins over what stands at the numbers, this over what the text says elsewhere, and
/// this over `usual` and the looks of the numbers. Numbers in both units are brought to radians, in
/// place.
UnitDecision decideUnit(std::span<Value> angles, std::optional<AngleUnit> said,
                        std::optional<AngleUnit> stated, AngleUnit usual, UnitGuess guess);

/// Half a unit of the last digit of the coarsest number printed with a fraction; zero if there is
/// none. Where the counts of decimals differ, trailing zeros were dropped: every number is then
/// taken to have as many significant digits as the one with the most, and zeros say nothing.
double resolutionOf(std::span<const Value> values);

}  // namespace rotcore
