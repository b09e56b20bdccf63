// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <string_view>

#include "rotcore/case/case.h"

namespace rotcore {

/// The version that is written. Files of a later version are refused, those of earlier ones read.
inline constexpr int kCaseVersion = 1;

/// The case as JSON text, one turn a line, ending with a line break. Reading it gives an equal
/// case, and writing that the same bytes: an angle is written in degrees where degrees give back
/// the same double, else in radians.
std::string writeCase(const Case& subject);

/// Reads what writeCase writes and what people write by hand in the same form:
///
///     { "trunnion_case": 1,
///       "start": { "kind": "euler", "order": "zyx", "about": "body", "unit": "deg", "values": [30,
///       20, 10] }, "chain": [ { "axis": "z", "angle_deg": 90, "about": "body", "name": "slew" } ],
///       "shown": { "order": "zyx", "about": "body", "unit": "deg" } }
///
/// Fields other than the version may be left out and then have the defaults of Case. An axis is a
/// letter or three numbers; an angle is `angle_deg` or `angle_rad`. Faults: badText (not JSON) and
/// badField (missing, unknown, repeated, of the wrong type or out of range), each with its place in
/// the text.
Result<Case> readCase(std::string_view json);

}  // namespace rotcore
