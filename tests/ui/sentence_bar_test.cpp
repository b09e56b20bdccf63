// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/sentence_bar.h"

#include <QAction>
#include <QApplication>
#include <QMenu>
#include <QTest>
#include <memory>

#include <gtest/gtest.h>

#include "rotcore/rotation/quaternion.h"

namespace {

using rotcore::fromDegrees;
using ui::CaseModel;

QString u8(const char* text)
{
    return QString::fromUtf8(text);
}

class Sentence : public testing::Test {
protected:
    void SetUp() override
    {
        m_model.setAngles({rotcore::Order::zyx,
                           rotcore::About::body,
                           {fromDegrees(30), fromDegrees(20), fromDegrees(10)}},
                          "turn");
        m_bar = std::make_unique<ui::SentenceBar>(m_model, nullptr);
        m_bar->show();
        m_bar->activateWindow();
        ASSERT_TRUE(QTest::qWaitForWindowActive(m_bar.get()));
        m_words = m_bar->findChildren<ui::ChoiceWord*>();
        ASSERT_EQ(m_words.size(), 3);
    }

    // Opens a word's choices by a key and takes the one with this text.
    void choose(ui::ChoiceWord* word, Qt::Key key, const QString& choice)
    {
        word->setFocus();
        QTest::keyClick(word, key);
        auto* menu = qobject_cast<QMenu*>(QApplication::activePopupWidget());
        ASSERT_NE(menu, nullptr);
        for (QAction* action : menu->actions())
            if (action->text() == choice) {
                menu->setActiveAction(action);
                QTest::keyClick(menu, Qt::Key_Return);
                return;
            }
        ADD_FAILURE() << "no choice " << choice.toStdString();
        menu->close();
    }

    CaseModel m_model;
    std::unique_ptr<ui::SentenceBar> m_bar;
    QList<ui::ChoiceWord*> m_words;
};

TEST_F(Sentence, ReadsAsASentenceWithItsProduct)
{
    EXPECT_EQ(m_bar->sentence(), "Turns z, y, x about the body, in degrees, taking body to world.");
    EXPECT_EQ(m_bar->productText(), u8("R_WB = Rz(30.0°) · Ry(20.0°) · Rx(10.0°)"));
}

TEST_F(Sentence, AnotherOrderLeavesThePose)
{
    const Eigen::Quaterniond before = m_model.findings().q_WB;
    choose(m_words[0], Qt::Key_Return, "x, y, z");
    EXPECT_EQ(m_model.findings().shown.order, rotcore::Order::xyz);
    // Three half-angle products and as many arctangents: 20 roundings of 1.1e-16 rad.
    EXPECT_LT(rotcore::angleBetween(before, m_model.findings().q_WB), 5e-15);
    EXPECT_TRUE(m_bar->sentence().startsWith("Turns x, y, z about"));
    m_model.undoStack().undo();
    EXPECT_TRUE(m_bar->sentence().startsWith("Turns z, y, x about"));
}

TEST_F(Sentence, AboutSpaceTheProductIsWrittenBackwards)
{
    choose(m_words[1], Qt::Key_Down, "the space: axes that stay still");
    EXPECT_EQ(m_model.findings().shown.about, rotcore::About::space);
    EXPECT_TRUE(m_bar->productText().startsWith("R_WB = Rx("));
    EXPECT_TRUE(m_bar->sentence().contains("about the space"));
}

TEST_F(Sentence, TheUnitChangesInPlace)
{
    choose(m_words[2], Qt::Key_Space, "radians");
    EXPECT_EQ(m_bar->productText(), u8("R_WB = Rz(0.524) · Ry(0.349) · Rx(0.175)"));
}

TEST_F(Sentence, LeftAndRightWalkFromWordToWord)
{
    m_words[0]->setFocus();
    QTest::keyClick(m_words[0], Qt::Key_Right);
    EXPECT_TRUE(m_words[1]->hasFocus());
    QTest::keyClick(m_words[1], Qt::Key_Left);
    QTest::keyClick(m_words[0], Qt::Key_Left);
    EXPECT_TRUE(m_words[2]->hasFocus());
}

TEST_F(Sentence, InANarrowWindowTheProductStandsBeneath)
{
    m_bar->resize(2000, m_bar->height());
    const int wide = m_bar->sizeHint().height();
    m_bar->resize(m_bar->minimumSizeHint().width(), m_bar->height());
    EXPECT_GT(m_bar->sizeHint().height(), wide);
}

TEST_F(Sentence, TheFactorOfTheRingBeingTurnedIsBold)
{
    const QString markup = ui::productMarkup(m_model.findings(), 1, ui::inkOn({}));
    EXPECT_TRUE(markup.contains(u8("<b>Ry(20.0°)</b>")));
    EXPECT_FALSE(markup.contains("<b>Rz"));
}

}  // namespace
