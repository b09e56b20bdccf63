// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QColor>

#include <Eigen/Geometry>
#include <Qt3DCore/QEntity>

#include "ui/stage/qt3d/stage_effect.h"
#include "ui/stage/qt3d/surface.h"

namespace Qt3DCore {
class QAttribute;
class QBuffer;
class QTransform;
}  // namespace Qt3DCore

namespace Qt3DRender {
class QGeometryRenderer;
}

namespace ui {

/// How a solid takes the light.
struct Finish {
    float shade = 1.0F;  ///< 0: the plain colour, as on paper; 1: fully lit
    float gloss = 0.0F;
    float fade = 0.0F;  ///< how far its distant half goes towards the background
};

/// One surface of one colour, standing somewhere: what the things on the stage are made of. Its
/// owner is the parent entity.
class Solid : public Qt3DCore::QEntity {
public:
    Solid(Qt3DCore::QEntity* parent, StageEffect* effect, const Finish& finish);

    /// The picture that follows may lack the new surface; the one after it has it.
    void setSurface(const Surface& surface);
    void setPose(const Eigen::Quaterniond& q_WS, const Eigen::Vector3d& origin_W);
    void setColour(const QColor& colour) { m_colour->setValue(colour); }
    /// Moves the whole surface outwards along its normals, in stage units.
    void setSwell(double distance) { m_swell->setValue(static_cast<float>(distance)); }

private:
    void createGeometry();

    Qt3DCore::QBuffer* m_vertices;  // these belong to the nodes they are part of
    Qt3DCore::QBuffer* m_indices;
    Qt3DCore::QAttribute* m_attributes[3] = {};  // place, normal, index
    Qt3DRender::QGeometryRenderer* m_renderer;
    Qt3DCore::QTransform* m_transform;
    Qt3DRender::QParameter* m_colour;
    Qt3DRender::QParameter* m_swell;
};

}  // namespace ui
