// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstddef>

#include <Eigen/Core>

#include "rotcore/names.h"

namespace rotcore {

enum class Axis { x, y, z };

template <>
struct Names<Axis> {
    static constexpr std::string_view kWhat = "an axis";
    static constexpr NameTable<Axis, 3> kTable{{{Axis::x, "x"}, {Axis::y, "y"}, {Axis::z, "z"}}};
};

/// 0, 1, 2 for x, y, z: the row of the axis in a vector.
constexpr int indexOf(Axis axis)
{
    return static_cast<int>(axis);
}

/// The axis of a row; `index` counts modulo 3.
constexpr Axis axisAt(int index)
{
    return static_cast<Axis>(((index % 3) + 3) % 3);
}

inline Eigen::Vector3d unitVector(Axis axis)
{
    return Eigen::Vector3d::Unit(indexOf(axis));
}

/// The axis that is neither; `first` and `second` differ.
constexpr Axis otherThan(Axis first, Axis second)
{
    return axisAt(3 - indexOf(first) - indexOf(second));
}

/// +1 if `second` follows `first` in the cycle x, y, z, x; -1 if it precedes it; 0 if they are
/// equal.
constexpr int cyclicSign(Axis first, Axis second)
{
    if (first == second) return 0;
    return axisAt(indexOf(first) + 1) == second ? 1 : -1;
}

}  // namespace rotcore
