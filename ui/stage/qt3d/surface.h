// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <cstdint>
#include <numbers>
#include <vector>

#include <Eigen/Core>

namespace ui {

/// Triangles with a normal at each vertex, as the graphics card takes them, in single precision.
struct Surface {
    std::vector<float> vertices;         ///< six a vertex: place, then unit normal
    std::vector<std::uint32_t> indices;  ///< three a triangle, counter-clockwise seen from outside

    std::uint32_t addVertex(const Eigen::Vector3d& at, const Eigen::Vector3d& normal);
    void addTriangle(std::uint32_t a, std::uint32_t b, std::uint32_t c);
    std::size_t vertexCount() const { return vertices.size() / kFloatsPerVertex; }

    static constexpr std::size_t kFloatsPerVertex = 6;
};

/// How finely something round is cut.
struct Facets {
    int along = 1;
    int around = 8;
};

/// A part of a torus about z: the circle of `radius` in the xy plane between two angles (radians,
/// from x towards y), as a tube of half width `thickness`. Around the tube it goes from `turnFrom`
/// to `turnTo` (radians, from outwards towards z).
struct ArcTube {
    double radius = 1.0;
    double thickness = 0.02;
    double from = 0.0;
    double to = 0.0;
    double turnFrom = 0.0;
    double turnTo = 2.0 * std::numbers::pi;
};
void addArcTube(Surface& surface, const ArcTube& arc, const Facets& facets);

/// A closed cylinder of half width `thickness` between two points that differ.
void addCylinder(Surface& surface, const Eigen::Vector3d& from, const Eigen::Vector3d& to,
                 double thickness, int facetsAround);

/// A part of a flat ring in the plane at height `z`, facing along z, between two angles as above.
struct FlatArc {
    double inner = 0.0;
    double outer = 1.0;
    double z = 0.0;
    double from = 0.0;
    double to = 0.0;
};
void addFlatArc(Surface& surface, const FlatArc& arc, int facetsAlong);

}  // namespace ui
