// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QLabel>

#include "ui/panels/ink.h"

namespace ui {

/// In which ink a label is written.
enum class Tone { text, quiet, warning, bad, x, y, z };

Tone toneOf(rotcore::Axis axis);

/// A label that keeps to its ink when the palette turns from light to dark.
class InkLabel : public QLabel {
    Q_OBJECT

public:
    InkLabel(const QString& text, Tone tone, QWidget* parent);

    void setTone(Tone tone);
    void setRelativeSize(double factor);  ///< of the font it would have by itself

    /// Small and bold, over a block.
    static InkLabel* title(const QString& text, QWidget* parent);
    /// Quiet and small.
    static InkLabel* note(const QString& text, QWidget* parent);

protected:
    void changeEvent(QEvent* event) override;

private:
    void applyTone();

    Tone m_tone;
};

/// The desktop's fixed font at so many times the size of `widget`'s.
QFont figureFont(const QWidget& widget, double factor);

}  // namespace ui
