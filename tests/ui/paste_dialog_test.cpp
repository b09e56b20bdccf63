// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/paste_dialog.h"

#include <QClipboard>
#include <QGuiApplication>

#include <gtest/gtest.h>

namespace {

using ui::CaseModel;

QString u8(const char* text)
{
    return QString::fromUtf8(text);
}

TEST(Paste, SaysWhatItTookAndApplies)
{
    CaseModel model;
    ui::PasteDialog dialog(model, nullptr);
    dialog.setText("Eigen::Quaterniond q(0.951549, 0.038135, 0.189308, 0.239298);");
    EXPECT_TRUE(dialog.taken().contains("wxyz")) << dialog.taken().toStdString();
    EXPECT_TRUE(dialog.result().contains(u8("z 30.000°"))) << dialog.result().toStdString();
    EXPECT_TRUE(dialog.result().contains("w 0.951549"));
    dialog.accept();
    EXPECT_NEAR(rotcore::toDegrees(model.findings().angles.angles[0]), 30.0, 1e-4);  // six decimals
    model.undoStack().undo();
    EXPECT_EQ(model.findings().q_WB.w(), 1.0);
}

TEST(Paste, AnotherReadingCanBeChosen)
{
    CaseModel model;
    ui::PasteDialog dialog(model, nullptr);
    dialog.setText("0.951549 0.038135 0.189308 0.239298");
    auto* readings = dialog.findChild<QListWidget*>();
    ASSERT_GT(readings->count(), 1);
    const QString first = dialog.taken();
    readings->setCurrentRow(1);
    EXPECT_NE(dialog.taken(), first);
}

TEST(Paste, AFaultNamesItsPlaceAndCannotBeApplied)
{
    CaseModel model;
    ui::PasteDialog dialog(model, nullptr);
    dialog.setText("30 20 ten");
    EXPECT_TRUE(dialog.remarks().startsWith("Line 1, column 4: 2 numbers"))
        << dialog.remarks().toStdString();
    dialog.accept();
    EXPECT_FALSE(model.undoStack().canUndo());
}

TEST(Paste, AMirroredMatrixIsRefusedNamingTheCause)
{
    CaseModel model;
    ui::PasteDialog dialog(model, nullptr);
    dialog.setText("1 0 0\n0 -1 0\n0 0 1");
    EXPECT_TRUE(dialog.remarks().contains("mirrors")) << dialog.remarks().toStdString();
    dialog.accept();
    EXPECT_FALSE(model.undoStack().canUndo());
}

TEST(Paste, TakesTheClipboardOnlyIfItHoldsNumbers)
{
    CaseModel model;
    QGuiApplication::clipboard()->setText("see you at the crane");
    ui::PasteDialog first(model, nullptr);
    first.fillFromClipboard();
    EXPECT_EQ(first.findChild<QPlainTextEdit*>()->toPlainText(), "");
    QGuiApplication::clipboard()->setText("30 20 10");
    ui::PasteDialog second(model, nullptr);
    second.fillFromClipboard();
    EXPECT_EQ(second.findChild<QPlainTextEdit*>()->toPlainText(), "30 20 10");
}

TEST(Paste, ColumnsCountBytesAndPositionsLetters)
{
    EXPECT_EQ(ui::positionOf(u8("30°\n12° x"), {2, 6}), 8);  // the degree sign has two bytes
}

}  // namespace
