// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <string_view>

#include "rotcore/reading/text/fields.h"
#include "rotcore/reading/text_input.h"

namespace rotcore {

/// Decides all that the field leaves open (kind from the count and the lengths, layout, unit,
/// order) and says what was decided how. `text` is only for the places in faults.
Result<TextInput> settled(std::string_view text, const Field& field, const StatedReading& stated,
                          UnitGuess unitGuess);

/// Line and column of a byte of `text`.
TextPlace placeOf(std::string_view text, std::size_t byte);

}  // namespace rotcore
