// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/number_field.h"

#include <QClipboard>
#include <QContextMenuEvent>
#include <QGuiApplication>
#include <QKeyEvent>
#include <QMenu>
#include <QPainter>
#include <QWheelEvent>
#include <cmath>
#include <memory>

#include "rotcore/number_text.h"
#include "ui/panels/ink.h"

namespace ui {
namespace {

constexpr int kWheelRest = 400;    // ms without a notch that end a roll of the wheel
constexpr int kWheelNotch = 120;   // eighths of a degree
constexpr double kStepGrid = 1e9;  // stepping leaves no rounding beyond nine decimals
constexpr int kUnderline = 2;      // px, of a field that has the focus or is bad

// Plain, with Shift, with Ctrl.
struct Steps {
    double plain, coarse, fine;
};

Steps stepsOf(Quantity quantity)
{
    switch (quantity) {
        case Quantity::degrees:
            return {1.0, 15.0, 0.1};
        case Quantity::radians:
        case Quantity::quaternion:
        case Quantity::matrix:
        case Quantity::length:
            return {0.01, 0.1, 0.001};
    }
    return {1.0, 10.0, 0.1};
}

// The widest number that a field is made for; longer ones scroll.
QString widestText(Quantity quantity)
{
    const double widest = quantity == Quantity::degrees ? -888.0 : -8.0;
    return figureText(widest, quantity);
}

bool isUndoKey(QKeyEvent* event)
{
    return event->matches(QKeySequence::Undo) || event->matches(QKeySequence::Redo);
}

}  // namespace

NumberField::NumberField(Quantity quantity, const FieldWays& ways, QWidget* parent)
    : QLineEdit(parent), m_quantity(quantity), m_ways(ways)
{
    setFrame(false);
    setAlignment(Qt::AlignRight);
    setReadOnly(ways.readOnly);
    setSizePolicy(QSizePolicy::Fixed, QSizePolicy::Fixed);
    setContextMenuPolicy(Qt::DefaultContextMenu);
    QPalette bare = palette();
    bare.setColor(QPalette::Base, Qt::transparent);
    bare.setResolveMask(QPalette::ResolveMask(1) << QPalette::Base);
    setPalette(bare);
    m_wheelRest.setSingleShot(true);
    m_wheelRest.setInterval(kWheelRest);
    connect(&m_wheelRest, &QTimer::timeout, this, &NumberField::endStepping);
    connect(this, &QLineEdit::textEdited, this, [this] {
        m_why.clear();
        showTip();
        update();
    });
    showValue();
}

void NumberField::setMeaning(const QString& meaning)
{
    if (meaning == m_meaning) return;
    m_meaning = meaning;
    setAccessibleName(meaning);
    showTip();
}

void NumberField::setValue(double value)
{
    setValue(value, m_quantity);
}

void NumberField::setValue(double value, Quantity quantity)
{
    const bool isSame = value == m_value && quantity == m_quantity;
    if (isSame && (isModified() || isBad())) return;
    if (quantity != m_quantity) {
        m_quantity = quantity;
        updateGeometry();
    }
    m_value = value;
    showValue();
}

rotcore::Result<double> NumberField::typed() const
{
    if (!isModified() && !isBad()) return m_value;
    return parseFigure(text(), m_quantity);
}

void NumberField::refuse(const QString& why)
{
    m_why = why;
    setAccessibleDescription(why);
    showTip();
    update();
}

void NumberField::restore()
{
    showValue();
}

QSize NumberField::sizeHint() const
{
    const QSize usual = QLineEdit::sizeHint();
    return {fontMetrics().horizontalAdvance(widestText(m_quantity)) + 6,
            usual.height() + kUnderline};
}

bool NumberField::event(QEvent* event)
{
    // Undo is the window's, unless something is being typed.
    if (event->type() == QEvent::ShortcutOverride && !isModified() &&
        isUndoKey(static_cast<QKeyEvent*>(event))) {
        event->ignore();
        return false;
    }
    return QLineEdit::event(event);
}

// While stepping this watches all widgets: a press of the mouse anywhere may begin another gesture.
bool NumberField::eventFilter(QObject* watched, QEvent* event)
{
    if (event->type() == QEvent::MouseButtonPress || event->type() == QEvent::TouchBegin)
        endStepping();
    return QLineEdit::eventFilter(watched, event);
}

void NumberField::keyPressEvent(QKeyEvent* event)
{
    if (isUndoKey(event) && !isModified()) return event->ignore();
    if (event->matches(QKeySequence::Copy) && !isModified() &&
        (!hasSelectedText() || selectedText() == text()))
        return copyNumber();
    switch (event->key()) {
        case Qt::Key_Return:
        case Qt::Key_Enter:
            commit();
            emit entered();
            return;
        case Qt::Key_Escape:
            if (!isModified() && !isBad()) return event->ignore();
            restore();
            selectAll();
            emit restored();
            return;
        case Qt::Key_Up:
        case Qt::Key_Down:
            stepBy(event->key() == Qt::Key_Up ? 1 : -1, event->modifiers());
            return;
        default:
            QLineEdit::keyPressEvent(event);
    }
}

void NumberField::keyReleaseEvent(QKeyEvent* event)
{
    const bool isStep = event->key() == Qt::Key_Up || event->key() == Qt::Key_Down;
    if (isStep && !event->isAutoRepeat()) endStepping();
    QLineEdit::keyReleaseEvent(event);
}

void NumberField::wheelEvent(QWheelEvent* event)
{
    if (!hasFocus() || !m_ways.steps || m_ways.readOnly) return event->ignore();
    m_wheelTravel += event->angleDelta().y();
    const int notches = m_wheelTravel / kWheelNotch;
    m_wheelTravel -= notches * kWheelNotch;
    if (notches != 0) stepBy(notches, event->modifiers());
    m_wheelRest.start();
    event->accept();
}

void NumberField::focusInEvent(QFocusEvent* event)
{
    QLineEdit::focusInEvent(event);
    if (event->reason() == Qt::TabFocusReason || event->reason() == Qt::BacktabFocusReason)
        selectAll();
    update();
}

void NumberField::focusOutEvent(QFocusEvent* event)
{
    endStepping();
    // What is half typed waits while a menu is open or another program is looked at.
    const bool comesBack =
        event->reason() == Qt::PopupFocusReason || event->reason() == Qt::ActiveWindowFocusReason;
    if (m_ways.commitsOnLeave && !comesBack) commit();
    QLineEdit::focusOutEvent(event);
    update();
}

void NumberField::contextMenuEvent(QContextMenuEvent* event)
{
    const std::unique_ptr<QMenu> menu(createStandardContextMenu());
    auto* copy = new QAction(tr("Copy with all digits"), menu.get());
    connect(copy, &QAction::triggered, this, &NumberField::copyNumber);
    menu->insertAction(menu->actions().value(0), copy);
    menu->exec(event->globalPos());
}

void NumberField::paintEvent(QPaintEvent* event)
{
    QLineEdit::paintEvent(event);
    const Ink ink = inkOn(palette());
    QPainter painter(this);
    const bool isStrong = isBad() || hasFocus();
    const int thick = isStrong ? kUnderline : 1;
    if (isStrong || isModified() || underMouse())
        painter.fillRect(0, height() - thick, width(), thick,
                         isBad()                    ? ink.bad
                         : isStrong || isModified() ? ink.accent
                                                    : ink.hairline);
}

void NumberField::commit()
{
    if (m_ways.readOnly || !isModified()) return;
    const auto number = parseFigure(text(), m_quantity);
    if (!number) return refuse(sentenceOf(number.error().message));
    if (!m_ways.commitsOnLeave) return;  // whoever waits for Enter takes the number from typed()
    setModified(false);
    emit committed(*number);
    if (!isBad()) showValue();
}

void NumberField::stepBy(int direction, Qt::KeyboardModifiers modifiers)
{
    if (!m_ways.steps || m_ways.readOnly) return;
    if (QGuiApplication::mouseButtons() != Qt::NoButton) return;  // something is being dragged
    const auto from = typed();
    if (!from) return refuse(sentenceOf(from.error().message));
    const Steps steps = stepsOf(m_quantity);
    const double step = modifiers.testFlag(Qt::ShiftModifier)     ? steps.coarse
                        : modifiers.testFlag(Qt::ControlModifier) ? steps.fine
                                                                  : steps.plain;
    if (!m_stepping) {
        emit steppingBegan();
        QCoreApplication::instance()->installEventFilter(this);
    }
    m_stepping = true;
    setModified(false);
    m_why.clear();
    emit committed(std::round((*from + direction * step) * kStepGrid) / kStepGrid);
    if (!isBad()) showValue();
}

void NumberField::endStepping()
{
    m_wheelRest.stop();
    m_wheelTravel = 0;
    if (!m_stepping) return;
    m_stepping = false;
    QCoreApplication::instance()->removeEventFilter(this);
    emit steppingEnded();
}

void NumberField::copyNumber() const
{
    QGuiApplication::clipboard()->setText(QString::fromStdString(rotcore::numberText(m_value)));
}

void NumberField::showValue()
{
    m_why.clear();
    const int cursor = cursorPosition();
    setText(figureText(m_value, m_quantity));  // also marks it as not modified
    if (hasFocus()) setCursorPosition(cursor);
    setAccessibleDescription({});
    showTip();
    update();
}

void NumberField::showTip()
{
    const QString digits = QString::fromStdString(rotcore::numberText(m_value));
    const QString unit = m_quantity == Quantity::degrees ? QStringLiteral("°") : QString();
    QString tip = m_meaning + QStringLiteral("\n") + digits + unit;
    if (isBad()) tip = m_why + QStringLiteral("\n") + tr("Escape puts back %1.").arg(digits + unit);
    setToolTip(tip);
}

}  // namespace ui
