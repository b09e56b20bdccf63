// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/quaternion_block.h"

#include <QGridLayout>
#include <cmath>

#include "rotcore/number_text.h"
#include "ui/panels/figure_text.h"

namespace ui {
namespace {

using rotcore::Algebra;
using rotcore::ScalarPlace;

constexpr int kColumnGap = 8;
constexpr double kLengthWorthAWord = 1e-6;  // one unit of the last digit shown

// 'w', 'x', 'y' or 'z' at a place of the layout.
char letterAt(ScalarPlace scalar, std::size_t place)
{
    return (scalar == ScalarPlace::first ? "wxyz" : "xyzw")[place];
}

Tone toneOfLetter(char letter)
{
    switch (letter) {
        case 'x':
            return Tone::x;
        case 'y':
            return Tone::y;
        case 'z':
            return Tone::z;
        default:
            return Tone::quiet;
    }
}

}  // namespace

QuaternionBlock::QuaternionBlock(CaseModel& model, QWidget* parent)
    : NumberBlock(model, tr("Quaternion"), parent),
      m_layout(new ChoiceWord(tr("Where the scalar w stands among the four numbers"), this)),
      m_algebra(new ChoiceWord(tr("Whose product the quaternion is written for"), this))
{
    addWords();
    auto* grid = new QGridLayout;
    grid->setHorizontalSpacing(kColumnGap);
    grid->setVerticalSpacing(2);
    grid->setColumnStretch(2, 1);
    grid->setColumnStretch(5, 1);
    for (std::size_t place = 0; place < 4; ++place) {
        Cell& cell = m_cells[place];
        cell.letter = new InkLabel({}, Tone::quiet, this);
        cell.number = addField(Quantity::quaternion);
        cell.number->setObjectName(QStringLiteral("quaternion%1").arg(place));
        connect(cell.number, &NumberField::committed, this,
                [this, place](double number) { edit(place, number); });
        const auto row = static_cast<int>(place / 2);
        const auto column = static_cast<int>(place % 2) * 3;
        grid->addWidget(cell.letter, row, column);
        grid->addWidget(cell.number, row, column + 1);
    }
    m_body->addLayout(grid);
    follow();
}

void QuaternionBlock::addWords()
{
    m_layout->setChoices({tr("w x y z: scalar first"), tr("x y z w: scalar last")},
                         {layoutWords(ScalarPlace::first), layoutWords(ScalarPlace::last)});
    m_algebra->setChoices({tr("Hamilton: i j = k"), tr("JPL: i j = −k")},
                          {algebraWords(Algebra::hamilton), algebraWords(Algebra::jpl)});
    for (ChoiceWord* word : {m_layout, m_algebra})
        word->setFont(InkLabel::note({}, this)->font());
    m_header->setSpacing(0);
    m_header->addWidget(m_layout);
    m_header->addWidget(InkLabel::note(QStringLiteral(", "), this));
    m_header->addWidget(m_algebra);
    connect(m_layout, &ChoiceWord::chosen, this, [this](int index) {
        View view = m_model.view();
        view.quaternionLayout = static_cast<ScalarPlace>(index);
        m_model.setView(view);
    });
    connect(m_algebra, &ChoiceWord::chosen, this, [this](int index) {
        View view = m_model.view();
        view.quaternionAlgebra = static_cast<Algebra>(index);
        m_model.setView(view);
    });
    connect(m_layout, &ChoiceWord::walked, m_algebra, [this] { m_algebra->setFocus(); });
    connect(m_algebra, &ChoiceWord::walked, m_layout, [this] { m_layout->setFocus(); });
}

void QuaternionBlock::present()
{
    const View& view = m_model.view();
    m_layout->setCurrent(static_cast<int>(view.quaternionLayout));
    m_algebra->setCurrent(static_cast<int>(view.quaternionAlgebra));
    const auto numbers =
        rotcore::numbersOf(m_model.findings().q_WB, view.quaternionLayout, view.quaternionAlgebra)
            .numbers;
    for (std::size_t place = 0; place < 4; ++place) {
        const Cell& cell = m_cells[place];
        const char letter = letterAt(view.quaternionLayout, place);
        const QString name(QChar::fromLatin1(letter));
        const QString meaning =
            letter == 'w'
                ? tr("w, the scalar: the cosine of half the angle")
                : tr("%1 of the vector: the axis times the sine of half the angle").arg(name);
        cell.letter->setText(name);
        cell.letter->setTone(toneOfLetter(letter));
        cell.letter->setToolTip(meaning);
        cell.number->setMeaning(tr("Quaternion %1").arg(meaning));
        cell.number->setValue(numbers[place]);
    }
    say({}, Tone::quiet);
}

void QuaternionBlock::edit(std::size_t place, double number)
{
    const View& view = m_model.view();
    rotcore::SentNumbers sent;
    sent.reading.kind = rotcore::Kind::quaternion;
    sent.reading.scalar = view.quaternionLayout;
    sent.reading.algebra = view.quaternionAlgebra;
    for (const Cell& cell : m_cells)
        sent.values.push_back(cell.number->value());
    sent.values[place] = number;
    const auto meaning = rotcore::interpret(sent);  // for the length they had
    if (const auto fault = m_model.setNumbers(sent, tr("change the quaternion"))) {
        m_cells[place].number->refuse(sentenceOf(fault->message));
        return say(sentenceOf(fault->message), Tone::bad);
    }
    if (meaning && std::abs(meaning->length - 1.0) > kLengthWorthAWord)
        say(tr("The four had length %1; all were scaled to length 1.")
                .arg(QString::fromStdString(rotcore::roundedText(meaning->length, 5))),
            Tone::quiet);
}

}  // namespace ui
