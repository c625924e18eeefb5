"""Reads the numbers of a LAS file the way a Python user would; told its path by LasBench.

Prints, in milliseconds, least and median time of pandas.read_csv and of numpy.loadtxt over the same
numbers, which a caller wrote to a file without the header, and what they sum up to.
"""

import sys
import time

import numpy
import pandas

path, runs = sys.argv[1], int(sys.argv[2])


def timed(read):
    times = []
    for _ in range(runs):
        start = time.perf_counter()
        read()
        times.append(1000 * (time.perf_counter() - start))
    times.sort()
    return f"{times[0]:.2f} {times[len(times) // 2]:.2f}"


print("pandas", timed(lambda: pandas.read_csv(path, header=None)))
print("numpy", timed(lambda: numpy.loadtxt(path, delimiter=",")))
print("sum", repr(float(pandas.read_csv(path, header=None, float_precision="round_trip").to_numpy().sum())))
