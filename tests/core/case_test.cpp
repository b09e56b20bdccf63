// SPDX-License-Identifier: GPL-3.0-or-later
#include <cmath>
#include <limits>

#include <nlohmann/json.hpp>

#include "rotcore/case/case_json.h"
#include "rotcore/case/findings.h"
#include "rotcore/case/findings_json.h"
#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using Eigen::Quaterniond;
using Eigen::Vector3d;

constexpr const char* kHandWritten = R"({
  "trunnion_case": 1,
  "start": { "kind": "quaternion", "layout": "xyzw", "values": [0, 0, 1, 1] },
  "chain": [
    { "axis": "x", "angle_deg": 90, "name": "luff" },
    { "axis": [0, 1, 1], "angle_rad": 0.5, "about": "space", "muted": true }
  ],
  "shown": { "order": "zxz", "about": "space", "unit": "rad", "outer_at_lock_deg": 15 }
})";

Case handWritten()
{
    Case subject;
    subject.start =
        SentNumbers{{.kind = Kind::quaternion, .scalar = ScalarPlace::last}, {0, 0, 1, 1}};
    subject.chain = {
        {.axis = Vector3d::UnitX(), .angle = 90_deg, .name = "luff"},
        {.axis = Vector3d(0, 1, 1), .angle = 0.5, .about = About::space, .muted = true}};
    subject.shown = {Order::zxz, About::space, AngleUnit::radians, 15_deg};
    return subject;
}

Fault faultOf(const std::string& json)
{
    const auto subject = readCase(json);
    return subject ? Fault{.message = "accepted"} : subject.error();
}

TEST(Examine, FollowsStartNumbersAndChain)
{
    const auto found = examine(handWritten());
    ASSERT_TRUE(found);
    const Quaterniond expected(Eigen::AngleAxisd(90_deg, Vector3d::UnitZ()) *
                               Eigen::AngleAxisd(90_deg, Vector3d::UnitX()));
    EXPECT_POSE_NEAR(found->q_WB, expected, 1e-15);
    ASSERT_EQ(found->partials.size(), 2U);
    EXPECT_POSE_NEAR(found->partials[1], expected, 1e-15);
    EXPECT_NEAR(found->start->length, std::sqrt(2.0), 1e-15);
    for (const EulerAngles& solution : found->euler.solutions) {
        EXPECT_EQ(solution.order, Order::zxz);
        EXPECT_EQ(solution.about, About::space);
        EXPECT_POSE_NEAR(pose(solution), expected, 4e-15);
    }
    EXPECT_EQ(found->orders.size(), 12U);
}

TEST(Examine, ShowsAnglesAsTheyWereTurnedOnlyIfTheCaseIsThoseTurns)
{
    const EulerAngles turned{
        Order::zyx, About::body, {200_deg, 100_deg, -30_deg}};  // past both ranges
    Case subject{.start = {}, .chain = chainOf(turned), .shown = {}};
    EXPECT_EQ(examine(subject)->angles, turned);
    EXPECT_NEAR(examine(subject)->euler.solutions[0].angles[1], 80_deg,
                1e-14);  // the twin is the canonical one
    const auto isCanonical = [](const Case& other) {
        const auto found = examine(other);
        return found->angles == found->euler.solutions[0];
    };
    subject.chain[1].muted = true;
    EXPECT_TRUE(isCanonical(subject));
    subject.chain = chainOf(turned);
    subject.shown.order = Order::xyz;
    EXPECT_TRUE(isCanonical(subject));
    subject.shown = {.about = About::space};
    EXPECT_TRUE(isCanonical(subject));
    subject.shown = {};
    subject.chain.push_back({.angle = 0.0});
    EXPECT_TRUE(isCanonical(subject));
}

TEST(Examine, OfAnEmptyCaseIsTheUprightPose)
{
    const auto found = examine(Case{});
    ASSERT_TRUE(found);
    EXPECT_EQ(found->R_WB, Eigen::Matrix3d::Identity());
    EXPECT_FALSE(found->axisAngle.axisIsUnique);
    EXPECT_FALSE(found->start);
}

