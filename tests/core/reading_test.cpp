// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/reading/reading.h"

#include <cmath>

#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using Eigen::Quaterniond;

const Quaterniond kQuarterTurnAboutZ(Eigen::AngleAxisd(90_deg, Eigen::Vector3d::UnitZ()));

TEST(Reading, EveryKindOfNumbersForAQuarterTurnAboutZ)  // by hand
{
    const double s = std::sqrt(0.5);
    const std::vector<SentNumbers> same{
        {{.kind = Kind::euler}, {90, 0, 0}},
        {{.kind = Kind::euler,
          .order = Order::xyz,
          .about = About::space,
          .unit = AngleUnit::radians},
         {0, 0, kPi / 2}},
        {{.kind = Kind::quaternion}, {s, 0, 0, s}},
        {{.kind = Kind::quaternion, .scalar = ScalarPlace::last}, {0, 0, s, s}},
        {{.kind = Kind::quaternion, .algebra = Algebra::jpl}, {s, 0, 0, -s}},
        {{.kind = Kind::quaternion, .direction = Direction::worldToBody}, {s, 0, 0, -s}},
        {{.kind = Kind::matrix}, {0, -1, 0, 1, 0, 0, 0, 0, 1}},
        {{.kind = Kind::matrix, .storage = Storage::columns}, {0, 1, 0, -1, 0, 0, 0, 0, 1}},
        {{.kind = Kind::rotationVector, .unit = AngleUnit::radians}, {0, 0, kPi / 2}},
        {{.kind = Kind::rotationVector, .unit = AngleUnit::degrees}, {0, 0, 90}},
        {{.kind = Kind::axisAngle}, {0, 0, 2, 90}},
        {{.kind = Kind::axisAngle, .unit = AngleUnit::radians}, {0, 0, -1, -kPi / 2}},
    };
    for (const SentNumbers& sent : same) {
        const auto meaning = interpret(sent);
        ASSERT_TRUE(meaning) << wordsOf(sent.reading);
        EXPECT_POSE_NEAR(meaning->q_WB, kQuarterTurnAboutZ, 1e-15) << wordsOf(sent.reading);
    }
}

TEST(Reading, JplAndWorldToBodyTogetherLeaveTheNumbersAsHamilton)
{
    // Sola 2017 (arXiv 1711.02508), table of conventions, second-hand: JPL is used with
    // global-to-local quaternions, whose components then equal Hamilton's local-to-global ones.
    const std::vector<double> numbers{0.5, 0.1, -0.7, 0.5};
    const SentNumbers hamilton{{.kind = Kind::quaternion}, numbers};
    const SentNumbers jpl{
        {.kind = Kind::quaternion, .algebra = Algebra::jpl, .direction = Direction::worldToBody},
        numbers};
    EXPECT_POSE_NEAR(interpret(hamilton)->q_WB, interpret(jpl)->q_WB, 0.0);
}

TEST(Reading, TellsWhatWasDoneToTheNumbers)
{
    const auto stretched = interpret({{.kind = Kind::quaternion}, {2, 0, 0, 2}});
    ASSERT_TRUE(stretched);
    EXPECT_NEAR(stretched->length, std::sqrt(8.0), 1e-15);
    ASSERT_EQ(stretched->warnings.size(), 1U);
    EXPECT_NE(stretched->warnings[0].find("2.828427"), std::string::npos);

    EXPECT_NE(stretched->warnings[0].find("not 1"), std::string::npos);
    const auto fourDigits = interpret({{.kind = Kind::quaternion}, {0.7071, 0, 0, 0.7071}});
    ASSERT_EQ(fourDigits->warnings.size(), 1U);
    EXPECT_NE(fourDigits->warnings[0].find("as few digits make it"), std::string::npos);

    const auto printed = interpret({{.kind = Kind::quaternion}, {0.7071068, 0, 0, 0.7071068}});
    EXPECT_TRUE(printed->warnings.empty());  // seven digits are not worth a word

    const auto rounded =
        interpret({{.kind = Kind::matrix}, {0.87, -0.5, 0, 0.5, 0.87, 0, 0, 0, 1}});
    ASSERT_TRUE(rounded);
    ASSERT_TRUE(rounded->matrix);
    EXPECT_EQ(rounded->matrix->state, MatrixCheck::State::rounded);
    ASSERT_EQ(rounded->warnings.size(), 1U);
    EXPECT_NE(rounded->warnings[0].find("few digits"), std::string::npos);

    EXPECT_EQ(interpret({{.kind = Kind::axisAngle}, {0, 0, 3, 90}})->warnings.size(), 1U);
}

TEST(Reading, RefusesWhatIsNoRotationAndSaysWhy)
{
    const auto fault = [](const SentNumbers& sent) {
        const auto meaning = interpret(sent);
        return meaning ? Fault{} : meaning.error();
    };
    EXPECT_EQ(fault({{.kind = Kind::euler}, {1, 2}}).kind, Fault::Kind::wrongCount);
    EXPECT_EQ(fault({{.kind = Kind::matrix}, {1, 2, 3}}).kind, Fault::Kind::wrongCount);
    EXPECT_EQ(fault({{.kind = Kind::euler}, {1, NAN, 3}}).message,
              "number 2 is not a finite number");
    EXPECT_EQ(fault({{.kind = Kind::quaternion}, {0, 0, 0, 0}}).kind, Fault::Kind::zeroLength);
    EXPECT_EQ(fault({{.kind = Kind::axisAngle}, {0, 0, 0, 1}}).kind, Fault::Kind::zeroLength);
    const Fault mirrored = fault({{.kind = Kind::matrix}, {1, 0, 0, 0, 1, 0, 0, 0, -1}});
    EXPECT_EQ(mirrored.kind, Fault::Kind::leftHanded);
    EXPECT_NE(mirrored.message.find("the third column is negated"), std::string::npos);
    const Fault scaled = fault({{.kind = Kind::matrix}, {2, 0, 0, 0, 2, 0, 0, 0, 2}});
    EXPECT_EQ(scaled.kind, Fault::Kind::notOrthonormal);
    EXPECT_NE(scaled.message.find("scaled by 2"), std::string::npos);
}

TEST(Reading, MatrixIsAcceptedUpToTheRoundingOfTwoDecimalsAndNoFurther)
{
    const auto stretched = [](double excess) {
        return interpret({{.kind = Kind::matrix}, {1, 0, 0, 0, 1, 0, 0, 0, std::sqrt(1 + excess)}});
    };
    EXPECT_TRUE(stretched(0.99 * kRoundedMatrixTolerance));
    EXPECT_FALSE(stretched(1.01 * kRoundedMatrixTolerance));
}

TEST(Reading, SentenceNamesOnlyTheSwitchesThatCount)
{
    EXPECT_EQ(wordsOf(Reading{}), "Euler angles, zyx about body, degrees, body to world");
    EXPECT_EQ(wordsOf({.kind = Kind::quaternion,
                       .scalar = ScalarPlace::last,
                       .direction = Direction::worldToBody}),
              "quaternion, xyzw, Hamilton, world to body");
    EXPECT_EQ(wordsOf({.kind = Kind::matrix, .storage = Storage::columns}),
              "matrix, listed by columns, body to world");
}

}  // namespace
