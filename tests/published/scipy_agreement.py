#!/usr/bin/python3
# SPDX-License-Identifier: GPL-3.0-or-later
"""Compares what trunnion-cli reads with SciPy's Rotation, over 100,000 rotations.

Usage: scipy_agreement.py TRUNNION_CLI angles-in|angles-out|other-kinds

angles-in    Euler angles of all 24 conventions to every other kind of numbers
angles-out   quaternions to Euler angles of all 24 conventions, at and near lock too
other-kinds  matrices, rotation vectors, axis and angle, quaternions of every layout

SciPy's capital letters are about body, its small ones about space; its quaternions are x, y, z, w.
Exit code: 0 if all agree, 1 with the worst rows of every disagreement.
"""
import json
import subprocess
import sys
import warnings

import numpy
from scipy.spatial.transform import Rotation

ORDERS = ("xyz", "xzy", "yxz", "yzx", "zxy", "zyx", "xyx", "xzx", "yxy", "yzy", "zxz", "zyz")
ROWS = 2084  # in each of 24 conventions and two directions: 100,032
NEAR_LOCK = [side * 10.0**-power for power in range(3, 17) for side in (-1.0, 1.0)]  # rad

# Each side takes some twenty roundings of 1.1e-16, of angles up to 6.3 rad before the sines.
POSE = 1e-14  # rad, and elements
# A rotation vector is the quaternion's vector times a factor up to pi, near which it is steepest.
VECTOR = 2e-14
# Axis and angle: the angle in degrees has 180 for a unit; elsewhere elements are near 1.
DEGREES = 1e-12
# Away from lock by d, an angle moves by up to sqrt(2)/d of the pose. SciPy 1.10.1 takes the middle
# one by an arccosine and all from elements of a matrix, with some 1e-15 of rounding.
ANGLE = 2e-13  # deg, for d of one radian
# Nearer than 1e-7 rad SciPy calls a pose locked and drops the difference.
SCIPY_LOCK = 3e-7  # rad


class Checks:
    """Collects disagreements, and keeps count of what was compared."""

    def __init__(self):
        self.compared = 0
        self.failures = []

    def small(self, what, errors, tolerance, inputs):
        """Every row's error must be within the tolerance (a number, or one for each row)."""
        errors = numpy.asarray(errors, dtype=float)
        limits = numpy.broadcast_to(tolerance, errors.shape)
        self.compared += errors.size
        bad = ~(errors <= limits)  # NaN is bad
        if not bad.any():
            return
        worst = numpy.argsort(numpy.where(bad, errors / limits, -1.0))[::-1][:3]
        rows = "".join(
            f"\n    off by {errors[row]:.3g}, limit {limits[row]:.3g}, for {inputs[row].tolist()}"
            for row in worst if bad[row])
        self.failures.append(f"{what}: {bad.sum()} of {errors.size} rows{rows}")

    def true(self, what, holds, inputs):
        """Every row must hold."""
        self.small(what, numpy.where(holds, 0.0, 1.0), 0.0, inputs)


class Answers:
    """The columns of what trunnion-cli answered, one row an input."""

    def __init__(self, lines):
        rows = [json.loads(line) for line in lines]
        for row in rows:
            if "error" in row:
                raise SystemExit(f"trunnion-cli refused a row: {row}")
        self.quaternion = numpy.array([row["quaternion_wxyz"] for row in rows])
        self.matrix = numpy.array([row["matrix"] for row in rows])
        self.rotvec = numpy.array([row["rotvec_rad"] for row in rows])
        self.axis = numpy.array([row["axis"] for row in rows])
        self.angle = numpy.array([row["angle_deg"] for row in rows])
        self.mrp = numpy.array([row["mrp"] for row in rows])
        self.gibbs = [row["gibbs"] for row in rows]
        self.solutions = numpy.array([row["euler"]["solutions"] for row in rows])
        self.locked = numpy.array([row["euler"]["locked"] for row in rows])
        self.distance = numpy.array([row["lock"]["distance_deg"] for row in rows])
        self.rotation = Rotation.from_quat(self.quaternion[:, [1, 2, 3, 0]])


def read(program, inputs, *options):
    """Runs the rows through the program."""
    text = "\n".join(" ".join(repr(float(number)) for number in row) for row in inputs) + "\n"
    done = subprocess.run([program, "read", "--json", *options, "-"], input=text, text=True,
                          capture_output=True, check=False)
    lines = done.stdout.splitlines()
    if done.returncode != 0 or len(lines) != len(inputs):
        raise SystemExit(f"trunnion-cli read {' '.join(options)}: exit code {done.returncode}, "
                         f"{len(lines)} answers to {len(inputs)} rows\n{done.stderr[:2000]}")
    return Answers(lines)


