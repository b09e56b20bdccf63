// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <memory>

#include "ui/stage/stage_renderer.h"

namespace ui {

/// Draws the stage with Qt3D and OpenGL, offscreen. Needs a QGuiApplication and what
/// prepareOpenGl() sets; build one only where openGlWorks().
class Qt3dRenderer : public StageRenderer {
public:
    Qt3dRenderer();
    ~Qt3dRenderer() override;

    QImage render(const Scene& scene, const Camera& camera, const QSize& size, qreal pixelRatio,
                  Scheme scheme) override;

private:
    class Things;  // keeps Qt3D out of this header
    std::unique_ptr<Things> m_things;
};

}  // namespace ui
