// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/rodrigues.h"

#include <cmath>
#include <limits>

#include "rotcore/rotation/quaternion.h"

namespace rotcore {

Result<Eigen::Vector3d> gibbsVectorOf(const Eigen::Quaterniond& q_WB)
{
    const Eigen::Quaterniond q = canonical(q_WB);
    // A scalar part of a few ulp is rounding; the vector would be a made-up number of size 1e16.
    const bool halfTurn = q.w() <= std::numeric_limits<double>::epsilon();
    if (halfTurn)
        return Fault{Fault::Kind::singular,
                     "the Gibbs vector does not exist at a half turn: tan(angle / 2) is infinite"};
    return Eigen::Vector3d(q.vec() / q.w());
}

Result<Eigen::Quaterniond> poseOfGibbsVector(const Eigen::Vector3d& gibbs)
{
    if (!gibbs.allFinite())
        return Fault{Fault::Kind::notFinite,
                     "a component of the Gibbs vector is not a finite number"};
    const auto unit = normalised(Eigen::Quaterniond(1.0, gibbs.x(), gibbs.y(), gibbs.z()));
    if (!unit) return unit.error();
    return unit->quaternion;
}

ModifiedRodrigues modifiedRodriguesOf(const Eigen::Quaterniond& q_WB)
{
    const Eigen::Quaterniond q = canonical(q_WB);
    ModifiedRodrigues parameters;
    parameters.principal = q.vec() / (1.0 + q.w());
    // -v / (1 - w), with 1 - w = |v|^2 / (1 + w) so that nothing cancels near w = 1.
    const Eigen::Vector3d shadow = (-(1.0 + q.w()) / q.vec().squaredNorm()) * q.vec();
    if (shadow.allFinite()) parameters.shadow = shadow;
    return parameters;
}

Result<Eigen::Quaterniond> poseOfModifiedRodrigues(const Eigen::Vector3d& parameters)
{
    if (!parameters.allFinite())
        return Fault{Fault::Kind::notFinite,
                     "a modified Rodrigues parameter is not a finite number"};
    // (1 - m^2, 2 m) up to length, divided by m where m^2 could overflow.
    const double size = parameters.stableNorm();
    const Eigen::Quaterniond q =
        size <= 1.0
            ? Eigen::Quaterniond(1.0 - size * size, 2.0 * parameters.x(), 2.0 * parameters.y(),
                                 2.0 * parameters.z())
            : Eigen::Quaterniond(1.0 / size - size, 2.0 * (parameters.x() / size),
                                 2.0 * (parameters.y() / size), 2.0 * (parameters.z() / size));
    const auto unit = normalised(q);
    if (!unit) return unit.error();
    return unit->quaternion;
}

}  // namespace rotcore
