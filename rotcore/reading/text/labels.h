// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string_view>

#include "rotcore/reading/reading.h"

namespace rotcore {

/// One number of several, as a label names it.
enum class Component {
    none,
    w,
    x,
    y,
    z,
    numbered,  ///< q0, q1, ...
    roll,
    pitch,
    yaw,
    omega,
    phi,
    kappa,
    turnX,
    turnY,
    turnZ,
    axis,
    axisX,
    axisY,
    axisZ,
    angle,
    element,   ///< r11, m00, ...
    position,  ///< tx, px, ...
    other,     ///< a rate, a time, ...
};

/// What a word says of the numbers after it.
enum class Topic {
    unknown,
    filler,       ///< says nothing and does not part numbers: array, float, const
    component,    ///< see Label::component
    orientation,  ///< opens a section: orientation, rotation, attitude
    position,     ///< opens a section that is left aside
    other,        ///< the same: velocity, scale, time, ...
    quaternion,
    euler,
    rollPitchYaw,
    yawPitchRoll,
    matrix,
    rotationVector,
    vector,  ///< a rotation vector after "rotation", otherwise nothing
    axisAngle,
    order,
    unit,
    unitAxis,  ///< UnitX, UnitY, UnitZ
};

struct Label {
    Topic topic = Topic::unknown;
    Component component = Component::none;
    Topic within = Topic::unknown;  ///< what the component belongs to, if its own name says so
    int number = 0;                 ///< of q0, q1, ...; ten times row plus column of an element
    std::optional<AngleUnit> unit;
    std::optional<Order> order;
    std::optional<About> about;
    std::optional<ScalarPlace> scalar;
    Axis axis = Axis::x;  ///< of unitAxis
};

/// The meaning of a word in any style of writing: `roll`, `pose.orientation.x`, `q_w`, `RotX`,
/// `yawDeg`.
Label labelOf(std::string_view word);

/// The bare orders of two or one axes that some functions take: `zy` and `z` are filled up to three
/// axes with turns of zero. Nothing if `text` is no such order.
std::optional<Order> shortOrder(std::string_view text);

}  // namespace rotcore
