// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QAbstractButton>
#include <QStringList>

namespace ui {

/// A word of a sentence that can be changed: underlined; a click, Enter, Space or Down opens the
/// choices in place.
class ChoiceWord : public QAbstractButton {
    Q_OBJECT

public:
    /// `meaning` spells what is chosen: the tooltip and the accessible name.
    ChoiceWord(const QString& meaning, QWidget* parent);

    /// What can be chosen, and the words that stand in the sentence for each. Equally many.
    void setChoices(const QStringList& choices, const QStringList& words);
    void setCurrent(int index);
    int current() const { return m_current; }

    void setBold(bool bold);
    void openChoices();

    QSize sizeHint() const override;
    QSize minimumSizeHint() const override { return sizeHint(); }

signals:
    void chosen(int index);  ///< by the person; the word changes when told to by setCurrent()
    void walked(int step);   ///< Left (-1) or Right (+1) was pressed

protected:
    void keyPressEvent(QKeyEvent* event) override;
    void paintEvent(QPaintEvent* event) override;

private:
    QString m_meaning;
    QStringList m_choices;
    QStringList m_words;
    int m_current = 0;
};

}  // namespace ui