def sequence(order, about):
    """The convention as SciPy has it."""
    return order.upper() if about == "body" else order


def locks_of(order):
    """The middle angles of the locks, radians."""
    if order[0] == order[2]:
        return (0.0, numpy.pi, -numpy.pi)
    return (numpy.pi / 2, -numpy.pi / 2)


def angles_near_lock(order, generator):
    """Triples in degrees at every lock, then from 1e-16 to 1e-3 rad off it, on both sides."""
    middles = list(locks_of(order))
    middles += [lock + offset for lock in locks_of(order) for offset in NEAR_LOCK]
    angles = generator.uniform(-180.0, 180.0, (len(middles), 3))
    angles[:, 1] = numpy.degrees(middles)
    return angles


def apart(first, second):
    """The angle between rotations, radians."""
    return (first.inv() * second).magnitude()


def up_to_sign(first, second):
    """The largest difference of elements of q and either of q and -q."""
    return numpy.minimum(abs(first - second).max(axis=1), abs(first + second).max(axis=1))


def turns_apart(first, second):
    """The difference of angles in degrees over whole turns."""
    return abs((first - second + 180.0) % 360.0 - 180.0)


def check_kinds(checks, name, answers, expected, inputs):
    """All kinds of numbers but Euler angles."""
    quaternion = expected.as_quat()[:, [3, 0, 1, 2]]
    checks.small(f"{name}: quaternion", up_to_sign(answers.quaternion, quaternion), POSE, inputs)
    checks.true(f"{name}: scalar >= 0", answers.quaternion[:, 0] >= 0.0, inputs)
    checks.small(f"{name}: matrix", abs(answers.matrix - expected.as_matrix()).max(axis=(1, 2)),
                 POSE, inputs)
    # At a half turn, to rounding, the opposite vectors do as well.
    half = numpy.pi - expected.magnitude() < 1e-14
    rotvec = expected.as_rotvec()
    error = numpy.where(half, up_to_sign(answers.rotvec, rotvec),
                        abs(answers.rotvec - rotvec).max(axis=1))
    checks.small(f"{name}: rotation vector", error, VECTOR, inputs)
    checks.small(f"{name}: axis times angle",
                 abs(answers.axis * numpy.radians(answers.angle)[:, None]
                     - answers.rotvec).max(axis=1), VECTOR, inputs)
    checks.small(f"{name}: angle", abs(answers.angle - numpy.degrees(expected.magnitude())),
                 DEGREES, inputs)
    mrp = expected.as_mrp()
    error = numpy.where(half, up_to_sign(answers.mrp, mrp), abs(answers.mrp - mrp).max(axis=1))
    checks.small(f"{name}: modified Rodrigues parameters", error, POSE, inputs)
    # The Gibbs vector is v/w: rounding of w, 1e-16, is magnified by 1/w^2.
    w = abs(quaternion[:, 0])
    some = w > 1e-6
    gibbs = numpy.array([g or [numpy.nan] * 3 for g in answers.gibbs])
    vector = quaternion[some, 1:] / quaternion[some, :1]
    checks.small(f"{name}: Gibbs vector", abs(gibbs[some] - vector).max(axis=1),
                 POSE / w[some]**2, inputs[some])


def check_angles(checks, name, answers, expected, order, about, inputs):
    """Both solutions, against SciPy's angles away from lock and against the pose everywhere."""
    seq = sequence(order, about)
    for number in (0, 1):
        rebuilt = Rotation.from_euler(seq, answers.solutions[:, number], degrees=True)
        checks.small(f"{name}: solution {number + 1} rebuilds the rotation",
                     apart(rebuilt, expected), POSE, inputs)
    with warnings.catch_warnings():
        warnings.simplefilter("ignore")  # SciPy tells of every locked row
        scipy = expected.as_euler(seq, degrees=True)
    lock = numpy.array(locks_of(order))
    middle = scipy[:, 1]
    distance = abs(numpy.radians(middle)[:, None] - lock).min(axis=1)
    far = distance > numpy.radians(1.0)
    first = answers.solutions[:, 0]
    checks.small(f"{name}: angles", turns_apart(first, scipy)[far].max(axis=1),
                 ANGLE / distance[far], inputs[far])
    checks.small(f"{name}: distance from lock",
                 abs(answers.distance - numpy.degrees(distance))[far], ANGLE / distance[far],
                 inputs[far])
    ours = Rotation.from_euler(seq, first, degrees=True)
    theirs = Rotation.from_euler(seq, scipy, degrees=True)
    checks.small(f"{name}: SciPy's pose near lock", apart(ours, theirs)[~far], SCIPY_LOCK,
                 inputs[~far])


def conventions():
    """All 24."""
    return [(order, about) for order in ORDERS for about in ("body", "space")]


