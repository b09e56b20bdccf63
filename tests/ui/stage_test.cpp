// SPDX-License-Identifier: GPL-3.0-or-later
// The stage without a window: rings, projection, picking, drags.
#include <cmath>

#include "rotcore/chain/chain.h"
#include "rotcore/lock/rates.h"
#include "tests/support/poses.h"
#include "ui/stage/arcball.h"
#include "ui/stage/picking.h"
#include "ui/stage/ring_drag.h"
#include "ui/stage/scene.h"

namespace {

using namespace rotcore;
using namespace ui;
using Eigen::Quaterniond;
using Eigen::Vector3d;

// A dozen products of numbers near 1, each rounded to 1.1e-16; the rest is room for other
// compilers.
constexpr double kRounding = 1e-14;
// Pixels here are below 1000, so rounding is below 1e-12 of them; the searches below end at 1e-9
// rad.
constexpr double kPixel = 1e-6;

constexpr QSizeF kSize(720, 550);

Scene sceneAt(Order order, About about, double a, double b, double c)
{
    const EulerAngles angles{order, about, {a, b, c}};
    return sceneOf(
        examine({.start = {}, .chain = chainOf(angles), .shown = {.order = order, .about = about}})
            .value(),
        {});
}

Scene zyxAt(double a, double b, double c)
{
    return sceneAt(Order::zyx, About::body, a, b, c);
}

double apart(const QPointF& a, const QPointF& b)
{
    return std::hypot(a.x() - b.x(), a.y() - b.y());
}

template <class Check>
void forAllConventions(const Check& check)
{
    for (const Order order : kAllOrders)
        for (const About about : {About::body, About::space})
            for (const auto& [a, b, c] :
                 {std::array{30_deg, 20_deg, 10_deg}, std::array{-160_deg, 77_deg, 221_deg},
                  std::array{12_deg, 90_deg, -33_deg}, std::array{5_deg, 0_deg, 50_deg}})
                check(EulerAngles{order, about, {a, b, c}});
}

TEST(Rig, TheInnermostRingCarriesTheBodyInAllConventions)
{
    forAllConventions([](const EulerAngles& angles) {
        const auto rings = ringsOf(angles);
        const Quaterniond q_WB = pose(angles);
        // Its pins and the direction across them are fixed in the body.
        const Vector3d own_W = q_WB * unitVector(rings[2].axis);
        const Vector3d across_W = q_WB * unitVector(rings[1].axis);
        EXPECT_NEAR((rings[2].q_WR * Vector3d::UnitX() - own_W).norm(), 0, kRounding);
        EXPECT_NEAR((rings[2].q_WR * Vector3d::UnitY() - across_W).norm(), 0, kRounding);
    });
}

TEST(Rig, PinsAreTheAxesOfTheRates)  // second source: the columns of the rate matrix
{
    forAllConventions([](const EulerAngles& angles) {
        const Eigen::Matrix3d axes_W = rateMatrixSpace(angles);
        for (const RingShape& ring : ringsOf(angles)) {
            EXPECT_NEAR((ring.pin_W - axes_W.col(ring.listed)).norm(), 0, kRounding);
            EXPECT_EQ(ring.angle, angles.angles[static_cast<std::size_t>(ring.listed)]);
            EXPECT_EQ(ring.axis, axesOf(angles.order)[static_cast<std::size_t>(ring.listed)]);
        }
    });
}

TEST(Rig, EachRingIsHeldInTheOneOutsideIt)
{
    forAllConventions([](const EulerAngles& angles) {
        const auto rings = ringsOf(angles);
        for (std::size_t n = 0; n < 3; ++n)
            EXPECT_NEAR((rings[n].q_WR * Vector3d::UnitX() - rings[n].pin_W).norm(), 0, kRounding);
        for (std::size_t n = 1; n < 3; ++n) {
            const Vector3d held_W = rings[n - 1].q_WR * Vector3d::UnitY();
            EXPECT_NEAR((held_W - rings[n].pin_W).norm(), 0, kRounding);
            EXPECT_LT(rings[n].radius, rings[n - 1].radius);
        }
    });
}

TEST(Rig, ALaterTurnLeavesTheOuterRingsWhereTheyAre)
{
    const auto before = zyxAt(30_deg, 20_deg, 10_deg).rings;
    const auto after = zyxAt(30_deg, 20_deg, 70_deg).rings;
    EXPECT_EQ(before[0].q_WR.coeffs(), after[0].q_WR.coeffs());
    EXPECT_EQ(before[1].q_WR.coeffs(), after[1].q_WR.coeffs());
    EXPECT_POSE_NEAR(after[2].q_WR, Eigen::AngleAxisd(60_deg, before[2].pin_W) * before[2].q_WR,
                     kRounding);
}

TEST(Scene, LockIsMarkedWithinTenDegreesAndItsLostDirectionIsAcrossAllPins)
{
    EXPECT_FALSE(zyxAt(30_deg, 79.9_deg, 10_deg).lock);
    const Scene near = zyxAt(30_deg, 84_deg, 10_deg);
    ASSERT_TRUE(near.lock);
    EXPECT_FALSE(near.lock->atLock);
    const Scene at = zyxAt(30_deg, 90_deg, 10_deg);
    ASSERT_TRUE(at.lock);
    EXPECT_TRUE(at.lock->atLock);
    for (const RingShape& ring : at.rings)
        EXPECT_NEAR(at.lock->lost_W.dot(ring.pin_W), 0, 1e-12);  // cosines; cos 90 deg is 6e-17
}

TEST(Scene, NorthEastDownStandsOnTheGroundWithZDownwards)
{
    const auto found = examine({}).value();
    EXPECT_EQ(sceneOf(found, {.worldNames = WorldNames::northEastDown}).up_W, -Vector3d::UnitZ());
    EXPECT_EQ(sceneOf(found, {.worldNames = WorldNames::yUp}).up_W, Vector3d::UnitY());
    EXPECT_EQ(sceneOf(found, {.worldNames = WorldNames::eastNorthUp}).axes[0].name, "east");
}

TEST(ScannerHead, FacesOutwardsAndFitsTheInnerRing)
{
    const auto mesh = scannerHead();
    std::vector<Vector3d> sum(mesh->parts.size(), Vector3d::Zero());
    std::vector<double> count(mesh->parts.size());
    for (const auto& t : mesh->triangles)
        for (const Vector3d& v : t.vertices) {
            EXPECT_LT(v.norm(), 0.85);  // stage units; the inner ring is at 1.25
            sum[static_cast<std::size_t>(t.part)] += v;
            count[static_cast<std::size_t>(t.part)] += 1;
        }
    for (const auto& t : mesh->triangles) {
        const auto part = static_cast<std::size_t>(t.part);
        EXPECT_GT(t.normal.dot(t.vertices[0] - sum[part] / count[part]), 0);  // parts are convex
        const Vector3d across =
            (t.vertices[1] - t.vertices[0]).cross(t.vertices[2] - t.vertices[0]);
        EXPECT_NEAR(t.normal.dot(across.normalized()), 1, kRounding);
    }
}

TEST(Projection, APointLandsWhereHandCalculationPutsIt)
{
    // From 10 units along x with a half angle whose tangent is 0.5: at the centre 5 units fill half
    // of 100 pixels.
    const Camera camera{
        .azimuth = 0, .elevation = 0, .distance = 10, .fieldOfView = 2 * std::atan(0.5), .lift = 0};
    const Projection projection(camera, QSizeF(200, 100));
    const auto seen = projection.project({0, 2, 1});
    ASSERT_TRUE(seen);
    EXPECT_NEAR(seen->at.x(), 120, 1e-10);  // y to the right, 10 pixels a unit
    EXPECT_NEAR(seen->at.y(), 40, 1e-10);
    EXPECT_NEAR(seen->depth, 10, 1e-12);
    EXPECT_NEAR(projection.project({5, 2, 1})->at.x(), 140, 1e-10);  // half as far, twice the size
    EXPECT_FALSE(projection.project({10.5, 0, 0}));                  // behind the viewer
}

TEST(Projection, ThePicturesMiddleIsLiftedByItsShareOfHalfTheHeight)
{
    const Projection projection(Camera{.lift = 0.2}, QSizeF(400, 300));
    EXPECT_NEAR(projection.project(Vector3d::Zero())->at.y(), 150 - 0.2 * 150, 1e-10);
}

TEST(Projection, TheRayThroughAPointsPixelGoesThroughThePoint)
{
    for (const Vector3d& up : {Vector3d(0, 0, 1), Vector3d(0, -1, 0), Vector3d(1, 0, 0)}) {
        const Projection projection(Camera{.azimuth = 2.1, .elevation = -0.7, .up_W = up}, kSize);
        for (const Vector3d& at :
             {Vector3d(0, 0, 0), Vector3d(1.2, -0.4, 0.9), Vector3d(-2, 1, -1)}) {
            const Ray ray = projection.rayThrough(projection.project(at)->at);
            EXPECT_NEAR((at - ray.origin).cross(ray.direction).norm(), 0,
                        1e-12);  // distances of 10
            EXPECT_GT((at - ray.origin).dot(ray.direction), 0);
        }
    }
}

TEST(Picking, ARingIsHitOnAndBesideItsLineButNotFarFromIt)
{
    const Scene scene = zyxAt(30_deg, 20_deg, 10_deg);
    const Projection projection(Camera{}, kSize);
    // The outer ring's rightmost front part, with nothing else near it.
    const auto& ring = scene.rings[0];
    QPointF right;
    for (int n = 0; n < 720; ++n) {
        const QPointF at = projection.project(pointOn(ring, n * 0.5_deg))->at;
        if (at.x() > right.x()) right = at;
    }
    EXPECT_EQ(ringAt(scene, projection, right), 0);
    EXPECT_EQ(ringAt(scene, projection, right + QPointF(7, 0)), 0);
    EXPECT_FALSE(ringAt(scene, projection, right + QPointF(9, 0)));
}

TEST(Picking, EveryPointOfARingHitsOneThatRunsThroughIt)
{
    const Projection projection(Camera{}, kSize);
    for (int turn = 0; turn < 360; turn += 15) {
        const Scene scene = zyxAt(turn * 1_deg, turn * 0.7_deg, 40_deg);
        for (const RingShape& ring : scene.rings)
            for (int n = 0; n < 90; ++n)
                EXPECT_TRUE(
                    ringAt(scene, projection, projection.project(pointOn(ring, n * 4_deg))->at));
    }
}

TEST(Picking, WhereRingsCrossTheOneNearerToTheEyeIsTaken)
{
    const Scene scene = zyxAt(30_deg, 20_deg, 10_deg);
    const Projection projection(Camera{}, kSize);
    int crossings = 0;
    for (int n = 0; n < 1440; ++n) {
        const Vector3d at_W = pointOn(scene.rings[0], n * 0.25_deg);
        const QPointF at = projection.project(at_W)->at;
        const auto hit = ringHit(scene, projection, at);
        ASSERT_TRUE(hit);
        if (hit->ring == 0) continue;
        EXPECT_LT(hit->depth, projection.project(at_W)->depth);
        if (hit->front) ++crossings;
    }
    EXPECT_GT(crossings, 0);
}

TEST(Picking, TheBodyIsHitAtItsSurface)
{
    const Scene scene = zyxAt(30_deg, 20_deg, 10_deg);
    const Projection projection(Camera{}, kSize);
    const Vector3d glass_W = scene.q_WB * Vector3d(0.762, 0.05, 0.03);  // on the snout's front face
    const auto hit = bodyAt(scene, projection, projection.project(glass_W)->at);
    ASSERT_TRUE(hit);
    EXPECT_NEAR((*hit - glass_W).norm(), 0, 1e-10);
    EXPECT_FALSE(bodyAt(scene, projection, {20, 500}));
}

class Dragged : public testing::Test {
protected:
    /// Takes ring n by the point at `where` on it and leads the pointer along its true way.
    double leadBy(int n, double where, double turn, DragGrain grain = DragGrain::plain)
    {
        const RingShape& ring = m_scene.rings[static_cast<std::size_t>(n)];
        const Vector3d grabbed = pointOn(ring, where);
        RingDrag drag(ring, grabbed, m_projection.project(grabbed)->at, m_projection);
        double angle = ring.angle;
        const int steps = static_cast<int>(std::abs(turn) / 5_deg);
        for (int s = 1; s <= steps; ++s) {
            const Vector3d to = Eigen::AngleAxisd(turn * s / steps, ring.pin_W) * grabbed;
            angle = drag.moveTo(m_projection.project(to)->at, m_projection, grain);
        }
        return angle - ring.angle;
    }

