"""Makes the reference numbers of CoreLogTest with NumPy: python3 core_shift_reference.py FOLDER.

FOLDER holds the open data of well AST-02 (core-ast02). The log is interpolated with numpy.interp
between samples that have a value; pairs across more than two steps of 0.1 m are left out.
"""

import csv
import sys

import numpy

folder = sys.argv[1]


def column(name, key):
    with open(f"{folder}/{name}", newline="") as file:
        return numpy.array([float(r[key]) if r[key] else numpy.nan for r in csv.DictReader(file)])


logs = "well_logs_AST02.csv"
core = "porperm_data_well_AST02.csv"
depth, rhob = column(logs, "depth"), column(logs, "RHOB")
plug, porosity = column(core, "depth"), column(core, "porosity")
there = ~numpy.isnan(rhob)
depth, rhob = depth[there][::-1], rhob[there][::-1]


def pairs(shift):
    at = plug + shift
    value = numpy.interp(at, depth, rhob, left=numpy.nan, right=numpy.nan)
    right = numpy.clip(numpy.searchsorted(depth, at), 1, len(depth) - 1)
    wide = depth[right] - depth[right - 1] > 0.2 + 1e-6
    value[wide & (depth[right] != at)] = numpy.nan
    both = ~numpy.isnan(value) & ~numpy.isnan(porosity)
    return value, both


value, both = pairs(0)
print("rows", len(column(logs, "depth")), "first three", value[:3], "pairs", both.sum())
best = max(
    (abs(numpy.corrcoef(v[b], porosity[b])[0, 1]), i)
    for i in range(-30, 31)
    for v, b in [pairs(i * 0.1)]
)
for i in (0, best[1]):
    v, b = pairs(i * 0.1)
    print(f"shift {i * 0.1:.1f} r {numpy.corrcoef(v[b], porosity[b])[0, 1]:.6f} n {b.sum()}")
