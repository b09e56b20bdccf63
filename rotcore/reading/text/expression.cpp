// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/expression.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <utility>

namespace rotcore {
namespace {

constexpr int kDeepestParentheses = 8;

/// A number on its way through the arithmetic.
struct Operand {
    double number = 0.0;
    int piPower = 0;         ///< how often pi is a factor: radians if positive, degrees if negative
    bool composite = false;  ///< has an operator, a constant or a function
    double halfDigit = 0.0;
    int significant = 0;
};

Operand constant(double number, int piPower = 0)
{
    return {number, piPower, true, 0.0, 0};
}

std::optional<Operand> constantOf(std::string_view word)
{
    constexpr double kInfinity = std::numeric_limits<double>::infinity();
    constexpr double kSqrt2 = std::numbers::sqrt2;
    struct Constant {
        std::string_view name;
        double number;
        int piPower;
    };
    static constexpr std::array kConstants{
        Constant{"pi", kPi, 1},
        Constant{"\u03C0", kPi, 1},
        Constant{"m_pi", kPi, 1},
        Constant{"m_pi_2", kPi / 2.0, 1},
        Constant{"m_pi_4", kPi / 4.0, 1},
        Constant{"half_pi", kPi / 2.0, 1},
        Constant{"two_pi", 2.0 * kPi, 1},
        Constant{"tau", 2.0 * kPi, 1},
        Constant{"m_sqrt2", kSqrt2, 0},
        Constant{"m_sqrt1_2", kSqrt2 / 2.0, 0},
        Constant{"sqrt1_2", kSqrt2 / 2.0, 0},
        Constant{"deg2rad", kRadiansPerDegree, 1},
        Constant{"deg_to_rad", kRadiansPerDegree, 1},
        Constant{"rad2deg", kDegreesPerRadian, -1},
        Constant{"rad_to_deg", kDegreesPerRadian, -1},
        Constant{"nan", std::numeric_limits<double>::quiet_NaN(), 0},
        Constant{"inf", kInfinity, 0},
        Constant{"infinity", kInfinity, 0},
    };
    const std::string_view name = lastName(word);
    for (const Constant& known : kConstants)
        if (isSameWord(name, known.name)) return constant(known.number, known.piPower);
    return std::nullopt;
}

std::optional<Operand> applied(std::string_view function, const Operand& to)
{
    const std::string_view name = lastName(function);
    const auto is = [&](std::string_view plain) { return isSameWord(name, plain); };
    if (is("sqrt")) return constant(std::sqrt(to.number));
    if (is("sin") || is("sinf")) return constant(std::sin(to.number));
    if (is("cos") || is("cosf")) return constant(std::cos(to.number));
    if (is("radians") || is("deg2rad") || is("toradians") || is("degtorad") || is("rad"))
        return constant(fromDegrees(to.number), 1);
    if (is("degrees") || is("rad2deg") || is("todegrees") || is("radtodeg"))
        return constant(toDegrees(to.number), -1);
    return std::nullopt;
}

/// Reads the tokens once from left to right; whatever is no number is passed on as it is.
class Arithmetic {
public:
    Arithmetic(std::string_view text, const std::vector<Token>& tokens)
        : m_text(text), m_tokens(tokens)
    {
    }

    Items run()
    {
        while (m_at < m_tokens.size())
            if (!bullet() && !value()) pass();
        return std::move(m_found);
    }

private:
    const Token* peek(std::size_t ahead = 0) const
    {
        return m_at + ahead < m_tokens.size() ? &m_tokens[m_at + ahead] : nullptr;
    }
    bool isSymbol(char symbol, std::size_t ahead = 0) const
    {
        const Token* token = peek(ahead);
        return token && token->kind == Token::Kind::symbol && token->symbol == symbol;
    }
    bool isWord(std::size_t ahead = 0) const
    {
        return peek(ahead) && peek(ahead)->kind == Token::Kind::word;
    }
    bool isNumber(std::size_t ahead = 0) const
    {
        return peek(ahead) && peek(ahead)->kind == Token::Kind::number;
    }
    std::string_view wordAt(std::size_t ahead = 0) const
    {
        return m_text.substr(peek(ahead)->begin, peek(ahead)->end - peek(ahead)->begin);
    }

