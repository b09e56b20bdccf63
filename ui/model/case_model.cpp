// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/model/case_model.h"

#include <QUndoCommand>
#include <cassert>

#include "rotcore/rotation/euler_solutions.h"

namespace ui {

/// One edit: the case before and after. Edits of one gesture merge into one.
class CaseCommand : public QUndoCommand {
public:
    CaseCommand(CaseModel& model, const rotcore::Case& after, const QString& what, int gesture)
        : QUndoCommand(what),
          m_model(model),
          m_before(model.subject()),
          m_after(after),
          m_gesture(gesture)
    {
    }

    void undo() override { m_model.adopt(m_before); }
    void redo() override { m_model.adopt(m_after); }
    int id() const override { return m_gesture == 0 ? -1 : 1; }

    bool mergeWith(const QUndoCommand* other) override
    {
        const auto* next = dynamic_cast<const CaseCommand*>(other);
        if (next == nullptr || next->m_gesture != m_gesture) return false;
        m_after = next->m_after;
        setObsolete(m_after == m_before);
        return true;
    }

private:
    CaseModel& m_model;
    rotcore::Case m_before;
    rotcore::Case m_after;
    int m_gesture;
};

CaseModel::CaseModel(const rotcore::Case& initial, QObject* parent)
    : QObject(parent), m_case(initial)
{
    auto found = rotcore::examine(initial);
    assert(found);
    m_findings = std::move(found.value());
}

void CaseModel::setAngle(int listed, double radians)
{
    rotcore::EulerAngles angles = m_findings.angles;
    angles.angles.at(static_cast<std::size_t>(listed)) = radians;
    const auto axis = axesOf(angles.order).at(static_cast<std::size_t>(listed));
    setAngles(angles, tr("turn about %1").arg(QString::fromLatin1(nameOf(axis).data(), 1)));
}

void CaseModel::setAngles(const rotcore::EulerAngles& angles, const QString& what)
{
    rotcore::Case after = m_case;
    after.start.reset();
    after.chain = chainOf(angles);
    after.shown.order = angles.order;
    after.shown.about = angles.about;
    push(after, what);
}

void CaseModel::setPose(const Eigen::Quaterniond& q_WB, const QString& what)
{
    const rotcore::EulerAngles& shown = m_findings.angles;
    const auto outer = static_cast<std::size_t>(rotcore::outerIndex(shown.about));
    const auto solved =
        solveEuler(q_WB.normalized(), shown.order, shown.about, shown.angles.at(outer));
    setAngles(nearerTo(shown, solved), what);
}

std::optional<rotcore::Fault> CaseModel::setNumbers(const rotcore::SentNumbers& numbers,
                                                    const QString& what)
{
    const auto meaning = interpret(numbers);
    if (!meaning) return meaning.error();
    setPose(meaning->q_WB, what);
    return std::nullopt;
}

void CaseModel::setConvention(const rotcore::Convention& convention, const QString& what)
{
    rotcore::Case after = m_case;
    after.shown = convention;
    const bool sameTurns =
        convention.order == m_case.shown.order && convention.about == m_case.shown.about;
    if (!sameTurns) {
        // The same pose in other turns; at lock the outer angle is the one the new convention asks
        // for.
        const auto solved =
            solveEuler(m_findings.q_WB, convention.order, convention.about, convention.outerAtLock);
        after.start.reset();
        after.chain = chainOf(solved.solutions.front());
    }
    push(after, what);
}

void CaseModel::setView(const View& view)
{
    if (view == m_view) return;
    m_view = view;
    emit viewChanged();
}

void CaseModel::beginGesture()
{
    assert(m_gesture == 0);
    m_gesture = ++m_gestures;
}

void CaseModel::endGesture()
{
    m_gesture = 0;
}

void CaseModel::push(const rotcore::Case& after, const QString& what)
{
    if (after == m_case) return;
    m_undo.push(new CaseCommand(*this, after, what, m_gesture));
}

void CaseModel::adopt(const rotcore::Case& subject)
{
    auto found = rotcore::examine(subject);
    assert(found);  // what is pushed was made of finite numbers here
    m_case = subject;
    m_findings = std::move(found.value());
    emit findingsChanged();
}

}  // namespace ui
