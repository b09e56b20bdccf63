// SPDX-License-Identifier: GPL-3.0-or-later
// What the painted stage shows: the body where it is, words that can be read.
#include "rotcore/chain/chain.h"
#include "tests/support/poses.h"
#include "ui/stage/painter_renderer.h"
#include "ui/stage/palette.h"
#include "ui/stage/stage_labels.h"
#include "ui/stage/stage_words.h"

namespace {

using namespace rotcore;
using namespace ui;
using Eigen::Vector3d;

constexpr QSize kSize(720, 550);

Scene sceneAt(double a, double b, double c)
{
    const EulerAngles angles{Order::zyx, About::body, {a, b, c}};
    return sceneOf(examine({.start = {}, .chain = chainOf(angles), .shown = {}}).value(), {});
}

QColor colourAt(const Scene& scene, const Vector3d& point_B, Scheme scheme)
{
    PainterRenderer renderer;
    const QImage image = renderer.render(scene, Camera{}, kSize, 1.0, scheme);
    const auto seen = Projection(Camera{}, kSize).project(scene.q_WB * point_B);
    return image.pixelColor(seen->at.toPoint());
}

/// Whether a colour is of a material, in whatever light: its hue, and saturated enough to have one.
bool isOf(const QColor& seen, Mesh::Material material, Scheme scheme)
{
    const QColor paint = paletteOf(scheme).material(material);
    const int apart = std::abs(seen.hslHue() - paint.hslHue());
    return std::min(apart, 360 - apart) <= 12 &&  // degrees; three roundings of dark colours
           std::abs(seen.hslSaturation() - paint.hslSaturation()) <= 40;
}

const Vector3d kLens(0.762, 0.07, 0.05);  // on the snout's front, beside the axis line
const Vector3d kMastHead(-0.26, -0.05, 0.74);
const Vector3d kPodWindow(-0.07, 0.515, -0.09);

TEST(PaintedStage, TheSnoutIsSeenWhereThePosePutsItAndNotFromBehind)
{
    for (const Scheme scheme : {Scheme::light, Scheme::dark}) {
        // The viewer stands 51.6 degrees round from x to y, 24 degrees up.
        for (const auto& [a, b, c] :
             {std::array{30_deg, 20_deg, 10_deg}, std::array{50_deg, 0_deg, 75_deg},
              std::array{70_deg, 10_deg, 100_deg}})
            EXPECT_TRUE(
                isOf(colourAt(sceneAt(a, b, c), kLens, scheme), Mesh::Material::glass, scheme))
                << a << ' ' << b << ' ' << c;
        EXPECT_FALSE(isOf(colourAt(sceneAt(230_deg, 0_deg, 0_deg), kLens, scheme),
                          Mesh::Material::glass, scheme));
    }
}

TEST(PaintedStage, ThePodIsOnTheBodysLeft)
{
    const Scheme scheme = Scheme::light;
    EXPECT_TRUE(isOf(colourAt(sceneAt(-60_deg, 0_deg, 0_deg), kPodWindow, scheme),
                     Mesh::Material::glass, scheme));
    // Mirrored, the window would be at -y: there is none.
    EXPECT_FALSE(isOf(colourAt(sceneAt(145_deg, 0_deg, 0_deg), {-0.07, -0.26, -0.09}, scheme),
                      Mesh::Material::glass, scheme));
}

TEST(PaintedStage, TheMastStandsUpFromTheRoof)
{
    for (const double heading : {0_deg, 100_deg, 190_deg}) {
        const QColor seen = colourAt(sceneAt(heading, 0_deg, 0_deg), kMastHead, Scheme::light);
        EXPECT_TRUE(isOf(seen, Mesh::Material::metal, Scheme::light))
            << heading << ' ' << seen.name().toStdString();
    }
}

TEST(PaintedStage, TheGroundIsPlainPaperAndTheSkyRunsDownwards)
{
    PainterRenderer renderer;
    const QImage image = renderer.render(sceneAt(0, 0, 0), Camera{}, kSize, 1.0, Scheme::dark);
    const Palette& palette = paletteOf(Scheme::dark);
    EXPECT_EQ(image.pixelColor(2, 0), palette.stageTop);
    const QColor foot = image.pixelColor(2, kSize.height() - 1);
    // A gradient is made of 256 steps, so its end may be one off.
    EXPECT_LE(std::abs(foot.red() - palette.stageBottom.red()), 1);
    EXPECT_LE(std::abs(foot.green() - palette.stageBottom.green()), 1);
    EXPECT_LE(std::abs(foot.blue() - palette.stageBottom.blue()), 1);
    const Vector3d spot(0.3, 1.2, -2.0);  // between the axes and the circles, on the ground
    const auto seen = Projection(Camera{}, kSize).project(spot);
    EXPECT_EQ(image.pixelColor(seen->at.toPoint()), palette.ground);
}

TEST(PaintedStage, APictureHasThePixelsAskedFor)
{
    PainterRenderer renderer;
    const QImage image = renderer.render(sceneAt(0, 0, 0), Camera{}, {300, 200}, 1.5, Scheme::dark);
    EXPECT_EQ(image.size(), QSize(450, 300));
    EXPECT_EQ(image.devicePixelRatio(), 1.5);
}

TEST(StageWords, MinusIsATrueMinusAndZeroHasNone)
{
    EXPECT_EQ(degreesText(-5_deg), QString::fromUtf8("−5.0°"));
    EXPECT_EQ(degreesText(-0.04_deg), QString::fromUtf8("0.0°"));
    EXPECT_EQ(degreesText(270.25_deg), QString::fromUtf8("270.3°"));
    EXPECT_EQ(ringText(sceneAt(30_deg, 0, 0).rings[0]), QString::fromUtf8("z 30.0°"));
}

TEST(StageWords, LockIsNamedByDegrees)
{
    EXPECT_EQ(lockText(sceneAt(30_deg, 20_deg, 10_deg)), QString());
    EXPECT_TRUE(lockText(sceneAt(30_deg, 65_deg, 10_deg)).startsWith("nearing lock"));
    EXPECT_TRUE(lockText(sceneAt(30_deg, 84_deg, 10_deg)).startsWith("near lock"));
    EXPECT_TRUE(lockText(sceneAt(30_deg, 90_deg, 10_deg)).startsWith("at lock"));
}

TEST(StageLabels, ChipsNeitherOverlapNorLeaveThePicture)
{
    const Projection projection(Camera{}, kSize);
    const QRectF picture({0, 0}, QSizeF(kSize));
    for (int a = -180; a <= 180; a += 30)
        for (int b = -90; b <= 90; b += 15)
            for (const int c : {-150, -60, 0, 10, 90}) {
                const Scene scene = sceneAt(a * 1_deg, b * 1_deg, c * 1_deg);
                std::vector<QRectF> chips;
                for (const auto& label :
                     labelsOf(scene, projection, paletteOf(Scheme::light), {})) {
                    if (label.kind != StageLabel::Kind::chip) continue;
                    EXPECT_TRUE(picture.contains(label.box)) << a << ' ' << b << ' ' << c;
                    for (const QRectF& other : chips)
                        EXPECT_FALSE(label.box.intersects(other)) << a << ' ' << b << ' ' << c;
                    chips.push_back(label.box);
                }
                EXPECT_EQ(chips.size(), 3U);
            }
}

}  // namespace
