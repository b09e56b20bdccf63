#!/usr/bin/env python3
# SPDX-License-Identifier: GPL-3.0-or-later
"""Times SciPy on the job of rotation_bench and prints one table with its results.

Usage: scipy_rotation.py RESULTS, the JSON file that rotation_bench wrote.
"""
import json
import statistics
import sys
import time

import numpy
import scipy
from scipy.spatial.transform import Rotation

ROWS = 1_000_000
REPEATS = 3
ROUTES = ("scipy", "eigen", "scalar", "sse2", "avx2", "avx512")
WAYS = {"poses": "angles to quaternions", "angles": "quaternions to angles"}


def milliseconds(work):
    """Median over REPEATS of the processor time that work() takes."""
    times = []
    for _ in range(REPEATS):
        start = time.process_time()
        work()
        times.append(1e3 * (time.process_time() - start))
    return statistics.median(times)


def scipy_times():
    random = numpy.random.default_rng(20)
    triples = random.uniform(-numpy.pi, numpy.pi, (ROWS, 3))
    triples[:, 1] *= 0.5
    rotations = Rotation.from_euler("ZYX", triples)
    return {
        "poses": milliseconds(lambda: Rotation.from_euler("ZYX", triples)),
        "angles": milliseconds(lambda: rotations.as_euler("ZYX")),
    }


def main():
    with open(sys.argv[1], encoding="utf-8") as file:
        results = json.load(file)
    times = {way: {} for way in WAYS}
    for run in results["benchmarks"]:
        if run.get("aggregate_name") == "median":
            way, route = run["run_name"].split("/")[:2]
            times[way][route] = run["cpu_time"]
    for way, taken in scipy_times().items():
        times[way]["scipy"] = taken

    print(f"{ROWS} rotations, zyx about body, one thread; medians of processor time; SciPy {scipy.__version__}")
    for way, words in WAYS.items():
        print(f"\n{words:24}{'ms':>10}{'x Eigen':>10}{'x SciPy':>10}")
        for route in ROUTES:
            if route not in times[way]:
                continue  # a vector unit that this machine lacks
            taken = times[way][route]
            print(f"{route:24}{taken:10.2f}{times[way]['eigen'] / taken:10.2f}"
                  f"{times[way]['scipy'] / taken:10.1f}")


if __name__ == "__main__":
    main()
