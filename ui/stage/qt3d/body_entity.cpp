// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d/body_entity.h"

#include "ui/stage/palette.h"

namespace ui {

namespace {

constexpr std::array kMaterials{Mesh::Material::housing, Mesh::Material::dark,
                                Mesh::Material::metal, Mesh::Material::glass};

Finish finishOf(Mesh::Material material)
{
    switch (material) {
        case Mesh::Material::housing:
            return {.shade = 1.0F, .gloss = 0.06F};
        case Mesh::Material::dark:
            return {.shade = 1.0F, .gloss = 0.12F};
        case Mesh::Material::metal:
            return {.shade = 1.0F, .gloss = 0.30F};
        case Mesh::Material::glass:
            return {.shade = 0.8F, .gloss = 0.60F};
    }
    return {};
}

Surface surfaceOf(const Mesh& mesh, Mesh::Material material)
{
    Surface surface;
    for (const Mesh::Triangle& triangle : mesh.triangles) {
        if (mesh.parts.at(static_cast<std::size_t>(triangle.part)) != material) continue;
        std::array<std::uint32_t, 3> corners{};
        for (std::size_t i = 0; i < 3; ++i) {
            corners[i] = surface.addVertex(triangle.vertices[i], triangle.normal);
        }
        surface.addTriangle(corners[0], corners[1], corners[2]);
    }
    return surface;
}

}  // namespace

BodyEntity::BodyEntity(Qt3DCore::QEntity* parent, StageEffect* effect) : m_solids{}
{
    for (std::size_t i = 0; i < kMaterials.size(); ++i) {
        m_solids[i] = new Solid(parent, effect, finishOf(kMaterials[i]));
        m_solids[i]->setEnabled(false);
    }
}

bool BodyEntity::show(const std::shared_ptr<const Mesh>& mesh, const Eigen::Quaterniond& q_WB,
                      Scheme scheme)
{
    const bool rebuilt = mesh != m_mesh;
    for (std::size_t i = 0; i < kMaterials.size(); ++i) {
        if (rebuilt) m_solids[i]->setSurface(mesh ? surfaceOf(*mesh, kMaterials[i]) : Surface{});
        m_solids[i]->setColour(paletteOf(scheme).material(kMaterials[i]));
        m_solids[i]->setPose(q_WB, Eigen::Vector3d::Zero());
    }
    m_mesh = mesh;
    return rebuilt;
}

}  // namespace ui
