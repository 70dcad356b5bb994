"""The signatures of the ten kinematical generators over a grid by NumPy in double precision.

What `rankfall scan specs/kinematics-ten.yaml --count` answers exactly, done the usual way: the
structure constants of a batch of points, ad-traces by einsum, eigenvalues by eigvalsh, eigenvalues
counted by sign with a tolerance. Prints points, seconds and points a second.

    python3 src-test/rankfall/bench/signatures.py [points on each axis, default 60]
"""

import sys
import time

import numpy

GENERATORS = ["J1", "J2", "J3", "P1", "P2", "P3", "K1", "K2", "K3", "H"]
BATCH = 4096
TOLERANCE = 1e-9


def rows():
    """Left, right, target and coefficient: a function of (a, b, m)."""
    turns = [(1, 2, 3), (2, 3, 1), (3, 1, 2)]
    for i, j, k in turns:
        yield f"J{i}", f"J{j}", f"J{k}", lambda a, b, m: 1
        yield f"P{i}", f"P{j}", f"J{k}", lambda a, b, m: -a * m
        yield f"K{i}", f"K{j}", f"J{k}", lambda a, b, m: b * m
        for v in "PK":
            yield f"J{i}", f"{v}{j}", f"{v}{k}", lambda a, b, m: 1
            yield f"J{j}", f"{v}{i}", f"{v}{k}", lambda a, b, m: -1
    for i in (1, 2, 3):
        yield "H", f"P{i}", f"K{i}", lambda a, b, m: a
        yield "H", f"K{i}", f"P{i}", lambda a, b, m: b
        yield f"K{i}", f"P{i}", "H", lambda a, b, m: m


def signatures(a, b, m):
    """Numbers of positive and negative eigenvalues of the Killing form at each point."""
    n = len(GENERATORS)
    c = numpy.zeros((len(a), n, n, n))
    for left, right, target, coefficient in rows():
        i, j, k = (GENERATORS.index(g) for g in (left, right, target))
        c[:, i, j, k] = coefficient(a, b, m)
        c[:, j, i, k] = -c[:, i, j, k]
    killing = numpy.einsum("pikl,pjlk->pij", c, c, optimize=True)
    values = numpy.linalg.eigvalsh(killing)
    return (values > TOLERANCE).sum(axis=1), (values < -TOLERANCE).sum(axis=1)


def main():
    size = int(sys.argv[1]) if len(sys.argv) > 1 else 60
    axis = numpy.linspace(-2, 2, size)
    grid = numpy.stack(numpy.meshgrid(axis, axis, axis, indexing="ij"), axis=-1).reshape(-1, 3)
    begun = time.perf_counter()
    counts = {}
    for at in range(0, len(grid), BATCH):
        plus, minus = signatures(*grid[at : at + BATCH].T)
        for pair, number in zip(*numpy.unique(plus * 16 + minus, return_counts=True)):
            counts[pair] = counts.get(pair, 0) + int(number)
    seconds = time.perf_counter() - begun
    for pair in sorted(counts):
        print(f"plus {pair // 16}, minus {pair % 16}: {counts[pair]}")
    print(f"{len(grid)} points, {seconds:.2f} s, {len(grid) / seconds:.0f} points a second")


if __name__ == "__main__":
    main()
