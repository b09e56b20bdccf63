// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QImage>
#include <QSize>

#include "ui/stage/camera.h"
#include "ui/stage/scene.h"

namespace ui {

/// Light or dark, as the desktop asks.
enum class Scheme { light, dark };

/// Draws what has a surface: ground, rings, pins, body, axis lines. Labels, arcs and handles are
/// painted over the picture by the stage's overlay, in logical pixels, whichever renderer drew it.
class StageRenderer {
public:
    virtual ~StageRenderer() = default;
    StageRenderer() = default;
    StageRenderer(const StageRenderer&) = delete;
    StageRenderer& operator=(const StageRenderer&) = delete;

    /// `size` in logical pixels; the image has size * pixelRatio pixels and its devicePixelRatio
    /// set. A null image says that this renderer cannot draw here (no OpenGL); the caller then
    /// takes the other one.
    virtual QImage render(const Scene& scene, const Camera& camera, const QSize& size,
                          qreal pixelRatio, Scheme scheme) = 0;
};

}  // namespace ui
