"""Sobol direction numbers and check points.

Reads the table new-joe-kuo-6.21201 of Joe and Kuo 2008 (SIAM J. Sci. Comput. 30:2635-2654)
as scipy ships it, chooses the dimensions that shared/engine/draw uses, and writes

  shared/engine/draw/sobol-directions.ts   the chosen rows of the table
  tests/golden/sobol.json                  unscrambled points by scipy.stats.qmc.Sobol

Choice: in the table's order, each dimension that over the first 1,024 points shares no
combination of binary digits with one chosen before, as long as the digits of both count
together to 4 or fewer (first digit of one, first three of the other; first two of both).
Under nested scrambling such a shared combination of k digits correlates two parameters by up
to 3 / 2^k. Where the search of the 21,201 dimensions ends is where the list ends.

Run from the root of the repository: python3 tests/golden/scripts/gen_h_sobol.py
Made with Python 3.11, numpy and scipy 1.17.1.
"""
import json
import os

import numpy as np
import scipy
from scipy.stats import qmc

DIGITS = 10
table = np.load(os.path.join(os.path.dirname(scipy.__file__), "stats", "_sobol_direction_numbers.npz"))


def row(dim):
    """Primitive polynomial (bits) and initial numbers m_1..m_s of a dimension (0: van der Corput)."""
    poly = int(table["poly"][dim])
    degree = poly.bit_length() - 1
    return poly, [int(m) for m in table["vinit"][dim][:degree]]


def numbers(dim, count):
    """m_1..m_count by the recurrence of Bratley and Fox 1988 (ACM TOMS 14:88-100)."""
    poly, m = row(dim)
    degree = len(m)
    if degree == 0:
        return [1] * count
    m = list(m)
    while len(m) < count:
        k = len(m)
        value = m[k - degree] ^ (m[k - degree] << degree)
        for j in range(1, degree):
            if poly >> (degree - j) & 1:
                value ^= m[k - j] << j
        m.append(value)
    return m[:count]


def digits(dim):
    """For each of the first 3 binary digits, which bits of the index flip it (as an integer)."""
    m = numbers(dim, DIGITS)
    return [
        sum((m[k] << (DIGITS - 1 - k) >> (DIGITS - 1 - r) & 1) << k for k in range(DIGITS))
        for r in range(3)
    ]


def span(rows):
    result = {0}
    for r in rows:
        result |= {x ^ r for x in result}
    return result - {0}


chosen, ones, twos, threes = [], set(), set(), set()
for dim in range(len(table["poly"])):
    d = digits(dim)
    one, two, three = span(d[:1]), span(d[:2]), span(d)
    if one & threes or two & twos or three & ones:
        continue
    chosen.append(dim)
    ones |= one
    twos |= two
    threes |= three

NOTICE = open("tests/golden/scripts/joe-kuo-licence.txt").read().strip().splitlines()
lines = [
    "/**",
    f" * Direction numbers of Sobol sequences: {len(chosen)} dimensions of the table new-joe-kuo-6.21201",
    " * (Joe and Kuo 2008, SIAM J. Sci. Comput. 30:2635-2654), as scipy 1.17.1 ships it. Made by",
    " * tests/golden/scripts/gen_h_sobol.py, which says how the dimensions were chosen; do not edit.",
    " *",
    *[(" * " + line).rstrip() for line in NOTICE],
    " */",
    "",
    "/**",
    " * One dimension a line: the primitive polynomial as a binary number (1: van der Corput's",
    " * sequence, of degree 0), then the initial numbers m_1..m_s of its degree s.",
    " */",
    "export const SOBOL_DIRECTIONS = `",
]
for d in chosen:
    poly, m = row(d)
    lines.append(" ".join(str(n) for n in ([poly] if poly == 1 else [poly, *m])))
lines.append("`;")
with open("shared/engine/draw/sobol-directions.ts", "w") as file:
    file.write("\n".join(lines) + "\n")

picks = [0, 1, 2, 9, 40, 60, 90, 120, 150, len(chosen) - 1]
points = qmc.Sobol(max(chosen) + 1, scramble=False, bits=30).random(256)
golden = {
    "file": "sobol.json",
    "note": "Unscrambled Sobol points of scipy.stats.qmc.Sobol(bits=30) in Gray-code order: row i is"
    " the point of index i XOR (i >> 1). positions: places in shared/engine/draw/sobol-directions.ts;"
    " dimensions: the same in the table new-joe-kuo-6.21201, from 0. All values are exact.",
    "source": f"scipy {scipy.__version__}, script scripts/gen_h_sobol.py",
    "positions": picks,
    "dimensions": [chosen[p] for p in picks],
    "points": [[float(points[i][chosen[p]]) for p in picks] for i in list(range(64)) + [100, 200, 255]],
    "indices": list(range(64)) + [100, 200, 255],
}
with open("tests/golden/sobol.json", "w") as file:
    json.dump(golden, file)
    file.write("\n")
