// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d_renderer.h"

#include <algorithm>
#include <array>
#include <vector>

#include "ui/stage/palette.h"
#include "ui/stage/qt3d/axis_entity.h"
#include "ui/stage/qt3d/body_entity.h"
#include "ui/stage/qt3d/ground_entity.h"
#include "ui/stage/qt3d/offscreen_engine.h"
#include "ui/stage/qt3d/ring_entity.h"

namespace ui {

namespace {

// Stage units.
constexpr std::array<double, 3> kTubes{0.036, 0.031, 0.026};  // half widths of the rings
constexpr double kOuterPinLength = 0.2;

/// Whether a pixel is one that was drawn or cleared by us: a picture that failed is all zero or all
/// opaque.
bool isOurs(QRgb pixel)
{
    return qAlpha(pixel) == kDrawnAlpha || (qAlpha(pixel) == 0 && pixel != 0);
}

bool wasDrawn(const QImage& picture)
{
    const int right = picture.width() - 1;
    const int bottom = picture.height() - 1;
    return isOurs(picture.pixel(0, 0)) && isOurs(picture.pixel(right, 0)) &&
           isOurs(picture.pixel(0, bottom)) && isOurs(picture.pixel(right, bottom));
}

/// Puts the stage's gradient behind what was drawn and makes the picture opaque.
void fillBackground(QImage& picture, const Palette& palette)
{
    for (int y = 0; y < picture.height(); ++y) {
        const double share = (y + 0.5) / picture.height();
        const QRgb behind = mixed(palette.stageTop, palette.stageBottom, share).rgb();
        auto* line = reinterpret_cast<QRgb*>(picture.scanLine(y));
        std::transform(line, line + picture.width(), line, [behind](QRgb pixel) {
            return qAlpha(pixel) == 0 ? behind : pixel | 0xff000000U;
        });
    }
}

}  // namespace

/// The engine and what stands in it.
class Qt3dRenderer::Things {
public:
    struct Format {
        QSize logical;
        QSize pixels;
    };

    Things();

    /// Null if the engine gives no picture.
    QImage draw(const Scene& scene, const Camera& camera, const Format& format, Scheme scheme);

private:
    /// True if a surface changed.
    bool show(const Scene& scene, const Camera& camera, Scheme scheme);
    bool showAxes(const Scene& scene, Scheme scheme);

    OffscreenEngine m_engine;
    StageEffect* m_effect;  // belongs to the engine's root
    GroundEntity m_ground;
    std::array<RingEntity, 3> m_rings;
    BodyEntity m_body;
    std::vector<AxisEntity> m_axes;
};

Qt3dRenderer::Things::Things()
    : m_effect(new StageEffect(m_engine.root())),
      m_ground(m_engine.root(), m_effect),
      m_rings{RingEntity(m_engine.root(), m_effect), RingEntity(m_engine.root(), m_effect),
              RingEntity(m_engine.root(), m_effect)},
      m_body(m_engine.root(), m_effect)
{
}

QImage Qt3dRenderer::Things::draw(const Scene& scene, const Camera& camera, const Format& format,
                                  Scheme scheme)
{
    const Palette& palette = paletteOf(scheme);
    QColor middle = mixed(palette.stageTop, palette.stageBottom, 0.5);
    m_effect->setBackground(middle);
    middle.setAlpha(0);
    m_engine.setClearColour(middle);
    m_engine.setView(Projection(camera, QSizeF(format.logical)));
    if (show(scene, camera, scheme))
        m_engine.capture(format.pixels);  // incomplete; the next one is not
    return m_engine.capture(format.pixels);
}

bool Qt3dRenderer::Things::show(const Scene& scene, const Camera& camera, Scheme scheme)
{
    bool changed = m_ground.show({.height = scene.groundHeight,
                                  .radius = scene.groundRadius,
                                  .up_W = scene.up_W,
                                  .fromAbove = eyeOf(camera).dot(scene.up_W) > scene.groundHeight},
                                 scheme);
    double reach = scene.rings[0].radius + kOuterPinLength;
    for (std::size_t i = 0; i < m_rings.size(); ++i) {
        changed |= m_rings[i].show(scene.rings[i], {kTubes[i], reach}, scheme);
        reach = scene.rings[i].radius;
    }
    changed |= m_body.show(scene.body, scene.q_WB, scheme);
    changed |= showAxes(scene, scheme);
    return changed;
}

bool Qt3dRenderer::Things::showAxes(const Scene& scene, Scheme scheme)
{
    const std::size_t count = scene.axes.size();
    while (m_axes.size() < count)
        m_axes.emplace_back(m_engine.root(), m_effect);
    bool changed = false;
    for (std::size_t i = 0; i < count; ++i) {
        changed |= m_axes[i].show(scene.axes[i], scene, scheme);
    }
    for (std::size_t i = count; i < m_axes.size(); ++i)
        m_axes[i].hide();
    return changed;
}

Qt3dRenderer::Qt3dRenderer() : m_things(std::make_unique<Things>()) {}

Qt3dRenderer::~Qt3dRenderer() = default;

QImage Qt3dRenderer::render(const Scene& scene, const Camera& camera, const QSize& size,
                            qreal pixelRatio, Scheme scheme)
{
    const QSize pixels = (QSizeF(size) * pixelRatio).toSize();
    if (pixels.isEmpty()) return {};
    QImage picture = m_things->draw(scene, camera, {size, pixels}, scheme);
    if (picture.isNull() || picture.depth() != 32 || !wasDrawn(picture)) return {};
    fillBackground(picture, paletteOf(scheme));
    picture.setDevicePixelRatio(pixelRatio);
    return picture;
}

}  // namespace ui
