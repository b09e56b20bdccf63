// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QDialog>
#include <QListWidget>
#include <QPlainTextEdit>
#include <QPushButton>
#include <vector>

#include "ui/model/case_model.h"
#include "ui/panels/ink_label.h"

namespace ui {

/// Numbers pasted as they were sent: says at once what they are taken for, what pose that is and
/// what else they could be, and sets the pose of the reading chosen.
class PasteDialog : public QDialog {
    Q_OBJECT

public:
    PasteDialog(CaseModel& model, QWidget* parent);

    /// Takes the clipboard's text if there are numbers in it.
    void fillFromClipboard();

    void setText(const QString& text);
    QString taken() const;    ///< what the numbers are taken for
    QString result() const;   ///< the angles and quaternion they give
    QString remarks() const;  ///< warnings, or the fault and its place

    void accept() override;

private:
    void layOut();
    void read();
    void showFault(const rotcore::Fault& fault);
    void showReading(int row);
    void markPlace(const std::optional<rotcore::TextPlace>& place);

    CaseModel& m_model;
    QPlainTextEdit* m_text;
    InkLabel* m_taken;
    InkLabel* m_result;
    InkLabel* m_remarks;
    InkLabel* m_othersTitle;
    QListWidget* m_readings;
    QPushButton* m_apply = nullptr;
    std::vector<rotcore::SentNumbers> m_offered;  ///< one a row of m_readings
    std::vector<std::string> m_warnings;          ///< of reading the text
};

/// The place of a byte column in `text`, counted in QChars from its start.
int positionOf(const QString& text, const rotcore::TextPlace& place);

}  // namespace ui
