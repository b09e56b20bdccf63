// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/numbers_panel.h"

#include <QClipboard>
#include <QEvent>
#include <QGuiApplication>
#include <QPainter>
#include <QPushButton>
#include <QScrollArea>
#include <QScrollBar>

#include "ui/panels/angles_block.h"
#include "ui/panels/axis_angle_block.h"
#include "ui/panels/copy_as.h"
#include "ui/panels/matrix_block.h"
#include "ui/panels/more_block.h"
#include "ui/panels/paste_dialog.h"
#include "ui/panels/quaternion_block.h"

namespace ui {
namespace {

constexpr int kSide = 16;
constexpr int kAbove = 10;
constexpr int kGap = 8;

// A line across, between blocks.
class Hairline : public QWidget {
public:
    explicit Hairline(QWidget* parent) : QWidget(parent) { setFixedHeight(1); }

protected:
    void paintEvent(QPaintEvent*) override
    {
        QPainter(this).fillRect(rect(), inkOn(palette()).hairline);
    }
};

// Scrolls up and down only: as wide as its widget needs to be, also when that grows.
class TallArea : public QScrollArea {
public:
    explicit TallArea(QWidget* parent) : QScrollArea(parent)
    {
        setFrameShape(QFrame::NoFrame);
        setWidgetResizable(true);
        setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
        setFocusPolicy(Qt::NoFocus);
    }

    bool eventFilter(QObject* watched, QEvent* event) override
    {
        if (watched == widget() && event->type() == QEvent::LayoutRequest) followWidth();
        return QScrollArea::eventFilter(watched, event);
    }

    void followWidth()
    {
        setMinimumWidth(widget()->minimumSizeHint().width() +
                        verticalScrollBar()->sizeHint().width());
    }
};

}  // namespace

NumbersPanel::NumbersPanel(CaseModel& model, QWidget* parent)
    : QWidget(parent),
      m_model(model),
      m_paste(new QAction(tr("Paste numbers…"), this)),
      m_copy(new QMenu(tr("Copy as"), this)),
      m_buttons(new QHBoxLayout)
{
    connect(m_paste, &QAction::triggered, this, &NumbersPanel::openPasteDialog);
    makeCopyMenu();
    QWidget* blocks = makeBlocks();
    auto* area = new TallArea(this);
    area->setWidget(blocks);
    area->viewport()->setAutoFillBackground(false);
    blocks->setAutoFillBackground(false);
    area->followWidth();

    auto* column = new QVBoxLayout(this);
    column->setContentsMargins({});
    column->setSpacing(0);
    column->addWidget(area, 1);
    m_buttons->setContentsMargins(kSide, kAbove, kSide, kAbove);
    m_buttons->setSpacing(kGap);
    m_buttons->addStretch(1);
    column->addLayout(m_buttons);
    addButton(m_paste);
    addButton(m_copy->menuAction());
}

QWidget* NumbersPanel::makeBlocks()
{
    auto* blocks = new QWidget;
    auto* column = new QVBoxLayout(blocks);
    column->setContentsMargins({});
    column->setSpacing(0);
    const std::initializer_list<QWidget*> inOrder{
        new AnglesBlock(m_model, blocks), new QuaternionBlock(m_model, blocks),
        new MatrixBlock(m_model, blocks), new AxisAngleBlock(m_model, blocks),
        m_more = new MoreBlock(m_model, blocks)};
    // Made in this order, which is that of the Tab key too.
    for (QWidget* block : inOrder) {
        if (column->count() > 0) column->addWidget(new Hairline(blocks));
        column->addWidget(block);
    }
    column->addStretch(1);
    return blocks;
}

void NumbersPanel::makeCopyMenu()
{
    connect(m_copy, &QMenu::aboutToShow, this, [this] {
        m_copy->clear();
        for (const CopyFormat format : kAllCopyFormats) {
            QAction* action = m_copy->addAction(copyLabel(format, m_model.findings().shown));
            connect(action, &QAction::triggered, this, [this, format] {
                QGuiApplication::clipboard()->setText(copyText(m_model.findings(), format));
            });
        }
    });
}

void NumbersPanel::addButton(QAction* action)
{
    auto* button = new QPushButton(action->text(), this);
    button->setEnabled(action->isEnabled());
    if (action->menu() != nullptr) button->setMenu(action->menu());
    connect(button, &QPushButton::clicked, action, &QAction::trigger);
    connect(action, &QAction::changed, button, [action, button] {
        button->setText(action->text());
        button->setEnabled(action->isEnabled());
    });
    m_buttons->insertWidget(m_buttons->count() - 1, button);
}

void NumbersPanel::setMoreUnfolded(bool unfolded)
{
    m_more->setUnfolded(unfolded);
}

void NumbersPanel::openPasteDialog()
{
    auto* dialog = new PasteDialog(m_model, this);
    dialog->setAttribute(Qt::WA_DeleteOnClose);
    dialog->fillFromClipboard();
    dialog->open();
}

void NumbersPanel::paintEvent(QPaintEvent*)
{
    // The sheet.
    QPainter(this).fillRect(rect(), palette().color(QPalette::Base));
}

}  // namespace ui
