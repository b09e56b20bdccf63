// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string>
#include <string_view>

#include "rotcore/case/findings.h"

namespace rotcore {

/// `text` as a JSON string in quotes; bytes that are not UTF-8 become U+FFFD.
std::string jsonString(std::string_view text);

/// Appends the members of a JSON object, without its braces, from "quaternion_wxyz" to "lock".
/// Numbers read back as the same doubles. What does not exist at the pose (the Gibbs vector at a
/// half turn, the amplification at lock) is null.
void appendFindingsJson(std::string& json, const Findings& found);

}  // namespace rotcore
