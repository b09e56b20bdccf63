// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/window/main_window.h"

#include <QActionGroup>
#include <QApplication>
#include <QCloseEvent>
#include <QHBoxLayout>
#include <QLabel>
#include <QMenuBar>
#include <QPainter>
#include <QScrollArea>
#include <QSettings>
#include <QSplitter>
#include <QStatusBar>
#include <QToolButton>
#include <QVBoxLayout>

#include "ui/panels/numbers_panel.h"
#include "ui/panels/sentence_bar.h"
#include "ui/stage/stage_widget.h"
#include "ui/window/theme.h"

namespace ui {
namespace {

QString textOf(std::string_view text)
{
    return QString::fromUtf8(text.data(), static_cast<qsizetype>(text.size()));
}

QToolButton* buttonOf(QAction* action, QWidget* parent)
{
    auto* button = new QToolButton(parent);
    button->setDefaultAction(action);
    button->setAutoRaise(true);
    button->setToolButtonStyle(Qt::ToolButtonTextOnly);
    return button;
}

}  // namespace

MainWindow::MainWindow(CaseModel& model, std::unique_ptr<StageRenderer> renderer,
                       const QString& caseName, std::optional<Scheme> scheme)
    : m_model(model),
      m_scheme(scheme),
      m_stage(new StageWidget(model, std::move(renderer))),
      m_sentence(new SentenceBar(model, this)),
      m_numbers(new NumbersPanel(model, this))
{
    setWindowTitle(tr("%1 \u2013 Trunnion").arg(caseName));
    createActions();
    createPanels();
    createTopBar(caseName);
    chooseScheme(scheme);
    connect(m_stage, &StageWidget::ringPointedAt, m_sentence, &SentenceBar::setActiveRing);
    connect(m_stage, &StageWidget::rendererFailed, this,
            [this] { tell(tr("OpenGL does not work here: the stage is painted without it.")); });
}

void MainWindow::createActions()
{
    createCaseMenu();
    createEditMenu();
    createViewMenu();
    createHelpMenu();
}

void MainWindow::createPanels()
{
    auto* scroll = new QScrollArea;
    scroll->setWidget(m_numbers);
    scroll->setWidgetResizable(true);
    scroll->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
    scroll->setFrameShape(QFrame::NoFrame);
    scroll->setMinimumWidth(m_numbers->minimumSizeHint().width() + 16);

    auto* splitter = new QSplitter(Qt::Horizontal);
    splitter->setObjectName("panels");
    splitter->addWidget(m_stage);
    splitter->addWidget(scroll);
    splitter->setStretchFactor(0, 1);
    splitter->setStretchFactor(1, 0);
    splitter->setSizes({960, 320});
    splitter->setChildrenCollapsible(false);

    auto* centre = new QWidget;
    auto* column = new QVBoxLayout(centre);
    column->setContentsMargins(0, 0, 0, 0);
    column->setSpacing(0);
    column->addWidget(m_sentence);
    column->addWidget(splitter, 1);
    setCentralWidget(centre);
    statusBar()->setSizeGripEnabled(false);
}

void MainWindow::createTopBar(const QString& caseName)
{
    auto* bar = new QWidget;
    auto* row = new QHBoxLayout(bar);
    row->setContentsMargins(0, 0, 8, 0);
    auto* name = new QLabel(caseName);
    name->setForegroundRole(QPalette::PlaceholderText);
    row->addWidget(name);
    row->addWidget(buttonOf(m_undo, bar));
    row->addWidget(buttonOf(m_redo, bar));
    menuBar()->setCornerWidget(bar, Qt::TopRightCorner);
}

void MainWindow::createCaseMenu()
{
    QMenu* menu = menuBar()->addMenu(tr("&Case"));
    QAction* paste = m_numbers->pasteAction();
    paste->setShortcut(QKeySequence(Qt::CTRL | Qt::SHIFT | Qt::Key_V));
    menu->addAction(paste);
    menu->addMenu(m_numbers->copyMenu());
    menu->addSeparator();
    menu->addAction(tr("&Quit"), QKeySequence::Quit, this, &QWidget::close);
}

void MainWindow::createEditMenu()
{
    QMenu* menu = menuBar()->addMenu(tr("&Edit"));
    m_undo = m_model.undoStack().createUndoAction(this, tr("Undo"));
    m_undo->setShortcut(QKeySequence::Undo);
    m_undo->setIconText("\u21B6");
    m_redo = m_model.undoStack().createRedoAction(this, tr("Redo"));
    m_redo->setShortcut(QKeySequence::Redo);
    m_redo->setIconText("\u21B7");
    menu->addActions({m_undo, m_redo});
}

void MainWindow::createViewMenu()
{
    QMenu* menu = menuBar()->addMenu(tr("&View"));
    menu->addMenu(worldMenu());
    menu->addMenu(schemeMenu());
    menu->addSeparator();
    menu->addAction(tr("Look from the &front quarter"), m_stage, &StageWidget::resetCamera);
}

void MainWindow::createHelpMenu()
{
    QMenu* menu = menuBar()->addMenu(tr("&Help"));
    menu->addAction(tr("&About Trunnion"), this, [this] { showAbout(this); });
}

QMenu* MainWindow::worldMenu()
{
    auto* menu = new QMenu(tr("&World's directions"), this);
    auto* group = new QActionGroup(menu);
    for (const auto& [names, words] : rotcore::Names<WorldNames>::kTable) {
        QAction* action = menu->addAction(textOf(words));
        action->setCheckable(true);
        action->setChecked(names == m_model.view().worldNames);
        group->addAction(action);
        connect(action, &QAction::triggered, this, [this, names = names] {
            View view = m_model.view();
            view.worldNames = names;
            m_model.setView(view);
        });
    }
    return menu;
}

QMenu* MainWindow::schemeMenu()
{
    auto* menu = new QMenu(tr("&Light or dark"), this);
    auto* group = new QActionGroup(menu);
    const std::array<std::pair<std::optional<Scheme>, QString>, 3> choices{
        {{std::nullopt, tr("As the &desktop")},
         {Scheme::light, tr("&Light")},
         {Scheme::dark, tr("D&ark")}}};
    for (const auto& [scheme, words] : choices) {
        QAction* action = menu->addAction(words);
        action->setCheckable(true);
        action->setChecked(scheme == m_scheme);
        group->addAction(action);
        connect(action, &QAction::triggered, this,
                [this, scheme = scheme] { chooseScheme(scheme); });
    }
    return menu;
}

void MainWindow::chooseScheme(std::optional<Scheme> scheme)
{
    m_scheme = scheme;
    const Scheme shown = scheme.value_or(schemeOfDesktop());
    applyScheme(shown);
    m_stage->setScheme(shown);
}

void MainWindow::tell(const QString& message)
{
    statusBar()->showMessage(message);
}

QImage MainWindow::picture()
{
    const qreal ratio = devicePixelRatioF();
    QImage image(size() * ratio, QImage::Format_ARGB32_Premultiplied);
    image.setDevicePixelRatio(ratio);
    render(&image);
    QPainter painter(&image);
    painter.drawImage(m_stage->mapTo(this, QPoint(0, 0)), m_stage->picture(m_stage->size(), ratio));
    return image;
}

void MainWindow::closeEvent(QCloseEvent* event)
{
    saveLayout();
    QMainWindow::closeEvent(event);
}

void MainWindow::saveLayout() const
{
    QSettings settings;
    settings.setValue("window/geometry", saveGeometry());
    settings.setValue("window/panels", findChild<QSplitter*>("panels")->saveState());
    const View& view = m_model.view();
    settings.setValue("view/worldNames", textOf(rotcore::nameOf(view.worldNames)));
    settings.setValue("view/quaternionLayout", textOf(rotcore::nameOf(view.quaternionLayout)));
    settings.setValue("view/quaternionAlgebra", textOf(rotcore::nameOf(view.quaternionAlgebra)));
    settings.setValue("view/unit", textOf(rotcore::nameOf(m_model.subject().shown.unit)));
}

void MainWindow::restoreLayout()
{
    const QSettings settings;
    restoreGeometry(settings.value("window/geometry").toByteArray());
    findChild<QSplitter*>("panels")->restoreState(settings.value("window/panels").toByteArray());
    const auto restore = [&](const char* key, auto& value) {
        using Value = std::remove_reference_t<decltype(value)>;
        const auto parsed = rotcore::parseName<Value>(settings.value(key).toString().toStdString());
        if (parsed) value = *parsed;
    };
    View view = m_model.view();
    restore("view/worldNames", view.worldNames);
    restore("view/quaternionLayout", view.quaternionLayout);
    restore("view/quaternionAlgebra", view.quaternionAlgebra);
    m_model.setView(view);
}

}  // namespace ui
