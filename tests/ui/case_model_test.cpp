// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/model/case_model.h"

#include <QSignalSpy>

#include "rotcore/rotation/euler_solutions.h"
#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using ui::CaseModel;

Case threeTurns(double a, double b, double c)
{
    return {.start = {}, .chain = chainOf({Order::zyx, About::body, {a, b, c}}), .shown = {}};
}

TEST(CaseModel, AnEditTellsItsPanelsOnceAndUndoes)
{
    CaseModel model(threeTurns(30_deg, 20_deg, 10_deg));
    QSignalSpy changed(&model, &CaseModel::findingsChanged);
    model.setAngle(1, 50_deg);
    EXPECT_EQ(changed.count(), 1);
    EXPECT_EQ(model.findings().angles.angles, (std::array{30_deg, 50_deg, 10_deg}));
    EXPECT_EQ(model.undoStack().undoText(), "turn about y");
    model.undoStack().undo();
    EXPECT_EQ(model.subject(), threeTurns(30_deg, 20_deg, 10_deg));
    model.undoStack().redo();
    EXPECT_EQ(model.findings().angles.angles[1], 50_deg);
}

TEST(CaseModel, AnEditThatChangesNothingIsNoStep)
{
    CaseModel model(threeTurns(30_deg, 20_deg, 10_deg));
    QSignalSpy changed(&model, &CaseModel::findingsChanged);
    model.setAngle(0, 30_deg);
    EXPECT_EQ(changed.count(), 0);
    EXPECT_FALSE(model.undoStack().canUndo());
}

TEST(CaseModel, AGestureIsOneStepAndTheNextGestureAnother)
{
    CaseModel model(threeTurns(0, 0, 0));
    for (int gesture = 0; gesture < 2; ++gesture) {
        model.beginGesture();
        for (int step = 1; step <= 10; ++step)
            model.setAngle(0, 0.1 * step + gesture);
        model.endGesture();
    }
    EXPECT_EQ(model.undoStack().count(), 2);
    model.undoStack().undo();
    EXPECT_EQ(model.findings().angles.angles[0], 1.0);
    model.undoStack().undo();
    EXPECT_EQ(model.findings().angles.angles[0], 0.0);
}

TEST(CaseModel, AGestureThatEndsWhereItBeganLeavesNoStep)
{
    CaseModel model(threeTurns(0, 0, 0));
    model.beginGesture();
    model.setAngle(0, 0.5);
    model.setAngle(0, 0.0);
    model.endGesture();
    EXPECT_FALSE(model.undoStack().canUndo());
}

TEST(CaseModel, AnotherOrderKeepsThePoseAndUndoesToTheSameAngles)
{
    CaseModel model(threeTurns(30_deg, 20_deg, 10_deg));
    const Eigen::Quaterniond before = model.findings().q_WB;
    for (const Order order : kAllOrders)
        for (const About about : {About::body, About::space}) {
            Convention convention = model.subject().shown;
            convention.order = order;
            convention.about = about;
            model.setConvention(convention, "change the order");
            EXPECT_POSE_NEAR(model.findings().q_WB, before,
                             2e-13);  // up to 24 conversions in a row
            EXPECT_EQ(model.findings().angles.order, order);
        }
    while (model.undoStack().canUndo())
        model.undoStack().undo();
    EXPECT_EQ(model.subject(), threeTurns(30_deg, 20_deg, 10_deg));
}

TEST(CaseModel, AUnitChangesNoAngle)
{
    CaseModel model(threeTurns(0.3, 200_deg, 0.1));
    Convention convention = model.subject().shown;
    convention.unit = AngleUnit::radians;
    model.setConvention(convention, "change the unit");
    EXPECT_EQ(model.findings().angles.angles[1], 200_deg);
}

TEST(CaseModel, SettingAPoseKeepsTheAnglesNearAndTheOuterOneAtLock)
{
    CaseModel model(threeTurns(30_deg, 100_deg, 10_deg));  // past lock: not the canonical triple
    const EulerAngles wanted{Order::zyx, About::body, {31_deg, 101_deg, 11_deg}};
    model.setPose(pose(wanted), "turn the body");
    for (std::size_t n = 0; n < 3; ++n)
        EXPECT_NEAR(model.findings().angles.angles[n], wanted.angles[n], 1e-13);
    model.setPose(pose({Order::zyx, About::body, {0.0, 90_deg, 20_deg}}), "turn the body");
    EXPECT_TRUE(model.findings().euler.locked());
    EXPECT_NEAR(model.findings().angles.angles[0], 31_deg, 1e-13);
}

TEST(CaseModel, BadNumbersAreRefusedAndChangeNothing)
{
    CaseModel model(threeTurns(30_deg, 20_deg, 10_deg));
    const auto fault =
        model.setNumbers({{.kind = Kind::matrix}, {1, 0, 0, 0, 1, 0, 0, 0, -1}}, "paste");
    ASSERT_TRUE(fault);
    EXPECT_EQ(fault->kind, Fault::Kind::leftHanded);
    EXPECT_EQ(model.subject(), threeTurns(30_deg, 20_deg, 10_deg));
    EXPECT_FALSE(model.setNumbers({{.kind = Kind::quaternion}, {2, 0, 0, 0}}, "paste"));
    EXPECT_POSE_NEAR(model.findings().q_WB, Eigen::Quaterniond::Identity(), 0.0);
}

TEST(CaseModel, TheViewIsNoPartOfTheHistory)
{
    CaseModel model;
    QSignalSpy changed(&model, &CaseModel::viewChanged);
    model.setView({.worldNames = ui::WorldNames::eastNorthUp});
    model.setView({.worldNames = ui::WorldNames::eastNorthUp});
    EXPECT_EQ(changed.count(), 1);
    EXPECT_FALSE(model.undoStack().canUndo());
}

}  // namespace
