// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QLineEdit>
#include <QTimer>

#include "rotcore/result.h"
#include "ui/panels/figure_text.h"

namespace ui {

/// How a field steps and when it hands over what was typed.
struct FieldWays {
    bool steps = true;           ///< Up, Down and the wheel change the number
    bool commitsOnLeave = true;  ///< else only Enter does
    bool readOnly = false;
};

/// One number that can be read, typed, stepped and copied. It holds the number with all digits and
/// shows it with fixed ones. Enter hands over what was typed, Escape puts the number back; what is
/// no number stays, marked and explained, and is not handed over.
class NumberField : public QLineEdit {
    Q_OBJECT

public:
    NumberField(Quantity quantity, const FieldWays& ways, QWidget* parent);

    /// What the number is, in words: its accessible name, and the first line of its tooltip.
    void setMeaning(const QString& meaning);

    /// Shows a number. What is being typed stays if the number is the one that was there.
    void setValue(double value);
    void setValue(double value, Quantity quantity);
    double value() const { return m_value; }

    /// What is in the field now: the number with all digits, or the one typed but not handed over.
    rotcore::Result<double> typed() const;

    void refuse(const QString& why);  ///< marks what was typed as bad
    void restore();                   ///< puts the number back
    bool isBad() const { return !m_why.isEmpty(); }

    QSize sizeHint() const override;
    QSize minimumSizeHint() const override { return sizeHint(); }

    bool eventFilter(QObject* watched, QEvent* event) override;

signals:
    void committed(double value);  ///< typed and handed over, or stepped
    void entered();                ///< Enter was pressed, whatever the text
    void restored();
    void steppingBegan();  ///< around the steps of one held key or one roll of the wheel
    void steppingEnded();

protected:
    bool event(QEvent* event) override;
    void keyPressEvent(QKeyEvent* event) override;
    void keyReleaseEvent(QKeyEvent* event) override;
    void wheelEvent(QWheelEvent* event) override;
    void focusInEvent(QFocusEvent* event) override;
    void focusOutEvent(QFocusEvent* event) override;
    void contextMenuEvent(QContextMenuEvent* event) override;
    void paintEvent(QPaintEvent* event) override;

private:
    void commit();
    void stepBy(int direction, Qt::KeyboardModifiers modifiers);
    void endStepping();
    void copyNumber() const;
    void showValue();
    void showTip();

    Quantity m_quantity;
    FieldWays m_ways;
    double m_value = 0.0;
    QString m_meaning;
    QString m_why;  ///< what is wrong with the text, if anything
    bool m_stepping = false;
    int m_wheelTravel = 0;  ///< eighths of a degree not yet made into a step
    QTimer m_wheelRest;
};

}  // namespace ui
