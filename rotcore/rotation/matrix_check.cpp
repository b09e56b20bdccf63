// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/matrix_check.h"

#include <algorithm>
#include <cmath>

#include <Eigen/Geometry>
#include <Eigen/SVD>

#include "rotcore/number_text.h"

namespace rotcore {
namespace {

// A product of a few roundings of 1.1e-16 per element stays well inside; seven printed digits do
// not.
constexpr double kExactTolerance = 1e-13;
// Beyond this squares and determinants overflow; an element of a rotation is at most 1.
constexpr double kLargestElement = 1e100;

double orthonormalityErrorOf(const Eigen::Matrix3d& M)
{
    return (M * M.transpose() - Eigen::Matrix3d::Identity()).cwiseAbs().maxCoeff();
}

bool isNearlyRotation(const Eigen::Matrix3d& M)
{
    return orthonormalityErrorOf(M) <= kRoundedMatrixTolerance && M.determinant() > 0.0;
}

double angleOf(const Eigen::Matrix3d& R)
{
    const Eigen::Quaterniond q(nearestRotation(R));
    return 2.0 * std::atan2(q.vec().norm(), std::abs(q.w()));
}

std::string causeWords(const MatrixCause& cause)
{
    using Kind = MatrixCause::Kind;
    const Eigen::Vector3d& f = cause.factors;
    const std::string three =
        roundedText(f[0], 4) + ", " + roundedText(f[1], 4) + " and " + roundedText(f[2], 4);
    switch (cause.kind) {
        case Kind::scaled:
            return "all elements are scaled by " + roundedText(std::abs(f[0]), 6) +
                   (f[0] < 0.0 ? ", and it mirrors" : "");
        case Kind::rowsScaled:
            return "the rows are scaled by " + three;
        case Kind::columnsScaled:
            return "the columns are scaled by " + three;
        case Kind::rowNegated:
            return "the " + ordinalText(cause.first) + " row is negated";
        case Kind::columnNegated:
            return "the " + ordinalText(cause.first) + " column is negated";
        case Kind::allNegated:
            return "all elements are negated";
        case Kind::rowsSwapped:
            return "the " + ordinalText(cause.first) + " and " + ordinalText(cause.second) +
                   " rows are swapped";
        case Kind::columnsSwapped:
            return "the " + ordinalText(cause.first) + " and " + ordinalText(cause.second) +
                   " columns are swapped";
        case Kind::elementNegated:
            return "the element in row " + std::to_string(cause.first + 1) + ", column " +
                   std::to_string(cause.second + 1) + " has the wrong sign";
    }
    return {};
}

// Collects the changes that make a rotation of what they are given.
class CauseFinder {
public:
    void tryChange(MatrixCause cause, const Eigen::Matrix3d& repaired)
    {
        if (!isNearlyRotation(repaired)) return;
        cause.angle = angleOf(repaired);
        cause.words = causeWords(cause);
        m_found.push_back(std::move(cause));
    }

    bool isEmpty() const { return m_found.empty(); }

