// SPDX-License-Identifier: GPL-3.0-or-later
#include <QApplication>
#include <QClipboard>
#include <QTest>
#include <QWheelEvent>
#include <memory>

#include <gtest/gtest.h>

#include "ui/panels/figure_text.h"
#include "ui/panels/number_block.h"
#include "ui/panels/numbers_panel.h"

namespace {

using rotcore::fromDegrees;
using ui::CaseModel;
using ui::NumberField;

QString u8(const char* text)
{
    return QString::fromUtf8(text);
}

rotcore::EulerAngles zyxDegrees(double z, double y, double x)
{
    return {rotcore::Order::zyx,
            rotcore::About::body,
            {fromDegrees(z), fromDegrees(y), fromDegrees(x)}};
}

class Numbers : public testing::Test {
protected:
    void SetUp() override
    {
        m_panel = std::make_unique<ui::NumbersPanel>(m_model, nullptr);
        m_panel->resize(340, 900);
        m_panel->show();
        m_panel->activateWindow();
        ASSERT_TRUE(QTest::qWaitForWindowActive(m_panel.get()));
    }

    NumberField& field(const QString& name) const
    {
        auto* found = m_panel->findChild<NumberField*>(name);
        EXPECT_NE(found, nullptr) << name.toStdString();
        return *found;
    }

    QString text(const QString& name) const { return field(name).text(); }

    // Into a field, as a person does it.
    void type(const QString& name, const QString& number, Qt::Key then = Qt::Key_Return) const
    {
        NumberField& target = field(name);
        target.setFocus(Qt::TabFocusReason);
        target.selectAll();
        QTest::keyClicks(&target, number);
        if (then != Qt::Key_unknown) QTest::keyClick(&target, then);
    }

    // The sentence beneath the block that a field is in.
    QString noteBeneath(const QString& name) const
    {
        const auto* block = qobject_cast<ui::NumberBlock*>(field(name).parentWidget());
        return block != nullptr ? block->note() : QString();
    }

    void turn(double z, double y, double x) { m_model.setAngles(zyxDegrees(z, y, x), "turn"); }

