// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <algorithm>
#include <ostream>
#include <string>
#include <string_view>
#include <vector>

#include <gtest/gtest.h>

#include "rotcore/reading/text_input.h"

namespace rotcore {

/// Readings in failure messages.
// NOLINTNEXTLINE(readability-identifier-naming): GoogleTest looks for this name
inline void PrintTo(const SentNumbers& sent, std::ostream* out)
{
    *out << wordsOf(sent.reading) << " [";
    for (const double value : sent.values)
        *out << ' ' << value;
    *out << " ]";
}

}  // namespace rotcore

namespace text_input_test {

using namespace rotcore;

/// The input of a text that must be readable; an empty one after a failure.
inline TextInput read(std::string_view text, const StatedReading& stated = {},
                      UnitGuess guess = UnitGuess::fromValues)
{
    auto input = readText(text, stated, guess);
    if (input) return input.value();
    ADD_FAILURE() << text << "\nrefused: " << input.error().message;
    return {};
}

/// The fault of a text that must be refused.
inline Fault refused(std::string_view text, const StatedReading& stated = {})
{
    auto input = readText(text, stated, UnitGuess::fromValues);
    if (!input) return input.error();
    ADD_FAILURE() << text << "\nwas read as " << testing::PrintToString(input->numbers);
    return {};
}

/// Whether a warning has these words in it.
inline bool says(const TextInput& input, std::string_view words)
{
    return std::any_of(input.warnings.begin(), input.warnings.end(),
                       [&](const std::string& w) { return w.find(words) != std::string::npos; });
}

/// The warnings as one text, for failure messages.
inline std::string warningsOf(const TextInput& input)
{
    std::string all;
    for (const std::string& warning : input.warnings)
        all += warning + "\n";
    return all;
}

/// The other reading with these words, or an empty one.
inline SentNumbers other(const TextInput& input, std::string_view words)
{
    for (const OtherReading& candidate : input.others)
        if (candidate.words.find(words) != std::string::npos) return candidate.numbers;
    return {};
}

inline SentNumbers angles(Order order, About about, AngleUnit unit, std::vector<double> values)
{
    return {{.kind = Kind::euler, .order = order, .about = about, .unit = unit}, std::move(values)};
}
inline SentNumbers degreesZyx(std::vector<double> values)
{
    return angles(Order::zyx, About::body, AngleUnit::degrees, std::move(values));
}
inline SentNumbers radiansZyx(std::vector<double> values)
{
    return angles(Order::zyx, About::body, AngleUnit::radians, std::move(values));
}
inline SentNumbers wxyz(std::vector<double> values)
{
    return {{.kind = Kind::quaternion, .scalar = ScalarPlace::first}, std::move(values)};
}
inline SentNumbers xyzw(std::vector<double> values)
{
    return {{.kind = Kind::quaternion, .scalar = ScalarPlace::last}, std::move(values)};
}
inline SentNumbers rows(std::vector<double> values)
{
    return {{.kind = Kind::matrix, .storage = Storage::rows}, std::move(values)};
}
inline SentNumbers columns(std::vector<double> values)
{
    return {{.kind = Kind::matrix, .storage = Storage::columns}, std::move(values)};
}
inline SentNumbers vector(AngleUnit unit, std::vector<double> values)
{
    return {{.kind = Kind::rotationVector, .unit = unit}, std::move(values)};
}
inline SentNumbers axisAngle(AngleUnit unit, std::vector<double> values)
{
    return {{.kind = Kind::axisAngle, .unit = unit}, std::move(values)};
}

constexpr auto kDegrees = AngleUnit::degrees;
constexpr auto kRadians = AngleUnit::radians;

}  // namespace text_input_test
