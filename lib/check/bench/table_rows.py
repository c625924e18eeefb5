"""Times pandas on the table of TableBench: least of some runs in milliseconds, and a column's sum.

python3 table_rows.py FILE RUNS
"""
import sys
import time

import pandas

least = float("inf")
for _ in range(int(sys.argv[2])):
    start = time.perf_counter()
    frame = pandas.read_csv(sys.argv[1])
    least = min(least, (time.perf_counter() - start) * 1e3)
print("pandas", round(least, 1), repr(float(frame["porosity [%]"].sum())))
