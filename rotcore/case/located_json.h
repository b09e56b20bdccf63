// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <map>
#include <string>
#include <string_view>

#include <nlohmann/json.hpp>

#include "rotcore/result.h"

namespace rotcore {

/// A JSON document that knows where in its text each value stood.
struct LocatedJson {
    nlohmann::ordered_json root;
    std::map<std::string, TextPlace> places;  ///< by JSON pointer (RFC 6901): "/chain/0/axis"

    /// The place of a value, or of the nearest one around it that has a place.
    TextPlace placeOf(std::string pointer) const;
};

/// Parses strictly (RFC 8259): no comments, no repeated names, at most 64 levels deep.
/// Fault: badText, with the place.
Result<LocatedJson> parseLocatedJson(std::string_view text);

}  // namespace rotcore
