// SPDX-License-Identifier: GPL-3.0-or-later
#include "rotcore/rotation/matrix_check.h"

#include <cmath>

#include "tests/support/poses.h"

namespace {

using namespace rotcore;
using Eigen::Matrix3d;
using Kind = MatrixCause::Kind;
using State = MatrixCheck::State;

// A pose with nothing special about it, made by Eigen.
Matrix3d genericRotation()
{
    return Matrix3d(Eigen::AngleAxisd(0.5, Eigen::Vector3d::UnitZ()) *
                    Eigen::AngleAxisd(-0.3, Eigen::Vector3d::UnitY()) *
                    Eigen::AngleAxisd(0.2, Eigen::Vector3d::UnitX()));
}

bool hasCause(const MatrixCheck& check, Kind kind, int first, int second = -1)
{
    for (const MatrixCause& cause : check.causes)
        if (cause.kind == kind && cause.first == first && cause.second == second) return true;
    return false;
}

TEST(MatrixCheck, ARotationHasNoFaultAtAll)
{
    std::mt19937_64 generator(41);
    for (int n = 0; n < 1000; ++n) {
        const auto check = checkMatrix(tests::randomPose(generator).toRotationMatrix());
        ASSERT_TRUE(check);
        EXPECT_EQ(check->state, State::rotation);
        EXPECT_LT(check->distance, 3e-15);  // an SVD and a product, a dozen roundings
        EXPECT_TRUE(check->causes.empty());
    }
}

TEST(MatrixCheck, FewDigitsAreRoundingAndTheNearestRotationIsClose)
{
    const Matrix3d R = genericRotation();
    const Matrix3d rounded = (R * 100.0).array().round() / 100.0;
    const auto check = checkMatrix(rounded);
    ASSERT_TRUE(check);
    EXPECT_EQ(check->state, State::rounded);
    EXPECT_NEAR(tests::largestDifference(check->nearest, R), 0.0,
                0.01);  // twice the rounding of 0.005
    EXPECT_NEAR(check->distance, (rounded - check->nearest).norm(), 1e-15);
}

TEST(MatrixCheck, EveryNegatedRowAndColumnIsNamed)
{
    for (int n = 0; n < 3; ++n) {
        Matrix3d M = genericRotation();
        M.col(n) *= -1.0;
        const auto column = checkMatrix(M);
        EXPECT_EQ(column->state, State::mirrored);
        EXPECT_TRUE(hasCause(*column, Kind::columnNegated, n));
        // The true pose turns by less than any other candidate's, so it leads, row or column.
        EXPECT_EQ(column->causes.front().first, n);
        M = genericRotation();
        M.row(n) *= -1.0;
        const auto row = checkMatrix(M);
        EXPECT_TRUE(hasCause(*row, Kind::rowNegated, n));
        EXPECT_NE(wordsOf(*row).find("determinant is -1"), std::string::npos);
    }
}

TEST(MatrixCheck, SwappedRowsAndColumnsAreNamed)
{
    Matrix3d M = genericRotation();
    M.row(0).swap(M.row(2));
    const auto rows = checkMatrix(M);
    EXPECT_EQ(rows->state, State::mirrored);
    EXPECT_TRUE(hasCause(*rows, Kind::rowsSwapped, 0, 2));
    M = genericRotation();
    M.col(1).swap(M.col(2));
    EXPECT_TRUE(hasCause(*checkMatrix(M), Kind::columnsSwapped, 1, 2));
    EXPECT_TRUE(hasCause(*checkMatrix(-genericRotation()), Kind::allNegated, -1));
}

TEST(MatrixCheck, ScalesAreMeasured)
{
    const auto uniform = checkMatrix(2.5 * genericRotation());
    EXPECT_EQ(uniform->state, State::notRotation);
    ASSERT_FALSE(uniform->causes.empty());
    EXPECT_EQ(uniform->causes.front().kind, Kind::scaled);
    EXPECT_NEAR(uniform->causes.front().factors[0], 2.5, 1e-14);
    EXPECT_NE(wordsOf(*uniform).find("scaled by 2.5"), std::string::npos);

    const Eigen::Vector3d factors(1.0, 2.0, 0.5);
    const auto columns = checkMatrix(genericRotation() * factors.asDiagonal());
    ASSERT_FALSE(columns->causes.empty());
    EXPECT_EQ(columns->causes.front().kind, Kind::columnsScaled);
    EXPECT_NEAR((columns->causes.front().factors - factors).norm(), 0.0, 1e-14);
    const auto rows = checkMatrix(factors.asDiagonal() * genericRotation());
    ASSERT_FALSE(rows->causes.empty());
    EXPECT_EQ(rows->causes.front().kind, Kind::rowsScaled);

    const auto mirrored = checkMatrix(-2.0 * genericRotation());
    ASSERT_FALSE(mirrored->causes.empty());
    EXPECT_NE(mirrored->causes.front().words.find("mirrors"), std::string::npos);
}

TEST(MatrixCheck, OneWrongSignIsFoundWhereverItIs)
{
    for (int row = 0; row < 3; ++row)
        for (int column = 0; column < 3; ++column) {
            Matrix3d M = genericRotation();
            M(row, column) *= -1.0;
            const auto check = checkMatrix(M);
            ASSERT_FALSE(check->causes.empty()) << row << column;
            EXPECT_EQ(check->causes.front().kind, Kind::elementNegated);
            EXPECT_EQ(check->causes.front().first, row);
            EXPECT_EQ(check->causes.front().second, column);
        }
}

TEST(MatrixCheck, WhatNoSlipExplainsIsSaidToBeSo)
{
    Matrix3d sheared = genericRotation();
    sheared(0, 1) += 0.4;
    sheared(2, 0) -= 0.3;
    const auto check = checkMatrix(sheared);
    EXPECT_EQ(check->state, State::notRotation);
    EXPECT_TRUE(check->causes.empty());
    EXPECT_NE(wordsOf(*check).find("No single slip"), std::string::npos);
}

TEST(MatrixCheck, NearestRotationBeatsEveryNeighbour)
{
    // By definition of nearest: no small turn of it comes closer to M.
    std::mt19937_64 generator(42);
    std::normal_distribution<double> noise(0.0, 0.2);
    for (int n = 0; n < 200; ++n) {
        Matrix3d M = tests::randomPose(generator).toRotationMatrix();
        for (double& element : M.reshaped())
            element += noise(generator);
        const Matrix3d nearest = nearestRotation(M);
        EXPECT_NEAR(nearest.determinant(), 1.0, 1e-14);
        EXPECT_NEAR(tests::largestDifference(nearest * nearest.transpose(), Matrix3d::Identity()),
                    0.0, 1e-14);
        for (int axis = 0; axis < 3; ++axis)
            for (const double angle : {-1e-3, 1e-3}) {
                const Matrix3d other =
                    Eigen::AngleAxisd(angle, Eigen::Vector3d::Unit(axis)) * nearest;
                EXPECT_GT((M - other).norm(), (M - nearest).norm());
            }
    }
}

TEST(MatrixCheck, NumbersBeyondAllMeasureAreRefused)
{
    Matrix3d M = Matrix3d::Identity();
    M(0, 1) = INFINITY;
    EXPECT_EQ(checkMatrix(M).error().kind, Fault::Kind::notFinite);
    M(0, 1) = 1e200;
    EXPECT_EQ(checkMatrix(M).error().kind, Fault::Kind::notOrthonormal);
    const auto zero = checkMatrix(Matrix3d::Zero());
    ASSERT_TRUE(zero);
    EXPECT_EQ(zero->state, State::notRotation);
    EXPECT_TRUE(zero->nearest.allFinite());
}

}  // namespace
