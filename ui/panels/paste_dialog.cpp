// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/paste_dialog.h"

#include <QClipboard>
#include <QDialogButtonBox>
#include <QGuiApplication>
#include <QVBoxLayout>
#include <algorithm>

#include "rotcore/reading/text_input.h"
#include "ui/panels/figure_text.h"

namespace ui {
namespace {

constexpr int kPadding = 16;
constexpr int kGap = 8;
constexpr int kTextLines = 6;
constexpr int kReadingRows = 4;
constexpr int kWidthInLetters = 64;

rotcore::Result<rotcore::TextInput> readPasted(const QString& text)
{
    return rotcore::readText(text.toStdString(), {}, rotcore::UnitGuess::fromValues);
}

QString resultText(const rotcore::Findings& found)
{
    const auto axes = rotcore::axesOf(found.angles.order);
    const rotcore::AngleUnit unit = found.shown.unit;
    QStringList angles;
    for (std::size_t n = 0; n < 3; ++n)
        angles << QString::fromUtf8(rotcore::nameOf(axes[n])) + QStringLiteral(" ") +
                      figureText(rotcore::inUnit(found.angles.angles[n], unit), quantityOf(unit));
    const Eigen::Quaterniond& q = found.q_WB;
    QStringList parts;
    for (const double part : {q.w(), q.x(), q.y(), q.z()})
        parts << fixedText(part, decimalsOf(Quantity::quaternion));
    return PasteDialog::tr("angles      %1\nquaternion  w %2  x %3  y %4  z %5")
        .arg(angles.join(QStringLiteral("  ")), parts[0], parts[1], parts[2], parts[3]);
}

}  // namespace

int positionOf(const QString& text, const rotcore::TextPlace& place)
{
    qsizetype start = 0;
    for (std::size_t line = 1; line < place.line; ++line) {
        const qsizetype end = text.indexOf('\n', start);
        if (end < 0) break;
        start = end + 1;
    }
    const QByteArray rest = text.mid(start).toUtf8();
    const auto bytes = std::min(static_cast<qsizetype>(place.column) - 1, rest.size());
    return static_cast<int>(start + QString::fromUtf8(rest.left(bytes)).size());
}

PasteDialog::PasteDialog(CaseModel& model, QWidget* parent)
    : QDialog(parent),
      m_model(model),
      m_text(new QPlainTextEdit(this)),
      m_taken(new InkLabel({}, Tone::text, this)),
      m_result(new InkLabel({}, Tone::text, this)),
      m_remarks(InkLabel::note({}, this)),
      m_othersTitle(InkLabel::title(tr("It could also be"), this)),
      m_readings(new QListWidget(this))
{
    setWindowTitle(tr("Paste numbers"));
    m_text->setPlaceholderText(
        tr("Angles, a quaternion, a matrix, a vector; bare or in code, CSV, JSON or a printout."));
    m_text->setAccessibleName(tr("Numbers as they were sent"));
    m_text->setTabChangesFocus(true);
    m_readings->setAccessibleName(tr("What the numbers are taken for"));
    layOut();
    connect(m_text, &QPlainTextEdit::textChanged, this, &PasteDialog::read);
    connect(m_readings, &QListWidget::currentRowChanged, this, &PasteDialog::showReading);
    read();
}

void PasteDialog::layOut()
{
    m_text->setFont(figureFont(*this, 1.0));
    m_result->setFont(figureFont(*this, 1.0));
    m_result->setTextInteractionFlags(Qt::TextSelectableByMouse);
    for (InkLabel* label : {m_taken, m_remarks})
        label->setWordWrap(true);
    const int line = m_text->fontMetrics().lineSpacing();
    m_text->setMinimumHeight(kTextLines * line);
    m_readings->setSizeAdjustPolicy(QAbstractScrollArea::AdjustToContents);
    m_readings->setSizePolicy(QSizePolicy::Expanding, QSizePolicy::Maximum);
    m_readings->setMinimumHeight(kReadingRows * (line + kGap));
    m_readings->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
    m_readings->setWordWrap(true);
    auto* buttons = new QDialogButtonBox(QDialogButtonBox::Cancel, this);
    m_apply = buttons->addButton(tr("Apply"), QDialogButtonBox::AcceptRole);
    connect(buttons, &QDialogButtonBox::accepted, this, &PasteDialog::accept);
    connect(buttons, &QDialogButtonBox::rejected, this, &PasteDialog::reject);
    auto* column = new QVBoxLayout(this);
    column->setContentsMargins(kPadding, kPadding, kPadding, kPadding);
    column->setSpacing(kGap);
    column->addWidget(InkLabel::title(tr("Numbers as they were sent"), this));
    column->addWidget(m_text, 1);
    column->addWidget(m_taken);
    column->addWidget(m_result);
    column->addWidget(m_remarks);
    column->addWidget(m_othersTitle);
    column->addWidget(m_readings);
    column->addWidget(buttons);
    resize(std::max(m_text->fontMetrics().averageCharWidth() * kWidthInLetters, sizeHint().width()),
           sizeHint().height());
}

void PasteDialog::fillFromClipboard()
{
    const QString text = QGuiApplication::clipboard()->text();
    if (!text.isEmpty() && readPasted(text).has_value()) setText(text);
    m_text->selectAll();
}

void PasteDialog::setText(const QString& text)
{
    m_text->setPlainText(text);
}

QString PasteDialog::taken() const
{
    return m_taken->text();
}

QString PasteDialog::result() const
{
    return m_result->text();
}

QString PasteDialog::remarks() const
{
    return m_remarks->text();
}

void PasteDialog::read()
{
    m_offered.clear();
    m_warnings.clear();
    const QSignalBlocker quiet(m_readings);
    m_readings->clear();
    markPlace({});
    const auto input = readPasted(m_text->toPlainText());
    m_othersTitle->setVisible(input.has_value() && !input->others.empty());
    m_readings->setVisible(!m_othersTitle->isHidden());
    if (!input) return showFault(input.error());
    m_warnings = input->warnings;
    m_offered.push_back(input->numbers);
    m_readings->addItem(
        tr("as taken: %1").arg(QString::fromStdString(rotcore::wordsOf(input->numbers.reading))));
    for (const rotcore::OtherReading& other : input->others) {
        m_offered.push_back(other.numbers);
        m_readings->addItem(QString::fromStdString(other.words));
    }
    m_readings->setCurrentRow(0);
    showReading(0);
}

void PasteDialog::showFault(const rotcore::Fault& fault)
{
    m_result->hide();
    m_result->clear();
    m_apply->setEnabled(false);
    if (m_text->toPlainText().trimmed().isEmpty()) {
        m_taken->clear();
        m_remarks->setTone(Tone::quiet);
        m_remarks->setText(tr("Nothing here yet. Paste the numbers as they were sent."));
        return;
    }
    m_taken->setText(tr("No orientation found."));
    const QString place =
        fault.place ? tr("Line %1, column %2: ").arg(fault.place->line).arg(fault.place->column)
                    : QString();
    m_remarks->setTone(Tone::bad);
    m_remarks->setText(place.isEmpty() ? sentenceOf(fault.message)
                                       : sentenceOf(place.toStdString() + fault.message));
    markPlace(fault.place);
}

void PasteDialog::showReading(int row)
{
    if (row < 0 || static_cast<std::size_t>(row) >= m_offered.size()) return;
    const rotcore::SentNumbers& sent = m_offered[static_cast<std::size_t>(row)];
    m_taken->setText(
        tr("Taken for: %1.").arg(QString::fromStdString(rotcore::wordsOf(sent.reading))));
    const auto found =
        rotcore::examine({.start = sent, .chain = {}, .shown = m_model.findings().shown});
    m_apply->setEnabled(found.has_value());
    m_result->setVisible(found.has_value());
    if (!found) {
        m_result->clear();
        m_remarks->setTone(Tone::bad);
        m_remarks->setText(sentenceOf(found.error().message));
        return markPlace(found.error().place);
    }
    m_result->setText(resultText(*found));
    QStringList sentences;
    for (const std::string& warning : m_warnings)
        sentences << sentenceOf(warning);
    if (found->start)
        for (const std::string& warning : found->start->warnings)
            sentences << sentenceOf(warning);
    m_remarks->setTone(Tone::warning);
    m_remarks->setText(sentences.join(QStringLiteral(" ")));
}

void PasteDialog::markPlace(const std::optional<rotcore::TextPlace>& place)
{
    QList<QTextEdit::ExtraSelection> marks;
    if (place) {
        QTextEdit::ExtraSelection mark;
        mark.cursor = m_text->textCursor();
        mark.cursor.setPosition(positionOf(m_text->toPlainText(), *place));
        mark.cursor.movePosition(QTextCursor::EndOfWord, QTextCursor::KeepAnchor);
        if (!mark.cursor.hasSelection())
            mark.cursor.movePosition(QTextCursor::NextCharacter, QTextCursor::KeepAnchor);
        mark.format.setUnderlineStyle(QTextCharFormat::WaveUnderline);
        mark.format.setUnderlineColor(inkOn(palette()).bad);
        marks << mark;
    }
    m_text->setExtraSelections(marks);
}

void PasteDialog::accept()
{
    const int row = std::max(0, m_readings->currentRow());
    if (static_cast<std::size_t>(row) >= m_offered.size()) return;
    const auto fault =
        m_model.setNumbers(m_offered[static_cast<std::size_t>(row)], tr("paste numbers"));
    if (fault) return showFault(*fault);
    QDialog::accept();
}

}  // namespace ui
