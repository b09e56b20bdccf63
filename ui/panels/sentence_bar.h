// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QBoxLayout>
#include <QWidget>

#include "ui/model/case_model.h"
#include "ui/panels/choice_word.h"
#include "ui/panels/ink_label.h"

namespace ui {

/// The convention as a sentence whose underlined words can be changed, and opposite it the product
/// it stands for.
class SentenceBar : public QWidget {
    Q_OBJECT

public:
    SentenceBar(CaseModel& model, QWidget* parent);

    /// Writes the factor of a ring bold while it is turned; `listed` is 0 to 2, or -1 for none.
    void setActiveRing(int listed);

    QString sentence() const;     ///< as it reads
    QString productText() const;  ///< without colours

    QSize minimumSizeHint() const override;

signals:
    void ringHovered(int listed);  ///< the pointer is on its factor; -1: on none

protected:
    void changeEvent(QEvent* event) override;
    void resizeEvent(QResizeEvent* event) override;

private:
    void present();
    void addSentence();
    void fold();
    void walk(int from, int step);
    void change(const rotcore::Convention& convention, const QString& what);

    CaseModel& m_model;
    ChoiceWord* m_order;
    ChoiceWord* m_about;
    ChoiceWord* m_unit;
    QLabel* m_product;
    QBoxLayout* m_row;  ///< the sentence, then the product
    int m_activeRing = -1;
};

/// The product as rich text in the colours of the axes, each factor a link to its ring.
QString productMarkup(const rotcore::Findings& found, int activeRing, const Ink& ink);

}  // namespace ui
