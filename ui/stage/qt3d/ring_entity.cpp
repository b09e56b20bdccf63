// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d/ring_entity.h"

#include <numbers>

#include "ui/stage/palette.h"

namespace ui {

using Eigen::Vector3d;

namespace {

// The tube and its pins, from the tube's half width; the pins start inside the ring.
constexpr double kTickRise = 0.05;
constexpr double kPinWidth = 1.3;
constexpr double kPinRoot = 1.6;
constexpr double kEmphasis = 0.35;

constexpr double kTurn = 2.0 * std::numbers::pi;
constexpr int kTicks = 24;  // one every 15 degrees
constexpr Finish kTubeFinish{.shade = 0.55F, .gloss = 0.12F, .fade = 0.62F};
constexpr Finish kTickFinish{.shade = 0.0F, .gloss = 0.0F, .fade = 0.62F};
constexpr Finish kPinFinish{.shade = 0.8F, .gloss = 0.15F, .fade = 0.35F};

Surface tubeOf(double radius, double thickness)
{
    Surface surface;
    addArcTube(surface, {.radius = radius, .thickness = thickness, .from = 0.0, .to = kTurn},
               {.along = 144, .around = 12});
    return surface;
}

void addBar(Surface& surface, ArcTube tube, double angle, double halfWidth)
{
    tube.from = angle - halfWidth;
    tube.to = angle + halfWidth;
    addArcTube(surface, tube, {.along = 1, .around = 12});
}

/// Four marks around the tube, so that one is seen from wherever one looks.
void addDots(Surface& surface, ArcTube tube, double angle, double halfWidth)
{
    constexpr double kHalfTurn = 0.55;
    for (int quarter = 0; quarter < 4; ++quarter) {
        tube.from = angle - halfWidth;
        tube.to = angle + halfWidth;
        tube.turnFrom = kTurn * quarter / 4 - kHalfTurn;
        tube.turnTo = kTurn * quarter / 4 + kHalfTurn;
        addArcTube(surface, tube, {.along = 1, .around = 3});
    }
}

/// The mark of an axis beside its colour: x has one bar, y two, z a dot; quarter turns are
/// stronger.
void addTick(Surface& surface, rotcore::Axis axis, const ArcTube& tube, double angle, bool quarter)
{
    const double strength = quarter ? 1.7 : 1.0;
    constexpr double kBar = 0.006;  // radians, as are those below
    constexpr double kApart = 0.016;
    switch (axis) {
        case rotcore::Axis::x:
            addBar(surface, tube, angle, strength * kBar);
            break;
        case rotcore::Axis::y:
            addBar(surface, tube, angle - kApart, strength * kBar);
            addBar(surface, tube, angle + kApart, strength * kBar);
            break;
        case rotcore::Axis::z:
            addDots(surface, tube, angle, strength * 0.4 * tube.thickness / tube.radius);
            break;
    }
}

Surface ticksOf(double radius, rotcore::Axis axis, double thickness)
{
    Surface surface;
    const ArcTube tube{.radius = radius, .thickness = (1.0 + kTickRise) * thickness};
    for (int tick = 0; tick < kTicks; ++tick) {
        addTick(surface, axis, tube, kTurn * tick / kTicks, tick % (kTicks / 4) == 0);
    }
    return surface;
}

Surface pinsOf(double radius, double outerRadius, double thickness)
{
    Surface surface;
    for (const double side : {1.0, -1.0}) {
        addCylinder(surface, side * (radius - kPinRoot * thickness) * Vector3d::UnitX(),
                    side * outerRadius * Vector3d::UnitX(), kPinWidth * thickness, 16);
    }
    return surface;
}

}  // namespace

RingEntity::RingEntity(Qt3DCore::QEntity* parent, StageEffect* effect)
    : m_tube(new Solid(parent, effect, kTubeFinish)),
      m_ticks(new Solid(parent, effect, kTickFinish)),
      m_pins(new Solid(parent, effect, kPinFinish))
{
}

bool RingEntity::show(const RingShape& ring, const RingMeasures& measures, Scheme scheme)
{
    const Build wanted{ring.radius, ring.axis, measures};
    const bool rebuilt = wanted != m_built;
    if (rebuilt) build(wanted);

    const Palette& palette = paletteOf(scheme);
    const QColor& colour = palette.axis(ring.axis);
    m_tube->setColour(colour);
    m_ticks->setColour(mixed(palette.sheet, colour, 0.08));
    m_pins->setColour(mixed(colour, Qt::black, 0.2));
    for (Solid* solid : {m_tube, m_ticks, m_pins})
        solid->setPose(ring.q_WR, Vector3d::Zero());
    const bool emphasised = ring.hovered || ring.dragged;
    for (Solid* solid : {m_tube, m_ticks}) {
        solid->setSwell(emphasised ? kEmphasis * measures.thickness : 0.0);
    }
    return rebuilt;
}

void RingEntity::build(const Build& wanted)
{
    const auto& [radius, axis, measures] = wanted;
    m_tube->setSurface(tubeOf(radius, measures.thickness));
    m_ticks->setSurface(ticksOf(radius, axis, measures.thickness));
    m_pins->setSurface(pinsOf(radius, measures.outerRadius, measures.thickness));
    m_built = wanted;
}

}  // namespace ui