    bool bullet()
    {
        if (!isSymbol('-') || !peek()->lineStart || !isNumber(1) || !peek(1)->blankBefore)
            return false;
        if (peek(1)->lineStart || (peek(2) && !peek(2)->lineStart)) return false;
        if (m_at == 0 && !peek(2)) return false;  // a lone "- 5" is more likely minus five
        ++m_at;
        return true;
    }

    void pass()
    {
        const Token& token = m_tokens[m_at];
        Item item;
        switch (token.kind) {
            case Token::Kind::word:
                item.kind = Item::Kind::word;
                break;
            case Token::Kind::clock:
                item.kind = Item::Kind::clock;
                break;
            case Token::Kind::garbled:
                item.kind = Item::Kind::garbled;
                break;
            case Token::Kind::symbol:
            case Token::Kind::number:
                item.kind = Item::Kind::symbol;
                break;
        }
        item.symbol = token.symbol;
        item.blankBefore = token.blankBefore;
        item.lineStart = token.lineStart;
        item.begin = token.begin;
        item.end = token.end;
        m_found.items.push_back(item);
        ++m_at;
    }

    /// An opening parenthesis after a word holds arguments, and after a number nothing to multiply.
    bool opensArguments() const
    {
        if (m_at == 0 || !isSymbol('(')) return false;
        const Token& before = m_tokens[m_at - 1];
        return before.kind != Token::Kind::symbol || before.symbol == ']' || before.symbol == '>';
    }

    bool value()
    {
        const std::size_t start = m_at;
        if (opensArguments()) return false;
        const auto operand = sum(0);
        if (!operand) {
            m_at = start;
            return false;
        }
        Value value;
        value.number = operand->number;
        value.begin = m_tokens[start].begin;
        value.halfDigit = operand->composite ? 0.0 : operand->halfDigit;
        value.significant = operand->composite ? 0 : operand->significant;
        if (operand->piPower != 0)
            value.unit = operand->piPower > 0 ? AngleUnit::radians : AngleUnit::degrees;
        imaginaryUnit(value);
        writtenUnit(value);
        Item item;
        item.kind = Item::Kind::value;
        item.blankBefore = m_tokens[start].blankBefore;
        item.lineStart = m_tokens[start].lineStart;
        item.begin = value.begin;
        item.end = m_tokens[m_at - 1].end;
        item.value = m_found.values.size();
        m_found.items.push_back(item);
        m_found.values.push_back(value);
        return true;
    }

    /// `0.7i`, `0.7 i`, `0.7*i`, `0.7.i`; not the j of `j = 0.7`.
    void imaginaryUnit(Value& value)
    {
        const std::size_t ahead = (isSymbol('.') || isSymbol('*')) && isWord(1) ? 1 : 0;
        if (!isWord(ahead) || peek(ahead)->lineStart) return;
        const std::string_view word = wordAt(ahead);
        if (word != "i" && word != "j" && word != "k") return;
        if (isSymbol('=', ahead + 1) || isSymbol(':', ahead + 1)) return;
        value.imaginary = word.front();
        m_at += ahead + 1;
    }

    /// `30deg`, `30 deg`, `30 (deg)`, `30 [deg]`; not the unit of the next label (`deg: 30`,
    /// `degrees=True`).
    void writtenUnit(Value& value)
    {
        const bool bracketed = isSymbol('(') || isSymbol('[');
        const bool multiplied = isSymbol('*');  // 30*deg
        const std::size_t ahead = bracketed || multiplied ? 1 : 0;
        if (!isWord(ahead) || peek(ahead)->lineStart) return;
        const auto unit = unitOfWord(wordAt(ahead));
        if (!unit) return;
        if (bracketed && !isSymbol(')', 2) && !isSymbol(']', 2)) return;
        const std::size_t after = ahead + (bracketed ? 2 : 1);
        if (isSymbol('=', after) || isSymbol(':', after) || isSymbol('(', after)) return;
        value.unit = unit;
        m_at += after;
    }

    std::optional<Operand> sum(int depth)
    {
        auto left = term(depth);
        while (left && (isSymbol('+') || isSymbol('-')) && !peek()->lineStart && peek(1)) {
            if (peek()->blankBefore && !peek(1)->blankBefore) break;  // a sign
            const std::size_t start = m_at;
            const bool minus = isSymbol('-');
            ++m_at;
            const auto right = term(depth);
            if (!right || (depth == 0 && !left->composite && !right->composite)) {
                m_at = start;
                break;
            }
            left->number += minus ? -right->number : right->number;
            left->piPower = left->piPower != 0 ? left->piPower : right->piPower;
            left->composite = true;
        }
        return left;
    }

