// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string_view>

#include "rotcore/reading/reading.h"

namespace rotcore {

/// How the numbers of a call are listed.
enum class Arguments {
    asListed,       ///< in the order of the reading
    byAxis,         ///< angles about x, y, z, whatever the order of the turns
    angleThenAxis,  ///< of axis and angle
};

/// What a library fixes about the numbers handed to one of its functions.
struct Constructor {
    /// Lower case, qualifiers joined with points; any further qualifier may precede.
    std::string_view name;
    Kind kind = Kind::quaternion;
    Arguments arguments = Arguments::asListed;
    std::optional<ScalarPlace> scalar = std::nullopt;
    std::optional<Order> order = std::nullopt;
    std::optional<About> about = std::nullopt;
    std::optional<AngleUnit> unit = std::nullopt;
    std::optional<Storage> storage = std::nullopt;
    /// If not empty, the word must end just so, capitals and all.
    std::string_view spelling = {};
    /// An order in capitals is about body, in small letters about space.
    bool caseSaysAbout = false;
};

/// The fact that decides for a call of `word` (`Eigen::Quaterniond`, `R.from_euler`), or nothing.
/// `afterNew`: the word `new` stands before it.
const Constructor* constructorOf(std::string_view word, bool afterNew);

}  // namespace rotcore
