// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QHBoxLayout>
#include <QVBoxLayout>
#include <QWidget>

#include "ui/model/case_model.h"
#include "ui/panels/ink_label.h"
#include "ui/panels/number_field.h"

namespace ui {

/// One block of the numbers: a title with something quiet opposite, the numbers, and a sentence
/// beneath when there is something to say. Each block draws the findings and edits by calls on the
/// model.
class NumberBlock : public QWidget {
    Q_OBJECT

public:
    NumberBlock(CaseModel& model, const QString& title, QWidget* parent);

    QString note() const;  ///< the sentence beneath, empty if there is none

protected:
    /// Draws the model's findings and view.
    virtual void present() = 0;

    /// Calls present() now and whenever findings or view change. For the end of a constructor.
    void follow();

    void say(const QString& sentence, Tone tone);  ///< beneath the numbers; nothing if empty

    /// A field whose steps of one held key undo together.
    NumberField* addField(Quantity quantity, const FieldWays& ways = {});

    CaseModel& m_model;
    QHBoxLayout* m_header;  ///< after the title and a stretch
    QVBoxLayout* m_body;

private:
    InkLabel* m_note;
};

}  // namespace ui