    CaseModel m_model;
    std::unique_ptr<ui::NumbersPanel> m_panel;
};

// Rz(30) Ry(20) Rx(10): the matrix is printed to 8 decimals in the documentation of AHRS 0.3 (class
// DCM); the quaternion is by hand, products of half-angle sines and cosines.
TEST_F(Numbers, TypedAnglesGiveTheQuaternionAndMatrixOfTheHandbook)
{
    type("angle0", "30");
    type("angle1", "20");
    type("angle2", "10");
    EXPECT_EQ(text("quaternion0"), "0.951549");
    EXPECT_EQ(text("quaternion1"), "0.038135");
    EXPECT_EQ(text("quaternion2"), "0.189308");
    EXPECT_EQ(text("quaternion3"), "0.239298");
    const char* matrix[] = {"0.8138", "−0.4410", "0.3785", "0.4698", "0.8826",
                            "0.0180", "−0.3420", "0.1632", "0.9254"};
    for (int n = 0; n < 9; ++n)
        EXPECT_EQ(text(QStringLiteral("matrix%1").arg(n)), u8(matrix[n]));
    EXPECT_EQ(text("axisAngle"), u8("35.817°"));
    EXPECT_EQ(text("axis0"), "0.1240");
    EXPECT_EQ(text("axis2"), "0.7782");
}

TEST_F(Numbers, EachEditIsUndoneByOneStep)
{
    type("angle0", "30");
    type("angle1", "20");
    m_model.undoStack().undo();
    EXPECT_EQ(text("angle0"), u8("30.000°"));
    EXPECT_EQ(text("angle1"), u8("0.000°"));
    m_model.undoStack().undo();
    EXPECT_EQ(text("angle0"), u8("0.000°"));
    EXPECT_FALSE(m_model.undoStack().canUndo());
}

TEST_F(Numbers, BadInputChangesNothingAndExplains)
{
    turn(30, 20, 10);
    const auto before = m_model.subject();
    type("angle1", "twenty");
    EXPECT_EQ(m_model.subject(), before);
    EXPECT_TRUE(field("angle1").isBad());
    EXPECT_EQ(text("angle1"), "twenty");
    EXPECT_TRUE(field("angle1").toolTip().contains("is not one number"));
    QTest::keyClick(&field("angle1"), Qt::Key_Escape);
    EXPECT_EQ(text("angle1"), u8("20.000°"));
    EXPECT_FALSE(field("angle1").isBad());
}

TEST_F(Numbers, WhatIsBeingTypedIsHandedOverOnLeaving)
{
    type("angle0", "45", Qt::Key_Tab);
    EXPECT_EQ(m_model.findings().angles.angles[0], fromDegrees(45));
}

TEST_F(Numbers, ExpressionsAndTheOtherUnitAreUnderstood)
{
    type("angle0", "pi/6");
    EXPECT_EQ(text("angle0"), u8("30.000°"));
    type("angle0", "12,5");
    EXPECT_EQ(text("angle0"), u8("12.500°"));
}

TEST_F(Numbers, KeysStepByOneFifteenAndATenth)
{
    turn(30, 20, 10);
    NumberField& z = field("angle0");
    z.setFocus();
    QTest::keyClick(&z, Qt::Key_Up);
    EXPECT_EQ(text("angle0"), u8("31.000°"));
    QTest::keyClick(&z, Qt::Key_Down, Qt::ShiftModifier);
    EXPECT_EQ(text("angle0"), u8("16.000°"));
    QTest::keyClick(&z, Qt::Key_Up, Qt::ControlModifier);
    EXPECT_EQ(text("angle0"), u8("16.100°"));
}

TEST_F(Numbers, AHeldKeyIsUndoneByOneStep)
{
    turn(30, 20, 10);
    NumberField& z = field("angle0");
    z.setFocus();
    QTest::keyPress(&z, Qt::Key_Up);
    QTest::keyPress(&z, Qt::Key_Up);
    QTest::keyPress(&z, Qt::Key_Up);
    QTest::keyRelease(&z, Qt::Key_Up);
    EXPECT_EQ(text("angle0"), u8("33.000°"));
    m_model.undoStack().undo();
    EXPECT_EQ(text("angle0"), u8("30.000°"));
}

TEST_F(Numbers, TheWheelStepsOnlyTheFieldThatHasTheFocus)
{
    turn(30, 20, 10);
    const auto roll = [this](const QString& name) {
        NumberField& target = field(name);
        const QPointF centre = QRectF(target.rect()).center();
        QWheelEvent notch(centre, target.mapToGlobal(centre), {}, {0, 120}, Qt::NoButton,
                          Qt::NoModifier, Qt::NoScrollPhase, false);
        QApplication::sendEvent(&target, &notch);
    };
    field("angle0").setFocus();
    roll("angle1");
    EXPECT_EQ(text("angle1"), u8("20.000°"));
    roll("angle0");
    roll("angle0");
    EXPECT_EQ(text("angle0"), u8("32.000°"));
    QTest::mouseClick(&field("angle1"), Qt::LeftButton);  // ends the roll
    m_model.undoStack().undo();
    EXPECT_EQ(text("angle0"), u8("30.000°"));
}

TEST_F(Numbers, TabGoesThroughTheBlocksAsTheyStand)
{
    m_panel->setMoreUnfolded(true);
    QStringList names;
    QWidget* each = &field("angle0");
    for (int step = 0; step < 200 && names.size() < 29; ++step, each = each->nextInFocusChain())
        if (qobject_cast<NumberField*>(each) != nullptr) names << each->objectName();
    EXPECT_EQ(
        names.join(' '),
        "angle0 angle1 angle2 quaternion0 quaternion1 quaternion2 quaternion3 matrix0 matrix1 "
        "matrix2 matrix3 matrix4 matrix5 matrix6 matrix7 matrix8 axisAngle axis0 axis1 axis2 "
        "more00 more01 more02 more10 more11 more12 more20 more21 more22");
}

TEST_F(Numbers, APanelIsWideEnoughForRadians)
{
    m_panel->setMoreUnfolded(true);
    rotcore::Convention radians = m_model.findings().shown;
    radians.unit = rotcore::AngleUnit::radians;
    m_model.setConvention(radians, "change the unit");
    QTest::qWait(20);
    m_panel->resize(m_panel->minimumSizeHint());
    QTest::qWait(20);
    const NumberField& last = field("more02");
    EXPECT_LE(last.mapTo(m_panel.get(), QPoint(last.width(), 0)).x(), m_panel->width());
    EXPECT_GE(last.width(), last.fontMetrics().horizontalAdvance(u8("−0.00000 rad")));
}

TEST_F(Numbers, CopyTakesAllDigitsInPlainText)
{
    turn(-100.0 / 3.0, 20, 10);
    NumberField& z = field("angle0");
    z.setFocus();
    z.selectAll();
    QTest::keyClick(&z, Qt::Key_C, Qt::ControlModifier);
    const QString copied = QGuiApplication::clipboard()->text();
    EXPECT_TRUE(copied.startsWith("-33.3333333")) << copied.toStdString();
    EXPECT_EQ(fromDegrees(copied.toDouble()), m_model.findings().angles.angles[0]);
}

TEST_F(Numbers, AQuaternionComponentIsNormalisedAndTheLengthTold)
{
    type("quaternion3", "1");  // w stays 1
    EXPECT_EQ(text("quaternion0"), "0.707107");
    EXPECT_EQ(text("quaternion3"), "0.707107");
    EXPECT_EQ(text("angle0"), u8("90.000°"));
    EXPECT_TRUE(noteBeneath("quaternion3").contains("1.4142"))
        << noteBeneath("quaternion3").toStdString();
    m_model.undoStack().undo();
    EXPECT_EQ(text("quaternion3"), "0.000000");
    EXPECT_EQ(noteBeneath("quaternion3"), "");
}

TEST_F(Numbers, FourZerosAreRefused)
{
    type("quaternion0", "0");
    EXPECT_TRUE(field("quaternion0").isBad());
    EXPECT_EQ(text("quaternion0"), "0");
    EXPECT_NE(noteBeneath("quaternion0"), "");
    EXPECT_EQ(m_model.findings().q_WB.w(), 1.0);
}

TEST_F(Numbers, LayoutAndAlgebraOnlyChangeHowTheQuaternionIsWritten)
{
    turn(30, 20, 10);
    const auto before = m_model.subject();
    m_model.setView({.worldNames = ui::WorldNames::plain,
                     .quaternionLayout = rotcore::ScalarPlace::last,
                     .quaternionAlgebra = rotcore::Algebra::jpl});
    EXPECT_EQ(text("quaternion3"), "0.951549");
    EXPECT_EQ(text("quaternion0"), u8("−0.038135"));
    EXPECT_EQ(m_model.subject(), before);
    type("quaternion3", "0.951549");  // written and read in the same layout
    EXPECT_NEAR(rotcore::toDegrees(m_model.findings().angles.angles[0]), 30.0, 1e-3);
}

TEST_F(Numbers, AMatrixWaitsForEnter)
{
    type("matrix0", "-1", Qt::Key_Tab);
    EXPECT_EQ(m_model.findings().R_WB(0, 0), 1.0);
    EXPECT_TRUE(noteBeneath("matrix0").contains("Enter"));
    type("matrix4", "-1");  // now a half turn about z
    EXPECT_EQ(m_model.findings().R_WB(0, 0), -1.0);
    EXPECT_EQ(text("angle0"), u8("180.000°"));
    EXPECT_EQ(noteBeneath("matrix0"), "");
}

TEST_F(Numbers, AMirroredMatrixIsRefusedNamingTheCause)
{
    const auto before = m_model.subject();
    type("matrix4", "-1");
    EXPECT_EQ(m_model.subject(), before);
    const QString why = noteBeneath("matrix4");
    EXPECT_TRUE(why.contains("mirrors")) << why.toStdString();
    EXPECT_TRUE(why.contains("second column is negated")) << why.toStdString();
    EXPECT_TRUE(field("matrix4").isBad());
    QTest::keyClick(&field("matrix4"), Qt::Key_Escape);
    EXPECT_EQ(text("matrix4"), "1.0000");
    EXPECT_FALSE(field("matrix0").isBad());
    EXPECT_EQ(noteBeneath("matrix4"), "");
}

TEST_F(Numbers, AxisAndAngleSetThePose)
{
    type("axisAngle", "90");  // about x, which stands for any axis
    EXPECT_EQ(text("angle2"), u8("90.000°"));
    type("axis1", "1");  // now about x + y
    EXPECT_EQ(text("axis0"), "0.7071");
    EXPECT_EQ(text("axisAngle"), u8("90.000°"));
}

TEST_F(Numbers, TheVectorsAreFoldedAwayAndCanBeEdited)
{
    EXPECT_FALSE(field("more00").isVisible());
    m_panel->setMoreUnfolded(true);
    EXPECT_TRUE(field("more00").isVisible());
    type("more02", "90");  // rotation vector, degrees about z
    EXPECT_EQ(text("angle0"), u8("90.000°"));
    EXPECT_EQ(text("more12"), "1.0000");  // tan 45 deg
    EXPECT_EQ(text("more22"), "0.4142");  // tan 22.5 deg
    type("more12", "0");
    EXPECT_EQ(text("angle0"), u8("0.000°"));
}

TEST_F(Numbers, AtLockTheSentenceSaysWhatIsStillFixed)
{
    turn(30, 90, 10);
    const QString note = noteBeneath("angle0");
    EXPECT_TRUE(note.startsWith(u8("At lock: only z − x = 20.000° is fixed")))
        << note.toStdString();
    EXPECT_TRUE(note.contains(u8("30.000°")));
    turn(30, 80, 10);
    EXPECT_EQ(noteBeneath("angle0"), "");
}

TEST_F(Numbers, ShowWhatTheFindingsHold)
{
    turn(-170, 95, 200);  // as turned, past lock and past a half turn
    EXPECT_EQ(text("angle0"), u8("−170.000°"));
    EXPECT_EQ(text("angle1"), u8("95.000°"));
    EXPECT_EQ(text("angle2"), u8("200.000°"));
    const auto& q = m_model.findings().q_WB;
    EXPECT_EQ(text("quaternion0"), ui::figureText(q.w(), ui::Quantity::quaternion));
    EXPECT_EQ(text("quaternion3"), ui::figureText(q.z(), ui::Quantity::quaternion));
}

TEST_F(Numbers, EveryFieldHasAnAccessibleNameAndAFullPrecisionTip)
{
    turn(30, 20, 10);
    for (const NumberField* each : m_panel->findChildren<NumberField*>()) {
        EXPECT_FALSE(each->accessibleName().isEmpty()) << each->objectName().toStdString();
        EXPECT_TRUE(each->toolTip().contains('\n')) << each->objectName().toStdString();
    }
    EXPECT_TRUE(field("quaternion0").toolTip().contains("0.95154"));
}

}  // namespace
