// SPDX-License-Identifier: GPL-3.0-or-later
// Plain numbers: how they are parted, what they are taken for, their unit, and what is refused.
#include "rotcore/reading/text_input.h"

#include <cmath>
#include <numbers>

#include "tests/core/text_input_support.h"

namespace {

using namespace text_input_test;

constexpr double kHalfPi = std::numbers::pi / 2.0;

// ---- numbers and what stands between them

TEST(TextInput, SeparatorsAndBracketsOfAllSortsPartNumbers)
{
    for (const char* text :
         {"30 20.5 -10", "30,20.5,-10", "30, 20.5, -10", "30;20.5;-10", "30\t20.5\t-10",
          "30\n20.5\n-10\n", "30\r\n20.5\r\n-10\r\n", "[30, 20.5, -10]", "((30), (20.5), (-10))",
          "{{30, 20.5}, {-10}}", "[[30], [20.5], [-10]]", "<30 20.5 -10>", "| 30 20.5 -10 |",
          "  30 ,20.5 , -10 ,", "(+30, 20.5, \u221210)", "30\u00A020.5\u3000-10",
          "\uFEFF30\uFF0C20.5\uFF0C-10", "- 30\n- 20.5\n- -10\n"})
        EXPECT_EQ(read(text).numbers, degreesZyx({30, 20.5, -10})) << text;
}

TEST(TextInput, NumbersOfEveryStyleComeThroughExactly)
{
    const auto input =
        read("1. .5 1e-21 +3 0.1 -0.30000000000000004 1.5e-3 1.03e-21 123456789.123456789");
    EXPECT_EQ(input.numbers.values,
              (std::vector<double>{1.0, 0.5, 1e-21, 3.0, 0.1, -0.30000000000000004, 1.5e-3,
                                   1.03e-21, 123456789.123456789}));
    const auto code = read("{0.1f, 1.0F, 2.5e-1f, -1.0L, 0.25d, 1.0D-3, 1E2, 4.9e-324, 1e-400}");
    EXPECT_EQ(code.numbers.values,
              (std::vector<double>{0.1, 1.0, 0.25, -1.0, 0.25, 1e-3, 100.0, 4.9e-324, 0.0}));
}

TEST(TextInput, ACommaBetweenDigitsIsDecimalWhereSomethingElsePartsTheNumbers)
{
    for (const char* text :
         {"0,5; 0,1; 0,2", "0,5 0,1 0,2", "0,5, 0,1, 0,2", "[0,5\t0,1\t0,2]", "0,5\n0,1\n0,2"}) {
        const auto input = read(text);
        EXPECT_EQ(input.numbers.values, (std::vector<double>{0.5, 0.1, 0.2})) << text;
        EXPECT_TRUE(says(input, "decimal marks")) << text;
    }
    EXPECT_EQ(read("x=0,25 y=0,5 z=1,5e1").numbers.values, (std::vector<double>{0.25, 0.5, 15.0}));
}

TEST(TextInput, ACommaPartsNumbersWhereNothingElseDoes)
{
    EXPECT_EQ(read("0,5,10").numbers, degreesZyx({0, 5, 10}));
    EXPECT_EQ(read("0.5,0.1 0.2").numbers, degreesZyx({0.5, 0.1, 0.2}));
    EXPECT_EQ(read("1,0,0;0,1,0;0,0,1").numbers, rows({1, 0, 0, 0, 1, 0, 0, 0, 1}));
    EXPECT_EQ(read("1,0 0,0").numbers, wxyz({1, 0, 0, 0}));  // as decimals they would be two
}

TEST(TextInput, CommasThatCouldBeEitherAreTold)
{
    const auto input = read("5,5 5,5 0,0 0,1");  // four decimals, or eight numbers
    EXPECT_EQ(input.numbers, wxyz({5.5, 5.5, 0, 0.1}));
    EXPECT_TRUE(says(input, "could separate")) << warningsOf(input);
    EXPECT_EQ(other(input, "commas separate"), xyzw({0, 0, 0, 1}));  // after time and position
}

TEST(TextInput, DimensionsAndNamesWithDigitsAreNoValues)
{
    const std::vector<double> quarter{0, -1, 0, 1, 0, 0, 0, 0, 1};
    for (const char* text :
         {"double R[9] = {0, -1, 0, 1, 0, 0, 0, 0, 1};",
          "float R_1[3][3] = {{0, -1, 0}, {1, 0, 0}, {0, 0, 1}};", "3x3 matrix: 0 -1 0 1 0 0 0 0 1",
          "3 x 3: 0 -1 0 1 0 0 0 0 1", "Matrix 3\u00D73\n0 -1 0\n1 0 0\n0 0 1",
          "Matrix3d m2; m2 << 0,-1,0, 1,0,0, 0,0,1;",
          "R[0][0]=0; R[0][1]=-1; R[0][2]=0; R[1][0]=1; R[1][1]=0; R[1][2]=0; R[2][0]=0; "
          "R[2][1]=0; "
          "R[2][2]=1;",
          "R(0,0) = 0; R(0,1) = -1; R(0,2) = 0; R(1,0) = 1; R(1,1) = 0; R(1,2) = 0; R(2,0) = 0; "
          "R(2,1) = 0; R(2,2) = 1;"})
        EXPECT_EQ(read(text).numbers, rows(quarter)) << text;
    EXPECT_EQ(read("Vector3d v(30, 20, 10)").numbers, degreesZyx({30, 20, 10}));
    EXPECT_EQ(read("pose 2: 30 20 10").numbers, degreesZyx({30, 20, 10}));
}

// ---- what numbers are taken for

TEST(TextInput, ThreeBareNumbersAreGuessedToBeEulerAngles)
{
    const auto input = read("30 20 10");
    EXPECT_TRUE(input.kindGuessed);
    EXPECT_EQ(input.numbers, degreesZyx({30, 20, 10}));
    EXPECT_TRUE(says(input, "taken for Euler angles"));
    EXPECT_TRUE(says(input, "zyx about body"));
    EXPECT_TRUE(says(input, "assumed: degrees"));
    ASSERT_EQ(input.others.size(), 2U);
    EXPECT_EQ(input.others[0].numbers, radiansZyx({30, 20, 10}));
    EXPECT_EQ(input.others[1].numbers, vector(kRadians, {30, 20, 10}));
}

TEST(TextInput, FourBareNumbersOfLengthOneAreAQuaternion)
{
    const auto input = read("0.5 0.5 -0.5 0.5");
    EXPECT_TRUE(input.kindGuessed);
    EXPECT_EQ(input.numbers, wxyz({0.5, 0.5, -0.5, 0.5}));
    EXPECT_EQ(other(input, "scalar last"), xyzw({0.5, 0.5, -0.5, 0.5}));
    EXPECT_TRUE(says(input, "wxyz"));
}

TEST(TextInput, FourBareNumbersWithAUnitAxisAreAxisAndAngle)
{
    const auto input = read("0.6 0 -0.8 90");
    EXPECT_TRUE(input.kindGuessed);
    EXPECT_EQ(input.numbers, axisAngle(kDegrees, {0.6, 0, -0.8, 90}));
    EXPECT_EQ(other(input, "quaternion"), wxyz({0.6, 0, -0.8, 90}));
    EXPECT_EQ(read("1 1 0 45").numbers, axisAngle(kDegrees, {1, 1, 0, 45}));
}

TEST(TextInput, AnAngleBeforeItsUnitAxisIsMovedBehindIt)
{
    const auto input = read("90 0.6 0 0.8");
    EXPECT_EQ(input.numbers, axisAngle(kDegrees, {0.6, 0, 0.8, 90}));
    EXPECT_TRUE(says(input, "an angle, then its axis"));
    EXPECT_EQ(other(input, "quaternion"), wxyz({90, 0.6, 0, 0.8}));
    const auto both = read("1 0 0 -1");
    EXPECT_EQ(both.numbers, axisAngle(kDegrees, {1, 0, 0, -1}));
    EXPECT_EQ(other(both, "an angle, then its axis"), axisAngle(kDegrees, {0, 0, -1, 1}));
}

TEST(TextInput, FourNumbersOfNoLengthAreAQuaternionToBeNormalised)
{
    const auto input = read("1 2 3 4");
    EXPECT_EQ(input.numbers, wxyz({1, 2, 3, 4}));
    EXPECT_TRUE(says(input, "not normalised"));
    EXPECT_EQ(other(input, "axis"), axisAngle(kDegrees, {1, 2, 3, 4}));
}

TEST(TextInput, NineBareNumbersAreAMatrixByRows)
{
    const auto input = read(" 0 -1 0\n 1 0 0\n 0 0 1\n");
    EXPECT_EQ(input.numbers, rows({0, -1, 0, 1, 0, 0, 0, 0, 1}));
    EXPECT_EQ(other(input, "columns"), columns({0, -1, 0, 1, 0, 0, 0, 0, 1}));
    EXPECT_TRUE(says(input, "taken for a matrix"));
    EXPECT_FALSE(says(input, "far from a rotation"));
    EXPECT_TRUE(says(read("30 20 10\n40 50 60\n70 80 90"), "far from a rotation"));
}

TEST(TextInput, TheTranslationOfATwelveNumberMatrixIsLeftAside)
{
    const auto input = read("0 -1 0 5\n1 0 0 6\n0 0 1 7");
    EXPECT_EQ(input.numbers, rows({0, -1, 0, 1, 0, 0, 0, 0, 1}));
    EXPECT_TRUE(says(input, "last column is left aside as the translation"));
    const auto rotationFirst = read("0 -1 0 1 0 0 0 0 1 5 6 7");
    EXPECT_EQ(rotationFirst.numbers, rows({0, -1, 0, 1, 0, 0, 0, 0, 1}));
    EXPECT_TRUE(says(rotationFirst, "last three are left aside"));
}

TEST(TextInput, AHomogeneousMatrixIsReadByRows)
{
    const auto input = read("[[0,-1,0,5],[1,0,0,6],[0,0,1,7],[0,0,0,1]]");
    EXPECT_EQ(input.numbers, rows({0, -1, 0, 1, 0, 0, 0, 0, 1}));
    EXPECT_TRUE(says(input, "translation of a 4x4 matrix is left aside"));
    EXPECT_FALSE(says(read("1 0 0 0 0 1 0 0 0 0 1 0 0 0 0 1"), "left aside"));
}

TEST(TextInput, AHomogeneousMatrixWithItsTranslationInTheLastRowIsTransposed)
{
    const auto input = read("0 1 0 0  -1 0 0 0  0 0 1 0  5 6 7 1");
    EXPECT_EQ(input.numbers, columns({0, 1, 0, -1, 0, 0, 0, 0, 1}));
    EXPECT_TRUE(says(input, "looks transposed"));
    StatedReading stated;
    stated.storage = Storage::rows;
    EXPECT_EQ(read("0 1 0 0 -1 0 0 0 0 0 1 0 5 6 7 1", stated).numbers.reading.storage,
              Storage::rows);
}

TEST(TextInput, ALastRowOtherThanZeroZeroZeroOneIsTold)
{
    EXPECT_TRUE(says(read("1 0 0 5 0 1 0 6 0 0 1 7 0 0 0.5 1"), "last row of the 4x4"));
    EXPECT_TRUE(says(read("1 0 0 5 0 1 0 6 0 0 1 7 0 0 0 2"), "last row of the 4x4"));
    EXPECT_FALSE(says(read("1 0 0 5 0 1 0 6 0 0 1 7 0 0 0 1"), "last row of the 4x4"));
}

// ---- units

TEST(TextInput, AUnitAtTheNumbersDecides)
{
    for (const char* text :
         {"30deg 20deg 10deg", "30 deg, 20 deg, 10 deg", "30\u00B0 20\u00B0 10\u00B0",
          "30 20 10 degrees", "(30, 20, 10) deg", "30 20 10 [deg]", "30_deg 20_deg 10_deg",
          "30 20 10 in degrees", "30*deg 20*deg 10*deg", "30 20 10deg",
          "[30, 20, 10], degrees=True", "(deg): 30 20 10"}) {
        const auto input = read(text);
        EXPECT_EQ(input.numbers, degreesZyx({30, 20, 10})) << text;
        EXPECT_FALSE(says(input, "assumed: degrees")) << text;
    }
    for (const char* text :
         {"0.5rad 0.2 rad 0.1 radians", "(0.5, 0.2, 0.1) rad", "radians: 0.5 0.2 0.1",
          "[0.5, 0.2, 0.1], degrees=False", "angles [rad] 0.5 0.2 0.1"})
        EXPECT_EQ(read(text).numbers, radiansZyx({0.5, 0.2, 0.1})) << text;
}

TEST(TextInput, MixedUnitsAreBroughtToRadians)
{
    const auto input = read("30deg 0.5rad -90deg");
    EXPECT_EQ(input.numbers, radiansZyx({fromDegrees(30), 0.5, fromDegrees(-90)}));
    EXPECT_TRUE(says(input, "mixed"));
    EXPECT_EQ(read("0 0 90deg").numbers, degreesZyx({0, 0, 90}));  // zero needs no unit
    EXPECT_EQ(read("10 pi/2 90deg").numbers, radiansZyx({10, kHalfPi, fromDegrees(90)}));
}

TEST(TextInput, AFactorPiMeansRadians)
{
    const double pi = std::numbers::pi;
    struct Written {
        const char* text;
        double number;
    };
    for (const Written& written :
         std::initializer_list<Written>{{"pi/2", pi / 2},
                                        {"-pi", -pi},
                                        {"M_PI/2", pi / 2},
                                        {"Math.PI/2", pi / 2},
                                        {"0.1*np.pi", 0.1 * pi},
                                        {"${-pi/2}", -pi / 2},
                                        {"2*pi/3", 2 * pi / 3},
                                        {"numpy.pi", pi},
                                        {"std::numbers::pi", pi},
                                        {"\u03C0/2", pi / 2},
                                        {"2pi", 2 * pi},
                                        {"2\u03C0/3", 2 * pi / 3},
                                        {"-M_PI_4", -pi / 4},
                                        {"30*pi/180", 30 * pi / 180},
                                        {"(1+2)*pi/4", 3 * pi / 4},
                                        {"-(pi/2)", -(pi / 2)},
                                        {"pi/2 - 0.1", pi / 2 - 0.1},
                                        {"1-pi", 1 - pi},
                                        {"math.radians(30)", fromDegrees(30)},
                                        {"np.deg2rad(-30)", fromDegrees(-30)},
                                        {"30 * DEG2RAD", 30 * kRadiansPerDegree},
                                        {"tau/8", 2 * pi / 8}}) {
        const auto input = read(std::string("[0, ") + written.text + ", 0]");
        EXPECT_EQ(input.numbers, radiansZyx({0, written.number, 0})) << written.text;
    }
}

TEST(TextInput, ArithmeticWithoutPiHasNoUnit)
{
    const double root = std::sqrt(2.0);
    const double half = root / 2.0;
    EXPECT_EQ(read("sqrt(2)/2 0 0 sqrt(2)/2").numbers, wxyz({half, 0, 0, half}));
    EXPECT_EQ(read("1/sqrt(2), 0, 0, -1/Math.sqrt(2)").numbers, wxyz({1 / root, 0, 0, -1 / root}));
    EXPECT_EQ(read("[M_SQRT1_2, 0, 0, -M_SQRT1_2]").numbers, wxyz({half, 0, 0, -half}));
    EXPECT_EQ(read("0.5**0.5 0 0 0.5**0.5").numbers,
              wxyz({std::pow(0.5, 0.5), 0, 0, std::pow(0.5, 0.5)}));
    EXPECT_EQ(read("cos(pi/8) 0 0 sin(pi/8)").numbers,
              wxyz({std::cos(std::numbers::pi / 8), 0, 0, std::sin(std::numbers::pi / 8)}));
    EXPECT_EQ(read("180/2 20*2 -(3+4)").numbers, degreesZyx({90, 40, -7}));
}

TEST(TextInput, ASignBeginsANumberUnlessThereIsOtherArithmetic)
{
    EXPECT_EQ(read("1 -2 3").numbers, degreesZyx({1, -2, 3}));
    EXPECT_EQ(read("1 - 2 3").numbers, degreesZyx({1, -2, 3}));
    EXPECT_EQ(read("1-2+3").numbers, degreesZyx({1, -2, 3}));
    EXPECT_EQ(read("0 -pi/2 0").numbers, radiansZyx({0, -kHalfPi, 0}));
    EXPECT_EQ(read("0\n-pi/2\n0").numbers, radiansZyx({0, -kHalfPi, 0}));
}

TEST(TextInput, AnglesThatAreMultiplesOfPiTwelfthsAreGuessedToBeRadians)
{
    for (const char* text :
         {"3.14 0 0", "0 1.57 0.2", "0.785 0 0", "0.12 -0. 1.5707963", "-2.618 0 0",
          "3.141 0 0" /* cut off, not rounded */, "1.05 0 0", "6.28 0 0"}) {
        const auto input = read(text);
        EXPECT_EQ(input.numbers.reading.unit, kRadians) << text;
        EXPECT_TRUE(says(input, "taken in radians")) << text;
        EXPECT_EQ(other(input, "degrees").reading.unit, kDegrees) << text;
    }
}

TEST(TextInput, AnglesWithoutSuchAMultipleAreDegrees)
{
    for (const char* text :
         {"3 0 0", "3.1 0 0" /* two digits */, "1.23 0 0", "0.12 0.34 0.56",
          "3.14 0 90" /* beyond a full turn */, "0 0 0", "0.00 0.00 0.00", "1.58 0 0"}) {
        const auto input = read(text);
        EXPECT_EQ(input.numbers.reading.unit, kDegrees) << text;
        EXPECT_TRUE(says(input, "assumed: degrees")) << text;
    }
}

TEST(TextInput, WhereUnitsAreNotGuessedTheLooksAreOnlyTold)
{
    const auto input = read("3.14 0 1.57", {}, UnitGuess::never);
    EXPECT_EQ(input.numbers, degreesZyx({3.14, 0, 1.57}));
    EXPECT_TRUE(says(input, "looks like radians"));
    const auto longVector = read("rotvec 0 0 90", {}, UnitGuess::never);
    EXPECT_EQ(longVector.numbers, vector(kRadians, {0, 0, 90}));
    EXPECT_TRUE(says(longVector, "looks like degrees"));
}

TEST(TextInput, ARotationVectorIsInRadiansUnlessLongerThanATurn)
{
    EXPECT_EQ(read("rotvec 0.1 0.2 0.3").numbers, vector(kRadians, {0.1, 0.2, 0.3}));
    EXPECT_EQ(read("rotvec 0 0 6.28").numbers.reading.unit, kRadians);
    const auto input = read("rotvec 0 4 6");  // length 7.2
    EXPECT_EQ(input.numbers, vector(kDegrees, {0, 4, 6}));
    EXPECT_TRUE(says(input, "longer than a full turn"));
}

TEST(TextInput, TheAngleAtAnAxisIsInDegreesUnlessItLooksLikeRadians)
{
    EXPECT_EQ(read("0 1 0 90").numbers.reading.unit, kDegrees);
    EXPECT_EQ(read("0 1 0 1.2").numbers.reading.unit, kDegrees);
    EXPECT_EQ(read("0 1 0 1.5708").numbers.reading.unit, kRadians);
    EXPECT_EQ(read("axis: 0 1 0 angle: 400").numbers.reading.unit, kDegrees);
}

// ---- printed digits

TEST(TextInput, TheResolutionIsHalfTheLastDigit)
{
    EXPECT_DOUBLE_EQ(read("30.25 20.50 10.00").resolution.value_or(0), 0.005);
    EXPECT_DOUBLE_EQ(read("1.5e-3 2.5e-3 0").resolution.value_or(0), 0.05e-3);
    EXPECT_DOUBLE_EQ(read("0,5; 0,1; 0,2").resolution.value_or(0), 0.05);
    EXPECT_FALSE(read("30 20 10").resolution.has_value());
    EXPECT_FALSE(read("pi/2 0 sqrt(2)").resolution.has_value());
    EXPECT_DOUBLE_EQ(read("30.5deg 0rad 0.100rad").resolution.value_or(0),
                     fromDegrees(0.05));  // rad
}

TEST(TextInput, WhereTrailingZerosWereDroppedTheDigitsOfTheLongestNumberCount)
{
    // 0.5 stands for 0.500000 beside a number of six digits
    EXPECT_DOUBLE_EQ(read("0.5 0.123456 0.25 0.8").resolution.value_or(0), 0.5e-6);
    EXPECT_DOUBLE_EQ(read("0.0 0.0 0.7071 0.7071").resolution.value_or(0), 0.5e-4);
    // of numbers with equally many digits the largest has the coarsest
    EXPECT_DOUBLE_EQ(read("12.34 0.1234 1.234").resolution.value_or(0), 0.005);
}

// ---- what is stated

TEST(TextInput, AStatedKindWinsOverTheGuess)
{
    StatedReading stated;
    stated.kind = Kind::rotationVector;
    const auto input = read("0.1 0.2 0.3", stated);
    EXPECT_FALSE(input.kindGuessed);
    EXPECT_EQ(input.numbers, vector(kRadians, {0.1, 0.2, 0.3}));
    stated.kind = Kind::axisAngle;
    EXPECT_EQ(read("0.5 0.5 0.5 0.5", stated).numbers.reading.kind, Kind::axisAngle);
}

TEST(TextInput, WhatIsStatedWinsOverTheTextAndIsToldSo)
{
    StatedReading stated;
    stated.unit = kRadians;
    const auto unit = read("30deg 20deg 10deg", stated);
    EXPECT_EQ(unit.numbers, radiansZyx({30, 20, 10}));
    EXPECT_TRUE(says(unit, "radians were stated"));

    stated = {};
    stated.scalar = ScalarPlace::first;
    const auto scalar = read("R.from_quat([0, 0, 0.6, 0.8])", stated);
    EXPECT_EQ(scalar.numbers, wxyz({0, 0, 0.6, 0.8}));
    EXPECT_TRUE(says(scalar, "the text says xyzw, but wxyz was stated"));

    stated = {};
    stated.order = Order::xyz;
    stated.about = About::space;
    const auto order = read("R.from_euler('ZYX', [30, 20, 10], degrees=True)", stated);
    EXPECT_EQ(order.numbers, angles(Order::xyz, About::space, kDegrees, {30, 20, 10}));
    EXPECT_TRUE(says(order, "the text says zyx, but xyz was stated"));
    EXPECT_TRUE(says(order, "the text says body, but space was stated"));

    stated = {};
    stated.kind = Kind::axisAngle;
    const auto kind = read("quaternion: 0 0 1 0.5", stated);
    EXPECT_EQ(kind.numbers.reading.kind, Kind::axisAngle);
    EXPECT_TRUE(says(kind, "the text says quaternion, but axis-angle was stated"));
}

TEST(TextInput, EverySwitchCanBeStated)
{
    StatedReading stated;
    stated.kind = Kind::quaternion;
    stated.algebra = Algebra::jpl;
    stated.direction = Direction::worldToBody;
    stated.scalar = ScalarPlace::last;
    const auto input = read("0 0 0.6 0.8", stated);
    EXPECT_EQ(input.numbers.reading, (Reading{.kind = Kind::quaternion,
                                              .scalar = ScalarPlace::last,
                                              .algebra = Algebra::jpl,
                                              .direction = Direction::worldToBody}));
    EXPECT_TRUE(input.warnings.empty()) << warningsOf(input);
    EXPECT_TRUE(input.others.empty());
}

TEST(TextInput, NamedNumbersArePutIntoAStatedLayout)
{
    StatedReading stated;
    stated.scalar = ScalarPlace::last;
    const auto quaternion = read("w=0.8 x=0.1 y=0.2 z=0.3", stated);
    EXPECT_EQ(quaternion.numbers, xyzw({0.1, 0.2, 0.3, 0.8}));
    EXPECT_FALSE(says(quaternion, "was stated"));
    stated = {};
    stated.order = Order::xyz;
    EXPECT_EQ(read("yaw 30 pitch 20 roll 10", stated).numbers.values,
              (std::vector<double>{10, 20, 30}));
    stated.order = Order::zxz;
    EXPECT_TRUE(says(read("yaw 30 pitch 20 roll 10", stated), "do not go with zxz"));
}

TEST(TextInput, AStatedKindPicksItsNumbersOutOfSeveral)
{
    StatedReading stated;
    stated.kind = Kind::euler;
    const auto input = read("quaternion: 1 0 0 0\nrpy: 0 0 0.3 rad", stated);
    EXPECT_EQ(input.numbers, angles(Order::xyz, About::space, kRadians, {0, 0, 0.3}));
    stated.kind = Kind::matrix;
    EXPECT_EQ(read("quaternion: 1 0 0 0\nM = 0 -1 0 1 0 0 0 0 1", stated).numbers,
              rows({0, -1, 0, 1, 0, 0, 0, 0, 1}));
}

// ---- faults

TEST(TextInput, AWrongCountIsRefusedWithItsPlace)
{
    const Fault five = refused("1 2\n3 4 5");
    EXPECT_EQ(five.kind, Fault::Kind::wrongCount);
    EXPECT_NE(five.message.find("5 numbers"), std::string::npos) << five.message;
    EXPECT_EQ(five.place, (TextPlace{2, 5}));
    const Fault two = refused("a: 1\n b:   2");
    EXPECT_EQ(two.kind, Fault::Kind::wrongCount);
    EXPECT_EQ(two.place, (TextPlace{2, 7}));
    EXPECT_EQ(refused("1").kind, Fault::Kind::wrongCount);
    EXPECT_EQ(refused("1 2 3 4 5 6").kind, Fault::Kind::wrongCount);
    EXPECT_EQ(refused("1 2 3 4 5 6 7").kind, Fault::Kind::wrongCount);  // no four of length 1
    EXPECT_EQ(refused("1 2 3 4 5 6 7 8 9 10").kind, Fault::Kind::wrongCount);
    EXPECT_EQ(refused("1 2 3 4 5 6 7 8 9 10 11 12 13 14 15 16 17").kind, Fault::Kind::wrongCount);
}

TEST(TextInput, AStatedKindThatDoesNotFitTheCountIsRefused)
{
    StatedReading stated;
    stated.kind = Kind::quaternion;
    const Fault few = refused("30 20 10", stated);
    EXPECT_EQ(few.kind, Fault::Kind::wrongCount);
    EXPECT_EQ(few.message, "3 numbers, but a quaternion takes 4");
    EXPECT_EQ(few.place, (TextPlace{1, 7}));
    stated.kind = Kind::euler;
    const Fault many = refused("1 2 3 4", stated);
    EXPECT_EQ(many.message, "4 numbers, but Euler angles take 3");
    EXPECT_EQ(many.place, (TextPlace{1, 7}));
    EXPECT_EQ(refused("quaternion 10 20 30").kind, Fault::Kind::wrongCount);
}

TEST(TextInput, NumbersThatAreNotFiniteAreRefusedWithTheirPlace)
{
    for (const char* text : {"0\n 0 nan", "0\n 0 NaN", "0\n 0 -inf", "0\n 0 Infinity",
                             "0\n 0 1e999", "0\n 0 -nan(ind)", "0\n 0 1/0", "0\n 0 np.nan"}) {
        const Fault fault = refused(text);
        EXPECT_EQ(fault.kind, Fault::Kind::notFinite) << text;
        EXPECT_EQ(fault.place, (TextPlace{2, 4})) << text;
    }
    // left aside, it does no harm
    EXPECT_EQ(read("position: 1 nan 3, orientation: w: 1 x: 0 y: 0 z: 0").numbers,
              wxyz({1, 0, 0, 0}));
}

TEST(TextInput, LookalikesOfNumbersAreNamed)
{
    for (const char* text : {"1 2 1_000", "1 2 0x1F", "1 2 1.2.3", "1 2 12ab"}) {
        const Fault fault = refused(text);
        EXPECT_EQ(fault.kind, Fault::Kind::badText) << text;
        EXPECT_NE(fault.message.find("is not a number"), std::string::npos) << fault.message;
        EXPECT_EQ(fault.place, (TextPlace{1, 5})) << text;
    }
    EXPECT_TRUE(says(read("30 20 10 000123.png"), "\"000123.png\", which is not a number"));
}

TEST(TextInput, TextWithoutNumbersIsRefused)
{
    for (const char* text : {"", " \n", "hello", "[]", "position: 1 2 3", "frame cam_01"}) {
        const Fault fault = refused(text);
        EXPECT_EQ(fault.kind, Fault::Kind::badText) << text;
        EXPECT_EQ(fault.place, (TextPlace{1, 1})) << text;
    }
}

}  // namespace