    // Rotations are likelier the less they turn; kinds keep the order in which they were tried.
    std::vector<MatrixCause> sortedByAngle()
    {
        std::stable_sort(
            m_found.begin(), m_found.end(),
            [](const MatrixCause& a, const MatrixCause& b) { return a.angle < b.angle - 1e-9; });
        return std::move(m_found);
    }

private:
    std::vector<MatrixCause> m_found;
};

// A matrix that mirrors, brought to right-handedness.
std::vector<MatrixCause> causesOfMirroring(const Eigen::Matrix3d& M)
{
    using Kind = MatrixCause::Kind;
    CauseFinder finder;
    for (int n = 0; n < 3; ++n) {
        Eigen::Matrix3d changed = M;
        changed.col(n) *= -1.0;
        finder.tryChange({.kind = Kind::columnNegated, .first = n}, changed);
        changed = M;
        changed.row(n) *= -1.0;
        finder.tryChange({.kind = Kind::rowNegated, .first = n}, changed);
    }
    finder.tryChange({.kind = Kind::allNegated}, -M);
    for (int n = 0; n < 3; ++n) {
        const int next = (n + 1) % 3;
        Eigen::Matrix3d changed = M;
        changed.col(n).swap(changed.col(next));
        finder.tryChange(
            {.kind = Kind::columnsSwapped, .first = std::min(n, next), .second = std::max(n, next)},
            changed);
        changed = M;
        changed.row(n).swap(changed.row(next));
        finder.tryChange(
            {.kind = Kind::rowsSwapped, .first = std::min(n, next), .second = std::max(n, next)},
            changed);
    }
    return finder.sortedByAngle();
}

std::vector<MatrixCause> causesOfStretching(const Eigen::Matrix3d& M)
{
    using Kind = MatrixCause::Kind;
    CauseFinder finder;
    const Eigen::Vector3d rows = M.rowwise().norm();
    const Eigen::Vector3d columns = M.colwise().norm();
    if (rows.minCoeff() > 0.0 && columns.minCoeff() > 0.0) {
        const double size = std::cbrt(M.determinant());
        if (size != 0.0)
            finder.tryChange({.kind = Kind::scaled, .factors = Eigen::Vector3d::Constant(size)},
                             M / size);
        if (finder.isEmpty()) {
            finder.tryChange({.kind = Kind::columnsScaled, .factors = columns},
                             M * columns.cwiseInverse().asDiagonal());
            finder.tryChange({.kind = Kind::rowsScaled, .factors = rows},
                             rows.cwiseInverse().asDiagonal() * M);
        }
    }
    for (int row = 0; row < 3; ++row)
        for (int column = 0; column < 3; ++column) {
            Eigen::Matrix3d changed = M;
            changed(row, column) *= -1.0;
            finder.tryChange({.kind = Kind::elementNegated, .first = row, .second = column},
                             changed);
        }
    return finder.sortedByAngle();
}

}  // namespace

Eigen::Matrix3d nearestRotation(const Eigen::Matrix3d& M)
{
    const double size = M.cwiseAbs().maxCoeff();
    if (size == 0.0) return Eigen::Matrix3d::Identity();
    const Eigen::JacobiSVD<Eigen::Matrix3d> svd(M / size,
                                                Eigen::ComputeFullU | Eigen::ComputeFullV);
    const Eigen::Matrix3d& U = svd.matrixU();
    const Eigen::Matrix3d& V = svd.matrixV();
    const double handedness = (U * V.transpose()).determinant() < 0.0 ? -1.0 : 1.0;
    return U * Eigen::Vector3d(1.0, 1.0, handedness).asDiagonal() * V.transpose();
}

Result<MatrixCheck> checkMatrix(const Eigen::Matrix3d& M)
{
    if (!M.allFinite())
        return Fault{Fault::Kind::notFinite, "an element of the matrix is not a finite number"};
    if (M.cwiseAbs().maxCoeff() > kLargestElement)
        return Fault{Fault::Kind::notOrthonormal, "an element of the matrix is " +
                                                      roundedText(M.cwiseAbs().maxCoeff(), 3) +
                                                      "; no element of a rotation exceeds 1"};
    MatrixCheck check;
    check.orthonormalityError = orthonormalityErrorOf(M);
    check.determinant = M.determinant();
    check.nearest = nearestRotation(M);
    check.distance = (M - check.nearest).norm();
    const bool orthonormal = check.orthonormalityError <= kRoundedMatrixTolerance;
    if (!orthonormal) {
        check.state = MatrixCheck::State::notRotation;
        check.causes = causesOfStretching(M);
    } else if (check.determinant < 0.0) {
        check.state = MatrixCheck::State::mirrored;
        check.causes = causesOfMirroring(M);
    } else if (check.orthonormalityError > kExactTolerance) {
        check.state = MatrixCheck::State::rounded;
    }
    return check;
}

std::string wordsOf(const MatrixCheck& check)
{
    using State = MatrixCheck::State;
    const std::string likely =
        check.causes.empty()
            ? "No single slip explains it: check that all nine numbers came from one matrix"
            : "Likeliest: " + check.causes.front().words;
    switch (check.state) {
        case State::rotation:
            return "a rotation, to the last digits of a double";
        case State::rounded:
            return "a rotation written with few digits: R R^T differs from I by " +
                   roundedText(check.orthonormalityError, 3) + "; the nearest rotation is used";
        case State::mirrored:
            return "not a rotation: its determinant is " + roundedText(check.determinant, 4) +
                   ", so it mirrors. " + likely;
        case State::notRotation:
            return "not a rotation: R R^T differs from I by " +
                   roundedText(check.orthonormalityError, 3) + " and the determinant is " +
                   roundedText(check.determinant, 4) + ". " + likely;
    }
    return {};
}

}  // namespace rotcore
