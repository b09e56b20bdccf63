// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QColor>
#include <QImage>
#include <QOffscreenSurface>
#include <array>

#include <Qt3DCore/QAspectEngine>
#include <Qt3DCore/QEntity>
#include <Qt3DRender/QCamera>

#include "ui/stage/camera.h"

namespace Qt3DRender {
class QClearBuffers;
class QRenderCapture;
class QRenderSurfaceSelector;
class QSubtreeEnabler;
class QTexture2D;
}  // namespace Qt3DRender

namespace ui {

/// A Qt3D engine that draws into a texture when asked, in the caller's thread and without an event
/// loop.
class OffscreenEngine {
public:
    OffscreenEngine();
    ~OffscreenEngine();
    OffscreenEngine(const OffscreenEngine&) = delete;
    OffscreenEngine& operator=(const OffscreenEngine&) = delete;

    /// The parent of everything drawn; it belongs to the engine.
    Qt3DCore::QEntity* root() const { return m_root; }

    void setView(const Projection& projection);
    /// Its alpha is what the picture has where nothing is drawn.
    void setClearColour(const QColor& colour);

    /// Null if the picture does not come, as without OpenGL. The first one after a surface has
    /// changed may lack that surface.
    QImage capture(const QSize& pixels);

private:
    void createFrameGraph();
    Qt3DCore::QNode* createTarget(Qt3DCore::QNode* parent);

    QOffscreenSurface m_surface;
    Qt3DCore::QAspectEngine m_engine;
    Qt3DCore::QEntity* m_root;  // this and all below belong to the engine
    Qt3DRender::QCamera* m_camera;
    Qt3DRender::QRenderSurfaceSelector* m_selector = nullptr;
    std::array<Qt3DRender::QTexture2D*, 2> m_textures{};  ///< colour, depth
    Qt3DRender::QClearBuffers* m_clear = nullptr;
    Qt3DRender::QSubtreeEnabler* m_drawing = nullptr;
    Qt3DRender::QRenderCapture* m_capture = nullptr;
    bool m_started = false;
};

}  // namespace ui
