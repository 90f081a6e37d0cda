"""Seeded whitened mixing systems, as lines of numbers that read back to the same double."""
import numpy as np

rng = np.random.default_rng(20260401)
print("# id,kind,fractions,rows,A column by column,b; made by make_problems.py, seed 20260401")
number = 0
for kind in ("bounded", "simplex"):
    for fractions, rows in ((3, 5), (4, 6), (4, 8), (5, 8), (6, 9), (8, 9)):
        for _ in range(25):
            number += 1
            a = rng.normal(size=(rows, fractions)) * rng.uniform(0.2, 20, size=(rows, 1))
            truth = rng.dirichlet(np.full(fractions, 0.6))
            b = a @ truth + rng.normal(size=rows) * rng.choice([0.01, 0.3, 3.0])
            if kind == "bounded":
                a[-1, :] = 200.0
                b[-1] = 200.0
            numbers = ",".join(repr(float(v)) for v in (*a.T.ravel(), *b))
            print(f"{number},{kind},{fractions},{rows},{numbers}")
