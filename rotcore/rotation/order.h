// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>

#include "rotcore/names.h"
#include "rotcore/rotation/axis.h"

namespace rotcore {

/// The axes of three turns, in the order they are listed.
enum class Order { xyz, xzy, yxz, yzx, zxy, zyx, xyx, xzx, yxy, yzy, zxz, zyz };

/// Whose axes: those the body carries, or those that stay still.
enum class About { body, space };

template <>
struct Names<Order> {
    static constexpr std::string_view kWhat = "an order of axes";
    static constexpr NameTable<Order, 12> kTable{{{Order::xyz, "xyz"},
                                                  {Order::xzy, "xzy"},
                                                  {Order::yxz, "yxz"},
                                                  {Order::yzx, "yzx"},
                                                  {Order::zxy, "zxy"},
                                                  {Order::zyx, "zyx"},
                                                  {Order::xyx, "xyx"},
                                                  {Order::xzx, "xzx"},
                                                  {Order::yxy, "yxy"},
                                                  {Order::yzy, "yzy"},
                                                  {Order::zxz, "zxz"},
                                                  {Order::zyz, "zyz"}}};
};

template <>
struct Names<About> {
    static constexpr std::string_view kWhat = "whose axes the turns are about";
    static constexpr NameTable<About, 2> kTable{{{About::body, "body"}, {About::space, "space"}}};
};

inline constexpr std::array<Order, 12> kAllOrders{Order::xyz, Order::xzy, Order::yxz, Order::yzx,
                                                  Order::zxy, Order::zyx, Order::xyx, Order::xzx,
                                                  Order::yxy, Order::yzy, Order::zxz, Order::zyz};

/// The three axes, as listed.
std::array<Axis, 3> axesOf(Order order);

/// The order of three axes. Fault: badText, if neighbours are equal (two turns in one).
Result<Order> orderOf(const std::array<Axis, 3>& axes);

/// The same axes listed backwards: about space in one is about body in the other.
Order reversed(Order order);

/// Whether the first axis comes back as the third (zxz and the like, "proper" Euler angles).
bool isRepeating(Order order);

/// The middle angles at which the order is at lock lie a quarter turn from zero (all axes
/// different) or at zero and a half turn (first axis repeated). The one nearer to `middle`, radians
/// in [-pi, pi].
double nearestLock(Order order, double middle);

/// An order as people write it: `zyx`, `ZYX`, `321`, `z-y-x`, `Z Y X`, `z,y,x`. The case says
/// nothing about body or space. Fault: badText, saying what is wrong with it.
Result<Order> parseOrder(std::string_view text);

}  // namespace rotcore
