// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d/solid.h"

#include <QByteArray>

#include <Qt3DCore/QAttribute>
#include <Qt3DCore/QBuffer>
#include <Qt3DCore/QGeometry>
#include <Qt3DCore/QTransform>
#include <Qt3DRender/QGeometryRenderer>
#include <Qt3DRender/QMaterial>

#include "ui/stage/qt3d/to_qt.h"

namespace ui {

using Qt3DCore::QAttribute;

namespace {

template <class T>
QByteArray bytesOf(const std::vector<T>& numbers)
{
    return QByteArray(reinterpret_cast<const char*>(numbers.data()),
                      static_cast<qsizetype>(numbers.size() * sizeof(T)));
}

Qt3DRender::QParameter* addParameter(Qt3DRender::QMaterial* material, const char* name,
                                     const QVariant& value)
{
    auto* parameter = new Qt3DRender::QParameter(QString::fromLatin1(name), value, material);
    material->addParameter(parameter);
    return parameter;
}

}  // namespace

Solid::Solid(Qt3DCore::QEntity* parent, StageEffect* effect, const Finish& finish)
    : Qt3DCore::QEntity(parent),
      m_vertices(nullptr),
      m_indices(nullptr),
      m_renderer(new Qt3DRender::QGeometryRenderer(this)),
      m_transform(new Qt3DCore::QTransform(this))
{
    createGeometry();
    auto* material = new Qt3DRender::QMaterial(this);
    material->setEffect(effect);
    m_colour = addParameter(material, "colour", QColor(Qt::gray));
    m_swell = addParameter(material, "swell", 0.0F);
    addParameter(material, "shade", finish.shade);
    addParameter(material, "gloss", finish.gloss);
    addParameter(material, "fade", finish.fade);
    addComponent(m_renderer);
    addComponent(material);
    addComponent(m_transform);
}

void Solid::createGeometry()
{
    auto* geometry = new Qt3DCore::QGeometry(m_renderer);
    m_vertices = new Qt3DCore::QBuffer(geometry);
    m_indices = new Qt3DCore::QBuffer(geometry);
    constexpr uint kStride = Surface::kFloatsPerVertex * sizeof(float);
    for (const uint part : {0U, 1U}) {
        m_attributes[part] =
            new QAttribute(m_vertices,
                           part == 0 ? QAttribute::defaultPositionAttributeName()
                                     : QAttribute::defaultNormalAttributeName(),
                           QAttribute::Float, 3, 0, part * 3 * static_cast<uint>(sizeof(float)),
                           kStride, geometry);
    }
    m_attributes[2] = new QAttribute(m_indices, QAttribute::UnsignedInt, 1, 0, 0, 0, geometry);
    m_attributes[2]->setAttributeType(QAttribute::IndexAttribute);
    for (QAttribute* attribute : m_attributes)
        geometry->addAttribute(attribute);
    m_renderer->setGeometry(geometry);
    m_renderer->setPrimitiveType(Qt3DRender::QGeometryRenderer::Triangles);
}

void Solid::setSurface(const Surface& surface)
{
    m_vertices->setData(bytesOf(surface.vertices));
    m_indices->setData(bytesOf(surface.indices));
    const auto vertices = static_cast<uint>(surface.vertexCount());
    m_attributes[0]->setCount(vertices);
    m_attributes[1]->setCount(vertices);
    m_attributes[2]->setCount(static_cast<uint>(surface.indices.size()));
    m_renderer->setVertexCount(static_cast<int>(surface.indices.size()));
    setEnabled(!surface.indices.empty());
}

void Solid::setPose(const Eigen::Quaterniond& q_WS, const Eigen::Vector3d& origin_W)
{
    m_transform->setRotation(toQt(q_WS));
    m_transform->setTranslation(toQt(origin_W));
}

}  // namespace ui
