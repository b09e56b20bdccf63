// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <optional>
#include <string>
#include <vector>

#include "rotcore/reading/text/runs.h"
#include "rotcore/reading/text_input.h"

namespace rotcore {

/// Numbers of a text that belong together, and what the text says of them.
struct Field {
    std::vector<Value> values;
    StatedReading said;  ///< by labels, units or a constructor
    std::string name;    ///< for messages: "quaternion", "numbers"
    bool named = false;  ///< a quaternion whose numbers have names; they stand w, x, y, z
    /// Euler angles that are about known axes, to be put into the order of the reading.
    std::optional<std::array<Axis, 3>> axes;
    bool maybeVector = false;        ///< named rx, ry, rz, which some use for a rotation vector
    std::vector<std::string> notes;  ///< warnings that hold if this field is used
};

/// What a text holds: rotations whose kind is said, numbers of which nothing is said, and the rest.
struct Fields {
    std::vector<Field> rotations;
    std::vector<Field> bare;
    std::vector<std::string> aside;  ///< names of numbers that are no part of an orientation
};

/// The name of a kind in messages: "Euler angles", "quaternion", ...
std::string_view kindName(Kind kind);

Fields fieldsOf(const Parts& parts);

}  // namespace rotcore
