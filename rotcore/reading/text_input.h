// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <string_view>
#include <vector>

#include "rotcore/reading/reading.h"

namespace rotcore {

/// The switches of a reading that were said outright and are not to be guessed.
struct StatedReading {
    std::optional<Kind> kind;
    std::optional<Order> order;
    std::optional<About> about;
    std::optional<AngleUnit> unit;
    std::optional<ScalarPlace> scalar;
    std::optional<Algebra> algebra;
    std::optional<Direction> direction;
    std::optional<Storage> storage;
};

/// Whether the size of the numbers may decide their unit. It may in one text that a person pastes;
/// it may not in a file of many lines, which must all be read alike.
enum class UnitGuess { fromValues, never };

/// Another thing that the same text could be.
struct OtherReading {
    SentNumbers numbers;
    std::string words;  ///< for people: "radians instead of degrees"
};

/// Numbers found in a text, and how sure it is what they are.
struct TextInput {
    SentNumbers numbers;
    bool kindGuessed = false;           ///< neither stated nor given by labels or a constructor
    std::vector<std::string> warnings;  ///< what was guessed or left aside, one sentence each
    std::vector<OtherReading> others;   ///< likeliest first
    /// Half a unit of the last digit of the coarsest value printed with a fraction, in the unit of
    /// the values (for axis and angle: of the angle); nothing if there is none. Where the counts of
    /// decimals differ, trailing zeros were dropped, and every value is taken to have as many
    /// significant digits as the one with the most.
    std::optional<double> resolution;
};

/// The orientation in `text`, which may be anything an engineer pastes: bare numbers, code, CSV,
/// JSON, YAML, XML attributes, printouts, over one line or several. What is stated wins over
/// labels, units and constructors in the text; these win over guesses. Numbers with names are put
/// into the stated layout or order.
/// Faults, always with the place in the text: badText, wrongCount, notFinite.
Result<TextInput> readText(std::string_view text, const StatedReading& stated, UnitGuess unitGuess);

}  // namespace rotcore
