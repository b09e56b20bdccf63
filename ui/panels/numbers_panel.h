// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAction>
#include <QHBoxLayout>
#include <QMenu>
#include <QWidget>

#include "ui/model/case_model.h"

namespace ui {

class MoreBlock;

/// The pose as every usual set of numbers: one column of blocks, always in the same order, and
/// beneath it the way in (paste) and out (copy).
class NumbersPanel : public QWidget {
    Q_OBJECT

public:
    NumbersPanel(CaseModel& model, QWidget* parent);

    /// For the window's menus too.
    QAction* pasteAction() const { return m_paste; }
    QMenu* copyMenu() const { return m_copy; }

    /// Puts an action of the window as a button beside those of the panel.
    void addButton(QAction* action);

    void setMoreUnfolded(bool unfolded);
    void openPasteDialog();

protected:
    void paintEvent(QPaintEvent* event) override;

private:
    QWidget* makeBlocks();
    void makeCopyMenu();

    CaseModel& m_model;
    QAction* m_paste;
    QMenu* m_copy;
    MoreBlock* m_more = nullptr;
    QHBoxLayout* m_buttons;
};

}  // namespace ui
