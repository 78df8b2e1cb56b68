"""Times one section with SciPy's sparse direct solver and with the program, in one run, and compares the temperatures.

The problem: insulation below, screed above it, a cable on the insulation; a uniform grid of square cells, balances of five cells, films on
the upper and lower edge, the other edges adiabatic. Both sides set the balances up themselves, from the numbers below.

    mvn -q -o test-compile
    mvn -q -o dependency:build-classpath -Dmdep.outputFile=target/classpath
    OMP_NUM_THREADS=1 OPENBLAS_NUM_THREADS=1 python3 src/bench/python/compare_section.py 316 1000

Arguments: numbers of cells along each side. Times are of setting up and solving, without reading and writing.
"""

import subprocess
import sys
import tempfile
import time
from pathlib import Path

import numpy
import scipy.sparse
import scipy.sparse.linalg

SIDE = 0.1  # m, both ways
INSULATION = 0.03  # m, from below
CONDUCTIVITIES = 0.04, 1.2  # W/(m K)
FILMS = 1 / 0.17, 10.8  # W/(m2 K), below and above
HEAT = 7.5  # W/m in one cell, the lowest screed cell of the first column
ROOT = Path(__file__).resolve().parents[3]


def balances(n):
    """The matrix and the right-hand side; rows of cells from below, 20 degrees on both sides count as 0."""
    size = SIDE / n
    middle = (numpy.arange(n) + 0.5) * size
    conductivity = numpy.where(middle < INSULATION, CONDUCTIVITIES[0], CONDUCTIVITIES[1])
    right = numpy.repeat(conductivity, n).reshape(n, n)
    right[:, -1] = 0
    up = numpy.zeros((n, n))
    up[:-1, :] = (2 / (1 / conductivity[:-1] + 1 / conductivity[1:]))[:, None]
    held = numpy.zeros((n, n))
    held[0, :] = size / (size / 2 / conductivity[0] + 1 / FILMS[0])
    held[-1, :] = size / (size / 2 / conductivity[-1] + 1 / FILMS[1])
    diagonal = held + right + up
    diagonal[:, 1:] += right[:, :-1]
    diagonal[1:, :] += up[:-1, :]
    matrix = scipy.sparse.diags(
        [diagonal.ravel(), -right.ravel()[:-1], -right.ravel()[:-1], -up.ravel()[:-n], -up.ravel()[:-n]],
        [0, 1, -1, n, -n],
        format="csc",
    )
    load = numpy.zeros((n, n))
    load[int(numpy.argmax(middle >= INSULATION)), 0] = HEAT
    return matrix, load.ravel()


def by_program(n, folder):
    """Seconds of a first and of a warmed-up run, steps, and the temperatures."""
    answer = Path(folder) / f"{n}.bin"
    classpath = "target/test-classes:target/classes:" + (ROOT / "target/classpath").read_text()
    command = ["java", "-Xms4g", "-Xmx4g", "-XX:+AlwaysPreTouch", "-cp", classpath]
    command += ["org.treadwarm.physics.section.CompareSection", str(n), str(answer)]
    printed = subprocess.run(command, cwd=ROOT, check=True, capture_output=True, text=True).stdout
    first, warm, steps = printed.split()
    return float(first), float(warm), int(steps), numpy.fromfile(answer, dtype=">f8")


def main():
    with tempfile.TemporaryDirectory() as folder:
        for n in [int(argument) for argument in sys.argv[1:]] or [316, 1000]:
            start = time.perf_counter()
            matrix, load = balances(n)
            solved = scipy.sparse.linalg.spsolve(matrix, load)
            seconds = time.perf_counter() - start
            first, warm, steps, temperatures = by_program(n, folder)
            print(
                f"{n * n} cells: spsolve {seconds:.3f} s; program {warm:.3f} s warm ({seconds / warm:.1f} times as fast), "
                f"{first:.3f} s at first ({seconds / first:.1f} times), {steps} steps; "
                f"largest difference {numpy.abs(solved - temperatures).max():.1e} K"
            )


if __name__ == "__main__":
    main()
