// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text_input.h"

#include "rotcore/reading/text/fields.h"
#include "rotcore/reading/text/general_text.h"
#include "rotcore/reading/text/settle.h"

namespace rotcore {
namespace {

constexpr std::size_t kMostPlainNumbers = 16;

bool isDigit(char c)
{
    return c >= '0' && c <= '9';
}
bool isBlank(char c)
{
    return c == ' ' || c == '\t' || c == '\r';
}

/// One line of nothing but plain numbers with blanks, commas or semicolons between them, as files
/// have them by the million. False if there is anything else in it, and when in doubt.
bool plainNumbers(std::string_view text, std::vector<Value>& values)
{
    while (!text.empty() && (isBlank(text.back()) || text.back() == '\n'))
        text.remove_suffix(1);
    bool hasPoint = false;
    bool hasTightComma = false;  // perhaps a decimal comma, if something else separates the numbers
    bool hasOtherSeparator = false;
    std::size_t at = 0;
    for (;;) {
        while (at < text.size() && isBlank(text[at]))
            ++at;
        if (at >= text.size()) break;
        Value value;
        value.begin = at;
        const bool negative = text[at] == '-';
        if (negative || text[at] == '+') ++at;
        if (at >= text.size() || !(isDigit(text[at]) || text[at] == '.')) return false;
        const NumberLiteral literal = numberAt(text.substr(at), DecimalMark::point);
        at += literal.length;
        if (literal.length == 0 || values.size() == kMostPlainNumbers) return false;
        value.number = negative ? -literal.number : literal.number;
        value.halfDigit = literal.halfDigit;
        value.significant = literal.significant;
        values.push_back(value);
        hasPoint = hasPoint || literal.halfDigit != 0.0;
        const std::size_t end = at;
        while (at < text.size() && isBlank(text[at]))
            ++at;
        if (at >= text.size()) break;
        const bool blank = at > end;
        const bool mark = text[at] == ',' || text[at] == ';';
        if (!blank && !mark) return false;
        const bool tight =
            !blank && text[at] == ',' && at + 1 < text.size() && !isBlank(text[at + 1]);
        (tight ? hasTightComma : hasOtherSeparator) = true;
        if (mark) ++at;
    }
    return !values.empty() && (hasPoint || !hasTightComma || !hasOtherSeparator);
}

}  // namespace

Result<TextInput> readText(std::string_view text, const StatedReading& stated, UnitGuess unitGuess)
{
    Field field;
    field.values.reserve(9);
    if (!plainNumbers(text, field.values)) return readGeneralText(text, stated, unitGuess);
    return settled(text, field, stated, unitGuess);
}

}  // namespace rotcore