    std::optional<Operand> term(int depth)
    {
        auto left = factor(depth);
        while (left && (isSymbol('*') || isSymbol('/')) && !peek()->lineStart) {
            const std::size_t start = m_at;
            const bool divide = isSymbol('/');
            ++m_at;
            const auto right = factor(depth);
            if (!right) {
                m_at = start;
                break;
            }
            left->number = divide ? left->number / right->number : left->number * right->number;
            left->piPower += divide ? -right->piPower : right->piPower;
            left->composite = true;
        }
        return left;
    }

    /// A primary with its signs; `2pi` and `a**b` belong here.
    std::optional<Operand> factor(int depth)
    {
        bool negative = false;
        if (isSymbol('-') || isSymbol('+')) {
            negative = isSymbol('-');
            ++m_at;
        }
        auto base = primary(depth);
        if (!base) return base;
        if (isWord() && !peek()->blankBefore) {
            if (const auto factor = constantOf(wordAt()); factor && factor->piPower == 1) {
                base = constant(base->number * factor->number, base->piPower + 1);
                ++m_at;
            }
        }
        if (isSymbol('*') && isSymbol('*', 1) && depth < kDeepestParentheses) {
            const std::size_t start = m_at;
            m_at += 2;
            if (const auto power = primary(depth + 1))
                base = constant(std::pow(base->number, power->number));
            else
                m_at = start;
        }
        if (negative) base->number = -base->number;
        return base;
    }

    std::optional<Operand> primary(int depth)
    {
        if (isNumber()) {
            const Token& token = *peek();
            ++m_at;
            return Operand{token.number, 0, false, token.halfDigit, token.significant};
        }
        if (isWord()) {
            const std::string_view word = wordAt();
            if (isSymbol('(', 1) && applied(word, {})) {
                ++m_at;
                const auto argument = parenthesised(depth);
                return argument ? applied(word, *argument) : std::nullopt;
            }
            const auto known = constantOf(word);
            if (!known || isSymbol('=', 1) || isSymbol(':', 1)) return std::nullopt;
            const bool indeterminate = std::isnan(known->number) && isSymbol('(', 1) && isWord(2);
            if (isSymbol('(', 1) && !indeterminate) return std::nullopt;
            m_at += indeterminate ? 3 : 1;  // nan(ind)
            return known;
        }
        return isSymbol('(') ? parenthesised(depth) : std::nullopt;
    }

    std::optional<Operand> parenthesised(int depth)
    {
        if (depth >= kDeepestParentheses) return std::nullopt;
        ++m_at;
        const auto inside = sum(depth + 1);
        if (!inside || !isSymbol(')')) return std::nullopt;
        ++m_at;
        return inside;
    }

    std::string_view m_text;
    const std::vector<Token>& m_tokens;
    Items m_found;
    std::size_t m_at = 0;
};

}  // namespace

bool isSameWord(std::string_view word, std::string_view plain)
{
    return word.size() == plain.size() &&
           std::equal(word.begin(), word.end(), plain.begin(), [](char a, char b) {
               return (a >= 'A' && a <= 'Z' ? static_cast<char>(a + 32) : a) == b;
           });
}

std::string_view lastName(std::string_view word)
{
    const auto joint = word.find_last_of(".:>");
    return joint == std::string_view::npos ? word : word.substr(joint + 1);
}

std::optional<AngleUnit> unitOfWord(std::string_view word)
{
    for (const std::string_view name :
         {"deg", "degs", "degree", "degrees", "_deg", "\u00B0", "\u00BA"})
        if (isSameWord(word, name)) return AngleUnit::degrees;
    for (const std::string_view name : {"rad", "rads", "radian", "radians", "_rad"})
        if (isSameWord(word, name)) return AngleUnit::radians;
    return std::nullopt;
}

Items itemsOf(std::string_view text, const std::vector<Token>& tokens)
{
    return Arithmetic(text, tokens).run();
}

}  // namespace rotcore
