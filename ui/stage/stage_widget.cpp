// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/stage_widget.h"

#include <QPainter>
#include <algorithm>

#include "ui/stage/painter_renderer.h"
#include "ui/stage/palette.h"
#include "ui/stage/stage_words.h"

namespace ui {

namespace {

constexpr int kRestDelay = 150;  // ms after the last change until the picture is drawn well
constexpr qreal kSupersampling = 2.0;
constexpr double kMostElevation = 1.5;  // radians; at the pole there is no way up
constexpr double kNearest = 4.5;        // stage units; the rig stays in front of the viewer
constexpr double kFarthest = 24.0;

}  // namespace

StageWidget::StageWidget(CaseModel& model, std::unique_ptr<StageRenderer> renderer, QWidget* parent)
    : QWidget(parent), m_model(model), m_renderer(std::move(renderer))
{
    if (!m_renderer) m_renderer = std::make_unique<PainterRenderer>();
    setFocusPolicy(Qt::StrongFocus);
    setMouseTracking(true);
    setAttribute(Qt::WA_OpaquePaintEvent);
    setAccessibleName(tr("Stage"));
    setAccessibleDescription(
        tr("The body in its three rings. 1, 2, 3 choose a ring, Left and Right turn it."));
    m_rest.setSingleShot(true);
    m_rest.setInterval(kRestDelay);
    connect(&m_rest, &QTimer::timeout, this, [this] {
        m_image = {};
        update();
    });
    connect(&m_model, &CaseModel::findingsChanged, this, &StageWidget::present);
    connect(&m_model, &CaseModel::viewChanged, this, &StageWidget::present);
    present();
}

StageWidget::~StageWidget()
{
    if (m_editing) m_model.endGesture();
}

void StageWidget::setRenderer(std::unique_ptr<StageRenderer> renderer)
{
    m_renderer = std::move(renderer);
    if (!m_renderer) m_renderer = std::make_unique<PainterRenderer>();
    changed();
}

void StageWidget::setScheme(Scheme scheme)
{
    if (scheme == m_scheme) return;
    m_scheme = scheme;
    changed();
}

void StageWidget::setCamera(const Camera& camera)
{
    m_camera = camera;
    m_camera.elevation = std::clamp(camera.elevation, -kMostElevation, kMostElevation);
    m_camera.distance = std::clamp(camera.distance, kNearest, kFarthest);
    m_camera.up_W = m_scene.up_W;
    changed();
}

void StageWidget::resetCamera()
{
    setCamera(Camera{});
}

void StageWidget::present()
{
    Pointing shown = m_pointing;
    if (!shown.hoveredRing && !shown.draggedRing && hasFocus()) shown.hoveredRing = m_chosen;
    m_scene = sceneOf(m_model.findings(), m_model.view(), shown);
    m_camera.up_W = m_scene.up_W;
    changed();
    const QString words = hint();
    if (words == m_hintTold) return;
    m_hintTold = words;
    emit hintChanged(words);
}

void StageWidget::point(const Pointing& pointing)
{
    const bool sameRing = pointing.hoveredRing == m_pointing.hoveredRing &&
                          pointing.draggedRing == m_pointing.draggedRing;
    if (sameRing && pointing.overBody == m_pointing.overBody) return;
    m_pointing = pointing;
    if (pointing.draggedRing || std::holds_alternative<Arcball>(m_grip))
        setCursor(Qt::ClosedHandCursor);
    else if (pointing.hoveredRing || pointing.overBody)
        setCursor(Qt::OpenHandCursor);
    else
        unsetCursor();
    present();
    if (sameRing) return;
    const auto ring = pointing.draggedRing ? pointing.draggedRing : pointing.hoveredRing;
    emit ringPointedAt(ring ? m_scene.rings.at(static_cast<std::size_t>(*ring)).listed : -1);
}

QString StageWidget::hint() const
{
    return hintText(m_scene, m_pointing);
}

void StageWidget::changed()
{
    m_image = {};
    m_rest.start();
    update();
}

QImage StageWidget::rendered(const QSize& size, qreal ratio, bool fine)
{
    const qreal sampled = fine ? ratio * kSupersampling : ratio;
    QImage image = m_renderer->render(m_scene, m_camera, size, sampled, m_scheme);
    if (image.isNull()) {
        m_renderer = std::make_unique<PainterRenderer>();
        emit rendererFailed();
        image = m_renderer->render(m_scene, m_camera, size, sampled, m_scheme);
    }
    if (fine) {
        image = image.scaled((QSizeF(size) * ratio).toSize(), Qt::IgnoreAspectRatio,
                             Qt::SmoothTransformation);
        image.setDevicePixelRatio(ratio);
    }
    return image;
}

QImage StageWidget::picture(const QSize& size, qreal ratio)
{
    const Scene held = m_scene;
    m_scene = sceneOf(m_model.findings(), m_model.view());
    QImage image = rendered(size, ratio, true).convertToFormat(QImage::Format_ARGB32_Premultiplied);
    QPainter painter(&image);
    painter.setFont(font());
    paintOverlay(painter, m_scene, Projection(m_camera, size), m_scheme, {});
    m_scene = held;
    return image;
}

void StageWidget::paintEvent(QPaintEvent* /*event*/)
{
    if (m_image.isNull()) m_image = rendered(size(), devicePixelRatioF(), isResting());
    QPainter painter(this);
    painter.drawImage(QPointF(), m_image);
    painter.setFont(font());
    paintOverlay(painter, m_scene, projection(), m_scheme, {hint(), sweep()});
    if (!hasFocus() || !m_byKeys) return;
    painter.setPen(QPen(paletteOf(m_scheme).accent, 2.0));
    painter.setBrush(Qt::NoBrush);
    painter.drawRect(QRectF(rect()).adjusted(1, 1, -1, -1));
}

void StageWidget::resizeEvent(QResizeEvent* /*event*/)
{
    changed();
}

std::optional<SweepMark> StageWidget::sweep() const
{
    if (const auto* turn = std::get_if<RingTurn>(&m_grip)) {
        const RingDrag& drag = turn->drag;
        return SweepMark{drag.pin_W(), drag.grabbed_W(), drag.turned(), turn->ring, turn->pointer};
    }
    if (!m_pointing.hoveredRing || !m_hovered_W) return std::nullopt;
    const int n = *m_pointing.hoveredRing;
    const RingShape& ring = m_scene.rings.at(static_cast<std::size_t>(n));
    return SweepMark{ring.pin_W, *m_hovered_W, std::nullopt, n, {}};
}

}  // namespace ui
