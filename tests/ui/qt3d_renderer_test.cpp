// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/stage/qt3d_renderer.h"

#include <QElapsedTimer>
#include <QGuiApplication>
#include <cmath>
#include <memory>
#include <numbers>
#include <optional>
#include <vector>

#include <gtest/gtest.h>

#include "rotcore/rotation/euler_angles.h"
#include "ui/stage/gl_probe.h"
#include "ui/stage/palette.h"
#include "ui/stage/qt3d/surface.h"

namespace ui {
namespace {

using Eigen::Quaterniond;
using Eigen::Vector3d;
using rotcore::About;
using rotcore::EulerAngles;
using rotcore::Order;

constexpr double kDegree = std::numbers::pi / 180.0;

/// The tests that draw need a display; where one is given it has to work.
class Qt3dRendererTest : public testing::Test {
protected:
    static void SetUpTestSuite() { prepareOpenGl(); }

    void SetUp() override
    {
        ASSERT_FALSE(qEnvironmentVariableIsEmpty("DISPLAY"))
            << "these tests need a display, as in xvfb-run -a ctest";
    }
};

using GlProbeTest = Qt3dRendererTest;

/// General poses of body and rig, in orders of both kinds and about both.
std::vector<EulerAngles> generalAngles()
{
    return {{Order::zyx, About::body, {30 * kDegree, 20 * kDegree, 10 * kDegree}},
            {Order::xyz, About::body, {-110 * kDegree, 35 * kDegree, 75 * kDegree}},
            {Order::zxz, About::body, {50 * kDegree, 65 * kDegree, -140 * kDegree}},
            {Order::yzx, About::space, {25 * kDegree, -40 * kDegree, 160 * kDegree}}};
}

/// The default three-quarter view, one from below and one with y up, without and with a shifted
/// lens.
std::vector<Camera> generalCameras()
{
    return {
        Camera{},
        Camera{
            .azimuth = -2.2, .elevation = -0.5, .distance = 6.0, .fieldOfView = 0.8, .lift = 0.0},
        Camera{.azimuth = 2.5, .elevation = 0.9, .lift = 0.2, .up_W = Vector3d::UnitY()}};
}

const std::vector<QSize> kSizes{{720, 550}, {360, 600}};

Scene sceneFor(const EulerAngles& angles)
{
    Scene scene;
    scene.q_WB = rotcore::pose(angles);
    scene.body = scannerHead();
    scene.rings = ringsOf(angles);
    for (int row = 0; row < 3; ++row) {
        const rotcore::Axis axis = rotcore::axisAt(row);
        const Vector3d unit = rotcore::unitVector(axis);
        scene.axes.push_back({AxisShape::Frame::world, axis, unit, 2.0, "X"});
        scene.axes.push_back({AxisShape::Frame::body, axis, scene.q_WB * unit, 1.08, "x"});
    }
    return scene;
}

/// An octahedron about a point of the body: small, and of the same shape on both sides of the
/// point.
std::shared_ptr<const Mesh> markerAt(const Vector3d& at_B)
{
    constexpr double kSize = 0.05;
    auto mesh = std::make_shared<Mesh>();
    mesh->parts = {Mesh::Material::dark};
    for (int octant = 0; octant < 8; ++octant) {
        const Vector3d signs(octant & 1 ? 1 : -1, octant & 2 ? 1 : -1, octant & 4 ? 1 : -1);
        const auto corner = [&](int row) {
            return Vector3d(at_B + kSize * signs[row] * Vector3d::Unit(row));
        };
        mesh->triangles.push_back({{corner(0), corner(1), corner(2)}, signs.normalized(), 0});
    }
    return mesh;
}

/// The middle of all pixels in which two pictures differ.
std::optional<QPointF> middleOfDifference(const QImage& first, const QImage& second)
{
    QPointF sum;
    int count = 0;
    for (int y = 0; y < first.height(); ++y) {
        for (int x = 0; x < first.width(); ++x) {
            if (first.pixel(x, y) == second.pixel(x, y)) continue;
            sum += QPointF(x + 0.5, y + 0.5);
            ++count;
        }
    }
    if (count == 0) return std::nullopt;
    return sum / count;
}

/// Whether a pixel has the colour of an axis, in whatever light.
bool hasHue(const QImage& picture, const QPointF& at, const QColor& expected)
{
    const QColor seen(picture.pixel(static_cast<int>(at.x()), static_cast<int>(at.y())));
    const int apart = std::abs(seen.hsvHue() - expected.hsvHue());
    return seen.hsvSaturation() > 40 && std::min(apart, 360 - apart) <= 15;
}

TEST_F(Qt3dRendererTest, BodyPointsAppearWhereTheProjectionPutsThem)
{
    // The marker is 5 px wide, seen in perspective: its middle lies within 0.3 px of its point, the
    // rest is for pixels cut at its edge.
    constexpr double kPixels = 0.8;
    Qt3dRenderer renderer;
    const Vector3d point_B(0.7, 0.45, -0.3);
    for (const EulerAngles& angles : generalAngles()) {
        for (const Camera& camera : generalCameras()) {
            for (const QSize& size : kSizes) {
                Scene scene;  // the rings shrink to the centre, where they hide nothing
                scene.up_W = camera.up_W;
                for (RingShape& ring : scene.rings)
                    ring.radius = 0.01;
                scene.q_WB = rotcore::pose(angles);
                const QImage without = renderer.render(scene, camera, size, 1.0, Scheme::light);
                scene.body = markerAt(point_B);
                const QImage with = renderer.render(scene, camera, size, 1.0, Scheme::light);
                ASSERT_FALSE(without.isNull() || with.isNull());

                const auto seen = middleOfDifference(without, with);
                const auto expected = Projection(camera, size).project(scene.q_WB * point_B);
                ASSERT_TRUE(seen && expected);
                EXPECT_NEAR(seen->x(), expected->at.x(), kPixels);
                EXPECT_NEAR(seen->y(), expected->at.y(), kPixels);
            }
        }
    }
}

TEST_F(Qt3dRendererTest, NearHalvesOfRingsAppearWhereTheProjectionPutsThem)
{
    Qt3dRenderer renderer;
    for (const EulerAngles& angles : generalAngles()) {
        Scene scene = sceneFor(angles);
        scene.axes.clear();
        for (const QSize& size : kSizes) {
            const Camera camera;
            const QImage picture = renderer.render(scene, camera, size, 1.0, Scheme::light);
            ASSERT_FALSE(picture.isNull());
            const Projection projection(camera, size);
            int points = 0;
            int found = 0;
            for (const RingShape& ring : scene.rings) {
                for (int n = 0; n < 72; ++n) {  // between the ticks
                    const double angle = (5 * n + 2.5) * kDegree;
                    const Vector3d at = ring.q_WR * Vector3d(ring.radius * std::cos(angle),
                                                             ring.radius * std::sin(angle), 0.0);
                    if (at.dot(eyeOf(camera)) < 0.0) continue;
                    ++points;
                    const QColor& colour = paletteOf(Scheme::light).axis(ring.axis);
                    if (hasHue(picture, projection.project(at)->at, colour)) ++found;
                }
            }
            EXPECT_GT(points, 90);
            EXPECT_GE(found, 9 * points / 10);  // rings hide each other where they cross
        }
    }
}

TEST_F(Qt3dRendererTest, PinsReachFromRingToRing)
{
    Qt3dRenderer renderer;
    const Scene scene = sceneFor(generalAngles().front());
    const Camera camera;
    const QImage picture = renderer.render(scene, camera, kSizes[0], 1.0, Scheme::dark);
    ASSERT_FALSE(picture.isNull());
    const std::array<double, 3> middles{1.85, 1.625, 1.375};  // halfway to what holds the pin
    for (std::size_t i = 0; i < 3; ++i) {
        const RingShape& ring = scene.rings[i];
        const Vector3d pin = ring.q_WR * Vector3d::UnitX();
        const double side = pin.dot(eyeOf(camera)) > 0.0 ? 1.0 : -1.0;
        const auto at = Projection(camera, kSizes[0]).project(side * middles[i] * pin);
        EXPECT_TRUE(hasHue(picture, at->at, paletteOf(Scheme::dark).axis(ring.axis))) << i;
    }
}

TEST_F(Qt3dRendererTest, PictureDoesNotDependOnWhatWasShownBefore)
{
    Scene first = sceneFor(generalAngles()[0]);
    Scene second = sceneFor(generalAngles()[2]);
    second.axes.resize(2);
    second.rings[1].hovered = true;
    second.rings[0].radius = 1.9;
    second.groundRadius = 2.3;
    Qt3dRenderer used;
    used.render(first, generalCameras()[1], kSizes[1], 2.0, Scheme::light);
    const QImage later = used.render(second, Camera{}, kSizes[0], 1.0, Scheme::dark);
    const QImage again = used.render(second, Camera{}, kSizes[0], 1.0, Scheme::dark);
    Qt3dRenderer fresh;
    const QImage alone = fresh.render(second, Camera{}, kSizes[0], 1.0, Scheme::dark);
    ASSERT_FALSE(later.isNull());
    EXPECT_EQ(later, again);
    EXPECT_EQ(later, alone);
}

TEST_F(Qt3dRendererTest, RingUnderTheHandIsThicker)
{
    Qt3dRenderer renderer;
    const auto pixelsOf = [&](bool hovered) {
        Scene scene = sceneFor(generalAngles()[0]);
        scene.axes.clear();
        scene.rings[1].hovered = hovered;
        const QImage picture = renderer.render(scene, Camera{}, kSizes[0], 1.0, Scheme::light);
        int count = 0;
        for (int y = 0; y < picture.height(); ++y) {
            for (int x = 0; x < picture.width(); ++x) {
                const QColor& colour = paletteOf(Scheme::light).axis(scene.rings[1].axis);
                if (hasHue(picture, QPointF(x, y), colour)) ++count;
            }
        }
        return count;
    };
    EXPECT_GT(pixelsOf(true), 1.2 * pixelsOf(false));
}

TEST_F(Qt3dRendererTest, SizeIsLogicalAndBackgroundIsTheStages)
{
    Qt3dRenderer renderer;
    const QImage picture =
        renderer.render(sceneFor(generalAngles()[0]), Camera{}, QSize(301, 200), 1.5, Scheme::dark);
    ASSERT_FALSE(picture.isNull());
    EXPECT_EQ(picture.size(), QSize(452, 300));  // 451.5, rounded
    EXPECT_EQ(picture.devicePixelRatio(), 1.5);
    const Palette& palette = paletteOf(Scheme::dark);
    const QColor top(picture.pixel(0, 0));
    const QColor bottom(picture.pixel(0, 299));
    EXPECT_NEAR(top.red(), palette.stageTop.red(), 1);
    EXPECT_NEAR(bottom.blue(), palette.stageBottom.blue(), 1);
    EXPECT_EQ(picture.pixelColor(200, 100).alpha(), 255);
}

TEST_F(Qt3dRendererTest, CornersMayBeCovered)
{
    Qt3dRenderer renderer;
    Scene scene;
    for (RingShape& ring : scene.rings)
        ring.radius = 0.01;
    const Camera near{.elevation = 1.55, .distance = 1.2, .lift = 0.0};
    const QImage picture = renderer.render(scene, near, kSizes[0], 1.0, Scheme::light);
    ASSERT_FALSE(picture.isNull());
    const QColor& ground = paletteOf(Scheme::light).ground;
    EXPECT_EQ(picture.pixelColor(0, 0).rgb(), ground.rgb());
    EXPECT_EQ(picture.pixelColor(719, 549).rgb(), ground.rgb());
}

TEST_F(Qt3dRendererTest, NothingIsDrawnOnNoPixels)
{
    Qt3dRenderer renderer;
    EXPECT_TRUE(renderer.render(Scene{}, Camera{}, QSize(0, 10), 1.0, Scheme::light).isNull());
}

TEST_F(GlProbeTest, FindsOpenGlOnThisDisplay)
{
    EXPECT_EQ(runGlProbe(), 0);
}

TEST_F(GlProbeTest, TakesTheAnswerOfTheChild)
{
    EXPECT_TRUE(openGlWorks(QStringLiteral("/bin/true")));
    EXPECT_FALSE(openGlWorks(QStringLiteral("/bin/false")));
    EXPECT_FALSE(openGlWorks(QStringLiteral("/no/such/program")));
}

TEST_F(GlProbeTest, DoesNotAskWithoutADisplay)
{
    const QByteArray display = qgetenv("DISPLAY");
    const QByteArray wayland = qgetenv("WAYLAND_DISPLAY");
    qunsetenv("DISPLAY");
    qunsetenv("WAYLAND_DISPLAY");
    EXPECT_FALSE(openGlWorks(QStringLiteral("/bin/true")));
    EXPECT_EQ(runGlProbe(), 1);
    qputenv("DISPLAY", display);
    if (!wayland.isEmpty()) qputenv("WAYLAND_DISPLAY", wayland);
}

/// Triangles whose winding disagrees with the normals of their corners.
int inwardTriangles(const Surface& surface)
{
    const auto part = [&](std::uint32_t vertex, std::size_t from) {
        const float* at = surface.vertices.data() + vertex * Surface::kFloatsPerVertex + from;
        return Eigen::Vector3f(at[0], at[1], at[2]);
    };
    int inward = 0;
    for (std::size_t i = 0; i < surface.indices.size(); i += 3) {
        const std::uint32_t* corner = surface.indices.data() + i;
        const Eigen::Vector3f a = part(corner[0], 0);
        const Eigen::Vector3f across = (part(corner[1], 0) - a).cross(part(corner[2], 0) - a);
        for (int n = 0; n < 3; ++n) {
            if (across.dot(part(corner[n], 3)) < -1e-9F) ++inward;
        }
    }
    return inward;
}

TEST(Surface, TrianglesRunCounterClockwiseSeenFromOutside)
{
    Surface tube;
    addArcTube(tube, {.radius = 1.5, .thickness = 0.1, .from = 0.3, .to = 5.0}, {40, 10});
    EXPECT_EQ(inwardTriangles(tube), 0);
    Surface cylinder;
    addCylinder(cylinder, {0.1, 0.2, 0.3}, {-0.5, 0.7, 1.0}, 0.2, 12);
    EXPECT_EQ(inwardTriangles(cylinder), 0);
    Surface disc;
    addFlatArc(disc, {.inner = 0.0, .outer = 2.0, .from = 0.0, .to = 6.0}, 30);
    EXPECT_EQ(inwardTriangles(disc), 0);
}

}  // namespace
}  // namespace ui
