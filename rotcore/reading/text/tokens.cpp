// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/tokens.h"

#include <algorithm>
#include <cstdint>
#include <initializer_list>
#include <utility>

namespace rotcore {
namespace {

bool isDigit(char c)
{
    return c >= '0' && c <= '9';
}
bool isLetter(char c)
{
    return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || c == '_';
}
bool isBlank(char c)
{
    return c == ' ' || (c >= '\t' && c <= '\r') || c == '\0';
}
char lowered(char c)
{
    return c >= 'A' && c <= 'Z' ? static_cast<char>(c + 32) : c;
}

struct CodePoint {
    std::uint32_t value = 0xFFFD;
    std::size_t length = 1;
};

/// The UTF-8 code point at `at`; a stray byte stands for itself as U+FFFD.
CodePoint codePointAt(std::string_view text, std::size_t at)
{
    const auto byte = [&](std::size_t n) { return static_cast<unsigned char>(text[n]); };
    const unsigned lead = byte(at);
    if (lead < 0x80) return {lead, 1};
    const std::size_t length = lead >= 0xF0 ? 4 : lead >= 0xE0 ? 3 : lead >= 0xC0 ? 2 : 1;
    if (length == 1 || at + length > text.size()) return {};
    std::uint32_t value = lead & (0x7FU >> length);
    for (std::size_t n = 1; n < length; ++n) {
        if ((byte(at + n) & 0xC0U) != 0x80U) return {};
        value = (value << 6U) | (byte(at + n) & 0x3FU);
    }
    return {value, length};
}

/// What a character outside ASCII stands for: ' ' for blanks, rules, arrows and quotes of all
/// sorts, a plain symbol for its full-width or typographic form, 'a' for letters.
char roleOf(std::uint32_t codePoint)
{
    switch (codePoint) {
        case 0x00A0:
        case 0x3000:
        case 0xFEFF:
        case 0xFFFD:
            return ' ';
        case 0x2212:
            return '-';
        case 0x2022:
            return ' ';
        case 0x3001:
            return ',';
        case 0x00B7:
        case 0x22C5:
            return '*';
        default:
            break;
    }
    if (codePoint >= 0xFF01 && codePoint <= 0xFF0F) return static_cast<char>(codePoint - 0xFEE0);
    if (codePoint >= 0xFF1A && codePoint <= 0xFF20) return static_cast<char>(codePoint - 0xFEE0);
    if (codePoint >= 0xFF3B && codePoint <= 0xFF5E) return static_cast<char>(codePoint - 0xFEE0);
    if (codePoint >= 0x2000 && codePoint <= 0x2BFF) return ' ';
    return 'a';
}

/// `2024-01-05T12:00:00.5Z` or `12:00:00.5` at the start of `text`: its length, or zero.
std::size_t clockLength(std::string_view text)
{
    const auto matches = [&](std::size_t from, std::string_view pattern) {
        if (from + pattern.size() > text.size()) return false;
        for (std::size_t n = 0; n < pattern.size(); ++n)
            if (pattern[n] == '9' ? !isDigit(text[from + n]) : text[from + n] != pattern[n])
                return false;
        return true;
    };
    std::size_t length = 0;
    if (matches(0, "9999-99-99")) {
        length = 10;
        if (length < text.size() && (text[length] == 'T' || text[length] == ' ') &&
            matches(length + 1, "99:99:99"))
            length += 9;
    } else if (matches(0, "99:99:99")) {
        length = 8;
    }
    if (length == 0) return 0;
    while (length < text.size() && (isDigit(text[length]) || text[length] == '.' ||
                                    text[length] == 'Z' || text[length] == ':'))
        ++length;
    return length;
}

bool isOneOf(std::string_view word, std::initializer_list<std::string_view> words)
{
    return std::any_of(words.begin(), words.end(), [&](std::string_view candidate) {
        return candidate.size() == word.size() &&
               std::equal(word.begin(), word.end(), candidate.begin(),
                          [](char a, char b) { return lowered(a) == b; });
    });
}

/// Letters that may touch a number without making another thing of it.
bool isUnitOrFactor(std::string_view letters)
{
    return isOneOf(letters, {"deg", "degs", "degree", "degrees", "rad", "rads", "radian", "radians",
                             "pi", "i", "j", "k", "_deg", "_rad"});
}

class Scanner {
public:
    Scanner(std::string_view text, DecimalMark mark) : m_text(text), m_mark(mark) {}

    std::vector<Token> run()
    {
        while (m_at < m_text.size())
            step();
        return std::move(m_tokens);
    }

private:
    void step()
    {
        const char c = m_text[m_at];
        if (isBlank(c)) {
            m_blank = true;
            m_lineStart = m_lineStart || c == '\n';
            ++m_at;
        } else if (isDigit(c) ||
                   (c == '.' && m_at + 1 < m_text.size() && isDigit(m_text[m_at + 1]))) {
            numberOrLookalike();
        } else if (isLetter(c)) {
            push(Token::Kind::word, wordEnd(m_at));
        } else if (static_cast<unsigned char>(c) >= 0x80) {
            outsideAscii();
        } else {
            push(Token::Kind::symbol, m_at + 1).symbol = c;
        }
    }

