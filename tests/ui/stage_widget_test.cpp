// SPDX-License-Identifier: GPL-3.0-or-later
// The stage by real events.
#include "ui/stage/stage_widget.h"

#include <QApplication>
#include <QSignalSpy>
#include <QTest>
#include <QWheelEvent>
#include <cmath>

#include "rotcore/chain/chain.h"
#include "tests/support/poses.h"
#include "ui/stage/painter_renderer.h"
#include "ui/stage/picking.h"

namespace {

using namespace rotcore;
using namespace ui;
using Eigen::Vector3d;

class Stage : public testing::Test {
protected:
    Stage()
    {
        m_stage.resize(720, 550);
        m_stage.show();
        m_stage.setFocus();
        QApplication::processEvents();
    }

    std::array<double, 3> angles() const { return m_model.findings().angles.angles; }

    QPoint placeOf(const Vector3d& point_W) const
    {
        return m_stage.projection().project(point_W)->at.toPoint();
    }
    QPoint placeOn(int ring, double where) const
    {
        return placeOf(pointOn(m_stage.scene().rings[static_cast<std::size_t>(ring)], where));
    }

    /// A place where a press takes the ring.
    double grabbable(int ring) const
    {
        for (int n = 0; n < 36; ++n) {
            const double where = 40_deg + n * 10_deg;
            const Vector3d at =
                pointOn(m_stage.scene().rings[static_cast<std::size_t>(ring)], where);
            const Picked picked = pickAt(m_stage.scene(), m_stage.projection(), placeOf(at));
            if (picked.ring && picked.ring->ring == ring && (picked.ring->at_W - at).norm() < 0.1)
                return where;
        }
        ADD_FAILURE() << "ring " << ring << " is nowhere to be seen";
        return 0;
    }

    void press(const QPoint& at) { QTest::mousePress(&m_stage, Qt::LeftButton, {}, at); }
    void release(const QPoint& at) { QTest::mouseRelease(&m_stage, Qt::LeftButton, {}, at); }
    void move(const QPoint& at, Qt::MouseButtons buttons = Qt::LeftButton,
              Qt::KeyboardModifiers modifiers = {})
    {
        QMouseEvent event(QEvent::MouseMove, at, m_stage.mapToGlobal(QPointF(at)), Qt::NoButton,
                          buttons, modifiers);
        QApplication::sendEvent(&m_stage, &event);
    }

    /// Leads a ring by the mouse along its way; leaves the button down.
    QPoint lead(int ring, double turn, Qt::KeyboardModifiers modifiers = {})
    {
        const RingShape shape = m_stage.scene().rings[static_cast<std::size_t>(ring)];
        const Vector3d grabbed = pointOn(shape, grabbable(ring));
        press(placeOf(grabbed));
        QPoint at;
        for (int n = 1; n <= 10; ++n) {
            at = placeOf(Eigen::AngleAxisd(turn * n / 10, shape.pin_W) * grabbed);
            move(at, Qt::LeftButton, modifiers);
        }
        return at;
    }

