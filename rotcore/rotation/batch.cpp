// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/batch.h"

#include <cassert>
#include <cmath>

#include "rotcore/rotation/batch_kernel.h"
#include "rotcore/rotation/euler_solutions.h"

namespace rotcore {
namespace batch {
namespace {

// One row at a time, by the C library.
struct Scalar {
    using Register = double;
    using Mask = bool;
    struct SineCosine {
        Register sine, cosine;
    };

    static constexpr std::size_t kWidth = 1;

    static double load(const double* from) { return *from; }
    static void store(double* to, double x) { *to = x; }
    static double splat(double x) { return x; }
    static double add(double x, double y) { return x + y; }
    static double subtract(double x, double y) { return x - y; }
    static double multiply(double x, double y) { return x * y; }
    static double multiplyAdd(double x, double y, double z) { return x * y + z; }
    static double negate(double x) { return -x; }
    static double squareRoot(double x) { return std::sqrt(x); }
    static bool less(double x, double y) { return x < y; }
    static bool both(bool x, bool y) { return x && y; }
    static bool andNot(bool x, bool y) { return x && !y; }
    static double select(bool which, double yes, double no) { return which ? yes : no; }
    static SineCosine sineCosine(double x) { return {std::sin(x), std::cos(x)}; }
    static double arcTangent(double y, double x) { return std::atan2(y, x); }
};

}  // namespace

void posesScalar(const PosesJob& job)
{
    runPoses<Scalar>(job);
}

void anglesScalar(const AnglesJob& job)
{
    runAngles<Scalar>(job);
}

}  // namespace batch

namespace {

// The same angles about body: about space lists them backwards.
struct AboutBody {
    Order order;
    std::size_t first, last;  // columns, 0 to 2

    AboutBody(Order listed, About about)
        : order(about == About::body ? listed : reversed(listed)),
          first(about == About::body ? 0 : 2),
          last(2 - first)
    {
    }
};

// The vector components along the first axis, the second and the remaining one.
template <class T>
std::array<T*, 3> componentsOf(Order order, const QuaternionColumnsOf<T>& q)
{
    const std::array<T*, 3> byAxis{q.x.data(), q.y.data(), q.z.data()};
    const auto [i, j, k] = axesOf(order);
    const auto column = [&](Axis axis) { return byAxis[static_cast<std::size_t>(indexOf(axis))]; };
    return {column(i), column(j), column(otherThan(i, j))};
}

double signOf(Order order)
{
    const auto axes = axesOf(order);
    return cyclicSign(axes[0], axes[1]);
}

template <class T, class U>
[[maybe_unused]] bool haveOneLength(const EulerColumnsOf<T>& angles,
                                    const QuaternionColumnsOf<U>& q)
{
    const std::size_t rows = angles.a.size();
    return angles.b.size() == rows && angles.c.size() == rows && q.w.size() == rows &&
           q.x.size() == rows && q.y.size() == rows && q.z.size() == rows;
}

struct Kernels {
    void (*poses)(const batch::PosesJob&);
    void (*angles)(const batch::AnglesJob&);
};

Kernels kernelsOf(VectorUnit unit)
{
    switch (unit) {
#if defined(__x86_64__)
        case VectorUnit::sse2:
            return {batch::posesSse2, batch::anglesSse2};
        case VectorUnit::avx2:
            return {batch::posesAvx2, batch::anglesAvx2};
        case VectorUnit::avx512:
            return {batch::posesAvx512, batch::anglesAvx512};
#else
        case VectorUnit::sse2:
        case VectorUnit::avx2:
        case VectorUnit::avx512:
#endif
        case VectorUnit::scalar:
            break;
    }
    return {batch::posesScalar, batch::anglesScalar};
}

}  // namespace

bool hasVectorUnit(VectorUnit unit)
{
    switch (unit) {
        case VectorUnit::scalar:
#if defined(__x86_64__)
        case VectorUnit::sse2:
            return true;
        case VectorUnit::avx2:
            return __builtin_cpu_supports("avx2") != 0 && __builtin_cpu_supports("fma") != 0;
        case VectorUnit::avx512:
            return __builtin_cpu_supports("avx512f") != 0 && hasVectorUnit(VectorUnit::avx2);
#else
            return true;
        case VectorUnit::sse2:
        case VectorUnit::avx2:
        case VectorUnit::avx512:
            return false;
#endif
    }
    return false;
}

VectorUnit bestVectorUnit()
{
    VectorUnit best = VectorUnit::scalar;
    for (const VectorUnit unit : kAllVectorUnits)
        if (hasVectorUnit(unit)) best = unit;
    return best;
}

void posesOf(Order order, About about, ConstEulerColumns in, QuaternionColumns out, AngleUnit unit,
             VectorUnit vectorUnit)
{
    assert(haveOneLength(in, out) && hasVectorUnit(vectorUnit));
    const AboutBody body(order, about);
    const std::array<const double*, 3> angles{in.a.data(), in.b.data(), in.c.data()};
    const auto [qi, qj, qm] = componentsOf(body.order, out);
    const batch::PosesJob job{angles[body.first],
                              angles[1],
                              angles[body.last],
                              out.w.data(),
                              qi,
                              qj,
                              qm,
                              in.a.size(),
                              isRepeating(body.order),
                              signOf(body.order),
                              0.5 * toRadians(1.0, unit)};
    kernelsOf(vectorUnit).poses(job);
}

void anglesOf(Order order, About about, ConstQuaternionColumns in, EulerColumns out, AngleUnit unit,
              VectorUnit vectorUnit)
{
    assert(haveOneLength(out, in) && hasVectorUnit(vectorUnit));
    const AboutBody body(order, about);
    const std::array<double*, 3> angles{out.a.data(), out.b.data(), out.c.data()};
    const auto [qi, qj, qm] = componentsOf(body.order, in);
    const batch::AnglesJob job{in.w.data(),
                               qi,
                               qj,
                               qm,
                               angles[body.first],
                               angles[1],
                               angles[body.last],
                               in.w.size(),
                               isRepeating(body.order),
                               signOf(body.order),
                               inUnit(1.0, unit),
                               0.5 * kLockTolerance};
    kernelsOf(vectorUnit).angles(job);
}

}  // namespace rotcore
