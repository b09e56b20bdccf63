// SPDX-License-Identifier: GPL-3.0-or-later
// A million rotations each way between zyx angles about body and quaternions, one thread: the batch
// on every vector unit of this machine against Eigen's own route. `run` adds SciPy and prints
// ratios.
#include <cstddef>
#include <cstdint>
#include <random>
#include <string>
#include <vector>

#include <Eigen/Geometry>
#include <benchmark/benchmark.h>

#include "rotcore/rotation/batch.h"

namespace {

using rotcore::About;
using rotcore::AngleUnit;
using rotcore::Order;
using rotcore::VectorUnit;

constexpr std::size_t kRows = 1'000'000;

// The same angles twice, each way natural to one side: by column here, by row for Eigen.
struct Data {
    std::vector<double> a, b, c, w, x, y, z;
    std::vector<Eigen::Vector3d> triples;
    std::vector<Eigen::Quaterniond> quaternions;

    Data()
        : a(kRows),
          b(kRows),
          c(kRows),
          w(kRows),
          x(kRows),
          y(kRows),
          z(kRows),
          triples(kRows),
          quaternions(kRows)
    {
        std::mt19937_64 random(20);
        std::uniform_real_distribution<double> full(-rotcore::kPi, rotcore::kPi);
        for (std::size_t row = 0; row < kRows; ++row) {
            triples[row] = {full(random), 0.5 * full(random), full(random)};
            a[row] = triples[row][0];
            b[row] = triples[row][1];
            c[row] = triples[row][2];
        }
        rotcore::posesOf(Order::zyx, About::body, angles(), poses());
        for (std::size_t row = 0; row < kRows; ++row)
            quaternions[row] = {w[row], x[row], y[row], z[row]};
    }
    rotcore::EulerColumns angles() { return {a, b, c}; }
    rotcore::QuaternionColumns poses() { return {w, x, y, z}; }
};

Data& data()
{
    static Data made;
    return made;
}

void countRows(benchmark::State& state)
{
    state.SetItemsProcessed(state.iterations() * static_cast<std::int64_t>(kRows));
}

void posesByEigen(benchmark::State& state)
{
    using Eigen::AngleAxisd;
    using Eigen::Vector3d;
    Data& all = data();
    for ([[maybe_unused]] auto _ : state) {
        for (std::size_t row = 0; row < kRows; ++row) {
            const Vector3d& turn = all.triples[row];
            all.quaternions[row] = Eigen::Quaterniond(AngleAxisd(turn[0], Vector3d::UnitZ()) *
                                                      AngleAxisd(turn[1], Vector3d::UnitY()) *
                                                      AngleAxisd(turn[2], Vector3d::UnitX()));
        }
        benchmark::ClobberMemory();
    }
    countRows(state);
}

void anglesByEigen(benchmark::State& state)
{
    Data& all = data();
    for ([[maybe_unused]] auto _ : state) {
        for (std::size_t row = 0; row < kRows; ++row)
            all.triples[row] = all.quaternions[row].toRotationMatrix().eulerAngles(2, 1, 0);
        benchmark::ClobberMemory();
    }
    countRows(state);
}

void posesByBatch(benchmark::State& state, VectorUnit unit)
{
    Data& all = data();
    for ([[maybe_unused]] auto _ : state) {
        rotcore::posesOf(Order::zyx, About::body, all.angles(), all.poses(), AngleUnit::radians,
                         unit);
        benchmark::ClobberMemory();
    }
    countRows(state);
}

void anglesByBatch(benchmark::State& state, VectorUnit unit)
{
    Data& all = data();
    for ([[maybe_unused]] auto _ : state) {
        rotcore::anglesOf(Order::zyx, About::body, all.poses(), all.angles(), AngleUnit::radians,
                          unit);
        benchmark::ClobberMemory();
    }
    countRows(state);
}

benchmark::internal::Benchmark* timed(benchmark::internal::Benchmark* one)
{
    return one->Unit(benchmark::kMillisecond)->MinTime(0.2);
}

}  // namespace

int main(int argc, char** argv)
{
    timed(benchmark::RegisterBenchmark("poses/eigen", posesByEigen));
    timed(benchmark::RegisterBenchmark("angles/eigen", anglesByEigen));
    for (const VectorUnit unit : rotcore::kAllVectorUnits) {
        if (!rotcore::hasVectorUnit(unit)) continue;
        const std::string name(rotcore::nameOf(unit));
        timed(benchmark::RegisterBenchmark(("poses/" + name).c_str(), posesByBatch, unit));
        timed(benchmark::RegisterBenchmark(("angles/" + name).c_str(), anglesByBatch, unit));
    }
    benchmark::Initialize(&argc, argv);
    if (benchmark::ReportUnrecognizedArguments(argc, argv)) return 1;
    benchmark::RunSpecifiedBenchmarks();
    return 0;
}
