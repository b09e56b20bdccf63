// SPDX-License-Identifier: GPL-3.0-or-later
// Any bytes, as pasted: readText must give numbers that interpret can use, or a fault with its
// place.
#include <cmath>
#include <cstddef>
#include <cstdint>
#include <cstdlib>
#include <string_view>

#include "rotcore/reading/text/general_text.h"
#include "rotcore/reading/text_input.h"

namespace {

using namespace rotcore;

void require(bool holds)
{
    if (!holds) std::abort();
}

void checkNumbers(const SentNumbers& numbers)
{
    require(numbers.values.size() == countOf(numbers.reading.kind));
    for (const double value : numbers.values)
        require(std::isfinite(value));
    const auto meaning = interpret(numbers);
    if (meaning) require(meaning->q_WB.coeffs().allFinite());
}

void checkPlace(std::string_view text, const TextPlace& place)
{
    require(place.line >= 1 && place.column >= 1);
    std::size_t lineStart = 0;
    for (std::size_t line = 1; line < place.line; ++line) {
        const auto end = text.find('\n', lineStart);
        require(end != std::string_view::npos);
        lineStart = end + 1;
    }
    require(lineStart + place.column <= text.size() + 1);
}

void checkResult(std::string_view text, const Result<TextInput>& result)
{
    if (!result) {
        require(!result.error().message.empty());
        require(result.error().place.has_value());
        checkPlace(text, *result.error().place);
        return;
    }
    checkNumbers(result->numbers);
    for (const OtherReading& other : result->others) {
        checkNumbers(other.numbers);
        require(!other.words.empty());
    }
    for (const std::string& warning : result->warnings)
        require(!warning.empty());
    if (result->resolution)
        require(std::isfinite(*result->resolution) && *result->resolution > 0.0);
}

/// What is stated depends on the length of the text, so that a seed file is plain text.
StatedReading statedFor(std::size_t choice)
{
    StatedReading stated;
    constexpr std::size_t kKinds = 5;
    if (choice % 8 < kKinds) stated.kind = static_cast<Kind>(choice % 8);
    if (choice % 3 == 0) stated.unit = AngleUnit::radians;
    if (choice % 7 == 0) stated.scalar = ScalarPlace::last;
    if (choice % 11 == 0) stated.order = Order::zxz;
    if (choice % 13 == 0) stated.storage = Storage::columns;
    return stated;
}

}  // namespace

// NOLINTNEXTLINE(readability-identifier-naming): libFuzzer looks for this name
extern "C" int LLVMFuzzerTestOneInput(const std::uint8_t* data, std::size_t size)
{
    const std::string_view text(reinterpret_cast<const char*>(data), size);
    const auto plain = readText(text, {}, UnitGuess::fromValues);
    checkResult(text, plain);
    const auto general = readGeneralText(text, {}, UnitGuess::fromValues);
    require(plain.has_value() == general.has_value());
    if (plain) require(plain->numbers == general->numbers && plain->warnings == general->warnings);
    checkResult(text, readText(text, statedFor(size), UnitGuess::never));
    return 0;
}
