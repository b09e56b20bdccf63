// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/choice_word.h"

#include <QActionGroup>
#include <QKeyEvent>
#include <QMenu>
#include <QPainter>

#include "ui/panels/ink.h"

namespace ui {
namespace {

constexpr int kRoomBelow = 3;  // px between the letters' descent and the underline's lower edge
constexpr int kUnderline = 2;

}  // namespace

ChoiceWord::ChoiceWord(const QString& meaning, QWidget* parent)
    : QAbstractButton(parent), m_meaning(meaning)
{
    setFocusPolicy(Qt::StrongFocus);
    setCursor(Qt::PointingHandCursor);
    setToolTip(meaning);
    setSizePolicy(QSizePolicy::Fixed, QSizePolicy::Fixed);
    connect(this, &QAbstractButton::clicked, this, &ChoiceWord::openChoices);
}

void ChoiceWord::setChoices(const QStringList& choices, const QStringList& words)
{
    m_choices = choices;
    m_words = words;
    setCurrent(m_current);
}

void ChoiceWord::setCurrent(int index)
{
    m_current = index;
    setText(m_words.value(index));
    setAccessibleName(m_meaning + QStringLiteral(": ") + text());
    updateGeometry();
}

void ChoiceWord::setBold(bool bold)
{
    QFont weighted = font();
    weighted.setBold(bold);
    setFont(weighted);
    updateGeometry();
}

void ChoiceWord::openChoices()
{
    auto* menu = new QMenu(this);
    menu->setAttribute(Qt::WA_DeleteOnClose);
    auto* group = new QActionGroup(menu);
    for (int index = 0; index < m_choices.size(); ++index) {
        QAction* action = menu->addAction(m_choices[index]);
        action->setCheckable(true);
        action->setChecked(index == m_current);
        group->addAction(action);
        connect(action, &QAction::triggered, this, [this, index] {
            if (index != m_current) emit chosen(index);
        });
        if (index == m_current) menu->setActiveAction(action);
    }
    menu->popup(mapToGlobal(QPoint(0, height())));
}

QSize ChoiceWord::sizeHint() const
{
    return {fontMetrics().horizontalAdvance(text()), fontMetrics().height() + kRoomBelow};
}

void ChoiceWord::keyPressEvent(QKeyEvent* event)
{
    switch (event->key()) {
        case Qt::Key_Return:
        case Qt::Key_Enter:
        case Qt::Key_Space:
        case Qt::Key_Down:
            openChoices();
            return;
        case Qt::Key_Left:
        case Qt::Key_Right:
            emit walked(event->key() == Qt::Key_Left ? -1 : 1);
            return;
        default:
            QAbstractButton::keyPressEvent(event);
    }
}

void ChoiceWord::paintEvent(QPaintEvent*)
{
    const Ink ink = inkOn(palette());
    QPainter painter(this);
    if (hasFocus()) {
        QColor wash = ink.accent;
        wash.setAlphaF(0.18F);
        painter.fillRect(rect(), wash);
    }
    painter.setPen(underMouse() || hasFocus() ? ink.accent : ink.text);
    painter.drawText(0, fontMetrics().ascent(), text());
    const int thick = hasFocus() ? kUnderline + 1 : kUnderline;
    painter.fillRect(0, height() - thick, width(), thick, ink.accent);
}

}  // namespace ui
