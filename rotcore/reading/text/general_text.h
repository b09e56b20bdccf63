// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string_view>

#include "rotcore/reading/text_input.h"

namespace rotcore {

/// What readText does with any text but plain numbers: tokens, arithmetic, words and runs, fields,
/// and the choice among them. For plain numbers it gives the same as the short way, and serves to
/// check it.
Result<TextInput> readGeneralText(std::string_view text, const StatedReading& stated,
                                  UnitGuess unitGuess);

}  // namespace rotcore
