// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/case/findings.h"
#include "rotcore/rotation/quaternion.h"

namespace rotcore {

std::optional<EulerAngles> turnedAngles(const Case& subject)
{
    if (subject.start || subject.chain.size() != 3) return std::nullopt;
    const auto axes = axesOf(subject.shown.order);
    EulerAngles angles{subject.shown.order, subject.shown.about, {}};
    for (std::size_t n = 0; n < 3; ++n) {
        const Turn& turn = subject.chain[n];
        if (turn.muted || turn.about != subject.shown.about || turn.axis != unitVector(axes[n]))
            return std::nullopt;
        angles.angles[n] = turn.angle;
    }
    return angles;
}

Result<Findings> examine(const Case& subject)
{
    Findings found;
    found.shown = subject.shown;

    Eigen::Quaterniond q_WB = Eigen::Quaterniond::Identity();
    if (subject.start) {
        auto start = interpret(*subject.start);
        if (!start) return start.error();
        q_WB = start->q_WB;
        found.start = std::move(start.value());
    }
    auto partials = partialPoses(subject.chain, q_WB);
    if (!partials) return partials.error();
    found.partials = std::move(partials.value());
    if (!found.partials.empty()) q_WB = found.partials.back();

    found.q_WB = canonical(q_WB);
    found.R_WB = found.q_WB.toRotationMatrix();
    found.axisAngle = axisAngleOf(found.q_WB);
    if (const auto gibbs = gibbsVectorOf(found.q_WB)) found.gibbs = *gibbs;
    found.modifiedRodrigues = modifiedRodriguesOf(found.q_WB);

    const Convention& shown = subject.shown;
    found.euler = solveEuler(found.q_WB, shown.order, shown.about, shown.outerAtLock);
    found.angles = turnedAngles(subject).value_or(found.euler.solutions.front());
    found.lock = gaugeLock(found.q_WB, found.angles);
    found.orders = rankOrders(found.q_WB, shown.about);
    return found;
}

}  // namespace rotcore
