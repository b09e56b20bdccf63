// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <array>
#include <cstddef>
#include <span>
#include <type_traits>

#include "rotcore/names.h"
#include "rotcore/rotation/angle.h"
#include "rotcore/rotation/order.h"

namespace rotcore {

/// What the processor works through a column with: rows at a time, and by which instructions.
enum class VectorUnit {
    scalar,  ///< one row, the C library's functions
    sse2,    ///< two rows
    avx2,    ///< four rows, with fused multiply-add
    avx512,  ///< eight rows, the same bits as avx2
};

template <>
struct Names<VectorUnit> {
    static constexpr std::string_view kWhat = "a vector unit";
    static constexpr NameTable<VectorUnit, 4> kTable{{{VectorUnit::scalar, "scalar"},
                                                      {VectorUnit::sse2, "sse2"},
                                                      {VectorUnit::avx2, "avx2"},
                                                      {VectorUnit::avx512, "avx512"}}};
};

inline constexpr std::array<VectorUnit, 4> kAllVectorUnits{VectorUnit::scalar, VectorUnit::sse2,
                                                           VectorUnit::avx2, VectorUnit::avx512};

/// Whether this processor, under this operating system, can run it.
bool hasVectorUnit(VectorUnit unit);

/// The widest that it can run.
VectorUnit bestVectorUnit();

/// Triples of angles by column, one triple per row, listed as in their order.
template <class T>
struct EulerColumnsOf {
    std::span<T> a, b, c;

    operator EulerColumnsOf<const T>() const requires(!std::is_const_v<T>) { return {a, b, c}; }
};
using EulerColumns = EulerColumnsOf<double>;
using ConstEulerColumns = EulerColumnsOf<const double>;

/// Quaternions by column, one per row.
template <class T>
struct QuaternionColumnsOf {
    std::span<T> w, x, y, z;

    operator QuaternionColumnsOf<const T>() const requires(!std::is_const_v<T>)
    {
        return {w, x, y, z};
    }
};
using QuaternionColumns = QuaternionColumnsOf<double>;
using ConstQuaternionColumns = QuaternionColumnsOf<const double>;

/// Row by row the pose q_WB of `pose`, with the sign its formula gives it; within 1e-15 of it in
/// each component. `in` is in `unit`. An angle that is not finite makes its row four NaN; no row
/// depends on another. All columns have one length, which may be zero; those of `out` overlap
/// nothing else. The processor must have `vectorUnit`.
void posesOf(Order order, About about, ConstEulerColumns in, QuaternionColumns out,
             AngleUnit unit = AngleUnit::radians, VectorUnit vectorUnit = bestVectorUnit());

/// Row by row the first solution of `solveEuler` for q_WB, in `unit`: middle angle in [-pi/2, pi/2]
/// (all axes different) or [0, pi] (first axis repeated), the others in (-pi, pi]. Nearer to lock
/// than kLockTolerance the outer angle is 0 and the middle one exactly that of the lock. A row must
/// have unit length (a common factor from 1e-100 to 1e100 does no harm), or an element that is not
/// finite, from which come three NaN; no row depends on another. Columns as in `posesOf`.
void anglesOf(Order order, About about, ConstQuaternionColumns in, EulerColumns out,
              AngleUnit unit = AngleUnit::radians, VectorUnit vectorUnit = bestVectorUnit());

}  // namespace rotcore
