// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/text/turn_product.h"

#include <array>
#include <utility>

namespace rotcore {

bool TurnProduct::addAngle(std::span<const Value> run, std::optional<AngleUnit> unit)
{
    if (run.size() != 1 && run.size() != 4) return false;
    m_turns.push_back({run[0], {run.begin() + 1, run.end()}});
    m_awaitsAxis = run.size() == 1;
    m_unit = unit;
    return true;
}

void TurnProduct::addAxis(std::span<const Value> three)
{
    m_turns.back().axis.assign(three.begin(), three.end());
    m_awaitsAxis = false;
}

void TurnProduct::addAxis(Axis axis)
{
    std::array<Value, 3> three{};
    three[static_cast<std::size_t>(indexOf(axis))].number = 1.0;
    addAxis(three);
}

void TurnProduct::finish(Fields& fields)
{
    m_awaitsAxis = false;
    const auto turns = std::exchange(m_turns, {});
    if (turns.empty()) return;
    Field field;
    field.said.unit = m_unit;
    field.name = "product of turns";
    if (turns.size() == 1 ? alone(turns[0], field) : together(turns, field))
        fields.rotations.push_back(std::move(field));
    else
        fields.aside.emplace_back("turns that make no set of Euler angles");
}

std::optional<Axis> TurnProduct::coordinateAxis(const Turn& turn)
{
    if (turn.axis.size() != 3) return std::nullopt;
    for (int n = 0; n < 3; ++n) {
        bool found = true;
        for (int m = 0; m < 3; ++m)
            found = found && turn.axis[static_cast<std::size_t>(m)].number == (m == n ? 1.0 : 0.0);
        if (found) return axisAt(n);
    }
    return std::nullopt;
}

bool TurnProduct::alone(const Turn& turn, Field& field)
{
    field.said.kind = Kind::axisAngle;
    field.values = turn.axis;
    field.values.push_back(turn.angle);
    return field.values.size() == 4;
}

bool TurnProduct::together(const std::vector<Turn>& turns, Field& field)
{
    if (turns.size() > 3) return false;
    std::array<Axis, 3> axes{};
    for (std::size_t n = 0; n < turns.size(); ++n) {
        const auto axis = coordinateAxis(turns[n]);
        if (!axis) return false;
        axes[n] = *axis;
        field.values.push_back(turns[n].angle);
    }
    if (turns.size() == 2) {
        if (axes[0] == axes[1]) return false;
        axes[2] = otherThan(axes[0], axes[1]);
        field.values.emplace_back();
    }
    const auto order = orderOf(axes);
    if (!order) return false;
    field.said.kind = Kind::euler;
    field.said.order = *order;
    field.said.about = About::body;
    return true;
}

}  // namespace rotcore
