// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/order.h"

#include <cmath>
#include <optional>

#include "rotcore/rotation/angle.h"

namespace rotcore {
namespace {

constexpr std::array<Axis, 3> axesNamed(std::string_view name)
{
    return {axisAt(name[0] - 'x'), axisAt(name[1] - 'x'), axisAt(name[2] - 'x')};
}

// Both tables are indexed by the order's value and made from its name, so they cannot disagree with
// it.
constexpr auto kAxes = [] {
    std::array<std::array<Axis, 3>, kAllOrders.size()> table{};
    for (const Order order : kAllOrders)
        table[static_cast<std::size_t>(order)] = axesNamed(nameOf(order));
    return table;
}();

constexpr auto kReversed = [] {
    std::array<Order, kAllOrders.size()> table{};
    for (const Order order : kAllOrders)
        for (const Order candidate : kAllOrders) {
            const auto& [i, j, k] = kAxes[static_cast<std::size_t>(order)];
            if (kAxes[static_cast<std::size_t>(candidate)] == std::array{k, j, i})
                table[static_cast<std::size_t>(order)] = candidate;
        }
    return table;
}();

std::optional<Axis> axisOfCharacter(char c)
{
    switch (c) {
        case 'x':
        case 'X':
        case '1':
            return Axis::x;
        case 'y':
        case 'Y':
        case '2':
            return Axis::y;
        case 'z':
        case 'Z':
        case '3':
            return Axis::z;
        default:
            return std::nullopt;
    }
}

bool isSeparator(char c)
{
    return c == '-' || c == ' ' || c == ',' || c == '_' || c == '\'';
}

Fault badOrder(std::string_view text, const std::string& why)
{
    return {Fault::Kind::badText, "\"" + std::string(text) + "\" is not an order of axes: " + why +
                                      ". Write three of x, y, z (or 1, 2, 3), as in zyx or 3-1-3"};
}

}  // namespace

std::array<Axis, 3> axesOf(Order order)
{
    return kAxes[static_cast<std::size_t>(order)];
}

Result<Order> orderOf(const std::array<Axis, 3>& axes)
{
    for (const Order order : kAllOrders)
        if (axesOf(order) == axes) return order;
    std::string name;
    for (const Axis axis : axes)
        name += nameOf(axis);
    return badOrder(name, "two neighbouring turns about one axis are a single turn");
}

Order reversed(Order order)
{
    return kReversed[static_cast<std::size_t>(order)];
}

bool isRepeating(Order order)
{
    const auto axes = axesOf(order);
    return axes[0] == axes[2];
}

double nearestLock(Order order, double middle)
{
    if (isRepeating(order)) return std::abs(middle) <= kPi / 2 ? 0.0 : kPi;
    return middle >= 0.0 ? kPi / 2 : -kPi / 2;
}

Result<Order> parseOrder(std::string_view text)
{
    std::array<Axis, 3> axes{};
    std::size_t count = 0;
    for (const char c : text) {
        if (isSeparator(c)) continue;
        const auto axis = axisOfCharacter(c);
        if (!axis) return badOrder(text, std::string("it has a '") + c + "' in it");
        if (count == axes.size()) return badOrder(text, "it names more than three axes");
        axes[count++] = *axis;
    }
    if (count != axes.size())
        return badOrder(text, "it names " + std::to_string(count) + " axes instead of three");
    if (axes[0] == axes[1] || axes[1] == axes[2])
        return badOrder(text, "two neighbouring turns about one axis are a single turn");
    return orderOf(axes);
}

}  // namespace rotcore
