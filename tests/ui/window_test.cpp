// SPDX-License-Identifier: GPL-3.0-or-later
// The window as a whole, by its menus and by real events.
#include <QAction>
#include <QApplication>
#include <QLabel>
#include <QLineEdit>
#include <QMenuBar>
#include <QSettings>
#include <QStandardPaths>
#include <QTest>

#include "tests/support/poses.h"
#include "ui/model/case_model.h"
#include "ui/panels/paste_dialog.h"
#include "ui/stage/painter_renderer.h"
#include "ui/stage/stage_widget.h"
#include "ui/window/main_window.h"
#include "ui/window/theme.h"

namespace {

using namespace rotcore;

class Window : public testing::Test {
protected:
    Window()
    {
        QStandardPaths::setTestModeEnabled(true);
        QApplication::setOrganizationName("Trunnion");
        QApplication::setApplicationName("TrunnionTest");
        QSettings().clear();
        m_window = std::make_unique<ui::MainWindow>(
            m_model, std::make_unique<ui::PainterRenderer>(), "a case", ui::Scheme::light);
        m_window->resize(1280, 800);
        m_window->show();
        QApplication::processEvents();
    }

    QAction* action(const QString& text) const
    {
        for (QAction* candidate : m_window->findChildren<QAction*>())
            if (candidate->text().remove('&') == text) return candidate;
        return nullptr;
    }

    ui::CaseModel m_model{
        Case{.start = {},
             .chain = chainOf({Order::zyx, About::body, {30_deg, 20_deg, 10_deg}}),
             .shown = {}}};
    std::unique_ptr<ui::MainWindow> m_window;
};

TEST_F(Window, TitleNamesTheCase)
{
    EXPECT_TRUE(m_window->windowTitle().startsWith("a case"));
}

TEST_F(Window, UndoAndRedoAreActionsWithTheWordsOfTheEdit)
{
    m_model.setAngle(0, 50_deg);
    QTest::keyClick(m_window.get(), Qt::Key_Z, Qt::ControlModifier);
    QAction* undo = action("Undo");
    QAction* redo = action("Redo turn about z");
    ASSERT_NE(undo, nullptr);
    ASSERT_NE(redo, nullptr);
    EXPECT_FALSE(undo->isEnabled());
    EXPECT_EQ(m_model.findings().angles.angles[0], 30_deg);
    redo->trigger();
    EXPECT_EQ(m_model.findings().angles.angles[0], 50_deg);
}

TEST_F(Window, PastingIsAKeyAwayAndShowsWhatWasTaken)
{
    m_window->activateWindow();
    QTest::keyClick(m_window.get(), Qt::Key_V, Qt::ControlModifier | Qt::ShiftModifier);
    auto* dialog = m_window->findChild<ui::PasteDialog*>();
    ASSERT_NE(dialog, nullptr);
    dialog->setText("0.5, 0.5, 0.5, 0.5");
    EXPECT_TRUE(dialog->taken().contains("quaternion")) << dialog->taken().toStdString();
    dialog->accept();
    EXPECT_POSE_NEAR(m_model.findings().q_WB, Eigen::Quaterniond(0.5, 0.5, 0.5, 0.5), 1e-15);
}

TEST_F(Window, LightAndDarkChangeTheWholeWindowAtOnce)
{
    const QImage light = m_window->picture();
    action("Dark")->trigger();
    QApplication::processEvents();
    const QImage dark = m_window->picture();
    const auto lightness = [](const QImage& image, QPoint at) {
        return image.pixelColor(at).lightness();
    };
    const QPoint panel(1270, 600);
    const QPoint stage(20, 120);
    for (const QPoint at : {panel, stage}) {
        EXPECT_GT(lightness(light, at), 200);
        EXPECT_LT(lightness(dark, at), 60);
    }
}

TEST_F(Window, WorldDirectionsAreChosenInTheMenuAndShownOnTheStage)
{
    action("north, east, down")->trigger();
    EXPECT_EQ(m_model.view().worldNames, ui::WorldNames::northEastDown);
    const auto* stage = m_window->findChild<ui::StageWidget*>();
    ASSERT_NE(stage, nullptr);
    bool named = false;
    for (const ui::AxisShape& axis : stage->scene().axes)
        named = named || axis.name.find("north") != std::string::npos;
    EXPECT_TRUE(named);
}

TEST_F(Window, LayoutAndChoicesComeBack)
{
    action("east, north, up")->trigger();
    m_window->close();
    ui::CaseModel other;
    ui::MainWindow again(other, std::make_unique<ui::PainterRenderer>(), "again",
                         ui::Scheme::light);
    again.restoreLayout();
    EXPECT_EQ(other.view().worldNames, ui::WorldNames::eastNorthUp);
    EXPECT_EQ(again.size(), QSize(1280, 800));
}

TEST_F(Window, PictureHoldsTheStageToo)
{
    // The stage's centre shows the body, which is neither paper nor sheet nor stage.
    const QImage picture = m_window->picture();
    EXPECT_EQ(picture.size(), m_window->size() * m_window->devicePixelRatioF());
    const auto* stage = m_window->findChild<ui::StageWidget*>();
    const QPoint centre = stage->mapTo(m_window.get(), stage->rect().center());
    EXPECT_NE(picture.pixelColor(centre),
              picture.pixelColor(centre - QPoint(0, stage->height() / 2 - 5)));
}

}  // namespace
