// SPDX-License-Identifier: GPL-3.0-or-later
#include <cmath>

#include "ui/stage/painter_parts.h"
#include "ui/stage/picking.h"

namespace ui {

using Eigen::Vector3d;

namespace {

constexpr int kSegments = 144;
constexpr int kTicks = 24;                                    // one every 15 degrees
constexpr std::array<double, 3> kTubes{0.036, 0.031, 0.026};  // half widths, stage units
constexpr double kEmphasis = 1.35;
constexpr double kPinOverhang = 0.2;  // of the outer ring's pins, stage units

double tubeOf(const RingShape& ring, int n)
{
    return kTubes[static_cast<std::size_t>(n)] * (ring.hovered || ring.dragged ? kEmphasis : 1.0);
}

/// Pixels per stage unit at a depth.
double scaleAt(const Projection& projection, double depth)
{
    return projection.projectionMatrix()(1, 1) * projection.size().height() / 2 / depth;
}

struct Station {
    QPointF at;
    QPointF aside;  // unit, at right angles to the ring on the picture
    double halfWidth = 0.0;
};

/// The ring at one angle; nothing where it is seen exactly along its direction or is behind the
/// viewer.
std::optional<Station> stationOf(const PaintContext& to, const RingShape& ring, double tube,
                                 double angle)
{
    constexpr double kStep = 1e-3;
    const auto here = to.projection.project(pointOn(ring, angle));
    const auto before = to.projection.project(pointOn(ring, angle - kStep));
    const auto after = to.projection.project(pointOn(ring, angle + kStep));
    if (!here || !before || !after) return std::nullopt;
    const QPointF along = after->at - before->at;
    const double length = std::hypot(along.x(), along.y());
    if (length < 1e-9) return std::nullopt;
    return Station{here->at, QPointF(-along.y(), along.x()) / length,
                   tube * scaleAt(to.projection, here->depth)};
}

/// The angles of the ring's plane between which it is on the asked half.
std::pair<double, double> spanOf(const PaintContext& to, const RingShape& ring, Half half)
{
    const Vector3d eye_R = ring.q_WR.conjugate() * to.eye_W;
    const double middle =
        std::atan2(eye_R.y(), eye_R.x()) + (half == Half::front ? 0.0 : rotcore::kPi);
    return {middle - rotcore::kPi / 2, middle + rotcore::kPi / 2};
}

using Stations = std::vector<Station>;

Stations stationsOf(const PaintContext& to, const RingShape& ring, double tube, Half half)
{
    const auto [from, until] = spanOf(to, ring, half);
    constexpr int kCount = kSegments / 2;
    Stations stations;
    for (int n = 0; n <= kCount; ++n)
        if (const auto s = stationOf(to, ring, tube, from + (until - from) * n / kCount))
            stations.push_back(*s);
    return stations;
}

/// A strip along the stations between two offsets across it, each of the half width.
void fillStrip(QPainter& painter, const Stations& stations, double low, double high, double margin,
               const QColor& colour)
{
    QPolygonF outline;
    for (const Station& s : stations)
        outline << s.at + s.aside * (low * s.halfWidth - margin);
    for (auto s = stations.rbegin(); s != stations.rend(); ++s)
        outline << s->at + s->aside * (high * s->halfWidth + margin);
    painter.setPen(Qt::NoPen);
    painter.setBrush(colour);
    painter.drawPolygon(outline, Qt::WindingFill);
}

/// A gleam along the side towards the light at the upper left, which makes the band round.
void fillGleam(QPainter& painter, const Stations& stations, const QColor& colour)
{
    const QPointF light(-0.6, -0.8);
    QPolygonF outline;
    const auto offset = [&](const Station& s, double share) {
        return s.at + s.aside * (share * s.halfWidth * QPointF::dotProduct(s.aside, light));
    };
    for (const Station& s : stations)
        outline << offset(s, 0.3);
    for (auto s = stations.rbegin(); s != stations.rend(); ++s)
        outline << offset(*s, 0.78);
    painter.setPen(Qt::NoPen);
    painter.setBrush(colour);
    painter.drawPolygon(outline, Qt::WindingFill);
}

/// Each axis has ticks of its own: x one bar, y two, z a dot.
void paintTick(const PaintContext& to, const RingShape& ring, double tube, double angle,
               const QColor& colour)
{
    const auto s = stationOf(to, ring, tube, angle);
    if (!s) return;
    const bool quarter = std::abs(std::sin(2 * angle)) < 1e-6;
    to.painter.setPen(QPen(colour, quarter ? 2.0 : 1.2, Qt::SolidLine, Qt::FlatCap));
    const auto bar = [&](double offset) {
        if (const auto b = stationOf(to, ring, tube, angle + offset))
            to.painter.drawLine(b->at - b->aside * b->halfWidth * 0.8,
                                b->at + b->aside * b->halfWidth * 0.8);
    };
    switch (ring.axis) {
        case rotcore::Axis::x:
            bar(0.0);
            break;
        case rotcore::Axis::y:
            bar(-0.016);
            bar(0.016);
            break;
        case rotcore::Axis::z:
            to.painter.setPen(Qt::NoPen);
            to.painter.setBrush(colour);
            to.painter.drawEllipse(s->at, s->halfWidth * (quarter ? 0.62 : 0.4),
                                   s->halfWidth * (quarter ? 0.62 : 0.4));
            break;
    }
}

void paintTicks(const PaintContext& to, const RingShape& ring, double tube, Half half,
                const QColor& colour)
{
    constexpr double kCrowded = 5.0;  // pixels between neighbours, below which ticks only blur
    const double step = 2 * rotcore::kPi / kTicks;
    for (int n = 0; n < kTicks; ++n) {
        const double angle = n * step;
        if (isFront(pointOn(ring, angle), to.eye_W) != (half == Half::front)) continue;
        const auto here = to.projection.project(pointOn(ring, angle - step / 4));
        const auto next = to.projection.project(pointOn(ring, angle + step / 4));
        if (!here || !next) continue;
        const QPointF gap = next->at - here->at;
        if (std::hypot(gap.x(), gap.y()) * 2 >= kCrowded) paintTick(to, ring, tube, angle, colour);
    }
}

}  // namespace

void paintRing(const PaintContext& to, int n, Half half)
{
    const RingShape& ring = to.scene.rings[static_cast<std::size_t>(n)];
    const double tube = tubeOf(ring, n);
    const Stations stations = stationsOf(to, ring, tube, half);
    const QColor base = to.palette.axis(ring.axis);
    if (half == Half::back) {
        QColor pale = base;
        pale.setAlphaF(0.4F);
        fillStrip(to.painter, stations, -0.9, 0.9, 0.0, pale);
        QColor tick = to.palette.stageTop;
        tick.setAlphaF(0.6F);
        paintTicks(to, ring, tube, half, tick);
        return;
    }
    if (ring.hovered || ring.dragged) {
        QColor halo = base;
        halo.setAlphaF(0.22F);
        fillStrip(to.painter, stations, -1.0, 1.0, 5.0, halo);
    }
    fillStrip(to.painter, stations, -1.0, 1.0, 0.5, mixed(base, Qt::black, 0.3));
    fillStrip(to.painter, stations, -1.0, 1.0, -0.4, base);
    fillGleam(to.painter, stations, mixed(base, Qt::white, 0.28));
    paintTicks(to, ring, tube, half, mixed(to.palette.sheet, base, 0.08));
}

void paintPins(const PaintContext& to, int n, Half half)
{
    const RingShape& ring = to.scene.rings[static_cast<std::size_t>(n)];
    const double holder = n == 0 ? ring.radius + kPinOverhang
                                 : to.scene.rings[static_cast<std::size_t>(n) - 1].radius;
    const double tube = kTubes[static_cast<std::size_t>(n)];
    for (const double side : {-1.0, 1.0}) {
        const Vector3d direction = side * ring.pin_W;
        if (isFront(direction, to.eye_W) != (half == Half::front)) continue;
        const auto from = to.projection.project((ring.radius - 1.6 * tube) * direction);
        const auto until = to.projection.project((holder + (n == 0 ? 0.0 : tube)) * direction);
        if (!from || !until) continue;
        const double width = 2.6 * tube * scaleAt(to.projection, from->depth);
        const QColor base = to.palette.axis(ring.axis);
        QColor edge = mixed(base, Qt::black, 0.5);
        QColor core = mixed(base, Qt::white, 0.35);
        if (half == Half::back) {
            edge = mixed(edge, to.palette.stageBottom, 0.35);
            core = mixed(core, to.palette.stageBottom, 0.35);
        }
        to.painter.setPen(QPen(edge, width, Qt::SolidLine, Qt::FlatCap));
        to.painter.drawLine(from->at, until->at);
        to.painter.setPen(QPen(core, width * 0.3, Qt::SolidLine, Qt::FlatCap));
        to.painter.drawLine(from->at, until->at);
    }
}

}  // namespace ui