TEST(Examine, PassesOnWhatIsWrong)
{
    Case subject = handWritten();
    subject.start->values = {0, 0, 0, 0};
    EXPECT_EQ(examine(subject).error().kind, Fault::Kind::zeroLength);
    subject = handWritten();
    subject.chain[0].axis = Vector3d::Zero();
    EXPECT_NE(examine(subject).error().message.find("turn 1"), std::string::npos);
}

TEST(CaseFile, HandWrittenOneIsRead)
{
    const auto subject = readCase(kHandWritten);
    ASSERT_TRUE(subject) << subject.error().message;
    EXPECT_EQ(*subject, handWritten());
}

TEST(CaseFile, RoundTripsByteForByteAndBitForBit)
{
    Case subject = handWritten();
    std::mt19937_64 generator(71);
    std::uniform_real_distribution<double> number(-400, 400);
    for (int n = 0; n < 500; ++n)
        subject.chain.push_back(
            {.axis = Vector3d(number(generator), 1e-300, -0.1),
             .angle = n % 2 == 0 ? number(generator) : fromDegrees(std::round(number(generator))),
             .name = "turn \"7\"\n\\ \u00e9"});
    subject.shown.outerAtLock = 0.1;
    const std::string written = writeCase(subject);
    const auto back = readCase(written);
    ASSERT_TRUE(back) << back.error().message;
    EXPECT_EQ(*back, subject);
    EXPECT_EQ(writeCase(*back), written);
    EXPECT_NE(written.find("\"angle_deg\": 90,"), std::string::npos);  // not 90.00000000000001
    EXPECT_EQ(*readCase(writeCase(Case{})), Case{});
}

TEST(CaseFile, SyntaxErrorsHaveTheirPlace)
{
    const Fault fault = faultOf(
        "{\n  \"trunnion_case\": 1,\n  \"chain\": [ { \"axis\": \"z\" \"angle_deg\": 3 } ]\n}");
    EXPECT_EQ(fault.kind, Fault::Kind::badText);
    ASSERT_TRUE(fault.place);
    EXPECT_EQ(fault.place->line, 3U);
    EXPECT_NE(faultOf("").message.find("not JSON"), std::string::npos);
    EXPECT_NE(faultOf("{\"trunnion_case\": 1, \"trunnion_case\": 1}").message.find("appears twice"),
              std::string::npos);
    EXPECT_NE(faultOf(std::string(100, '[')).message.find("64 levels"), std::string::npos);
    EXPECT_NE(faultOf("{\"trunnion_case\": 1, \"chain\": [{\"axis\":\"z\",\"angle_deg\":1e999}]}")
                  .message.find("overflow"),
              std::string::npos);
    EXPECT_EQ(faultOf("{\"trunnion_case\": 1} x").kind, Fault::Kind::badText);
}