    Token& push(Token::Kind kind, std::size_t end)
    {
        Token token;
        token.kind = kind;
        token.blankBefore = m_blank;
        token.lineStart = m_lineStart;
        token.begin = m_at;
        token.end = end;
        m_tokens.push_back(token);
        m_at = end;
        m_blank = false;
        m_lineStart = false;
        return m_tokens.back();
    }

    void outsideAscii()
    {
        const CodePoint point = codePointAt(m_text, m_at);
        const char role = roleOf(point.value);
        if (point.value == 0x00B0 || point.value == 0x00BA || point.value == 0x03C0) {
            push(Token::Kind::word, m_at + point.length);  // degree signs and pi stand alone
        } else if (role == ' ') {
            m_blank = true;
            m_at += point.length;
        } else if (role == 'a') {
            push(Token::Kind::word, wordEnd(m_at));
        } else {
            push(Token::Kind::symbol, m_at + point.length).symbol = role;
        }
    }

    /// The end of the letters, digits and letters outside ASCII that start at `at`.
    std::size_t identifierEnd(std::size_t at) const
    {
        while (at < m_text.size()) {
            if (isLetter(m_text[at]) || isDigit(m_text[at])) {
                ++at;
                continue;
            }
            if (static_cast<unsigned char>(m_text[at]) < 0x80) break;
            const CodePoint point = codePointAt(m_text, at);
            if (roleOf(point.value) != 'a' || point.value == 0x00B0 || point.value == 0x00BA) break;
            at += point.length;
        }
        return at;
    }

    /// The same with qualifiers: `std::numbers::pi`, `pose.orientation`, `msg->x`.
    std::size_t wordEnd(std::size_t at) const
    {
        at = identifierEnd(at);
        for (;;) {
            std::size_t joint = 0;
            const std::string_view rest = m_text.substr(at, 3);
            if (rest.starts_with("::") || rest.starts_with("->")) joint = 2;
            if (rest.starts_with(".")) joint = 1;
            if (joint == 0 || at + joint >= m_text.size() || !isLetter(m_text[at + joint]))
                return at;
            at = identifierEnd(at + joint);
        }
    }

    void numberOrLookalike()
    {
        if (const std::size_t clock = clockLength(m_text.substr(m_at)); clock > 0) {
            push(Token::Kind::clock, m_at + clock);
            return;
        }
        const NumberLiteral literal = numberAt(m_text.substr(m_at), m_mark);
        const std::size_t end = m_at + literal.length;
        const std::size_t letters = identifierEnd(end);
        const std::string_view suffix = m_text.substr(end, letters - end);
        const bool isSuffix = isOneOf(suffix, {"f", "l", "d"});
        if (!suffix.empty() && !isSuffix && !isUnitOrFactor(suffix) && suffix != "\u03C0") {
            push(Token::Kind::garbled, garbledEnd(letters));
            return;
        }
        if (suffix.empty() && continuesAfterPoint(end)) {
            push(Token::Kind::garbled, garbledEnd(end));
            return;
        }
        Token& token = push(Token::Kind::number, end);
        token.number = literal.number;
        token.halfDigit = literal.halfDigit;
        token.significant = literal.significant;
        if (isSuffix) m_at = letters;
    }

    /// A second point (`1.2.3`) or the ending of a file name (`000123.png`), but not the `.i` of
    /// `0.0.i`.
    bool continuesAfterPoint(std::size_t end) const
    {
        if (end + 1 >= m_text.size() || m_text[end] != '.') return false;
        const std::size_t letters = identifierEnd(end + 1);
        const std::string_view after = m_text.substr(end + 1, letters - end - 1);
        return !after.empty() && !isOneOf(after, {"i", "j", "k"});
    }

    std::size_t garbledEnd(std::size_t at) const
    {
        for (;;) {
            at = identifierEnd(at);
            if (at + 1 >= m_text.size() || m_text[at] != '.') return at;
            if (!isLetter(m_text[at + 1]) && !isDigit(m_text[at + 1])) return at;
            ++at;
        }
    }

    std::string_view m_text;
    DecimalMark m_mark;
    std::vector<Token> m_tokens;
    std::size_t m_at = 0;
    bool m_blank = true;
    bool m_lineStart = true;
};

}  // namespace

std::vector<Token> tokensOf(std::string_view text, DecimalMark mark)
{
    return Scanner(text, mark).run();
}

bool mayHaveDecimalCommas(std::string_view text)
{
    bool tight = false;
    bool separated = false;
    int commasInStretch = 0;
    for (std::size_t at = 0; at < text.size(); ++at) {
        const char c = text[at];
        const bool digitBefore = at > 0 && isDigit(text[at - 1]);
        const char next = at + 1 < text.size() ? text[at + 1] : ' ';
        if (c == '.' && (digitBefore || isDigit(next))) return false;
        if (c == ',' && !isBlank(next)) {
            if (!digitBefore || !isDigit(next) || ++commasInStretch > 1) return false;
            tight = true;
        } else if (!isDigit(c)) {
            separated = separated || (tight && commasInStretch > 0);
            commasInStretch = 0;
        }
    }
    return tight && separated;
}

}  // namespace rotcore