    CaseModel m_model{{.start = {},
                       .chain = chainOf({Order::zyx, About::body, {30_deg, 20_deg, 10_deg}}),
                       .shown = {}}};
    StageWidget m_stage{m_model, std::make_unique<PainterRenderer>()};
};

// Mouse places are whole pixels, 0.7 off at most at either end; a unit is about 100 pixels and the
// shortest lever half a unit, foreshortened to no less than a third where these drags go: 1.4 / 17
// rad.
constexpr double kMouseTolerance = 5_deg;

TEST_F(Stage, DraggingARingTurnsJustItsAngleAndUndoesAsOneStep)
{
    for (const int ring : {0, 1, 2}) {
        const auto before = angles();
        const auto listed = static_cast<std::size_t>(
            m_stage.scene().rings.at(static_cast<std::size_t>(ring)).listed);
        release(lead(ring, 35_deg));
        auto expected = before;
        expected[listed] = angles()[listed];
        EXPECT_EQ(angles(), expected);
        EXPECT_NEAR(angles()[listed], before[listed] + 35_deg, kMouseTolerance) << ring;
        EXPECT_EQ(m_model.undoStack().count(), 1);
        m_model.undoStack().undo();
        EXPECT_EQ(angles(), before);
    }
}

TEST_F(Stage, ShiftSnapsADragToFifteenDegrees)
{
    release(lead(0, 42_deg, Qt::ShiftModifier));
    EXPECT_NEAR(angles()[0], 75_deg,
                1e-12);  // 30 + 42 = 72, rounded; a product of two exact numbers
}

TEST_F(Stage, EscapeGivesBackWhatADragChanged)
{
    const auto before = angles();
    const QPoint at = lead(1, 30_deg);
    EXPECT_NE(angles(), before);
    QTest::keyClick(&m_stage, Qt::Key_Escape);
    EXPECT_EQ(angles(), before);
    move(at + QPoint(30, 30));
    EXPECT_EQ(angles(), before);
    release(at);
    m_model.setAngle(0, 1.0);  // gestures are over: this is a step of its own
    m_model.setAngle(0, 2.0);
    EXPECT_EQ(m_model.undoStack().index(), 2);
}

TEST_F(Stage, KeysChooseARingAndTurnIt)
{
    QTest::keyClick(&m_stage, Qt::Key_2);
    EXPECT_EQ(m_stage.chosenRing(), 1);
    EXPECT_TRUE(m_stage.scene().rings[1].hovered);
    QTest::keyClick(&m_stage, Qt::Key_Right);
    EXPECT_NEAR(angles()[1], 21_deg, 1e-12);
    QTest::keyClick(&m_stage, Qt::Key_Left, Qt::ShiftModifier);
    EXPECT_NEAR(angles()[1], 6_deg, 1e-12);
    QTest::keyClick(&m_stage, Qt::Key_Right, Qt::ControlModifier);
    EXPECT_NEAR(angles()[1], 6.1_deg, 1e-12);
    EXPECT_EQ(m_model.undoStack().count(), 3);  // each key let go is a step
    EXPECT_EQ(angles()[0], 30_deg);
    EXPECT_EQ(angles()[2], 10_deg);
}

TEST_F(Stage, AHeldKeyUndoesAsOneStep)
{
    QTest::keyClick(&m_stage, Qt::Key_1);
    QTest::keyPress(&m_stage, Qt::Key_Right);
    for (int n = 0; n < 4; ++n) {
        QKeyEvent repeat(QEvent::KeyPress, Qt::Key_Right, {}, {}, true);
        QApplication::sendEvent(&m_stage, &repeat);
    }
    QTest::keyRelease(&m_stage, Qt::Key_Right);
    EXPECT_NEAR(angles()[0], 35_deg, 1e-12);
    EXPECT_EQ(m_model.undoStack().count(), 1);
}

TEST_F(Stage, HoveringLightsTheRingAndSaysWhatAPressWouldDo)
{
    QSignalSpy told(&m_stage, &StageWidget::ringPointedAt);
    for (const int ring : {0, 1, 2}) {
        move(placeOn(ring, grabbable(ring)), Qt::NoButton);
        EXPECT_EQ(m_stage.pointing().hoveredRing, ring);
        EXPECT_TRUE(m_stage.scene().rings.at(static_cast<std::size_t>(ring)).hovered);
        EXPECT_TRUE(m_stage.hint().contains(QString("the %1 ring").arg("zyx"[ring])));
        EXPECT_EQ(m_stage.cursor().shape(), Qt::OpenHandCursor);
    }
    EXPECT_EQ(told.count(), 3);
    move({5, 540}, Qt::NoButton);
    EXPECT_FALSE(m_stage.pointing().hoveredRing);
    EXPECT_EQ(m_stage.cursor().shape(), Qt::ArrowCursor);
}

TEST_F(Stage, TheBodyFollowsTheHandAndUndoesAsOneStep)
{
    const Eigen::Quaterniond before = m_model.findings().q_WB;
    const Vector3d grabbed_B(0.762, 0.05, 0.03);
    const QPoint from = placeOf(before * grabbed_B);
    press(from);
    for (int n = 1; n <= 6; ++n) {
        const QPoint at = from + QPoint(4 * n, -3 * n);
        move(at);
        const QPoint seen = placeOf(m_model.findings().q_WB * grabbed_B);
        EXPECT_LE((seen - at).manhattanLength(), 3);  // pixels, of which rounding is 2
    }
    release(from + QPoint(24, -18));
    EXPECT_EQ(m_model.undoStack().count(), 1);
    EXPECT_EQ(m_model.undoStack().undoText(), "turn the body");
    m_model.undoStack().undo();
    EXPECT_POSE_NEAR(m_model.findings().q_WB, before, 1e-15);
}

TEST_F(Stage, EmptySpaceOrbitsAndADoubleClickGoesBack)
{
    const auto before = angles();
    press({30, 500});
    move({80, 480});
    release({80, 480});
    EXPECT_NE(m_stage.camera().azimuth, Camera{}.azimuth);
    EXPECT_EQ(angles(), before);
    press({30, 500});
    move({30, 5000});  // far down: to the pole and no farther
    release({30, 500});
    EXPECT_LT(m_stage.camera().elevation, kPi / 2);
    QTest::mouseDClick(&m_stage, Qt::LeftButton, {}, {30, 500});
    EXPECT_EQ(m_stage.camera(), Camera{});
    EXPECT_EQ(m_model.undoStack().count(), 0);
}

TEST_F(Stage, TheWheelZoomsWithinLimits)
{
    const auto wheel = [&](int notches) {
        QWheelEvent event(QPointF(300, 300), QPointF(300, 300), {}, {0, 120 * notches}, {}, {},
                          Qt::NoScrollPhase, false);
        QApplication::sendEvent(&m_stage, &event);
    };
    wheel(1);
    EXPECT_LT(m_stage.camera().distance, Camera{}.distance);
    wheel(1000);
    EXPECT_GT(m_stage.camera().distance, kRingRadii[0]);
    wheel(-1000);
    EXPECT_LT(m_stage.camera().distance, kFarPlane);
}

TEST_F(Stage, KeysMoveTheCamera)
{
    QTest::keyClick(&m_stage, Qt::Key_Left, Qt::AltModifier);
    QTest::keyClick(&m_stage, Qt::Key_Plus);
    EXPECT_LT(m_stage.camera().azimuth, Camera{}.azimuth);
    EXPECT_LT(m_stage.camera().distance, Camera{}.distance);
    QTest::keyClick(&m_stage, Qt::Key_Home);
    EXPECT_EQ(m_stage.camera(), Camera{});
}

TEST_F(Stage, RestsAfterAChangeAndThenRunsNoTimer)
{
    m_model.setAngle(0, 0.4);
    EXPECT_FALSE(m_stage.isResting());
    EXPECT_TRUE(QTest::qWaitFor([&] { return m_stage.isResting(); }, 2000));
    QTest::qWait(50);
    EXPECT_TRUE(m_stage.isResting());
}

class NoRenderer : public StageRenderer {
public:
    QImage render(const Scene& /*scene*/, const Camera& /*camera*/, const QSize& /*size*/,
                  qreal /*pixelRatio*/, Scheme /*scheme*/) override
    {
        return {};
    }
};

TEST_F(Stage, ARendererThatCannotDrawIsReplacedAndSaid)
{
    QSignalSpy failed(&m_stage, &StageWidget::rendererFailed);
    m_stage.setRenderer(std::make_unique<NoRenderer>());
    EXPECT_FALSE(m_stage.grab().isNull());
    EXPECT_EQ(failed.count(), 1);
    EXPECT_FALSE(m_stage.picture({200, 150}, 2.0).isNull());
    EXPECT_EQ(failed.count(), 1);
}

TEST_F(Stage, APictureIsWithoutTheHandAndInBothSchemesDifferent)
{
    m_stage.picture({400, 300}, 2.0);  // the first use of a glyph may differ by a few pixels
    const QImage plain = m_stage.picture({400, 300}, 2.0);
    EXPECT_EQ(plain.size(), QSize(800, 600));
    move(placeOn(0, grabbable(0)), Qt::NoButton);
    EXPECT_EQ(m_stage.picture({400, 300}, 2.0), plain);
    m_stage.setScheme(Scheme::dark);
    EXPECT_NE(m_stage.picture({400, 300}, 2.0), plain);
}

}  // namespace
