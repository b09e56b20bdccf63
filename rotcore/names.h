// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <cstddef>
#include <string>
#include <string_view>
#include <utility>

#include "rotcore/result.h"

namespace rotcore {

/// The words of an enumeration, as used on the command line, in files and in messages.
template <class E, std::size_t n>
using NameTable = std::array<std::pair<E, std::string_view>, n>;

/// Specialised beside each enumeration that has words: `kTable`, a NameTable, and `kWhat`, what the
/// words name.
template <class E>
struct Names;

/// The word of a value. Every value must stand in its table.
template <class E>
constexpr std::string_view nameOf(E value)
{
    for (const auto& [candidate, name] : Names<E>::kTable)
        if (candidate == value) return name;
    return {};
}

/// The value of a word, spelt exactly. Fault: badText, listing the words there are.
template <class E>
Result<E> parseName(std::string_view text)
{
    std::string choices;
    for (const auto& [value, name] : Names<E>::kTable) {
        if (name == text) return value;
        choices += choices.empty() ? "" : ", ";
        choices += name;
    }
    return Fault{Fault::Kind::badText, "\"" + std::string(text) + "\" is not " +
                                           std::string(Names<E>::kWhat) + "; choose from " +
                                           choices};
}

}  // namespace rotcore
