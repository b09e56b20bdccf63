// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d/ground_entity.h"

#include <numbers>

#include "ui/stage/palette.h"

namespace ui {

using Eigen::Vector3d;

namespace {

constexpr double kTurn = 2.0 * std::numbers::pi;
// Stage units. Marks lie a little off the disc, so that the depth buffer can tell them from it.
constexpr double kLift = 0.005;
constexpr double kLineWidth = 0.012;
constexpr int kTicks = 24;
constexpr Finish kPlain{.shade = 0.0F};

Surface discOf(double radius)
{
    Surface surface;
    addFlatArc(surface, {.inner = 0.0, .outer = radius, .from = 0.0, .to = kTurn}, 120);
    return surface;
}

Surface circlesOf(double radius)
{
    Surface surface;
    for (const double part : {1.0 / 3.0, 2.0 / 3.0}) {
        addFlatArc(surface,
                   {.inner = part * radius - 0.5 * kLineWidth,
                    .outer = part * radius + 0.5 * kLineWidth,
                    .z = kLift,
                    .from = 0.0,
                    .to = kTurn},
                   96);
    }
    return surface;
}

Surface rimOf(double radius)
{
    Surface surface;
    addFlatArc(
        surface,
        {.inner = radius - kLineWidth, .outer = radius, .z = kLift, .from = 0.0, .to = kTurn}, 120);
    for (int tick = 0; tick < kTicks; ++tick) {
        const double inner = tick % (kTicks / 4) == 0 ? 0.93 : 0.965;
        const double middle = kTurn * tick / kTicks;
        const double half = 0.5 * kLineWidth / radius;
        addFlatArc(surface,
                   {.inner = inner * radius,
                    .outer = radius,
                    .z = kLift,
                    .from = middle - half,
                    .to = middle + half},
                   1);
    }
    return surface;
}

}  // namespace

GroundEntity::GroundEntity(Qt3DCore::QEntity* parent, StageEffect* effect)
    : m_disc(new Solid(parent, effect, kPlain)),
      m_circles(new Solid(parent, effect, kPlain)),
      m_rim(new Solid(parent, effect, kPlain))
{
}

bool GroundEntity::show(const GroundShape& ground, Scheme scheme)
{
    const bool rebuilt = m_radius != ground.radius;
    if (rebuilt) {
        m_disc->setSurface(discOf(ground.radius));
        m_circles->setSurface(circlesOf(ground.radius));
        m_rim->setSurface(rimOf(ground.radius));
    }
    const Palette& palette = paletteOf(scheme);
    m_disc->setColour(palette.ground);
    m_circles->setColour(mixed(palette.ground, palette.groundLine, 0.5));
    m_rim->setColour(palette.groundLine);
    const Eigen::Quaterniond q_WG =
        Eigen::Quaterniond::FromTwoVectors(Vector3d::UnitZ(), ground.up_W);
    for (Solid* solid : {m_disc, m_circles, m_rim}) {
        solid->setPose(q_WG, ground.height * ground.up_W);
    }
    m_disc->setEnabled(ground.fromAbove);
    m_radius = ground.radius;
    return rebuilt;
}

}  // namespace ui
