// SPDX-License-Identifier: GPL-3.0-or-later
// Against ERFA, the free edition of the IAU's SOFA library: the values its C test program prints
// (source of 30 Oct 2025, seen), and the library itself (2.0.0 or later), linked.
//
// eraRx, eraRy and eraRz give coordinates in turned axes, and multiply from the left. So a matrix
// of ERFA is the transpose of our R_WB with the same turns, read from the right. Where the printed
// matrices act on r0, which is no rotation, they fix the product alone.
#include <cmath>

#include <erfa.h>

#include "rotcore/chain/chain.h"
#include "rotcore/rotation/quaternion.h"
#include "rotcore/rotation/rotation_vector.h"
#include "tests/published/checks.h"

namespace {

using namespace rotcore;
using namespace published;
using Eigen::Matrix3d;
using Eigen::Quaterniond;
using Eigen::Vector3d;
using tests::randomPose;

/// SOFA's own tolerance for these values.
constexpr double kSofa = 1e-12;

/// A matrix as ERFA holds it.
struct ErfaMatrix {
    double r[3][3] = {{1, 0, 0}, {0, 1, 0}, {0, 0, 1}};

    ErfaMatrix() = default;
    explicit ErfaMatrix(const Matrix3d& M)
    {
        for (int row = 0; row < 3; ++row)
            for (int column = 0; column < 3; ++column)
                r[row][column] = M(row, column);
    }
    Matrix3d matrix() const
    {
        Matrix3d M;
        for (int row = 0; row < 3; ++row)
            for (int column = 0; column < 3; ++column)
                M(row, column) = r[row][column];
        return M;
    }
};

Matrix3d r0()
{
    return rows({2, 3, 2, 3, 2, 3, 3, 4, 5});
}

TEST(Erfa, RxIsTheTransposeOfOurTurnAboutX)  // t_rx, phi = 0.3456789
{
    const Matrix3d R_BW = turnAbout(Axis::x, 0.3456789).toRotationMatrix().transpose();
    EXPECT_ELEMENTS_NEAR(
        R_BW * r0(),
        rows({2, 3, 2, 3.839043388235612460, 3.237033249594111899, 4.516714379005982719,
              1.806030415924501684, 3.085711545336372503, 3.687721683977873065}),
        kSofa);
}

TEST(Erfa, RzIsTheTransposeOfOurTurnAboutZ)  // t_rz, psi = 0.3456789
{
    const Matrix3d R_BW = turnAbout(Axis::z, 0.3456789).toRotationMatrix().transpose();
    EXPECT_ELEMENTS_NEAR(
        R_BW * r0(),
        rows({2.898197754208926769, 3.500207892850427330, 2.898197754208926769,
              2.144865911309686813, 0.865184781897815993, 2.144865911309686813, 3, 4, 5}),
        kSofa);
}

TEST(Erfa, LinkedTurnsInSuccessionAreTheTransposeOfOurEulerAngles)
{
    std::mt19937_64 generator(20251);
    std::uniform_real_distribution<double> angle(-7.0, 7.0);
    for (int n = 0; n < 1000; ++n) {
        const double a = angle(generator);
        const double b = angle(generator);
        const double c = angle(generator);
        ErfaMatrix zyx;
        eraRz(a, zyx.r);
        eraRy(b, zyx.r);
        eraRx(c, zyx.r);
        EXPECT_ELEMENTS_NEAR(pose({Order::zyx, About::body, {a, b, c}}).toRotationMatrix(),
                             zyx.matrix().transpose(), kRounding);
        ErfaMatrix yzy;
        eraRy(a, yzy.r);
        eraRz(b, yzy.r);
        eraRy(c, yzy.r);
        EXPECT_ELEMENTS_NEAR(pose({Order::yzy, About::body, {a, b, c}}).toRotationMatrix(),
                             yzy.matrix().transpose(), kRounding);
    }
}

TEST(Erfa, Rv2mIsTheTransposeOfOurRotationVector)  // t_rv2m; the vector has length 0.75 pi
{
    const auto q_WB = poseOfRotationVector({0.0, 1.41371669, -1.88495559});
    ASSERT_TRUE(q_WB);
    EXPECT_ELEMENTS_NEAR(
        q_WB->toRotationMatrix().transpose(),
        rows({-0.7071067782221119905, -0.5656854276809129651, -0.4242640700104211225,
              0.5656854276809129651, -0.0925483394532274246, -0.8194112531408833269,
              0.4242640700104211225, -0.8194112531408833269, 0.3854415612311154341}),
        1e-14);  // SOFA's own
}

TEST(Erfa, LinkedRv2mAgreesForVectorsOfAnyLength)
{
    std::mt19937_64 generator(20252);
    std::uniform_real_distribution<double> length(-9.0, 1.0);  // powers of ten, radians
    for (int n = 0; n < 1000; ++n) {
        Vector3d w = Vector3d(randomPose(generator).vec()).normalized();
        w *= std::pow(10.0, length(generator));
        ErfaMatrix M;
        eraRv2m(w.data(), M.r);
        const auto q_WB = poseOfRotationVector(w);
        ASSERT_TRUE(q_WB);
        EXPECT_ELEMENTS_NEAR(q_WB->toRotationMatrix().transpose(), M.matrix(), kRounding);
    }
}

TEST(Erfa, LinkedRm2vGivesOurRotationVector)
{
    std::mt19937_64 generator(20253);
    for (int n = 0; n < 1000; ++n) {
        const Quaterniond q_WB = randomPose(generator);
        ErfaMatrix M(q_WB.toRotationMatrix().transpose());
        Vector3d w;
        eraRm2v(M.r, w.data());
        // ERFA takes axis and angle from the antisymmetric part, of length 2 sin(angle), whose
        // elements carry a few roundings: so its error grows as 1/sin(angle), times the angle.
        const double angle = w.norm();
        const double tolerance = 1e-15 * (2.0 + angle / std::abs(std::sin(angle)));
        EXPECT_ELEMENTS_NEAR(rotationVectorOf(q_WB), w, tolerance);
    }
}

TEST(Erfa, HalfTurnIsReadThoughRm2vReturnsNone)  // observed: ERFA sees no antisymmetric part
{
    const Matrix3d R_WB = Vector3d(1, -1, -1).asDiagonal();
    ErfaMatrix M(R_WB);
    Vector3d w;
    eraRm2v(M.r, w.data());
    EXPECT_ELEMENTS_NEAR(w, Vector3d::Zero(), 0.0);

    const Quaterniond q_WB = read({.kind = Kind::matrix}, typed(R_WB));
    EXPECT_ELEMENTS_NEAR(rotationVectorOf(q_WB), kPi * Vector3d::UnitX(), 1e-15);  // by hand
}

TEST(Erfa, TestMatrixOfRm2vIsRefusedForItMirrors)  // t_rm2v: its determinant is -1
{
    const Matrix3d M = rows({0.0, -0.8, -0.6, 0.8, -0.36, 0.48, 0.6, 0.48, -0.64});
    EXPECT_EQ(refusal({.kind = Kind::matrix}, typed(M)), Fault::Kind::leftHanded);
    // SOFA's formula still gives a vector for it, whose matrix is another one.
    const auto q_WB = poseOfRotationVector({0.0, 1.413716694115406957, -1.884955592153875943});
    ASSERT_TRUE(q_WB);
    EXPECT_GT((q_WB->toRotationMatrix().transpose() - M).norm(), 0.5);
}

TEST(Erfa,
     FukushimaWilliamsMatrixIsAChainOfFourTurns)  // t_fw2m: F1(-eps) F3(-psi) F1(phib) F3(gamb)
{
    double gamb = -0.2243387670997992368e-5;
    double phib = 0.4091014602391312982;
    double psi = -0.9501954178013015092e-3;
    double eps = 0.4091014316587367472;
    const auto q_WB = pose(Chain{{Vector3d::UnitZ(), gamb},
                                 {Vector3d::UnitX(), phib},
                                 {Vector3d::UnitZ(), -psi},
                                 {Vector3d::UnitX(), -eps}});
    ASSERT_TRUE(q_WB);
    const Matrix3d R_BW = q_WB->toRotationMatrix().transpose();
    EXPECT_ELEMENTS_NEAR(
        R_BW,
        rows({0.9999995505176007047, 0.8695404617348192957e-3, 0.3779735201865582571e-3,
              -0.8695404723772016038e-3, 0.9999996219496027161, -0.1361752496887100026e-6,
              -0.3779734957034082790e-3, -0.1924880848087615651e-6, 0.9999999285679971958}),
        kSofa);
    ErfaMatrix linked;
    eraFw2m(gamb, phib, psi, eps, linked.r);
    EXPECT_ELEMENTS_NEAR(R_BW, linked.matrix(), 1e-15);  // most elements are far below 1
}

TEST(Erfa, NutationMatrixIsOurXzx)  // t_numat: F1(-(epsa + deps)) F3(-dpsi) F1(epsa)
{
    const double epsa = 0.40907897633565099;
    const double dpsi = -0.9630909107115582393e-5;
    const double deps = 0.4063239174001678826e-4;
    const Quaterniond q_WB = pose({Order::xzx, About::body, {epsa, -dpsi, -(epsa + deps)}});
    EXPECT_ELEMENTS_NEAR(
        q_WB.toRotationMatrix().transpose(),
        rows({0.9999999999536227949, 0.8836239320236250577e-5, 0.3830833447458251908e-5,
              -0.8836083657016688588e-5, 0.9999999991354654959, -0.4063240865361857698e-4,
              -0.3831192481833385226e-5, 0.4063237480216934159e-4, 0.9999999991671660407}),
        kSofa);
    std::mt19937_64 generator(20254);
    std::uniform_real_distribution<double> angle(-3.0, 3.0);
    for (int n = 0; n < 1000; ++n) {
        const double e = angle(generator);
        const double p = angle(generator);
        const double d = angle(generator);
        ErfaMatrix linked;
        eraNumat(e, p, d, linked.r);
        EXPECT_ELEMENTS_NEAR(pose({Order::xzx, About::body, {e, -p, -(e + d)}}).toRotationMatrix(),
                             linked.matrix().transpose(), kRounding);
    }
}

TEST(Erfa, IcrsToGalacticIsOurZxz)  // header of eraIcrs2g: F3(-R) F1(90 - Q) F3(90 + P)
{
    const double P = 192.85948;
    const double Q = 27.12825;
    const double R = 32.93192;
    const Matrix3d R_GI = matrixAboutBody(Order::zxz, {90.0 + P, 90.0 - Q, -R}).transpose();
    EXPECT_ELEMENTS_NEAR(R_GI,
                         rows({-0.054875560416215368, -0.873437090234885049, -0.483835015548713227,
                               0.494109427875583674, -0.444829629960011178, 0.746982244497218891,
                               -0.867666149019004701, -0.198076373431201528, 0.455983776175066922}),
                         1e-14);  // printed to 18 digits; the header's angles carry few roundings
    // t_icrs2g; the longitude is 320 deg. The linked function takes and gives the same angles.
    const double ra = 5.9338074302227188;
    const double dec = -1.1784870613579945;
    double l = 0.0;
    double b = 0.0;
    eraIcrs2g(ra, dec, &l, &b);
    const Vector3d s_I(std::cos(ra) * std::cos(dec), std::sin(ra) * std::cos(dec), std::sin(dec));
    const Vector3d s_G = R_GI * s_I;
    EXPECT_NEAR(std::atan2(s_G.y(), s_G.x()) + 2.0 * kPi, 5.5850536063818546461558, 1e-14);
    EXPECT_NEAR(std::asin(s_G.z()), -0.7853981633974483096157, 1e-14);
    EXPECT_NEAR(std::atan2(s_G.y(), s_G.x()) + 2.0 * kPi, l, 1e-14);
    EXPECT_NEAR(std::asin(s_G.z()), b, 1e-14);
}

TEST(Erfa, MatricesAreHandedOverByRows)  // t_rxr, t_rxp, t_trxp: guards the comparisons above
{
    ErfaMatrix a(r0());
    ErfaMatrix b(rows({1, 2, 2, 4, 1, 1, 3, 0, 1}));
    ErfaMatrix product;
    eraRxr(a.r, b.r, product.r);
    EXPECT_ELEMENTS_NEAR(product.matrix(), rows({20, 7, 9, 20, 8, 11, 34, 10, 15}), kSofa);
    EXPECT_ELEMENTS_NEAR(a.matrix() * b.matrix(), rows({20, 7, 9, 20, 8, 11, 34, 10, 15}), kSofa);
    Vector3d p(0.2, 1.5, 0.1);
    Vector3d rp;
    eraRxp(a.r, p.data(), rp.data());
    EXPECT_ELEMENTS_NEAR(rp, Vector3d(5.1, 3.9, 7.1), kSofa);
    EXPECT_ELEMENTS_NEAR(a.matrix() * p, Vector3d(5.1, 3.9, 7.1), kSofa);
    Vector3d trp;
    eraTrxp(a.r, p.data(), trp.data());
    EXPECT_ELEMENTS_NEAR(trp, Vector3d(5.2, 4.0, 5.4), kSofa);
    EXPECT_ELEMENTS_NEAR(a.matrix().transpose() * p, Vector3d(5.2, 4.0, 5.4), kSofa);
}

TEST(Erfa, LinkedProductOfMatricesIsAChainAboutBody)
{
    std::mt19937_64 generator(20255);
    for (int n = 0; n < 200; ++n) {
        const AxisAngle first = axisAngleOf(randomPose(generator));
        const AxisAngle second = axisAngleOf(randomPose(generator));
        const auto q_first = pose(Chain{{first.axis, first.angle}});
        const auto q_second = pose(Chain{{second.axis, second.angle}});
        const auto both = pose(Chain{{first.axis, first.angle}, {second.axis, second.angle}});
        ASSERT_TRUE(q_first && q_second && both);
        ErfaMatrix a(q_first->toRotationMatrix());
        ErfaMatrix b(q_second->toRotationMatrix());
        ErfaMatrix ab;
        eraRxr(a.r, b.r, ab.r);
        EXPECT_ELEMENTS_NEAR(both->toRotationMatrix(), ab.matrix(), kRounding);
    }
}

TEST(Erfa, LongitudeAndLatitudeTurnXIntoTheDirection)  // t_s2c, t_c2s
{
    // Latitude is positive towards z, so the turn about y is by its negative.
    const auto directionOf = [](double longitude, double latitude) -> Vector3d {
        return pose({Order::zyx, About::body, {longitude, -latitude, 0.0}}) * Vector3d::UnitX();
    };
    EXPECT_ELEMENTS_NEAR(
        directionOf(3.0123, -0.999),
        Vector3d(-0.5366267667260523906, 0.0697711109765145365, -0.8409302618566214041), kSofa);
    EXPECT_ELEMENTS_NEAR(directionOf(-0.4636476090008061162, 0.2199879773954594463),
                         Vector3d(100.0, -50.0, 25.0).normalized(), 1e-14);  // SOFA's own
}

}  // namespace
