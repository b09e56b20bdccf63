// SPDX-License-Identifier: GPL-3.0-or-later
// Four rows at a time. To be compiled with -mavx2 -mfma, and with -ffp-contract=off, so that only
// the multiply-adds written as such are fused and avx512 gives the same bits.
#include "rotcore/rotation/batch_kernel.h"

#if defined(__x86_64__)
#include <immintrin.h>
#include <sleef.h>

namespace rotcore::batch {
namespace {

struct Avx2 {
    using Register = __m256d;
    using Mask = __m256d;
    struct SineCosine {
        Register sine, cosine;
    };
    static constexpr std::size_t kWidth = 4;

    static Register load(const double* from) { return _mm256_loadu_pd(from); }
    static void store(double* to, Register x) { _mm256_storeu_pd(to, x); }
    static Register splat(double x) { return _mm256_set1_pd(x); }
    static Register add(Register x, Register y) { return _mm256_add_pd(x, y); }
    static Register subtract(Register x, Register y) { return _mm256_sub_pd(x, y); }
    static Register multiply(Register x, Register y) { return _mm256_mul_pd(x, y); }
    static Register multiplyAdd(Register x, Register y, Register z)
    {
        return _mm256_fmadd_pd(x, y, z);
    }
    static Register negate(Register x) { return _mm256_xor_pd(x, _mm256_set1_pd(-0.0)); }
    static Register squareRoot(Register x) { return _mm256_sqrt_pd(x); }
    static Mask less(Register x, Register y) { return _mm256_cmp_pd(x, y, _CMP_LT_OQ); }
    static Mask both(Mask x, Mask y) { return _mm256_and_pd(x, y); }
    static Mask andNot(Mask x, Mask y) { return _mm256_andnot_pd(y, x); }
    static Register select(Mask which, Register yes, Register no)
    {
        return _mm256_blendv_pd(no, yes, which);
    }
    // The forms named finz choose by row, not by block, so no row depends on its neighbours.
    static SineCosine sineCosine(Register x)
    {
        const auto both = Sleef_finz_sincosd4_u10avx2(x);
        return {both.x, both.y};
    }
    static Register arcTangent(Register y, Register x) { return Sleef_finz_atan2d4_u10avx2(y, x); }
};

}  // namespace

void posesAvx2(const PosesJob& job)
{
    runPoses<Avx2>(job);
}

void anglesAvx2(const AnglesJob& job)
{
    runAngles<Avx2>(job);
}

}  // namespace rotcore::batch
#endif
