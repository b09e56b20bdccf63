// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/scene.h"

namespace ui {

using Eigen::Quaterniond;
using Eigen::Vector3d;
using rotcore::Axis;

namespace {

constexpr double kBodyAxisLength = 1.08;  // between the body and the inner ring
constexpr double kUprightLength = 2.06;   // clears the outer ring and its pins

Vector3d upOf(WorldNames names)
{
    switch (names) {
        case WorldNames::plain:
        case WorldNames::eastNorthUp:
        case WorldNames::forwardLeftUp:
            return Vector3d::UnitZ();
        case WorldNames::northEastDown:
            return -Vector3d::UnitZ();
        case WorldNames::rightDownForward:
            return -Vector3d::UnitY();
        case WorldNames::yUp:
            return Vector3d::UnitY();
    }
    return Vector3d::UnitZ();
}

std::array<std::string, 3> wordsOf(WorldNames names)
{
    switch (names) {
        case WorldNames::plain:
        case WorldNames::yUp:
            return {"X", "Y", "Z"};
        case WorldNames::eastNorthUp:
            return {"east", "north", "up"};
        case WorldNames::northEastDown:
            return {"north", "east", "down"};
        case WorldNames::forwardLeftUp:
            return {"forward", "left", "up"};
        case WorldNames::rightDownForward:
            return {"right", "down", "forward"};
    }
    return {};
}

std::vector<AxisShape> axesOf(const Scene& scene, WorldNames names)
{
    std::vector<AxisShape> axes;
    const auto words = wordsOf(names);
    for (int row = 0; row < 3; ++row) {
        const Axis axis = rotcore::axisAt(row);
        const Vector3d unit = rotcore::unitVector(axis);
        const bool level = std::abs(unit.dot(scene.up_W)) < 0.5;
        axes.push_back({AxisShape::Frame::world, axis, unit,
                        level ? scene.groundRadius : kUprightLength,
                        words[static_cast<std::size_t>(row)]});
    }
    for (int row = 0; row < 3; ++row) {
        const Axis axis = rotcore::axisAt(row);
        axes.push_back({AxisShape::Frame::body, axis, scene.q_WB * rotcore::unitVector(axis),
                        kBodyAxisLength, std::string(1, "xyz"[row])});
    }
    return axes;
}

std::optional<LockShape> lockOf(const Scene& scene, const rotcore::Findings& found)
{
    if (found.lock.distance >= kNearLock) return std::nullopt;
    return LockShape{scene.rings[0].pin_W, scene.q_WB * found.lock.lostDirectionBody,
                     found.euler.locked()};
}

}  // namespace

Scene sceneOf(const rotcore::Findings& found, const View& view, const Pointing& pointing)
{
    static const std::shared_ptr<const Mesh> kBody = scannerHead();
    Scene scene;
    scene.q_WB = found.q_WB;
    scene.body = kBody;
    scene.rings = ringsOf(found.angles);
    for (int n = 0; n < 3; ++n) {
        RingShape& ring = scene.rings[static_cast<std::size_t>(n)];
        ring.hovered = pointing.hoveredRing == n;
        ring.dragged = pointing.draggedRing == n;
    }
    scene.up_W = upOf(view.worldNames);
    scene.axes = axesOf(scene, view.worldNames);
    scene.lockDistance = found.lock.distance;
    scene.lock = lockOf(scene, found);
    return scene;
}

}  // namespace ui
