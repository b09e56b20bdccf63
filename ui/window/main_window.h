// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QMainWindow>
#include <memory>
#include <optional>

#include "ui/model/case_model.h"
#include "ui/stage/stage_renderer.h"

class QMenu;

namespace ui {

class NumbersPanel;
class SentenceBar;
class StageWidget;

/// The window of one case: the tasks along the top, the convention as a sentence, the stage and the
/// numbers.
class MainWindow : public QMainWindow {
    Q_OBJECT

public:
    /// `caseName` stands in the title. `scheme`: nothing follows the desktop.
    MainWindow(CaseModel& model, std::unique_ptr<StageRenderer> renderer, const QString& caseName,
               std::optional<Scheme> scheme = std::nullopt);

    /// Said in the status line until something else is.
    void tell(const QString& message);

    /// The whole window as it stands, drawn at rest: stage, labels and panels.
    QImage picture();

    void restoreLayout();

protected:
    void closeEvent(QCloseEvent* event) override;

private:
    void createPanels();
    void createTopBar(const QString& caseName);
    void createActions();
    void createCaseMenu();
    void createEditMenu();
    void createViewMenu();
    void createHelpMenu();
    QMenu* schemeMenu();
    QMenu* worldMenu();
    void chooseScheme(std::optional<Scheme> scheme);
    void saveLayout() const;

    CaseModel& m_model;
    std::optional<Scheme> m_scheme;
    StageWidget* m_stage = nullptr;
    SentenceBar* m_sentence = nullptr;
    NumbersPanel* m_numbers = nullptr;
    QAction* m_undo = nullptr;
    QAction* m_redo = nullptr;
};

/// What Trunnion is, its caution and its licence.
void showAbout(QWidget* parent);

}  // namespace ui
