// SPDX-License-Identifier: GPL-3.0-or-later
// Eight rows at a time. To be compiled with -mavx512f -mfma, and with -ffp-contract=off, so that
// only the multiply-adds written as such are fused and avx2 gives the same bits.
#include "rotcore/rotation/batch_kernel.h"

#if defined(__x86_64__)
#include <immintrin.h>
#include <sleef.h>

namespace rotcore::batch {
namespace {

struct Avx512 {
    using Register = __m512d;
    using Mask = __mmask8;
    struct SineCosine {
        Register sine, cosine;
    };
    static constexpr std::size_t kWidth = 8;

    static Register load(const double* from) { return _mm512_loadu_pd(from); }
    static void store(double* to, Register x) { _mm512_storeu_pd(to, x); }
    static Register splat(double x) { return _mm512_set1_pd(x); }
    static Register add(Register x, Register y) { return _mm512_add_pd(x, y); }
    static Register subtract(Register x, Register y) { return _mm512_sub_pd(x, y); }
    static Register multiply(Register x, Register y) { return _mm512_mul_pd(x, y); }
    static Register multiplyAdd(Register x, Register y, Register z)
    {
        return _mm512_fmadd_pd(x, y, z);
    }
    // The floating-point form of this is no part of AVX-512F.
    static Register negate(Register x)
    {
        return _mm512_castsi512_pd(
            _mm512_xor_si512(_mm512_castpd_si512(x), _mm512_castpd_si512(_mm512_set1_pd(-0.0))));
    }
    // The plain form makes GCC 12 warn of its own header.
    static Register squareRoot(Register x) { return _mm512_maskz_sqrt_pd(0xff, x); }
    static Mask less(Register x, Register y) { return _mm512_cmp_pd_mask(x, y, _CMP_LT_OQ); }
    static Mask both(Mask x, Mask y) { return static_cast<Mask>(x & y); }
    static Mask andNot(Mask x, Mask y) { return static_cast<Mask>(x & ~y); }
    static Register select(Mask which, Register yes, Register no)
    {
        return _mm512_mask_blend_pd(which, no, yes);
    }
    // The forms named finz choose by row, not by block, so no row depends on its neighbours.
    static SineCosine sineCosine(Register x)
    {
        const auto both = Sleef_finz_sincosd8_u10avx512f(x);
        return {both.x, both.y};
    }
    static Register arcTangent(Register y, Register x)
    {
        return Sleef_finz_atan2d8_u10avx512f(y, x);
    }
};

}  // namespace

void posesAvx512(const PosesJob& job)
{
    runPoses<Avx512>(job);
}

void anglesAvx512(const AnglesJob& job)
{
    runAngles<Avx512>(job);
}

}  // namespace rotcore::batch
#endif
