// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once
#include <optional>
#include <string>
#include <vector>

#include <Eigen/Core>

#include "rotcore/result.h"

namespace rotcore {

/// A matrix whose R R^T differs from I by no more than this in any element is taken for a rotation
/// written with few digits (two decimals give up to 2 * 0.005 * sqrt(3) = 0.017).
inline constexpr double kRoundedMatrixTolerance = 0.02;

/// One change that would make a rotation of the matrix.
struct MatrixCause {
    enum class Kind {
        scaled,         ///< all elements by one factor; negative if it also mirrors
        rowsScaled,     ///< each row by a factor of its own
        columnsScaled,  ///< each column by a factor of its own
        rowNegated,
        columnNegated,
        allNegated,
        rowsSwapped,
        columnsSwapped,
        elementNegated,
    };
    Kind kind = Kind::scaled;
    int first = -1;   ///< row or column, from 0, where there is one
    int second = -1;  ///< the other of two swapped, or the column of a single element
    Eigen::Vector3d factors =
        Eigen::Vector3d::Ones();  ///< of the rows or columns, or one factor thrice
    double angle = 0.0;           ///< of the rotation it would then be, radians: small is likelier
    std::string words = {};       ///< "the third column is negated"
    friend bool operator==(const MatrixCause&, const MatrixCause&) = default;
};

/// How far a matrix is from a rotation, and why.
struct MatrixCheck {
    enum class State {
        rotation,  ///< to the last digits of a double
        rounded,   ///< within kRoundedMatrixTolerance
        mirrored,  ///< orthonormal as nearly, but with determinant -1
        notRotation,
    };
    State state = State::rotation;
    double orthonormalityError = 0.0;  ///< largest element of |M M^T - I|
    double determinant = 1.0;
    double distance = 0.0;  ///< Frobenius norm of M - nearest
    Eigen::Matrix3d nearest =
        Eigen::Matrix3d::Identity();  ///< nearest rotation; see nearestRotation
    std::vector<MatrixCause> causes;  ///< likeliest first; empty for a rotation, or if none fits
};

/// The rotation nearest to M in the Frobenius norm: U diag(1, 1, det(U V^T)) V^T of the singular
/// value decomposition M = U S V^T (Kabsch 1978, Acta Cryst. A34, 827-828). Not unique if M has
/// rank below two or mirrors with equal singular values. Elements must be finite.
Eigen::Matrix3d nearestRotation(const Eigen::Matrix3d& M);

/// Fault: notFinite.
Result<MatrixCheck> checkMatrix(const Eigen::Matrix3d& M);

/// One sentence on a matrix that is not exactly a rotation: the measure, the likely cause, what to
/// do.
std::string wordsOf(const MatrixCheck& check);

}  // namespace rotcore
