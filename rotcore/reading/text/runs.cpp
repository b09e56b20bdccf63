// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/runs.h"

#include <algorithm>
#include <cmath>
#include <utility>

namespace rotcore {
namespace {

using ItemKind = Item::Kind;

/// `3x3`, `4x4`, `3d`: words that start with a digit and belong to a heading.
bool isDimension(std::string_view word)
{
    const bool digit = !word.empty() && word[0] >= '1' && word[0] <= '9';
    if (!digit) return false;
    const std::string_view rest = word.substr(1);
    if (isSameWord(rest, "d")) return true;
    return rest.size() >= 2 && !(rest.front() >= '0' && rest.front() <= '9') &&
           rest.back() >= '1' && rest.back() <= '9' &&
           (rest.front() == 'x' || rest.front() == 'X' || rest.size() == 3);
}

class Parter {
public:
    Parter(std::string_view text, const Items& items) : m_text(text), m_found(items) {}

    Parts run()
    {
        for (m_at = 0; m_at < m_found.items.size();)
            step();
        return std::move(m_parts);
    }

private:
    const Item* peek(std::size_t ahead = 0) const
    {
        return m_at + ahead < m_found.items.size() ? &m_found.items[m_at + ahead] : nullptr;
    }
    bool isSymbol(char symbol, std::size_t ahead = 0) const
    {
        const Item* item = peek(ahead);
        return item && item->kind == ItemKind::symbol && item->symbol == symbol;
    }
    bool isWord(std::size_t ahead = 0) const
    {
        return peek(ahead) && peek(ahead)->kind == ItemKind::word;
    }
    std::string_view textAt(std::size_t ahead = 0) const
    {
        return m_text.substr(peek(ahead)->begin, peek(ahead)->end - peek(ahead)->begin);
    }
    /// Digits alone, as written.
    bool isIndex(std::size_t ahead) const
    {
        if (!peek(ahead) || peek(ahead)->kind != ItemKind::value) return false;
        const std::string_view text = textAt(ahead);
        return text.size() <= 3 &&
               std::all_of(text.begin(), text.end(), [](char c) { return c >= '0' && c <= '9'; });
    }

    void step()
    {
        switch (peek()->kind) {
            case ItemKind::value:
                value();
                return;
            case ItemKind::word:
                word();
                return;
            case ItemKind::clock:
                m_parts.hasClock = true;
                break;
            case ItemKind::garbled:
                if (!isDimension(textAt())) m_parts.garbled.push_back(textAt());
                break;
            case ItemKind::symbol:
                break;
        }
        ++m_at;
    }

    void value()
    {
        const bool isKey = isIndex(0) && isSymbol(':', 1) && !peek(1)->blankBefore;
        const bool isSize = isIndex(0) && isIndex(2) && isWord(1) &&
                            (textAt(1) == "x" || textAt(1) == "X" || textAt(1) == "\u00D7");
        if (isSize || isKey) {
            m_at += isSize ? 3 : 2;
            return;
        }
        if (m_parts.parts.empty() || !m_parts.parts.back().isRun) {
            Part part;
            part.isRun = true;
            part.first = m_parts.values.size();
            m_parts.parts.push_back(part);
        }
        m_parts.values.push_back(m_found.values[peek()->value]);
        m_parts.parts.back().last = m_parts.values.size();
        ++m_at;
    }

    void word()
    {
        Part part;
        part.word = textAt();
        const bool afterNew = m_at > 0 && isSameWord(m_previousWord, "new");
        part.afterIn = isSameWord(m_previousWord, "in");
        m_previousWord = part.word;
        ++m_at;
        if (isSameWord(part.word, "cuda") && isSymbol(':') && isIndex(1)) {
            m_at += 2;  // device='cuda:0'
            return;
        }
        const bool indexed = skipIndices();
        if (indexed && part.word == m_lastIndexed) {
            endOfLabel(part);
            return;  // the next element of the same array
        }
        m_lastIndexed = indexed ? part.word : std::string_view();
        const Constructor* constructor = constructorOf(part.word, afterNew);
        if (constructor && (opensCall() || constructor->name == "coeffs"))
            part.constructor = constructor;
        else
            part.label = labelOf(part.word);
        if (part.label.topic == Topic::filler) return;
        endOfLabel(part);
        if (part.label.topic == Topic::unit) truth(part);
        m_parts.parts.push_back(part);
    }

    /// `R[9]`, `R[0][1]`, `R(0, 1) =`: the numbers in the brackets are no values.
    bool skipIndices()
    {
        const std::size_t start = m_at;
        for (;;) {
            const char open = isSymbol('[') ? '[' : isSymbol('(') ? '(' : '\0';
            if (open == '\0' || peek()->blankBefore || !isIndex(1)) break;
            std::size_t ahead = 2;
            if (isSymbol(',', ahead) && isIndex(ahead + 1)) ahead += 2;
            if (!isSymbol(open == '[' ? ']' : ')', ahead)) break;
            if (open == '(' && !isSymbol('=', ahead + 1)) break;
            m_at += ahead + 1;
        }
        return m_at != start;
    }

    /// Whether the word is called: `Quaterniond(`, `Quaternion<double> q(`, `Quaterniond q = {`.
    bool opensCall() const
    {
        std::size_t ahead = 0;
        if (isSymbol('<') && isWord(1) && isSymbol('>', 2)) ahead = 3;
        if (isWord(ahead)) ++ahead;
        if (isSymbol('=', ahead)) ++ahead;
        return isSymbol('(', ahead) || isSymbol('{', ahead) || isSymbol('[', ahead);
    }

    /// `degrees=True`, `"degrees": false`: the unit, said or denied, and no label of what follows.
    void truth(Part& part)
    {
        const std::size_t ahead = (isSymbol('"') || isSymbol('\'') ? 1 : 0) + 1;
        if (!part.assigned || !isWord(ahead)) return;
        const bool denied = isSameWord(textAt(ahead), "false");
        if (!denied && !isSameWord(textAt(ahead), "true")) return;
        const bool degrees = part.label.unit == AngleUnit::degrees;
        part.label.unit = degrees != denied ? AngleUnit::degrees : AngleUnit::radians;
        part.assigned = false;
        m_at += ahead + 1;
    }

    /// What stands between a label and its value.
    void endOfLabel(Part& part)
    {
        std::size_t ahead = isSymbol('"') || isSymbol('\'') ? 1 : 0;
        part.assigned = isSymbol(':', ahead) || isSymbol('=', ahead);
        part.attribute = ahead == 0 && isSymbol('=') && (isSymbol('"', 1) || isSymbol('\'', 1));
    }

    std::string_view m_text;
    const Items& m_found;
    Parts m_parts;
    std::size_t m_at = 0;
    std::string_view m_previousWord;
    std::string_view m_lastIndexed;
};

}  // namespace

Parts partsOf(std::string_view text, const Items& items)
{
    return Parter(text, items).run();
}

}  // namespace rotcore
