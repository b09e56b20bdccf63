// SPDX-License-Identifier: GPL-3.0-or-later
#include <cmath>
#include <cstdio>
#include <filesystem>
#include <fstream>
#include <iterator>
#include <sstream>

#include <nlohmann/json.hpp>
#include <sys/wait.h>
#include <unistd.h>

#include "tests/support/poses.h"

namespace {

using nlohmann::json;
namespace fs = std::filesystem;

struct Outcome {
    int code = -1;
    std::string out;
    std::string err;

    std::vector<json> objects() const
    {
        std::vector<json> found;
        std::istringstream lines(out);
        for (std::string line; std::getline(lines, line);)
            found.push_back(json::parse(line));
        return found;
    }
};

std::string contentOf(const fs::path& path)
{
    std::ifstream file(path);
    return {std::istreambuf_iterator<char>(file), {}};
}

// A folder of its own for each test, gone afterwards.
class Cli : public testing::Test {
protected:
    Cli() : m_folder(fs::temp_directory_path() / ("trunnion-cli-" + std::to_string(::getpid())))
    {
        fs::create_directories(m_folder);
    }
    ~Cli() override { fs::remove_all(m_folder); }

    fs::path file(const std::string& name, const std::string& content) const
    {
        std::ofstream(m_folder / name) << content;
        return m_folder / name;
    }

    // Runs `trunnion-cli arguments < input` by the shell.
    Outcome run(const std::string& arguments, const std::string& input = {}) const
    {
        const fs::path in = file("in", input);
        const std::string command = std::string(TRUNNION_CLI) + " " + arguments + " <" +
                                    in.string() + " >" + (m_folder / "out").string() + " 2>" +
                                    (m_folder / "err").string();
        const int status = std::system(command.c_str());
        return {WEXITSTATUS(status), contentOf(m_folder / "out"), contentOf(m_folder / "err")};
    }

    json readJson(const std::string& arguments, const std::string& input = {}) const
    {
        const Outcome done = run("read --json " + arguments, input);
        EXPECT_EQ(done.code, 0) << done.err;
        const auto objects = done.objects();
        EXPECT_EQ(objects.size(), 1U) << done.out;
        return objects.empty() ? json() : objects.front();
    }