    Scene m_scene = zyxAt(30_deg, 20_deg, 10_deg);
    Projection m_projection{Camera{}, kSize};
};

// Where the circle runs along the line of sight the picture says little: a pull of 4 squared pixels
// a squared radian towards the place before then costs up to half a degree, and nothing once past
// it.
constexpr double kDragTolerance = 0.5_deg;

TEST_F(Dragged, ARingFollowsThePointerEitherWay)
{
    for (const int n : {0, 1, 2})
        for (const double turn : {40_deg, -40_deg, 90_deg, -130_deg})
            EXPECT_NEAR(leadBy(n, 1.1, turn), turn, kDragTolerance) << n << " by " << turn;
}

TEST_F(Dragged, ARingGoesRoundPastTheHalfTurn)
{
    EXPECT_NEAR(leadBy(0, 1.57, 270_deg), 270_deg, kDragTolerance);
    EXPECT_NEAR(leadBy(0, 1.57, -400_deg), -400_deg, kDragTolerance);
}

TEST_F(Dragged, FineMotionCountsATenthAndSnappedMotionInSteps)
{
    EXPECT_NEAR(leadBy(0, 1.57, 40_deg, DragGrain::fine), 4_deg, kDragTolerance / 10);
    EXPECT_NEAR(leadBy(1, 1.57, 41_deg, DragGrain::snapped), 40_deg, kRounding);  // 20 to 60
}

TEST_F(Dragged, APressTurnsNothing)
{
    for (const int n : {0, 1, 2})
        for (int where = 0; where < 24; ++where) {
            const RingShape& ring = m_scene.rings[static_cast<std::size_t>(n)];
            const Vector3d grabbed = pointOn(ring, where * 15_deg);
            const QPointF press = m_projection.project(grabbed)->at + QPointF(3, -2);
            RingDrag drag(ring, grabbed, press, m_projection);
            EXPECT_NEAR(drag.moveTo(press, m_projection, DragGrain::plain), ring.angle, 1e-8);
        }
}

TEST(Arcball, WhatWasGrabbedStaysUnderThePointerWhileOnTheBall)
{
    const Scene scene = zyxAt(30_deg, 20_deg, 10_deg);
    const Projection projection(Camera{}, kSize);
    const Vector3d grabbed_W = scene.q_WB * Vector3d(0.762, 0.05, 0.03);
    const QPointF press = projection.project(grabbed_W)->at;
    const Arcball ball(scene.q_WB, grabbed_W, press, projection);
    EXPECT_POSE_NEAR(ball.poseAt(press, projection), scene.q_WB,
                     1e-12);  // rad, rounding of the ray
    for (const QPointF& step : {QPointF(12, 0), QPointF(25, -30), QPointF(-8, 5)}) {
        const Quaterniond q_drag = ball.poseAt(press + step, projection) * scene.q_WB.conjugate();
        EXPECT_LT(apart(projection.project(q_drag * grabbed_W)->at, press + step), kPixel);
    }
}

TEST(Arcball, RollsOnBeyondTheRimWithoutAJump)
{
    const Projection projection(Camera{}, kSize);
    const Vector3d grabbed_W = eyeOf(Camera{}).normalized() * 0.5;
    const QPointF press = projection.project(grabbed_W)->at;
    const Arcball ball(Quaterniond::Identity(), grabbed_W, press, projection);
    Quaterniond last = Quaterniond::Identity();
    for (int n = 1; n <= 100; ++n) {
        const Quaterniond next = ball.poseAt(press + QPointF(n, 0), projection);
        // A pixel is 1/85 of a unit; next to the rim the ball turns by sqrt(2 * 1/85 / 0.5) = 0.22
        // rad a pixel.
        EXPECT_LT(tests::poseDistance(last, next), 0.25) << n;
        last = next;
    }
    EXPECT_GT(tests::poseDistance(Quaterniond::Identity(), last), 2.0);
}

}  // namespace
