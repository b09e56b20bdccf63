// SPDX-License-Identifier: GPL-3.0-or-later
// Two rows at a time, on every 64-bit x86.
#include "rotcore/rotation/batch_kernel.h"

#if defined(__x86_64__)
#include <emmintrin.h>
#include <sleef.h>

namespace rotcore::batch {
namespace {

struct Sse2 {
    using Register = __m128d;
    using Mask = __m128d;
    struct SineCosine {
        Register sine, cosine;
    };
    static constexpr std::size_t kWidth = 2;

    static Register load(const double* from) { return _mm_loadu_pd(from); }
    static void store(double* to, Register x) { _mm_storeu_pd(to, x); }
    static Register splat(double x) { return _mm_set1_pd(x); }
    static Register add(Register x, Register y) { return _mm_add_pd(x, y); }
    static Register subtract(Register x, Register y) { return _mm_sub_pd(x, y); }
    static Register multiply(Register x, Register y) { return _mm_mul_pd(x, y); }
    static Register multiplyAdd(Register x, Register y, Register z)
    {
        return _mm_add_pd(_mm_mul_pd(x, y), z);
    }
    static Register negate(Register x) { return _mm_xor_pd(x, _mm_set1_pd(-0.0)); }
    static Register squareRoot(Register x) { return _mm_sqrt_pd(x); }
    static Mask less(Register x, Register y) { return _mm_cmplt_pd(x, y); }
    static Mask both(Mask x, Mask y) { return _mm_and_pd(x, y); }
    static Mask andNot(Mask x, Mask y) { return _mm_andnot_pd(y, x); }
    static Register select(Mask which, Register yes, Register no)
    {
        return _mm_or_pd(_mm_and_pd(which, yes), _mm_andnot_pd(which, no));
    }
    // The forms named cinz choose by row, not by block, so no row depends on its neighbours.
    static SineCosine sineCosine(Register x)
    {
        const auto both = Sleef_cinz_sincosd2_u10sse2(x);
        return {both.x, both.y};
    }
    static Register arcTangent(Register y, Register x) { return Sleef_cinz_atan2d2_u10sse2(y, x); }
};

}  // namespace

void posesSse2(const PosesJob& job)
{
    runPoses<Sse2>(job);
}

void anglesSse2(const AnglesJob& job)
{
    runAngles<Sse2>(job);
}

}  // namespace rotcore::batch
#endif
