// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d/surface.h"

#include <array>
#include <cmath>
#include <numbers>

#include <Eigen/Geometry>

namespace ui {

using Eigen::Vector3d;

namespace {

Vector3d onCircle(double angle)
{
    return {std::cos(angle), std::sin(angle), 0.0};
}

/// Joins two rows of vertices, each counted from its first; the outside is seen with `left` at the
/// left of `right` when rows run upwards.
void addStrip(Surface& surface, std::uint32_t left, std::uint32_t right, int cells)
{
    for (std::uint32_t i = 0; i < static_cast<std::uint32_t>(cells); ++i) {
        surface.addTriangle(left + i, right + i, right + i + 1);
        surface.addTriangle(left + i, right + i + 1, left + i + 1);
    }
}

/// A disc that closes a cylinder, with the normal it shows.
void addCap(Surface& surface, const Vector3d& centre, const Vector3d& normal, double radius,
            int facetsAround)
{
    const Vector3d u = normal.unitOrthogonal();
    const Vector3d v = normal.cross(u);
    const std::uint32_t middle = surface.addVertex(centre, normal);
    for (int i = 0; i <= facetsAround; ++i) {
        const double angle = 2.0 * std::numbers::pi * i / facetsAround;
        const std::uint32_t rim = surface.addVertex(
            centre + radius * (std::cos(angle) * u + std::sin(angle) * v), normal);
        if (i > 0) surface.addTriangle(middle, rim - 1, rim);
    }
}

}  // namespace

std::uint32_t Surface::addVertex(const Vector3d& at, const Vector3d& normal)
{
    const auto index = static_cast<std::uint32_t>(vertexCount());
    for (const Vector3d& part : {at, normal}) {
        for (const double number : part)
            vertices.push_back(static_cast<float>(number));
    }
    return index;
}

void Surface::addTriangle(std::uint32_t a, std::uint32_t b, std::uint32_t c)
{
    indices.insert(indices.end(), {a, b, c});
}

void addArcTube(Surface& surface, const ArcTube& arc, const Facets& facets)
{
    std::uint32_t previous = 0;
    for (int i = 0; i <= facets.along; ++i) {
        const Vector3d outward = onCircle(arc.from + (arc.to - arc.from) * i / facets.along);
        const auto row = static_cast<std::uint32_t>(surface.vertexCount());
        for (int k = 0; k <= facets.around; ++k) {
            const double turn = arc.turnFrom + (arc.turnTo - arc.turnFrom) * k / facets.around;
            const Vector3d normal = std::cos(turn) * outward + std::sin(turn) * Vector3d::UnitZ();
            surface.addVertex(arc.radius * outward + arc.thickness * normal, normal);
        }
        if (i > 0) addStrip(surface, previous, row, facets.around);
        previous = row;
    }
}

void addCylinder(Surface& surface, const Vector3d& from, const Vector3d& to, double thickness,
                 int facetsAround)
{
    const Vector3d along = (to - from).normalized();
    const Vector3d u = along.unitOrthogonal();
    const Vector3d v = along.cross(u);
    std::array<std::uint32_t, 2> rows{};
    for (const std::size_t end : {0U, 1U}) {
        rows[end] = static_cast<std::uint32_t>(surface.vertexCount());
        for (int k = 0; k <= facetsAround; ++k) {
            const double turn = 2.0 * std::numbers::pi * k / facetsAround;
            const Vector3d normal = std::cos(turn) * u + std::sin(turn) * v;
            surface.addVertex((end == 0 ? from : to) + thickness * normal, normal);
        }
    }
    addStrip(surface, rows[1], rows[0], facetsAround);
    addCap(surface, from, -along, thickness, facetsAround);
    addCap(surface, to, along, thickness, facetsAround);
}

void addFlatArc(Surface& surface, const FlatArc& arc, int facetsAlong)
{
    std::array<std::uint32_t, 2> rows{};
    for (const std::size_t side : {0U, 1U}) {
        rows[side] = static_cast<std::uint32_t>(surface.vertexCount());
        const double radius = side == 0 ? arc.inner : arc.outer;
        for (int i = 0; i <= facetsAlong; ++i) {
            const double angle = arc.from + (arc.to - arc.from) * i / facetsAlong;
            surface.addVertex(radius * onCircle(angle) + arc.z * Vector3d::UnitZ(),
                              Vector3d::UnitZ());
        }
    }
    addStrip(surface, rows[0], rows[1], facetsAlong);
}

}  // namespace ui
