// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <span>
#include <vector>

#include "rotcore/reading/text/fields.h"

namespace rotcore {

/// Turns written as calls that take an angle and an axis, multiplied or alone.
class TurnProduct {
public:
    /// One number is an angle whose axis follows; four are an angle and its axis. False for other
    /// counts.
    bool addAngle(std::span<const Value> run, std::optional<AngleUnit> unit);
    /// Whether the last turn still lacks its axis.
    bool awaitsAxis() const { return m_awaitsAxis; }
    void addAxis(std::span<const Value> three);
    void addAxis(Axis axis);

    /// One turn as axis and angle, two or three about coordinate axes as Euler angles about body;
    /// others are left aside. Nothing if there is no turn. Forgets the turns.
    void finish(Fields& fields);

private:
    struct Turn {
        Value angle;
        std::vector<Value> axis;
    };

    static std::optional<Axis> coordinateAxis(const Turn& turn);
    static bool alone(const Turn& turn, Field& field);
    static bool together(const std::vector<Turn>& turns, Field& field);

    std::vector<Turn> m_turns;
    std::optional<AngleUnit> m_unit;
    bool m_awaitsAxis = false;
};

}  // namespace rotcore
