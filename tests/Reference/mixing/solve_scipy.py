"""Solves the bounded problems of a file with scipy.optimize.nnls: solve_scipy.py PROBLEMS [FIRST-N]."""
import sys

import numpy as np
import scipy
from scipy.optimize import nnls

limit = int(sys.argv[2]) if len(sys.argv) > 2 else 10**9
print(f"# scipy {scipy.__version__} optimize.nnls")
done = 0
for line in open(sys.argv[1]):
    if line.startswith("#"):
        continue
    number, kind, fractions, rows, *values = line.strip().split(",")
    if kind != "bounded" or done >= limit:
        continue
    done += 1
    n, m = int(fractions), int(rows)
    values = np.array([float(v) for v in values])
    x, _ = nnls(values[: n * m].reshape(n, m).T, values[n * m:])
    print(f"{number}," + ",".join(repr(float(v)) for v in x))
