// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <memory>

#include "ui/stage/qt3d/solid.h"
#include "ui/stage/scene.h"
#include "ui/stage/stage_renderer.h"

namespace ui {

/// The Qt3D side of the body: one solid for each material of its mesh.
class BodyEntity {
public:
    /// The nodes belong to `parent`.
    BodyEntity(Qt3DCore::QEntity* parent, StageEffect* effect);

    /// Without a mesh nothing is shown. True if a surface changed, so that the next picture may be
    /// incomplete.
    bool show(const std::shared_ptr<const Mesh>& mesh, const Eigen::Quaterniond& q_WB,
              Scheme scheme);

private:
    std::array<Solid*, 4> m_solids;  ///< in the order of Mesh::Material
    std::shared_ptr<const Mesh> m_mesh;
};

}  // namespace ui
