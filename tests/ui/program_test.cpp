// SPDX-License-Identifier: GPL-3.0-or-later
// `trunnion` as it is started: pictures, arguments, files, and machines without display or OpenGL.
#include <QImage>
#include <cstdlib>
#include <filesystem>
#include <fstream>
#include <iterator>

#include <gtest/gtest.h>
#include <sys/wait.h>
#include <unistd.h>

namespace {

namespace fs = std::filesystem;

class Program : public testing::Test {
protected:
    Program() : m_folder(fs::temp_directory_path() / ("trunnion-" + std::to_string(::getpid())))
    {
        fs::create_directories(m_folder);
    }
    ~Program() override { fs::remove_all(m_folder); }

    // Runs the program by the shell; `setting` goes before it, as in "env A=b".
    int run(const std::string& arguments, const std::string& setting = {})
    {
        const std::string command = setting + " timeout 120 " + TRUNNION + " " + arguments + " >" +
                                    (m_folder / "out").string() + " 2>" +
                                    (m_folder / "err").string();
        return WEXITSTATUS(std::system(command.c_str()));
    }

    std::string said(const char* stream) const
    {
        std::ifstream file(m_folder / stream);
        return {std::istreambuf_iterator<char>(file), {}};
    }

    QImage snapshot(const std::string& options, const std::string& setting = {})
    {
        const std::string file = (m_folder / "picture.png").string();
        fs::remove(file);
        EXPECT_EQ(run("--snapshot " + file + " " + options, setting), 0) << said("err");
        return QImage(QString::fromStdString(file));
    }

    fs::path m_folder;
};

const std::string kNoDisplay = "env -u DISPLAY -u WAYLAND_DISPLAY -u QT_QPA_PLATFORM";

// Different colours in a coarse grid over the stage: a stage that drew nothing has only its
// gradient.
int coloursOf(const QImage& image)
{
    QList<QRgb> colours;
    for (int x = 100; x < image.width() * 7 / 10; x += 7)
        for (int y = 100; y < image.height() - 60; y += 7)
            if (const QRgb colour = image.pixel(x, y) & 0xF0F0F0; !colours.contains(colour))
                colours.push_back(colour);
    return static_cast<int>(colours.size());
}

TEST_F(Program, SnapshotHasTheAskedSizeSchemeAndScale)
{
    const QImage light = snapshot("--size 1000x700 --scheme light --renderer painter");
    EXPECT_EQ(light.size(), QSize(1000, 700));
    EXPECT_GT(light.pixelColor(990, 500).lightness(), 200);
    EXPECT_GT(coloursOf(light), 30);
    const QImage dark = snapshot("--size 1000x700 --scheme dark --renderer painter");
    EXPECT_LT(dark.pixelColor(990, 500).lightness(), 60);
    EXPECT_EQ(snapshot("--size 900x650 --scale 2 --renderer painter").size(), QSize(1800, 1300));
}

TEST_F(Program, SnapshotNeedsNoDisplay)
{
    EXPECT_GT(coloursOf(snapshot("--size 1000x700", kNoDisplay)), 30);
}

TEST_F(Program, SnapshotIsDrawnWithOpenGlWhereThereIsSomeAndPaintedWhereThereIsNone)
{
    EXPECT_GT(coloursOf(snapshot("--size 1000x700 --renderer qt3d")), 30);
    EXPECT_GT(coloursOf(snapshot("--size 1000x700 --renderer qt3d",
                                 "env LIBGL_DRIVERS_PATH=/nonexistent")),
              30);
}

TEST_F(Program, WithoutADisplayTheWindowIsRefusedWithWhatToDo)
{
    EXPECT_EQ(run("", kNoDisplay), 4);
    EXPECT_NE(said("err").find("--snapshot"), std::string::npos);
}

TEST_F(Program, BadArgumentsAreTwoAndBadFilesThree)
{
    EXPECT_EQ(run("--nonsense"), 2);
    EXPECT_EQ(run("--size 10x10 --snapshot x.png"), 2);
    EXPECT_EQ(run("--scheme pink"), 2);
    EXPECT_EQ(run("--scale 9"), 2);
    EXPECT_EQ(run("no-such.json"), 3);
    const fs::path broken = m_folder / "broken.json";
    std::ofstream(broken) << "{ \"trunnion_case\": 1,\n  \"chain\": 7 }\n";
    EXPECT_EQ(run(broken.string()), 3);
    EXPECT_NE(said("err").find("line 2"), std::string::npos) << said("err");
    EXPECT_EQ(run("--snapshot /nonexistent/picture.png --renderer painter"), 3);
}

TEST_F(Program, ACaseFileIsShown)
{
    const fs::path file = m_folder / "upright.json";
    std::ofstream(file)
        << "{ \"trunnion_case\": 1, \"chain\": [ { \"axis\": \"z\", \"angle_deg\": 170 } ] }";
    const QImage other = snapshot(file.string() + " --size 1000x700 --renderer painter");
    EXPECT_NE(other, snapshot("--size 1000x700 --renderer painter"));
}

TEST_F(Program, HelpAndVersionAreFine)
{
    EXPECT_EQ(run("--help"), 0);
    EXPECT_NE(said("out").find("does not release motion"), std::string::npos);
    EXPECT_EQ(run("--version"), 0);
    EXPECT_EQ(said("out"), "trunnion 0.1.0\n");
}

}  // namespace
