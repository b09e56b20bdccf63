// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include "ui/stage/stage_renderer.h"

namespace ui {

/// The stage by the painter's algorithm, without OpenGL: what is farther is drawn first. The rings
/// lie on spheres about the body's centre, so that the order outer to inner behind it and inner to
/// outer before it is exact.
class PainterRenderer : public StageRenderer {
public:
    QImage render(const Scene& scene, const Camera& camera, const QSize& size, qreal pixelRatio,
                  Scheme scheme) override;
};

}  // namespace ui
