// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/chain/chain.h"

#include <algorithm>

#include "rotcore/rotation/rotation_vector.h"

namespace rotcore {

Chain chainOf(const EulerAngles& euler)
{
    const auto axes = axesOf(euler.order);
    Chain chain;
    for (std::size_t n = 0; n < axes.size(); ++n)
        chain.push_back(
            {.axis = unitVector(axes[n]), .angle = euler.angles[n], .about = euler.about});
    return chain;
}

Result<std::vector<Eigen::Quaterniond>> partialPoses(const Chain& chain,
                                                     const Eigen::Quaterniond& q_WS)
{
    std::vector<Eigen::Quaterniond> poses;
    poses.reserve(chain.size());
    Eigen::Quaterniond q_WB = q_WS;
    for (const Turn& turn : chain) {
        const auto step = poseOfAxisAngle(turn.axis, turn.angle);
        if (!step)
            return Fault{step.error().kind,
                         "turn " + std::to_string(poses.size() + 1) + ": " + step.error().message};
        if (!turn.muted) {
            // Normalised each time: over thousands of turns the length would drift.
            q_WB = (turn.about == About::body ? q_WB * *step : *step * q_WB).normalized();
        }
        poses.push_back(q_WB);
    }
    return poses;
}

Result<Eigen::Quaterniond> pose(const Chain& chain, const Eigen::Quaterniond& q_WS)
{
    const auto poses = partialPoses(chain, q_WS);
    if (!poses) return poses.error();
    return poses->empty() ? q_WS : poses->back();
}

Chain inverse(const Chain& chain)
{
    const auto isBody = [](const Turn& turn) { return turn.about == About::body; };
    const bool mixed = std::any_of(chain.begin(), chain.end(), isBody) &&
                       !std::all_of(chain.begin(), chain.end(), isBody);
    Chain result = chain;
    for (Turn& turn : result) {
        turn.angle = -turn.angle;
        if (mixed) turn.about = isBody(turn) ? About::space : About::body;
    }
    if (!mixed) std::reverse(result.begin(), result.end());
    return result;
}

}  // namespace rotcore
