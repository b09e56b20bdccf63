// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/copy_as.h"

#include <gtest/gtest.h>
#include <nlohmann/json.hpp>

#include "rotcore/reading/text_input.h"
#include "ui/panels/figure_text.h"

namespace {

using rotcore::fromDegrees;
using ui::CopyFormat;

// Rz(30) Ry(20) Rx(10), a pose without symmetry.
rotcore::Findings generalPose()
{
    rotcore::Case subject;
    subject.chain = rotcore::chainOf({rotcore::Order::zyx,
                                      rotcore::About::body,
                                      {fromDegrees(30), fromDegrees(20), fromDegrees(10)}});
    return rotcore::examine(subject).value();
}

// The pose of a copied text as the core reads it, with what may have to be said to it.
double offWhenReadBack(CopyFormat format, const rotcore::StatedReading& stated = {})
{
    const rotcore::Findings found = generalPose();
    const std::string text = ui::copyText(found, format).toStdString();
    const auto input = rotcore::readText(text, stated, rotcore::UnitGuess::fromValues);
    if (!input) {
        ADD_FAILURE() << text << "\n" << input.error().message;
        return 1.0;
    }
    const auto meaning = rotcore::interpret(input->numbers);
    return meaning ? rotcore::angleBetween(meaning->q_WB, found.q_WB) : 1.0;
}

// The texts hold every digit; reading normalises again and a matrix is solved for its quaternion, a
// dozen roundings of 1.1e-16 rad.
constexpr double kPoseTolerance = 1e-15;  // rad

TEST(CopyAs, TextForEigenGivesThePoseWhenReadBack)
{
    EXPECT_LT(offWhenReadBack(CopyFormat::eigenQuaternion), kPoseTolerance);
    EXPECT_LT(offWhenReadBack(CopyFormat::eigenMatrix), kPoseTolerance);
}

TEST(CopyAs, TextForPythonGivesThePoseWhenReadBack)
{
    EXPECT_LT(offWhenReadBack(CopyFormat::scipyRotation), kPoseTolerance);
    EXPECT_LT(offWhenReadBack(CopyFormat::numpyMatrix), kPoseTolerance);
}

TEST(CopyAs, PlainNumbersGiveThePoseWhenTheirLayoutIsSaid)
{
    rotcore::StatedReading quaternion;
    quaternion.kind = rotcore::Kind::quaternion;
    quaternion.scalar = rotcore::ScalarPlace::first;
    EXPECT_LT(offWhenReadBack(CopyFormat::quaternionWxyz, quaternion), kPoseTolerance);
    quaternion.scalar = rotcore::ScalarPlace::last;
    EXPECT_LT(offWhenReadBack(CopyFormat::quaternionXyzw, quaternion), kPoseTolerance);
    rotcore::StatedReading matrix;
    matrix.kind = rotcore::Kind::matrix;
    EXPECT_LT(offWhenReadBack(CopyFormat::matrixRows, matrix), kPoseTolerance);
    rotcore::StatedReading angles;
    angles.kind = rotcore::Kind::euler;
    angles.order = rotcore::Order::zyx;
    angles.unit = rotcore::AngleUnit::degrees;
    EXPECT_LT(offWhenReadBack(CopyFormat::angles, angles), kPoseTolerance);
}

TEST(CopyAs, AnglesAreTheRoundestThatAreTheSame)
{
    EXPECT_EQ(ui::copyText(generalPose(), CopyFormat::angles), "30 20 10");
}

TEST(CopyAs, EigenTakesTheScalarFirstAndSciPyLast)
{
    EXPECT_TRUE(ui::copyText(generalPose(), CopyFormat::eigenQuaternion)
                    .startsWith("Eigen::Quaterniond q_WB(0.9515"));
    EXPECT_TRUE(ui::copyText(generalPose(), CopyFormat::scipyRotation)
                    .startsWith("Rotation.from_quat([0.0381"));
}

TEST(CopyAs, JsonHoldsEveryFormWithItsConvention)
{
    const rotcore::Findings found = generalPose();
    const auto json = nlohmann::json::parse(ui::copyText(found, CopyFormat::json).toStdString());
    EXPECT_EQ(json["quaternion_wxyz"][0].get<double>(), found.q_WB.w());
    EXPECT_EQ(json["quaternion_wxyz"][3].get<double>(), found.q_WB.z());
    EXPECT_EQ(json["matrix_rows"][2][0].get<double>(), found.R_WB(2, 0));
    EXPECT_EQ(json["euler"]["order"], "zyx");
    EXPECT_EQ(json["euler"]["about"], "body");
    EXPECT_EQ(json["euler"]["values"][1].get<double>(), 20.0);
    EXPECT_EQ(json["direction"], "body-to-world");
}

TEST(CopyAs, EveryTextIsAscii)
{
    for (const CopyFormat format : ui::kAllCopyFormats)
        for (const QChar c : ui::copyText(generalPose(), format))
            EXPECT_LT(c.unicode(), 128) << ui::copyLabel(format, {}).toStdString();
}

TEST(FigureText, HasATrueMinusAndNoMinusZero)
{
    using ui::Quantity;
    EXPECT_EQ(ui::figureText(-30.0, Quantity::degrees), QString::fromUtf8("−30.000°"));
    EXPECT_EQ(ui::figureText(-0.0004, Quantity::degrees), QString::fromUtf8("0.000°"));
    EXPECT_EQ(ui::figureText(-0.5, Quantity::radians), QString::fromUtf8("−0.50000 rad"));
}

TEST(FigureText, RoughNumbersAreWrittenAsPowers)
{
    EXPECT_EQ(ui::roughText(2.2e-16), QString::fromUtf8("2 × 10⁻¹⁶"));
    EXPECT_EQ(ui::roughText(9.7e-17), QString::fromUtf8("1 × 10⁻¹⁶"));
    EXPECT_EQ(ui::roughText(0.03), "0.03");
    EXPECT_EQ(ui::roughText(0.0), "0");
}

TEST(FigureText, ReadsNumbersAsPeopleTypeThem)
{
    using ui::parseFigure;
    using ui::Quantity;
    const auto degrees = [](const char* text) {
        const auto number = parseFigure(QString::fromUtf8(text), Quantity::degrees);
        return number ? *number : -1e9;
    };
    EXPECT_EQ(degrees("30"), 30.0);
    EXPECT_EQ(degrees("−12,5"), -12.5);
    EXPECT_EQ(degrees(" 12.5° "), 12.5);
    EXPECT_EQ(degrees("30 deg"), 30.0);
    EXPECT_EQ(degrees("pi/2"), 90.0);
    EXPECT_NEAR(degrees("0.5 rad"), 28.64788975654116, 1e-13);  // 90/pi by bc; two roundings
    EXPECT_NEAR(*parseFigure("sqrt(2)/2", Quantity::quaternion), 0.7071067811865476, 1e-16);
    EXPECT_NEAR(*parseFigure("90 deg", Quantity::radians), 1.5707963267948966, 1e-16);
}

TEST(FigureText, RefusesWhatIsNotOneNumber)
{
    for (const char* text : {"", "abc", "1 2", "1,2,3", "12 apples", "0x10", "nan", "1e999", "3i"})
        EXPECT_FALSE(ui::parseFigure(text, ui::Quantity::degrees).has_value()) << text;
}

TEST(FigureText, MessagesAreSentencesWithTrueMinusSigns)
{
    EXPECT_EQ(ui::sentenceOf("its determinant is -1, so it mirrors"),
              QString::fromUtf8("Its determinant is −1, so it mirrors."));
    EXPECT_EQ(ui::sentenceOf("a left-handed one"), "A left-handed one.");
}

TEST(FigureText, FactorsStandAsMatricesAreMultiplied)
{
    rotcore::EulerAngles angles{rotcore::Order::zyx, rotcore::About::body, {0.5, 0.25, 0.125}};
    EXPECT_EQ(ui::factorsOf(angles, rotcore::AngleUnit::radians)[0].text, "Rz(0.500)");
    angles.about = rotcore::About::space;
    EXPECT_EQ(ui::factorsOf(angles, rotcore::AngleUnit::radians)[0].text, "Rx(0.125)");
    EXPECT_EQ(ui::factorsOf(angles, rotcore::AngleUnit::radians)[0].listed, 2);
}

}  // namespace
