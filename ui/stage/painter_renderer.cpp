// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/painter_renderer.h"

#include <QLinearGradient>
#include <cmath>

#include "ui/stage/painter_parts.h"
#include "ui/stage/picking.h"

namespace ui {

using Eigen::Vector3d;

namespace {

constexpr double kBodyAxisWidth = 2.4;  // logical pixels
constexpr double kWorldAxisWidth = 1.6;

/// Two unit directions of the ground, right-handed with up.
std::pair<Vector3d, Vector3d> groundFrame(const Vector3d& up_W)
{
    const Vector3d first = std::abs(up_W.x()) < 0.5 ? Vector3d::UnitX() : Vector3d::UnitY();
    return {first, up_W.cross(first)};
}

Vector3d onGround(const Scene& scene, double radius, double angle)
{
    const auto [u, v] = groundFrame(scene.up_W);
    return scene.groundHeight * scene.up_W + radius * (std::cos(angle) * u + std::sin(angle) * v);
}

void line(const PaintContext& to, const Vector3d& from_W, const Vector3d& until_W)
{
    const auto from = to.projection.project(from_W);
    const auto until = to.projection.project(until_W);
    if (from && until) to.painter.drawLine(from->at, until->at);
}

void groundCircle(const PaintContext& to, double radius)
{
    constexpr int kCorners = 120;
    QPolygonF circle;
    for (int n = 0; n < kCorners; ++n)
        if (const auto p =
                to.projection.project(onGround(to.scene, radius, 2 * rotcore::kPi * n / kCorners)))
            circle << p->at;
    to.painter.drawPolygon(circle);
}

void paintGround(const PaintContext& to)
{
    const double radius = to.scene.groundRadius;
    const bool fromAbove = to.eye_W.dot(to.scene.up_W) > to.scene.groundHeight;
    const QColor hair = mixed(to.palette.ground, to.palette.groundLine, 0.45);
    to.painter.setPen(QPen(to.palette.groundLine, 1.0));
    to.painter.setBrush(fromAbove ? QBrush(to.palette.ground) : QBrush(Qt::NoBrush));
    groundCircle(to, radius);
    to.painter.setBrush(Qt::NoBrush);
    to.painter.setPen(QPen(hair, 1.0));
    groundCircle(to, radius / 3);
    groundCircle(to, radius * 2 / 3);
    to.painter.setPen(QPen(to.palette.groundLine, 1.0));
    for (int n = 0; n < 24; ++n) {
        const double angle = 2 * rotcore::kPi * n / 24;
        const double inner = n % 6 == 0 ? 0.93 : 0.965;
        line(to, onGround(to.scene, inner * radius, angle), onGround(to.scene, radius, angle));
    }
}

/// Dashes that shorten with distance, as something lying in the world does.
void dashes(const PaintContext& to, const Vector3d& from_W, const Vector3d& until_W)
{
    const double length = (until_W - from_W).norm();
    const int count = std::max(1, static_cast<int>(length / 0.1));
    for (int n = 0; n < count; ++n) {
        const double start = static_cast<double>(n) / count;
        const double end = (n + 0.58) / count;
        line(to, from_W + start * (until_W - from_W), from_W + end * (until_W - from_W));
    }
}

void paintWorldAxes(const PaintContext& to)
{
    const Vector3d centre = to.scene.groundHeight * to.scene.up_W;
    for (const AxisShape& axis : to.scene.axes) {
        if (axis.frame != AxisShape::Frame::world) continue;
        to.painter.setPen(
            QPen(to.palette.axis(axis.axis), kWorldAxisWidth, Qt::SolidLine, Qt::FlatCap));
        if (std::abs(axis.direction_W.dot(to.scene.up_W)) < 0.5) {
            dashes(to, centre, centre + axis.length * axis.direction_W);
        } else {
            const double outside = to.scene.rings[0].radius;
            dashes(to, centre, -outside * to.scene.up_W);
            dashes(to, outside * to.scene.up_W, axis.length * to.scene.up_W);
        }
    }
}

/// The part of each body axis that is outside the body, on one half.
void paintBodyAxes(const PaintContext& to, Half half)
{
    for (const AxisShape& axis : to.scene.axes) {
        if (axis.frame != AxisShape::Frame::body) continue;
        if (isFront(axis.direction_W, to.eye_W) != (half == Half::front)) continue;
        const double start = reachOfBody(to.scene, axis.direction_W);
        to.painter.setPen(
            QPen(to.palette.axis(axis.axis), kBodyAxisWidth, Qt::SolidLine, Qt::RoundCap));
        line(to, start * axis.direction_W, axis.length * axis.direction_W);
    }
}

void paintAll(const PaintContext& to)
{
    paintGround(to);
    paintWorldAxes(to);
    for (const int n : {0, 1, 2}) {
        paintPins(to, n, Half::back);
        paintRing(to, n, Half::back);
    }
    paintBodyAxes(to, Half::back);
    paintBody(to);
    paintBodyAxes(to, Half::front);
    for (const int n : {2, 1, 0}) {
        paintRing(to, n, Half::front);
        paintPins(to, n, Half::front);
    }
}

}  // namespace

QImage PainterRenderer::render(const Scene& scene, const Camera& camera, const QSize& size,
                               qreal pixelRatio, Scheme scheme)
{
    QImage image((QSizeF(size) * pixelRatio).toSize().expandedTo({1, 1}),
                 QImage::Format_ARGB32_Premultiplied);
    image.setDevicePixelRatio(pixelRatio);
    const Palette& palette = paletteOf(scheme);
    QPainter painter(&image);
    painter.setRenderHint(QPainter::Antialiasing);
    QLinearGradient backdrop(0, 0, 0, size.height());
    backdrop.setColorAt(0, palette.stageTop);
    backdrop.setColorAt(1, palette.stageBottom);
    painter.fillRect(QRectF(QPointF(), QSizeF(size)), backdrop);
    const Projection projection(camera, size);
    paintAll({painter, scene, projection, palette, eyeOf(camera)});
    return image;
}

}  // namespace ui
