// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/panels/sentence_bar.h"

#include <QEvent>
#include <QHBoxLayout>
#include <algorithm>
#include <array>

#include "ui/panels/figure_text.h"

namespace ui {
namespace {

using rotcore::About;
using rotcore::AngleUnit;

constexpr int kSide = 20;
constexpr int kAbove = 8;
constexpr int kBeforeProduct = 24;

template <class E>
int placeOf(E value)
{
    return static_cast<int>(value);
}

}  // namespace

QString productMarkup(const rotcore::Findings& found, int activeRing, const Ink& ink)
{
    QString markup = QStringLiteral("R<sub>WB</sub> = ");
    bool isFirst = true;
    for (const Factor& factor : factorsOf(found.angles, found.shown.unit)) {
        if (!isFirst) markup += QStringLiteral(" · ");
        isFirst = false;
        const QString text = factor.listed == activeRing
                                 ? QStringLiteral("<b>%1</b>").arg(factor.text)
                                 : factor.text;
        markup += QStringLiteral("<a href=\"%1\" style=\"color:%2;text-decoration:none\">%3</a>")
                      .arg(QString::number(factor.listed), ink.of(factor.axis).name(), text);
    }
    return markup;
}

SentenceBar::SentenceBar(CaseModel& model, QWidget* parent)
    : QWidget(parent),
      m_model(model),
      m_order(
          new ChoiceWord(tr("The axes of the three turns, in the order they are listed"), this)),
      m_about(
          new ChoiceWord(tr("Whose axes: those the body carries, or those that stay still"), this)),
      m_unit(new ChoiceWord(tr("The unit of all angles"), this)),
      m_product(new InkLabel({}, Tone::text, this)),
      m_row(new QBoxLayout(QBoxLayout::LeftToRight, this))
{
    QStringList orders;
    for (const rotcore::Order order : rotcore::kAllOrders)
        orders << orderWords(order);
    m_order->setChoices(orders, orders);
    m_about->setChoices(
        {tr("the body: axes that turn along"), tr("the space: axes that stay still")},
        {tr("body"), tr("space")});
    m_unit->setChoices({tr("degrees"), tr("radians")}, {tr("degrees"), tr("radians")});
    addSentence();
    connect(m_order, &ChoiceWord::chosen, this, [this](int index) {
        rotcore::Convention convention = m_model.findings().shown;
        convention.order = rotcore::kAllOrders[static_cast<std::size_t>(index)];
        change(convention, tr("change the order"));
    });
    connect(m_about, &ChoiceWord::chosen, this, [this](int index) {
        rotcore::Convention convention = m_model.findings().shown;
        convention.about = static_cast<About>(index);
        change(convention, tr("change whose axes"));
    });
    connect(m_unit, &ChoiceWord::chosen, this, [this](int index) {
        rotcore::Convention convention = m_model.findings().shown;
        convention.unit = static_cast<AngleUnit>(index);
        change(convention, tr("change the unit"));
    });
    connect(m_product, &QLabel::linkHovered, this,
            [this](const QString& link) { emit ringHovered(link.isEmpty() ? -1 : link.toInt()); });
    connect(&m_model, &CaseModel::findingsChanged, this, &SentenceBar::present);
    present();
}

void SentenceBar::addSentence()
{
    m_row->setContentsMargins(kSide, kAbove, kSide, kAbove);
    m_row->setSpacing(0);
    auto* row = new QHBoxLayout;
    row->setSpacing(0);
    m_row->addLayout(row, 1);
    const auto plain = [this, row](const QString& text) {
        auto* label = new InkLabel(text, Tone::text, this);
        row->addWidget(label);
        return label;
    };
    plain(tr("Turns "));
    row->addWidget(m_order);
    plain(tr(" about the "));
    row->addWidget(m_about);
    plain(tr(", in "));
    row->addWidget(m_unit);
    plain(tr(", taking body to world."))
        ->setToolTip(tr("The pose takes body coordinates to world coordinates: v_W = R_WB v_B."));
    row->addStretch(1);
    m_row->addWidget(m_product);
    m_product->setFont(figureFont(*this, 1.0));
    m_product->setTextFormat(Qt::RichText);
    m_product->setTextInteractionFlags(Qt::LinksAccessibleByMouse);
    m_product->setAlignment(Qt::AlignRight | Qt::AlignVCenter);
    m_product->setToolTip(
        tr("R_WB takes body coordinates to world coordinates. It is the product of the three "
           "turns, as matrices are multiplied."));
    const std::array words{m_order, m_about, m_unit};
    for (int place = 0; place < 3; ++place) {
        ChoiceWord* word = words[static_cast<std::size_t>(place)];
        word->setBold(true);
        connect(word, &ChoiceWord::walked, this, [this, place](int step) { walk(place, step); });
    }
}

void SentenceBar::setActiveRing(int listed)
{
    if (listed == m_activeRing) return;
    m_activeRing = listed;
    present();
}

QString SentenceBar::sentence() const
{
    return tr("Turns %1 about the %2, in %3, taking body to world.")
        .arg(m_order->text(), m_about->text(), m_unit->text());
}

QString SentenceBar::productText() const
{
    QString text = QStringLiteral("R_WB = ");
    QStringList factors;
    for (const Factor& factor : factorsOf(m_model.findings().angles, m_model.findings().shown.unit))
        factors << factor.text;
    return text + factors.join(QStringLiteral(" · "));
}

QSize SentenceBar::minimumSizeHint() const
{
    const int sentence = m_row->itemAt(0)->minimumSize().width();
    return {2 * kSide + std::max(sentence, m_product->sizeHint().width()),
            QWidget::minimumSizeHint().height()};
}

void SentenceBar::resizeEvent(QResizeEvent* event)
{
    QWidget::resizeEvent(event);
    fold();
}

// In a narrow window the product stands beneath the sentence.
void SentenceBar::fold()
{
    const int needed = 2 * kSide + m_row->itemAt(0)->minimumSize().width() + kBeforeProduct +
                       m_product->sizeHint().width();
    m_row->setDirection(width() < needed ? QBoxLayout::TopToBottom : QBoxLayout::LeftToRight);
}

void SentenceBar::changeEvent(QEvent* event)
{
    QWidget::changeEvent(event);
    if (event->type() == QEvent::PaletteChange) present();
}

void SentenceBar::present()
{
    const rotcore::Convention& shown = m_model.findings().shown;
    m_order->setCurrent(placeOf(shown.order));
    m_about->setCurrent(placeOf(shown.about));
    m_unit->setCurrent(placeOf(shown.unit));
    m_product->setText(productMarkup(m_model.findings(), m_activeRing, inkOn(palette())));
    m_product->setAccessibleName(productText());
    setAccessibleName(sentence());
    fold();
}

void SentenceBar::walk(int from, int step)
{
    const std::array words{m_order, m_about, m_unit};
    const int to = (from + step + 3) % 3;
    words[static_cast<std::size_t>(to)]->setFocus(Qt::TabFocusReason);
}

void SentenceBar::change(const rotcore::Convention& convention, const QString& what)
{
    m_model.setConvention(convention, what);
}

}  // namespace ui
