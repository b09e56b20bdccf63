// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <string>

#include <Eigen/Core>

#include "rotcore/names.h"
#include "rotcore/result.h"
#include "rotcore/rotation/axis.h"

namespace rotcore {

/// An axis or its opposite.
struct SignedAxis {
    Axis axis = Axis::x;
    int sign = 1;  ///< +1 or -1
    friend bool operator==(const SignedAxis&, const SignedAxis&) = default;
};

enum class Handedness { right, left };

template <>
struct Names<Handedness> {
    static constexpr std::string_view kWhat = "a handedness";
    static constexpr NameTable<Handedness, 2> kTable{
        {{Handedness::right, "right-handed"}, {Handedness::left, "left-handed"}}};
};

/// A relabelling of axes: the new coordinates in terms of the old, `x' = images[0]` and so on,
/// three different axes each with a sign. East-north-up to north-east-down is {y, x, -z}.
struct AxisMap {
    std::array<SignedAxis, 3> images{{{Axis::x, 1}, {Axis::y, 1}, {Axis::z, 1}}};
    friend bool operator==(const AxisMap&, const AxisMap&) = default;
};

/// All 48 of them, the identity first, the 24 that keep handedness before the 24 that change it.
const std::array<AxisMap, 48>& allAxisMaps();

/// The matrix that takes old coordinates (a column) to new ones.
Eigen::Matrix3d matrixOf(const AxisMap& map);

/// `right` if a right-handed system stays one (determinant +1).
Handedness handednessOf(const AxisMap& map);

AxisMap inverse(const AxisMap& map);

/// First `inner`, then `outer`.
AxisMap composed(const AxisMap& outer, const AxisMap& inner);

/// "y, x, -z".
std::string textOf(const AxisMap& map);

/// Reads "y, x, -z", "y x -z", "yx-z" or "Y,X,-Z". Faults: badText.
Result<AxisMap> parseAxisMap(std::string_view text);

}  // namespace rotcore
