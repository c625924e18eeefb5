"""Counts and sums of every number column of the shared tables, with Python's csv module alone.

Run in the shared folder: python3 shared_tables.py data > shared_tables.csv
"""
import csv
import math
import os
import sys


def number(cell):
    try:
        return float(cell)
    except ValueError:
        return None


out = csv.writer(sys.stdout, lineterminator="\n")
out.writerow(["file", "rows", "column", "count", "sum"])
root = sys.argv[1]
names = sorted(
    os.path.relpath(os.path.join(folder, name), root)
    for folder, _, files in os.walk(root)
    for name in files
    if name.endswith(".csv")
)
for name in names:
    with open(os.path.join(root, name), encoding="utf-8", newline="") as file:
        head, *rows = [row for row in csv.reader(file) if row]
    for at, _ in enumerate(head):
        cells = [row[at].strip() for row in rows if row[at].strip()]
        values = [number(cell) for cell in cells]
        known = [v for v in values if v is not None and math.isfinite(v)]
        if known and len(known) == len(cells):
            out.writerow([name, len(rows), at, len(known), repr(math.fsum(known))])