TEST(CaseFile, FieldErrorsNameTheFieldAndItsLine)
{
    struct Wrong {
        const char* find;
        const char* replacement;
        const char* said;
        std::size_t line;
    };
    const std::vector<Wrong> wrongs{
        {"\"trunnion_case\": 1", "\"trunnion_case\": 2", "later Trunnion", 2},
        {"\"trunnion_case\": 1", "\"trunnion_case\": 0.5", "does not exist", 2},
        {"\"trunnion_case\": 1,", "", "not a case file", 1},
        {"\"kind\": \"quaternion\"", "\"kind\": \"quat\"", "choose from euler, quaternion", 3},
        {"\"kind\": \"quaternion\", ", "", "has no kind", 3},
        {"[0, 0, 1, 1]", "[0, 0, 1]", "holds 3 numbers; quaternion takes 4", 3},
        {"[0, 0, 1, 1]", "[0, 0, \"1\", 1]", "not a list of numbers", 3},
        {"\"axis\": \"x\"", "\"axis\": \"w\"", "choose from x, y, z", 5},
        {"\"axis\": \"x\", ", "", "has no axis", 5},
        {"[0, 1, 1]", "[0, 1]", "2 numbers instead of three", 6},
        {"[0, 1, 1]", "[0, 0, 0]", "no length", 6},
        {"\"angle_deg\": 90", "\"angel_deg\": 90", "has no angle", 5},
        {"\"angle_deg\": 90", "\"angle_deg\": 90, \"angel\": 1",
         "is not a field here; the fields are", 5},
        {"\"angle_deg\": 90", "\"angle_deg\": \"90\"", "is not a number", 5},
        {"\"angle_deg\": 90", "\"angle_deg\": 90, \"angle_rad\": 1", "given twice", 5},
        {"\"muted\": true", "\"muted\": 1", "not true or false", 6},
        {"\"luff\"", "7", "not text", 5},
        {"\"order\": \"zxz\"", "\"order\": \"zzx\"", "choose from xyz", 8},
        {"\"shown\": {", "\"show\": {", "is not a field here", 8},
    };
    for (const Wrong& wrong : wrongs) {
        std::string json = kHandWritten;
        json.replace(json.find(wrong.find), std::string(wrong.find).size(), wrong.replacement);
        const Fault fault = faultOf(json);
        EXPECT_EQ(fault.kind, Fault::Kind::badField) << wrong.replacement;
        EXPECT_NE(fault.message.find(wrong.said), std::string::npos) << fault.message;
        ASSERT_TRUE(fault.place) << wrong.replacement;
        EXPECT_EQ(fault.place->line, wrong.line) << fault.message;
    }
    EXPECT_NE(faultOf("[1]").message.find("not an object"), std::string::npos);
    EXPECT_NE(faultOf("{\"trunnion_case\": 1, \"chain\": {}}").message.find("not a list"),
              std::string::npos);
}

TEST(FindingsJson, NumbersReadBackAsTheSameDoubles)
{
    std::mt19937_64 generator(72);
    for (int n = 0; n < 200; ++n) {
        const Quaterniond q = tests::randomPose(generator);
        const auto found =
            examine({.start = SentNumbers{{.kind = Kind::quaternion}, {q.w(), q.x(), q.y(), q.z()}},
                     .chain = {},
                     .shown = {}});
        std::string json = "{";
        appendFindingsJson(json, *found);
        const auto parsed = nlohmann::json::parse(json + "}");
        for (int row = 0; row < 3; ++row)
            for (int column = 0; column < 3; ++column)
                EXPECT_EQ(parsed["matrix"][static_cast<std::size_t>(row)]
                                [static_cast<std::size_t>(column)]
                                    .get<double>(),
                          found->R_WB(row, column));
        EXPECT_EQ(parsed["quaternion_wxyz"][0].get<double>(), found->q_WB.w());
        EXPECT_EQ(parsed["lock"]["amplification"].get<double>(), found->lock.amplification);
    }
}

TEST(FindingsJson, WhatDoesNotExistIsNullAndAtLockTheFixedCombinationIsGiven)
{
    // zyx (30, 90, 10): only yaw - roll = 20 counts.
    const auto found = examine(
        {.start = SentNumbers{{.kind = Kind::euler}, {30, 90, 10}}, .chain = {}, .shown = {}});
    std::string json = "{";
    appendFindingsJson(json, *found);
    const auto locked = nlohmann::json::parse(json + "}");
    EXPECT_TRUE(locked["euler"]["locked"].get<bool>());
    EXPECT_TRUE(locked["lock"]["amplification"].is_null());
    EXPECT_EQ(locked["euler"]["fixed"]["combination"], "first - third");
    EXPECT_NEAR(locked["euler"]["fixed"]["value"].get<double>(), 20.0, 1e-12);

    const auto half = examine(
        {.start = SentNumbers{{.kind = Kind::euler}, {180, 0, 0}}, .chain = {}, .shown = {}});
    json = "{";
    appendFindingsJson(json, *half);
    EXPECT_TRUE(nlohmann::json::parse(json + "}")["gibbs"].is_null());
    EXPECT_EQ(json.find("-0,"), std::string::npos);  // no negative zeros
}

}  // namespace