    fs::path m_folder;
};

Eigen::Quaterniond quaternionIn(const json& answer)
{
    const auto& q = answer.at("quaternion_wxyz");
    return {q[0].get<double>(), q[1].get<double>(), q[2].get<double>(), q[3].get<double>()};
}

// W3C Device Orientation, intrinsic ZXY (30, 60, 45) deg; derived from its annex, nine digits.
const Eigen::Quaterniond kW3c(.723317411, .360423406, .439679740, .391903837);
constexpr double kW3cTolerance = 2e-9;

TEST_F(Cli, ReadsThreeAnglesInAStatedConvention)
{
    const json answer = readJson("--as euler --order zxy --about body --unit deg 30 60 45");
    EXPECT_POSE_NEAR(quaternionIn(answer), kW3c, kW3cTolerance);
    EXPECT_FALSE(answer["input"]["guessed"].get<bool>());
    EXPECT_EQ(answer["input"]["kind"], "euler");
    // By hand: space-fixed turns are listed backwards.
    EXPECT_POSE_NEAR(quaternionIn(readJson("--as euler --order yxz --about space 45 60 30")), kW3c,
                     kW3cTolerance);
}

TEST_F(Cli, TheContractHoldsMemberForMember)
{
    const json answer =
        readJson("--as euler 30 20 10 --to-order zxz --to-about space --to-unit rad");
    const std::vector<std::string> members{
        "quaternion_wxyz", "matrix", "rotvec_rad", "axis", "angle_deg",
        "gibbs",           "mrp",    "euler",      "lock", "input"};
    for (const std::string& member : members)
        EXPECT_TRUE(answer.contains(member)) << member;
    EXPECT_EQ(answer.size(), members.size());
    EXPECT_EQ(answer["euler"]["order"], "zxz");
    EXPECT_EQ(answer["euler"]["about"], "space");
    EXPECT_EQ(answer["euler"]["unit"], "rad");
    EXPECT_EQ(answer["euler"]["locked"], false);
    ASSERT_EQ(answer["euler"]["solutions"].size(), 2U);
    EXPECT_EQ(answer["euler"]["solutions"][0].size(), 3U);
    EXPECT_EQ(answer["matrix"].size(), 3U);
    EXPECT_EQ(answer["matrix"][2].size(), 3U);
    for (const char* member : {"distance_deg", "amplification", "lost_direction_body"})
        EXPECT_TRUE(answer["lock"].contains(member)) << member;
    for (const char* member : {"kind", "guessed", "warnings"})
        EXPECT_TRUE(answer["input"].contains(member)) << member;
}

TEST_F(Cli, EveryRepresentationItPrintsItReadsBack)
{
    const json answer = readJson("--as quaternion 0.5 -0.1 0.7 0.5");
    const Eigen::Quaterniond q = quaternionIn(answer);
    const auto list = [](const json& values) {
        std::string text;
        for (const json& value : values)
            for (const json& number : value.is_array() ? value : json::array({value}))
                text += " " + number.dump();
        return text;
    };
    const std::vector<std::string> ways{
        "--as quaternion" + list(answer["quaternion_wxyz"]),
        "--as matrix" + list(answer["matrix"]),
        "--as rotvec --unit rad" + list(answer["rotvec_rad"]),
        "--as axis-angle --unit deg" + list(answer["axis"]) + " " + answer["angle_deg"].dump(),
        "--as euler --order zyx --unit deg" + list(answer["euler"]["solutions"][0]),
        "--as euler --order zyx --unit deg" + list(answer["euler"]["solutions"][1]),
    };
    for (const std::string& way : ways)
        EXPECT_POSE_NEAR(quaternionIn(readJson(way)), q, 4e-15)
            << way;  // two conversions of the core
}

TEST_F(Cli, SwitchesOfEveryKindChangeTheReading)
{
    // By hand, all of them a quarter turn about z.
    const Eigen::Quaterniond quarter(Eigen::AngleAxisd(90_deg, Eigen::Vector3d::UnitZ()));
    const std::vector<std::string> ways{
        "--as quaternion --layout xyzw 0 0 1 1",
        "--as quaternion --algebra jpl 1 0 0 -1",
        "--as quaternion --direction world-to-body 1 0 0 -1",
        "--as matrix --storage columns 0 1 0 -1 0 0 0 0 1",
        "--as axis-angle --unit rad -- 0 0 -1 -pi/2",
        "--as rotvec --unit deg 0 0 90",
    };
    for (const std::string& way : ways)
        EXPECT_POSE_NEAR(quaternionIn(readJson(way)), quarter, 1e-15) << way;
}

TEST_F(Cli, NegativeNumbersAreNotTakenForOptions)
{
    EXPECT_POSE_NEAR(quaternionIn(readJson("--as euler -90 -.5 -0 --unit deg")),
                     quaternionIn(readJson("--as euler --unit deg \"-90 -0.5 0\"")), 0.0);
    EXPECT_POSE_NEAR(quaternionIn(readJson("--as euler --unit rad -pi/2 0 0")),
                     quaternionIn(readJson("--as euler --unit deg -90 0 0")), 1e-15);
}

TEST_F(Cli, BulkAnswersEachLineInOrderWithErrorsInPlace)
{
    const std::string input = "30 20 10\n\n# a comment, 1 2 3\n1 2 x\n40 50 60\n";
    for (const std::string& operand :
         {std::string("-"), std::string(), file("poses.txt", input).string()}) {
        const Outcome done = run("read --json --as euler " + operand, input);
        EXPECT_EQ(done.code, 3);
        const auto objects = done.objects();
        ASSERT_EQ(objects.size(), 3U) << done.out;
        EXPECT_TRUE(objects[0].contains("quaternion_wxyz"));
        EXPECT_TRUE(objects[1].contains("error"));
        EXPECT_EQ(objects[1]["line"], 4);
        EXPECT_NEAR(objects[2]["euler"]["solutions"][0][1].get<double>(), 50.0, 1e-13);
        EXPECT_NE(done.err.find("line 4, column "), std::string::npos);
    }
}

TEST_F(Cli, BulkOfManyLinesKeepsTheirOrderAndLineNumbers)
{
    std::string input;
    for (int n = 0; n < 40000; ++n)
        input += n == 31234 ? "oops\n" : std::to_string(n % 180) + ".25 10 20\n";
    const Outcome done = run("read --json --as euler -", input);
    EXPECT_EQ(done.code, 3);
    EXPECT_EQ(done.err.rfind("line 31235, column ", 0), 0U) << done.err;
    const auto objects = done.objects();
    ASSERT_EQ(objects.size(), 40000U);
    for (std::size_t n = 0; n < objects.size(); n += 997) {
        const auto first = objects[n]["euler"]["solutions"][0][0].get<double>();
        EXPECT_NEAR(first, static_cast<double>(n % 180) + 0.25, 1e-12);
    }
}

TEST_F(Cli, PasteIsOneSetHoweverManyLines)
{
    const json matrix = readJson("--paste", "[[0., -1., 0.],\n [1., 0., 0.],\n [0., 0., 1.]]\n");
    EXPECT_EQ(matrix["input"]["kind"], "matrix");
    EXPECT_NEAR(matrix["angle_deg"].get<double>(), 90.0, 1e-13);
    const json labelled =
        readJson("--paste -", "orientation:\n  x: 0.0\n  y: 0.0\n  z: 0.6\n  w: 0.8\n");
    EXPECT_EQ(labelled["input"]["kind"], "quaternion");
    EXPECT_FALSE(labelled["input"]["guessed"].get<bool>());
    EXPECT_NEAR(labelled["quaternion_wxyz"][0].get<double>(), 0.8, 1e-15);
    const Outcome bad = run("read --paste", "R =\n1 2 3\n4 5 6\n7 8\n");
    EXPECT_EQ(bad.code, 3);
    EXPECT_EQ(bad.err.rfind("line ", 0), 0U) << bad.err;
}

TEST_F(Cli, WhatIsNoRotationIsRefusedWithItsCause)
{
    const Outcome mirrored = run("read --json --as matrix 1 0 0 0 1 0 0 0 -1");
    EXPECT_EQ(mirrored.code, 3);
    EXPECT_NE(mirrored.err.find("determinant is -1"), std::string::npos);
    EXPECT_NE(mirrored.objects().at(0)["error"].get<std::string>().find("third column is negated"),
              std::string::npos);
    EXPECT_EQ(run("read --as quaternion 0 0 0 0").code, 3);
}

TEST_F(Cli, AtLockAndAtSingularVectorsItSaysSo)
{
    const json locked = readJson("--as euler --order zyx 50 90 20");
    EXPECT_EQ(locked["euler"]["locked"], true);
    EXPECT_TRUE(locked["lock"]["amplification"].is_null());
    EXPECT_NE(locked["input"]["warnings"].dump().find("lock"), std::string::npos);
    EXPECT_NEAR(locked["euler"]["fixed"]["value"].get<double>(), 30.0, 1e-12);
    const json half = readJson("--as axis-angle --unit deg 0 1 0 180");
    EXPECT_TRUE(half["gibbs"].is_null());
}

TEST_F(Cli, FewDigitsNearLockAreSaidToMeanLittle)
{
    // 89.99 deg of pitch printed to 0.01 deg may be 90; printed to 0.0001 deg it is not.
    const auto warns = [&](const char* numbers) {
        const json answer = readJson(std::string("--as euler --order zyx ") + numbers);
        EXPECT_EQ(answer["euler"]["locked"], false);
        return answer["input"]["warnings"].dump().find("close to lock") != std::string::npos;
    };
    EXPECT_TRUE(warns("10.00 89.99 20.00"));
    EXPECT_FALSE(warns("10.0000 89.9900 20.0000"));
    EXPECT_FALSE(warns("10.00 80.00 20.00"));
}

TEST_F(Cli, TableSaysWhatElseTheNumbersCouldBe)
{
    EXPECT_NE(run("read 0.5 0.5 0.5 0.5").out.find("scalar last, xyzw"), std::string::npos);
    EXPECT_NE(run("read 1 2 3").out.find("a rotation vector"), std::string::npos);
    EXPECT_EQ(run("read --as quaternion --layout wxyz 0.5 0.5 0.5 0.5").out.find("could be"),
              std::string::npos);
}

TEST_F(Cli, TableShowsEveryRepresentationWithItsConvention)
{
    const Outcome done = run("read 30 20 10 --as euler");
    EXPECT_EQ(done.code, 0);
    for (const char* part :
         {"read as", "quaternion", "matrix", "angles", "or as well", "rotation vector", "axis",
          "Gibbs vector", "mod. Rodrigues", "shadow set", "lock", "orders",
          "zyx about body, degrees", "70 deg from lock"})
        EXPECT_NE(done.out.find(part), std::string::npos) << part << "\n" << done.out;
    EXPECT_NE(run("read --as matrix 1 0 0 0 1 0 0 0 1").out.find("matrix check"),
              std::string::npos);
}

TEST_F(Cli, BadUsageIsTwoAndBadInputIsThree)
{
    EXPECT_EQ(run("").code, 2);
    EXPECT_EQ(run("raed 1 2 3").code, 2);
    EXPECT_EQ(run("read --as eulre 1 2 3").code, 2);
    EXPECT_NE(run("read --as eulre 1 2 3").err.find("choose from euler"), std::string::npos);
    EXPECT_EQ(run("read --order zzx 1 2 3").code, 2);
    EXPECT_EQ(run("read --nonsense 1 2 3").code, 2);
    EXPECT_EQ(run("read no-such-file.csv").code, 3);
    EXPECT_NE(run("read no-such-file.csv").err.find("no file no-such-file.csv"), std::string::npos);
    EXPECT_EQ(run("read 1 2").code, 3);
    EXPECT_EQ(run("read \"\"").code, 3);
    EXPECT_EQ(run("--help").code, 0);
    EXPECT_EQ(run("--version").out, "trunnion-cli 0.1.0\n");
}

TEST_F(Cli, HelpHasExamplesAndTheCaution)
{
    EXPECT_NE(run("read --help").out.find("Examples:"), std::string::npos);
    EXPECT_NE(run("--help").out.find("does not release motion"), std::string::npos);
}

TEST_F(Cli, CompletionKnowsEveryOptionOfTheHelp)
{
    const std::string completion =
        contentOf(fs::path(TRUNNION_SOURCE) / "app/completion/trunnion-cli.bash");
    std::istringstream help(run("read --help").out);
    int options = 0;
    for (std::string word; help >> word;) {
        if (word == "Examples:") break;
        if (const auto at = word.find("--"); at != std::string::npos && word.size() > at + 2) {
            const std::string option = word.substr(at);
            EXPECT_NE(completion.find(option), std::string::npos) << option;
            ++options;
        }
    }
    EXPECT_GE(options, 14);
    // And bash offers the words of an option.
    const std::string script =
        "bash -c 'source " + std::string(TRUNNION_SOURCE) +
        "/app/completion/trunnion-cli.bash; COMP_WORDS=(trunnion-cli read --as q); COMP_CWORD=3;"
        " _trunnion_cli; echo ${COMPREPLY[*]}' >" +
        (m_folder / "completed").string();
    ASSERT_EQ(std::system(script.c_str()), 0);
    EXPECT_EQ(contentOf(m_folder / "completed"), "quaternion\n");
}

TEST_F(Cli, ALivePipeIsAnsweredBeforeItEnds)
{
    // The writer waits until its first line has been answered; were the input read to its end
    // first, it would wait for its whole patience of 20 s and the answer would come after "gave
    // up".
    const std::string answer = (m_folder / "answers").string();
    const std::string script = "bash -c '{ echo 1 2 3; for n in $(seq 200); do [ -s " + answer +
                               " ] && break; sleep 0.1; done; [ -s " + answer +
                               " ] && echo 4 5 6; } | " + TRUNNION_CLI +
                               " read --json --as euler - >" + answer + "'";
    ASSERT_EQ(std::system(script.c_str()), 0);
    const std::string answers = contentOf(answer);
    EXPECT_EQ(std::count(answers.begin(), answers.end(), '\n'), 2);
}

}  // namespace
