// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>

#include <Eigen/Geometry>

#include "rotcore/rotation/order.h"

namespace rotcore {

/// Three angles with the convention without which they mean nothing.
struct EulerAngles {
    Order order = Order::zyx;
    About about = About::body;
    std::array<double, 3> angles{};  ///< Radians, listed as in `order`.
    friend bool operator==(const EulerAngles&, const EulerAngles&) = default;
};

/// The pose q_WB, of unit length. For listed turns i, j, k by a, b, c it is R_i(a) R_j(b) R_k(c)
/// about body and R_k(c) R_j(b) R_i(a) about space, each right-handed. Angles must be finite.
Eigen::Quaterniond pose(const EulerAngles& euler);

/// The turn by `angle` (radians) about a coordinate axis.
Eigen::Quaterniond turnAbout(Axis axis, double angle);

/// The same numbers as turns about the other set of axes: the pose is unchanged, the list reversed.
EulerAngles aboutTheOther(const EulerAngles& euler);

}  // namespace rotcore
