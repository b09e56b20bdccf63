// SPDX-License-Identifier: GPL-3.0-or-later
#include <cmath>

#include "ui/stage/scene.h"

namespace ui {

using Eigen::Vector3d;

namespace {

using Material = Mesh::Material;

/// Builds a mesh of convex parts, each of them beside its neighbours and none inside another.
class PartBuilder {
public:
    explicit PartBuilder(Mesh& mesh) : m_mesh(mesh) {}

    /// Six faces; `slant` moves the top face's edge at +x back by that much.
    void box(Material material, const Vector3d& low, const Vector3d& high, double slant = 0.0)
    {
        begin(material);
        const auto corner = [&](int bits) {
            Vector3d at((bits & 1) != 0 ? high.x() : low.x(), (bits & 2) != 0 ? high.y() : low.y(),
                        (bits & 4) != 0 ? high.z() : low.z());
            if ((bits & 5) == 5) at.x() -= slant;
            return at;
        };
        constexpr std::array<std::array<int, 4>, 6> kFaces{
            {{0, 4, 6, 2}, {1, 3, 7, 5}, {0, 1, 5, 4}, {2, 6, 7, 3}, {0, 2, 3, 1}, {4, 5, 7, 6}}};
        for (const auto& face : kFaces)
            quad(corner(face[0]), corner(face[1]), corner(face[2]), corner(face[3]));
    }

    /// A round part along x or z (`along`), closed at both ends.
    void frustum(Material material, const Vector3d& from, rotcore::Axis along, double length,
                 double radiusFrom, double radiusTo)
    {
        begin(material);
        constexpr int kSides = 20;
        const Vector3d axis = rotcore::unitVector(along);
        const Vector3d u = rotcore::unitVector(rotcore::axisAt(rotcore::indexOf(along) + 1));
        const Vector3d v = axis.cross(u);
        const Vector3d to = from + length * axis;
        for (int n = 0; n < kSides; ++n) {
            const double a = 2 * rotcore::kPi * n / kSides;
            const double b = 2 * rotcore::kPi * (n + 1) / kSides;
            const Vector3d da = std::cos(a) * u + std::sin(a) * v;
            const Vector3d db = std::cos(b) * u + std::sin(b) * v;
            quad(from + radiusFrom * da, from + radiusFrom * db, to + radiusTo * db,
                 to + radiusTo * da);
            triangle(to, to + radiusTo * da, to + radiusTo * db);
            triangle(from, from + radiusFrom * db, from + radiusFrom * da);
        }
    }

private:
    void begin(Material material) { m_mesh.parts.push_back(material); }
    void triangle(const Vector3d& a, const Vector3d& b, const Vector3d& c)
    {
        m_mesh.triangles.push_back({{a, b, c},
                                    (b - a).cross(c - a).normalized(),
                                    static_cast<int>(m_mesh.parts.size()) - 1});
    }
    void quad(const Vector3d& a, const Vector3d& b, const Vector3d& c, const Vector3d& d)
    {
        triangle(a, b, c);
        triangle(a, c, d);
    }

    Mesh& m_mesh;
};

}  // namespace

std::shared_ptr<const Mesh> scannerHead()
{
    using rotcore::Axis;
    auto mesh = std::make_shared<Mesh>();
    PartBuilder add(*mesh);
    add.box(Material::housing, {-0.46, -0.26, -0.24}, {0.28, 0.26, 0.24});
    add.box(Material::metal, {-0.36, -0.16, 0.24}, {0.14, 0.16, 0.33}, 0.12);    // roof
    add.frustum(Material::dark, {0.28, 0.0, -0.02}, Axis::x, 0.38, 0.17, 0.22);  // snout
    add.frustum(Material::dark, {0.66, 0.0, -0.02}, Axis::x, 0.09, 0.235, 0.235);
    add.frustum(Material::glass, {0.75, 0.0, -0.02}, Axis::x, 0.012, 0.18, 0.18);
    add.frustum(Material::dark, {-0.22, 0.0, 0.33}, Axis::z, 0.34, 0.042, 0.036);  // mast
    add.frustum(Material::metal, {-0.22, 0.0, 0.67}, Axis::z, 0.13, 0.085, 0.06);
    add.box(Material::metal, {-0.2, 0.26, -0.18}, {0.16, 0.5, 0.1});  // pod
    add.box(Material::glass, {-0.14, 0.5, -0.13}, {0.1, 0.515, 0.05});
    add.box(Material::dark, {-0.53, -0.2, -0.18}, {-0.46, -0.04, 0.18});  // cooling fins
    add.box(Material::dark, {-0.53, 0.04, -0.18}, {-0.46, 0.2, 0.18});
    add.box(Material::dark, {-0.34, -0.2, -0.3}, {0.02, 0.1, -0.24});  // foot
    mesh->tips = {{{0.762, 0.0, -0.02}, "snout"},
                  {{-0.22, 0.0, 0.8}, "mast"},
                  {{-0.02, 0.515, -0.04}, "pod"}};
    return mesh;
}

}  // namespace ui
