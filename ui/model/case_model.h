// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <QObject>
#include <QString>
#include <QUndoStack>
#include <optional>

#include "rotcore/case/case.h"
#include "rotcore/case/findings.h"
#include "ui/model/view.h"

namespace ui {

/// The one case of a window, with its findings, its view and its undo stack. Every panel edits it
/// by one call here and draws what comes back. All edits of one gesture (a drag, a held key) undo
/// as one step.
class CaseModel : public QObject {
    Q_OBJECT

public:
    /// `initial` must examine without fault.
    explicit CaseModel(const rotcore::Case& initial = {}, QObject* parent = nullptr);

    const rotcore::Case& subject() const { return m_case; }
    const rotcore::Findings& findings() const { return m_findings; }
    const View& view() const { return m_view; }
    QUndoStack& undoStack() { return m_undo; }

    /// Sets one of the three angles shown, radians; the others stay as they are. `listed` is 0
    /// to 2.
    void setAngle(int listed, double radians);

    /// Sets all three angles shown.
    void setAngles(const rotcore::EulerAngles& angles, const QString& what);

    /// Sets the pose; the angles become the ones of it nearest to those shown, and at lock the
    /// outer angle stays.
    void setPose(const Eigen::Quaterniond& q_WB, const QString& what);

    /// Reads numbers and sets their pose. Returns what is wrong with them and changes nothing, or
    /// nothing.
    std::optional<rotcore::Fault> setNumbers(const rotcore::SentNumbers& numbers,
                                             const QString& what);

    /// Another order, about or unit; the pose is unchanged.
    void setConvention(const rotcore::Convention& convention, const QString& what);

    void setView(const View& view);  ///< not undone: it changes nothing of the case

    /// Between these, edits merge into one undo step. They do not nest.
    void beginGesture();
    void endGesture();

signals:
    void findingsChanged();
    void viewChanged();

private:
    friend class CaseCommand;
    void push(const rotcore::Case& after, const QString& what);
    void adopt(const rotcore::Case& subject);

    rotcore::Case m_case;
    rotcore::Findings m_findings;
    View m_view;
    QUndoStack m_undo;
    int m_gesture = 0;  ///< number of the gesture under way, 0 for none
    int m_gestures = 0;
};

}  // namespace ui
