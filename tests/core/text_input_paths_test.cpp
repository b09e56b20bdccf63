// SPDX-License-Identifier: GPL-3.0-or-later
// The short way for plain lines gives what the general way gives; no text, however large or odd,
// hurts.
#include <array>
#include <chrono>
#include <cmath>
#include <cstdio>
#include <cstdlib>
#include <cstring>
#include <iomanip>
#include <locale>
#include <random>
#include <sstream>

#include "rotcore/reading/text/general_text.h"
#include "rotcore/reading/text/tokens.h"
#include "tests/core/text_input_support.h"

namespace {

using namespace text_input_test;

void expectSame(const std::string& text, const StatedReading& stated, UnitGuess guess)
{
    const auto plain = readText(text, stated, guess);
    const auto general = readGeneralText(text, stated, guess);
    ASSERT_EQ(plain.has_value(), general.has_value()) << text;
    if (!plain) {
        EXPECT_EQ(plain.error(), general.error()) << text;
        return;
    }
    EXPECT_EQ(plain->numbers, general->numbers) << text;
    EXPECT_EQ(plain->kindGuessed, general->kindGuessed) << text;
    EXPECT_EQ(plain->warnings, general->warnings) << text;
    EXPECT_EQ(plain->resolution, general->resolution) << text;
    ASSERT_EQ(plain->others.size(), general->others.size()) << text;
    for (std::size_t n = 0; n < plain->others.size(); ++n) {
        EXPECT_EQ(plain->others[n].numbers, general->others[n].numbers) << text;
        EXPECT_EQ(plain->others[n].words, general->others[n].words) << text;
    }
}

std::string randomLine(std::mt19937_64& random)
{
    const auto pick = [&](std::size_t below) { return static_cast<std::size_t>(random() % below); };
    constexpr std::array kSeparators{" ", ",", ", ", ";", "\t", "  ", " , ", ",,", "; ", "\n"};
    constexpr std::array<std::size_t, 12> kCounts{1, 2, 3, 3, 3, 4, 4, 4, 7, 8, 9, 16};
    const std::string separator = kSeparators[pick(kSeparators.size())];
    std::uniform_real_distribution<double> size(-1.0, 1.0);
    std::ostringstream line;
    line << (pick(8) == 0 ? " " : "");
    const std::size_t count = kCounts[pick(kCounts.size())];
    for (std::size_t n = 0; n < count; ++n) {
        if (n > 0) line << separator;
        if (pick(20) == 0) line << '+';
        const double value = size(random) * std::pow(10.0, static_cast<double>(pick(4)));
        switch (pick(6)) {
            case 0:
                line << std::lround(value);
                break;
            case 1:
                line << std::scientific << std::setprecision(3) << value;
                break;
            case 2:
                line << std::defaultfloat << std::setprecision(17) << value;
                break;
            case 3:
                line << std::lround(value) << '.';
                break;
            default:
                line << std::fixed << std::setprecision(static_cast<int>(pick(7))) << value;
        }
    }
    line << (pick(8) == 0 ? "\r\n" : "");
    return line.str();
}

TEST(TextInputPaths, BothWaysGiveTheSame)
{
    std::mt19937_64 random(20240105);
    for (int n = 0; n < 20000 && !testing::Test::HasFailure(); ++n) {
        const std::string line = randomLine(random);
        StatedReading stated;
        if (n % 3 == 1) stated.kind = static_cast<Kind>(random() % 5);
        if (n % 5 == 1) stated.unit = kRadians;
        expectSame(line, stated, n % 2 == 0 ? UnitGuess::fromValues : UnitGuess::never);
    }
}

TEST(TextInputPaths, BothWaysAgreeOnOddLines)
{
    for (const char* text : {"",
                             " ",
                             "1",
                             "1,2,3,",
                             ",1,2,3",
                             "1,,2,3",
                             "1;2;3;",
                             "0,5;1,5;2,5",
                             "0,5 1,5 2,5",
                             "0,5,10",
                             "1 , 2,3",
                             "1,2 3",
                             "- 1 2 3",
                             "+ 1 2 3",
                             "-1-2-3",
                             "1e5 2E+3 -1e-3",
                             "1.e2 .5 -.5",
                             "1e 2 3",
                             "1.2.3 4 5 6",
                             "1-2 3 4",
                             "1/2 0 0",
                             "1e999 0 0",
                             "nan 0 0",
                             "1d 2 3",
                             "1f 2 3",
                             "0x10 1 2",
                             "12:30:05 1 2 3",
                             "2024-01-05 1 2 3",
                             "1 2 3 4 5 6 7 8 9 10 11 12 13 14 15 16 17",
                             "1\v2\f3",
                             "00012 007 0",
                             "1 2 3\n\n",
                             "-0 -0.0 0",
                             "1. , 2. , 3.",
                             "1.,2.,3.",
                             "1., 2 3,4"})
        for (const UnitGuess guess : {UnitGuess::fromValues, UnitGuess::never})
            expectSame(text, {}, guess);
}

TEST(TextInputPaths, EveryDoubleComesThroughBitForBit)
{
    std::mt19937_64 random(7);
    for (int n = 0; n < 20000; ++n) {
        std::array<double, 3> values{};
        std::string text;
        for (double& value : values) {
            do {
                const std::uint64_t bits = random();
                std::memcpy(&value, &bits, sizeof value);
            } while (!std::isfinite(value));
            std::array<char, 40> digits{};
            const int precision = 1 + static_cast<int>(random() % 17);
            std::snprintf(digits.data(), digits.size(), "%.*e", precision, value);
            value = std::strtod(digits.data(), nullptr);  // the C library as second source
            text += std::string(digits.data()) + " ";
        }
        if (!std::isfinite(values[0] + values[1] + values[2])) continue;
        const auto input = readText(text, {}, UnitGuess::never);
        ASSERT_TRUE(input) << text;
        for (std::size_t m = 0; m < 3; ++m)
            ASSERT_EQ(input->numbers.values[m], values[m]) << text;
    }
}

TEST(TextInputPaths, ShortDecimalsAreRoundedOnce)
{
    std::mt19937_64 random(11);
    for (int n = 0; n < 200000; ++n) {
        const std::string text =
            std::to_string(random() % 100000) + "." + std::to_string(random() % 100000000);
        const NumberLiteral literal = numberAt(text, DecimalMark::point);
        ASSERT_EQ(literal.number, std::strtod(text.c_str(), nullptr)) << text;
        ASSERT_EQ(literal.length, text.size());
    }
}

TEST(TextInputPaths, ALocaleWithDecimalCommasChangesNothing)
{
    struct Comma : std::numpunct<char> {
        char do_decimal_point() const override { return ','; }
    };
    const std::locale before = std::locale::global(std::locale(std::locale(), new Comma));
    const auto input = read("30.5 20.25 10.125");
    std::locale::global(before);
    EXPECT_EQ(input.numbers, degreesZyx({30.5, 20.25, 10.125}));
}

// ---- large and odd texts

/// A text of a megabyte takes no more than the work of its parts, and nothing said of it grows with
/// it.
void expectFast(const std::string& text)
{
    const auto start = std::chrono::steady_clock::now();
    const auto result = readText(text, {}, UnitGuess::fromValues);
    const std::chrono::duration<double> taken = std::chrono::steady_clock::now() - start;
    // measured below 0.5 s, and 2 s with sanitizers; what grows with the square takes minutes
    EXPECT_LT(taken.count(), 10.0) << text.substr(0, 20);
    if (!result) {
        EXPECT_TRUE(result.error().place.has_value());
        EXPECT_LT(result.error().message.size(), 1000U);
    } else {
        for (const std::string& warning : result->warnings)
            EXPECT_LT(warning.size(), 1000U);
    }
}

TEST(TextInputPaths, LargeTextsOfAnythingAreReadOrRefusedInLinearTime)
{
    for (const char* piece : {"[",
                              "(",
                              "((1",
                              "1*(",
                              "-",
                              "1",
                              "1 ",
                              "0.1,",
                              "1,1 ",
                              "x",
                              "x ",
                              "x: 1 ",
                              "q: 1 ",
                              "w 1 x 2 ",
                              "pi*",
                              "1+",
                              "sqrt(",
                              "1e",
                              "\n",
                              "\xC2\xB0",
                              "\xFF",
                              ".",
                              "1.",
                              "R[1]",
                              "deg ",
                              "1deg ",
                              "yaw 1 ",
                              "AngleAxisd(1,",
                              "UnitZ ",
                              "12:30:05 ",
                              "position 1 2 3 ",
                              "1_0 ",
                              "axis 1 2 3 angle 4 ",
                              "quaternion 1 2 3 4 ",
                              "zyx 1 2 3 "}) {
        std::string text;
        while (text.size() < (1U << 20U))
            text += piece;
        expectFast(text);
    }
    expectFast(std::string(1U << 20U, '\0'));
    expectFast(std::string(1U << 20U, '['));
}

TEST(TextInputPaths, ATextThatIsTooLongIsRefused)
{
    const Fault fault = refused(std::string((4U << 20U) + 1, 'a'));
    EXPECT_EQ(fault.kind, Fault::Kind::badText);
    EXPECT_NE(fault.message.find("4 MB"), std::string::npos);
}

TEST(TextInputPaths, AnyBytesAreReadOrRefused)
{
    std::mt19937_64 random(3);
    const std::string_view alphabet =
        "0123456789.,;:=-+*/()[]{}<>'\"eExyzwqpi rad\n\t\xC2\xB0\xE2\x88\x92";
    for (int n = 0; n < 20000; ++n) {
        std::string text;
        const std::size_t length = random() % 40;
        for (std::size_t m = 0; m < length; ++m)
            text += n % 2 == 0 ? alphabet[random() % alphabet.size()]
                               : static_cast<char>(random() % 256);
        const auto input = readText(text, {}, UnitGuess::fromValues);
        if (!input) {
            EXPECT_TRUE(input.error().place.has_value());
            continue;
        }
        ASSERT_EQ(input->numbers.values.size(), countOf(input->numbers.reading.kind));
        for (const double value : input->numbers.values)
            ASSERT_TRUE(std::isfinite(value)) << text;
    }
}

TEST(TextInputPaths, NulBytesPartNumbers)
{
    EXPECT_EQ(read(std::string_view("30\0"
                                    "20\0"
                                    "10\0",
                                    9))
                  .numbers,
              degreesZyx({30, 20, 10}));
}

}  // namespace
