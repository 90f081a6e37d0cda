"""Reference values of TEOS-10 from the Python package gsw (the library of SCOR/IAPSO WG127; written with Debian's 3.6.16).

    python3 gsw_reference.py make           writes gsw_reference.csv.gz and gsw_nsquared.csv beside this file
    python3 gsw_reference.py points STEP    recomputes every STEP-th row of gsw_reference.csv.gz from its inputs and prints it
    python3 gsw_reference.py nsquared       recomputes gsw_nsquared.csv and prints it

The points: the whole ocean, the Baltic, both sides of Central America, high latitudes, great depths, nodes and edges of the atlas.
Inputs: lon, lat (degrees), p (dbar), p_ref (dbar), SP, t (degC, ITS-90). Numbers have 17 significant digits; empty is NaN.
"""
import csv
import gzip
import io
import os
import sys

import gsw
import numpy as np

FOLDER = os.path.dirname(os.path.abspath(__file__))
INPUTS = ["lon", "lat", "p", "p_ref", "SP", "t"]


def points():
    rng = np.random.default_rng(20240611)

    def box(n, lon, lat, p, sp, t):
        return np.column_stack([rng.uniform(*lon, n), rng.uniform(*lat, n), rng.uniform(*p, n),
                                rng.choice([0.0, 1000.0, 2000.0, 3000.0, 4000.0], n), rng.uniform(*sp, n), rng.uniform(*t, n)])

    sets = [
        box(900, (0, 360), (-80, 90), (0, 6500), (30, 40), (-2, 30)),
        box(300, (-180, 180), (-80, 90), (0, 200), (0, 42), (-2, 38)),
        box(300, (5, 47), (48, 71), (0, 450), (0, 35), (-1, 25)),
        box(500, (258, 294), (2, 21), (0, 5000), (32, 37), (1, 30)),
        box(150, (-102, -66), (2, 21), (0, 50), (20, 37), (10, 32)),
        box(200, (0, 360), (60, 90), (0, 4500), (25, 36), (-2, 10)),
        box(200, (0, 360), (-86, -60), (0, 6000), (33, 35), (-2, 5)),
        box(200, (0, 360), (-60, 60), (6000, 10500), (34, 36), (-1, 3)),
    ]
    nodes = box(150, (0, 1), (0, 1), (0, 1), (34, 36), (0, 20))
    nodes[:, 0] = rng.integers(0, 91, 150) * 4.0
    nodes[:, 1] = -86.0 + rng.integers(0, 45, 150) * 4.0
    nodes[:, 2] = rng.choice([0.0, 10.0, 50.0, 101.0, 505.0, 2025.0, 5098.0, 6131.0], 150)
    edges = np.array([[lon, lat, p, 0.0, 35.0, 10.0] for lon in (-180.0, -0.001, 0.0, 180.0, 359.999, 360.0)
                      for lat in (-86.0, -70.0, 0.0, 66.0, 90.0) for p in (0.0, 1000.0)])
    return np.vstack(sets + [nodes, edges])


def values(inputs):
    lon, lat, p, p_ref, sp, t = inputs.T
    sa = gsw.SA_from_SP(sp, p, lon, lat)
    ct = gsw.CT_from_t(sa, t, p)
    pt0 = gsw.pt0_from_t(sa, t, p)
    z = gsw.z_from_p(p, lat)
    return {
        "SA_from_SP": sa,
        "SP_from_SA": gsw.SP_from_SA(sa, p, lon, lat),
        "CT_from_t": ct,
        "pt0_from_t": pt0,
        "pt_from_t": gsw.pt_from_t(sa, t, p, p_ref),
        "CT_from_pt": gsw.CT_from_pt(sa, pt0),
        "pt_from_CT": gsw.pt_from_CT(sa, ct),
        "t_from_CT": gsw.t_from_CT(sa, ct, p),
        "rho": gsw.rho(sa, ct, p),
        "rho_ref": gsw.rho(sa, ct, p_ref),
        "alpha": gsw.alpha(sa, ct, p),
        "beta": gsw.beta(sa, ct, p),
        "z_from_p": z,
        "p_from_z": gsw.p_from_z(z, lat),
        "grav": gsw.grav(lat, p),
        "O2sol": gsw.O2sol(sa, ct, p, lon, lat),
        "O2sol_SP_pt": gsw.O2sol_SP_pt(sp, pt0),
    }


def number(value):
    return "" if np.isnan(value) else "%.17g" % value


def write(stream, columns):
    stream.write(",".join(columns) + "\n")
    for row in zip(*columns.values()):
        stream.write(",".join(number(value) for value in row) + "\n")


def with_inputs(inputs):
    return {**dict(zip(INPUTS, inputs.T)), **values(inputs)}


def stored_inputs():
    with gzip.open(os.path.join(FOLDER, "gsw_reference.csv.gz"), "rt", encoding="utf-8") as stream:
        rows = csv.DictReader(line for line in stream if not line.startswith("#"))
        return np.array([[float(row[name]) for name in INPUTS] for row in rows])


def nsquared():
    with open(os.path.join(FOLDER, "gsw_check_casts.csv"), encoding="utf-8") as stream:
        rows = list(csv.DictReader(stream))
    columns = {name: [] for name in ("cast", "level", "p_mid", "n2")}
    for cast in sorted({row["cast"] for row in rows}):
        levels = [row for row in rows if row["cast"] == cast and row["SA_from_SP"] and row["CT_from_t"]]
        sa, ct, p, lat = (np.array([float(row[name]) for row in levels]) for name in ("SA_from_SP", "CT_from_t", "p_chck_cast", "lat"))
        n2, p_mid = gsw.Nsquared(sa, ct, p, lat)
        columns["cast"] += [float(cast)] * len(n2)
        columns["level"] += [float(row["level"]) for row in levels[:-1]]
        columns["p_mid"] += list(p_mid)
        columns["n2"] += list(n2)
    return columns


def main(arguments):
    np.seterr(invalid="ignore")
    head = "# gsw_reference.py with gsw %s; what the columns are stands in the script.\n" % gsw.__version__
    if arguments == ["make"]:
        text = io.StringIO(head)
        text.seek(0, io.SEEK_END)
        write(text, with_inputs(points()))
        with open(os.path.join(FOLDER, "gsw_reference.csv.gz"), "wb") as stream:
            stream.write(gzip.compress(text.getvalue().encode(), 9, mtime=0))
        with open(os.path.join(FOLDER, "gsw_nsquared.csv"), "w", encoding="utf-8", newline="\n") as stream:
            stream.write(head)
            write(stream, nsquared())
    elif arguments == ["nsquared"]:
        write(sys.stdout, nsquared())
    elif len(arguments) == 2 and arguments[0] == "points":
        write(sys.stdout, with_inputs(stored_inputs()[::int(arguments[1])]))
    else:
        sys.exit(__doc__)


if __name__ == "__main__":
    main(sys.argv[1:])
