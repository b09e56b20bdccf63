// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
// The batch formulas, written once over a unit V that knows how to do arithmetic on V::kWidth rows.
// Each source that includes this is compiled for its own instruction set, so nothing here may be an
// inline function with external linkage (the linker keeps one copy of those, perhaps one that this
// processor cannot run): hence the unnamed namespace, plain arrays, and no header but <cstddef>.
#include <cstddef>

namespace rotcore::batch {

/// Angles about body to quaternions; q_i, q_j, q_m are the components along the first axis, the
/// second and the third of the three.
struct PosesJob {
    const double *a, *b, *c;
    double *w, *qi, *qj, *qm;
    std::size_t count;
    bool repeating;       ///< whether the first axis comes back as the third
    double sign;          ///< +1 if i, j are in cyclic order, else -1
    double halfToRadian;  ///< half of one unit of angle, in radians
};

/// And back.
struct AnglesJob {
    const double *w, *qi, *qj, *qm;
    double *a, *b, *c;
    std::size_t count;
    bool repeating;
    double sign;
    double fromRadian;  ///< one radian, in the unit of angle
    double lockHalf;    ///< half of the lock tolerance, radians
};

void posesScalar(const PosesJob& job);
void anglesScalar(const AnglesJob& job);
void posesSse2(const PosesJob& job);
void anglesSse2(const AnglesJob& job);
void posesAvx2(const PosesJob& job);
void anglesAvx2(const AnglesJob& job);
void posesAvx512(const PosesJob& job);
void anglesAvx512(const AnglesJob& job);

inline constexpr double kHalfTurn = 3.14159265358979323846;
inline constexpr double kQuarterTurn = 0.5 * kHalfTurn;

namespace {

template <class V>
typename V::SineCosine sineCosineOfHalf(const PosesJob& job, const double* angle)
{
    return V::sineCosine(V::multiply(V::splat(job.halfToRadian), V::load(angle)));
}

template <class V>
void posesBlock(const PosesJob& job, std::size_t row)
{
    using R = typename V::Register;
    const auto a = sineCosineOfHalf<V>(job, job.a + row);
    const auto b = sineCosineOfHalf<V>(job, job.b + row);
    const auto c = sineCosineOfHalf<V>(job, job.c + row);
    const R cc = V::multiply(a.cosine, c.cosine);
    const R ss = V::multiply(a.sine, c.sine);
    const R sc = V::multiply(a.sine, c.cosine);
    const R cs = V::multiply(a.cosine, c.sine);
    const R e = V::splat(job.sign);
    const R eb = V::multiply(e, b.sine);
    if (job.repeating) {
        V::store(job.w + row, V::multiply(b.cosine, V::subtract(cc, ss)));
        V::store(job.qi + row, V::multiply(b.cosine, V::add(sc, cs)));
        V::store(job.qj + row, V::multiply(b.sine, V::add(cc, ss)));
        V::store(job.qm + row, V::multiply(eb, V::subtract(sc, cs)));
    } else {
        V::store(job.w + row, V::multiplyAdd(b.cosine, cc, V::negate(V::multiply(eb, ss))));
        V::store(job.qi + row, V::multiplyAdd(b.cosine, sc, V::multiply(eb, cs)));
        V::store(job.qj + row,
                 V::multiplyAdd(b.sine, cc, V::negate(V::multiply(V::multiply(e, b.cosine), ss))));
        V::store(job.qm + row, V::multiplyAdd(b.cosine, cs, V::multiply(eb, sc)));
    }
}

/// x in (-3 pi, 3 pi), brought into (-pi, pi].
template <class V>
typename V::Register wrappedOnce(typename V::Register x)
{
    const auto turn = V::splat(2.0 * kHalfTurn);
    const auto above = V::less(V::splat(kHalfTurn), x);
    const auto inside = V::less(V::splat(-kHalfTurn), x);
    x = V::select(above, V::subtract(x, turn), x);
    return V::select(inside, x, V::add(x, turn));
}

template <class V>
typename V::Register length(typename V::Register x, typename V::Register y)
{
    return V::squareRoot(V::multiplyAdd(x, x, V::multiply(y, y)));
}

/// The two pairs of solveEuler: their lengths are cosine and sine of half the middle angle as
/// counted from a lock, their bearings half the sum and half the difference of the other two.
template <class V>
struct Pairs {
    typename V::Register sumCosine, sumSine, differenceCosine, differenceSine;
};

template <class V>
struct HalfAngles {
    typename V::Register sum, middle, difference;
};

/// At lock the shorter pair has no bearing; the one it takes makes the outer angle zero.
template <class V>
HalfAngles<V> halfAnglesOf(const Pairs<V>& pairs, double lockHalf)
{
    using R = typename V::Register;
    const R sumLength = length<V>(pairs.sumCosine, pairs.sumSine);
    const R differenceLength = length<V>(pairs.differenceCosine, pairs.differenceSine);
    const auto upper = V::less(sumLength, differenceLength);
    const R shorter = V::select(upper, sumLength, differenceLength);
    const R longer = V::select(upper, differenceLength, sumLength);
    const auto locked = V::less(shorter, V::multiply(V::splat(lockHalf), longer));

    const R sum = V::arcTangent(pairs.sumSine, pairs.sumCosine);
    const R difference = V::arcTangent(pairs.differenceSine, pairs.differenceCosine);
    const R quarter = V::splat(kQuarterTurn);
    R middle = V::arcTangent(differenceLength, sumLength);
    middle = V::select(V::less(quarter, middle), quarter, middle);  // if rounded above it
    const R atLock = V::select(upper, quarter, V::splat(0.0));
    return {V::select(V::both(locked, upper), V::negate(difference), sum),
            V::select(locked, atLock, middle),
            V::select(V::andNot(locked, upper), V::negate(sum), difference)};
}

template <class V>
void anglesBlock(const AnglesJob& job, std::size_t row)
{
    using R = typename V::Register;
    const R w = V::load(job.w + row);
    const R qi = V::load(job.qi + row);
    const R qj = V::load(job.qj + row);
    const R qm = V::load(job.qm + row);
    const R em = V::multiply(V::splat(job.sign), qm);
    const Pairs<V> pairs = job.repeating ? Pairs<V>{w, qi, qj, em}
                                         : Pairs<V>{V::subtract(w, qj), V::subtract(qi, em),
                                                    V::add(w, qj), V::add(qi, em)};
    const HalfAngles<V> half = halfAnglesOf<V>(pairs, job.lockHalf);
    const R lowerLock = V::splat(job.repeating ? 0.0 : -kQuarterTurn);
    const R innerSign = V::splat(job.repeating ? 1.0 : -job.sign);
    const R a = wrappedOnce<V>(V::add(half.sum, half.difference));
    const R b = V::add(V::add(half.middle, half.middle), lowerLock);
    const R c = wrappedOnce<V>(V::multiply(innerSign, V::subtract(half.sum, half.difference)));
    // An infinity has a bearing, but the angles of such a row mean nothing.
    const R zeroOrNan = V::multiply(V::splat(0.0), V::add(V::add(w, qi), V::add(qj, qm)));
    const R unit = V::splat(job.fromRadian);
    V::store(job.a + row, V::multiply(unit, V::add(a, zeroOrNan)));
    V::store(job.b + row, V::multiply(unit, V::add(b, zeroOrNan)));
    V::store(job.c + row, V::multiply(unit, V::add(c, zeroOrNan)));
}

// NOLINTBEGIN(modernize-avoid-c-arrays): std::array would bring inline functions.

/// The last rows, fewer than a block, are copied into one, so that they take the same path.
template <class V>
void runPoses(const PosesJob& job)
{
    std::size_t row = 0;
    for (; row + V::kWidth <= job.count; row += V::kWidth)
        posesBlock<V>(job, row);
    if (row == job.count) return;
    const std::size_t rest = job.count - row;
    double in[3][V::kWidth] = {};
    double out[4][V::kWidth];
    for (std::size_t lane = 0; lane < rest; ++lane) {
        in[0][lane] = job.a[row + lane];
        in[1][lane] = job.b[row + lane];
        in[2][lane] = job.c[row + lane];
    }
    posesBlock<V>({in[0], in[1], in[2], out[0], out[1], out[2], out[3], V::kWidth, job.repeating,
                   job.sign, job.halfToRadian},
                  0);
    for (std::size_t lane = 0; lane < rest; ++lane) {
        job.w[row + lane] = out[0][lane];
        job.qi[row + lane] = out[1][lane];
        job.qj[row + lane] = out[2][lane];
        job.qm[row + lane] = out[3][lane];
    }
}

template <class V>
void runAngles(const AnglesJob& job)
{
    std::size_t row = 0;
    for (; row + V::kWidth <= job.count; row += V::kWidth)
        anglesBlock<V>(job, row);
    if (row == job.count) return;
    const std::size_t rest = job.count - row;
    double in[4][V::kWidth] = {};
    double out[3][V::kWidth];
    for (std::size_t lane = 0; lane < rest; ++lane) {
        in[0][lane] = job.w[row + lane];
        in[1][lane] = job.qi[row + lane];
        in[2][lane] = job.qj[row + lane];
        in[3][lane] = job.qm[row + lane];
    }
    anglesBlock<V>({in[0], in[1], in[2], in[3], out[0], out[1], out[2], V::kWidth, job.repeating,
                    job.sign, job.fromRadian, job.lockHalf},
                   0);
    for (std::size_t lane = 0; lane < rest; ++lane) {
        job.a[row + lane] = out[0][lane];
        job.b[row + lane] = out[1][lane];
        job.c[row + lane] = out[2][lane];
    }
}

// NOLINTEND(modernize-avoid-c-arrays)

}  // namespace
}  // namespace rotcore::batch