def angles_in(program, checks, generator):
    """Euler angles of all 24 conventions; every other one in radians."""
    for index, (order, about) in enumerate(conventions()):
        lock = angles_near_lock(order, generator)
        inputs = generator.uniform(-360.0, 360.0, (ROWS, 3))
        inputs[:len(lock)] = lock
        degrees = index % 2 == 0
        if not degrees:
            inputs = numpy.radians(inputs)
        expected = Rotation.from_euler(sequence(order, about), inputs, degrees=degrees)
        answers = read(program, inputs, "--as", "euler", "--order", order, "--about", about,
                       "--unit", "deg" if degrees else "rad", "--to-order", order,
                       "--to-about", about)
        name = f"angles {order} about {about}"
        check_kinds(checks, name, answers, expected, inputs)
        check_angles(checks, name, answers, expected, order, about, inputs)
        at_lock = len(locks_of(order))
        checks.true(f"{name}: locked", answers.locked[:at_lock], inputs)
        checks.true(f"{name}: not locked", ~answers.locked[len(lock):], inputs[len(lock):])


def angles_out(program, checks, generator):
    """Quaternions, uniform over all rotations and near lock, to all 24 conventions."""
    for order, about in conventions():
        seq = sequence(order, about)
        expected = Rotation.random(ROWS, random_state=generator.integers(2**31))
        lock = Rotation.from_euler(seq, angles_near_lock(order, generator), degrees=True)
        expected = Rotation.concatenate([lock, expected[len(lock):]])
        inputs = expected.as_quat()
        answers = read(program, inputs, "--as", "quaternion", "--layout", "xyzw", "--to-order",
                       order, "--to-about", about)
        name = f"quaternions to {order} about {about}"
        check_kinds(checks, name, answers, expected, inputs)
        check_angles(checks, name, answers, expected, order, about, inputs)


def other_kinds(program, checks, generator):
    """Matrices, rotation vectors, axis and angle, and quaternions as other algebras have them."""
    expected = Rotation.random(1000, random_state=generator.integers(2**31))
    half_turns = Rotation.from_quat(generator.normal(size=(40, 4)) * [1, 1, 1, 0])
    small = Rotation.from_rotvec(generator.normal(size=(40, 3)) * 1e-9)
    expected = Rotation.concatenate([expected, half_turns, small])
    quaternion = expected.as_quat()
    scaled = quaternion * generator.uniform(0.1, 30.0, (len(quaternion), 1))
    matrix = expected.as_matrix()
    rotvec = expected.as_rotvec()
    angle = expected.magnitude()
    axis = rotvec / angle[:, None]
    inverse = expected.inv()
    jpl = inverse.as_quat()  # ij = -k: the same numbers turn the other way
    for name, inputs, options in (
            ("matrix by rows", matrix.reshape(-1, 9), ("--as", "matrix", "--storage", "rows")),
            ("matrix by columns", matrix.transpose(0, 2, 1).reshape(-1, 9),
             ("--as", "matrix", "--storage", "columns")),
            ("matrix world to body", inverse.as_matrix().reshape(-1, 9),
             ("--as", "matrix", "--direction", "world-to-body")),
            ("rotation vector", rotvec, ("--as", "rotvec", "--unit", "rad")),
            ("rotation vector in degrees", numpy.degrees(rotvec),
             ("--as", "rotvec", "--unit", "deg")),
            ("axis and angle", numpy.column_stack([axis * 3.0, numpy.degrees(angle)]),
             ("--as", "axis-angle", "--unit", "deg")),
            ("quaternion of any length, scalar last", scaled,
             ("--as", "quaternion", "--layout", "xyzw")),
            ("quaternion of any length, scalar first", scaled[:, [3, 0, 1, 2]],
             ("--as", "quaternion", "--layout", "wxyz")),
            ("JPL quaternion", jpl,
             ("--as", "quaternion", "--layout", "xyzw", "--algebra", "jpl")),
            ("quaternion world to body", inverse.as_quat(),
             ("--as", "quaternion", "--layout", "xyzw", "--direction", "world-to-body"))):
        check_kinds(checks, name, read(program, inputs, *options), expected, inputs)


def main():
    """Runs one of the checks."""
    jobs = {"angles-in": angles_in, "angles-out": angles_out, "other-kinds": other_kinds}
    if len(sys.argv) != 3 or sys.argv[2] not in jobs:
        raise SystemExit(__doc__)
    checks = Checks()
    jobs[sys.argv[2]](sys.argv[1], checks, numpy.random.default_rng(10101))
    for failure in checks.failures:
        print("DISAGREES", failure)
    print(f"{checks.compared} comparisons with SciPy, {len(checks.failures)} kinds disagree")
    return 1 if checks.failures or checks.compared == 0 else 0


if __name__ == "__main__":
    sys.exit(main())
