# Reference values for quartz cement and the burial model: the differential equations integrated by
# SciPy's solve_ivp (DOP853, rtol 1e-11), without the closed form that the library uses.
# Run: python3 reference.py > reference.csv
import numpy as np
import scipy
from scipy.integrate import solve_ivp

A, B, MV, MA = 1.98e-22, 0.022, 60.09 / 2.65, 3.15576e13


def rate(celsius):
    return A * 10 ** (B * celsius)


def cement(phi0, legs, f, d, c):
    """Constant volume between the grains: d phi/dt = -MV r A0 phi/phi0."""
    a0 = 6 * f * (1 - c) / d
    phi = phi0
    for t1, t2, ma in legs:
        right = lambda s, y: -MV * rate(t1 + (t2 - t1) * s) * a0 * y / phi0 * ma * MA
        phi = solve_ivp(right, (0, 1), [phi], "DOP853", rtol=1e-11, atol=1e-14).y[0][-1]
    return phi


def burial(points, d, q, c, igv0, stable, beta, onset, over=None):
    """Compaction by the greatest stress and cement in what it leaves, by volume of grains."""
    points = np.array(points, float)
    over = np.zeros(len(points)) if over is None else np.array(over, float)
    per_km = (2300 - 1030) * 9.80665e-3
    vc, top = 0.0, 0.0
    for i in range(len(points) - 1):
        (a1, z1, t1), (a2, z2, t2) = points[i], points[i + 1]
        s1, s2 = per_km * z1 / 1000 - over[i], per_km * z2 / 1000 - over[i + 1]
        t = lambda s: t1 + (t2 - t1) * s
        most = lambda s: max(top, s1, s1 + (s2 - s1) * s)

        def between(s):
            igv = stable + (igv0 - stable) * np.exp(-beta * most(s))
            return igv / (1 - igv)

        def right(s, y):
            vi = max(between(s), y[0])
            r = rate(t(s)) if t(s) >= onset else 0.0
            return [MV * r * 6 * q * (1 - c) / d * (vi - y[0]) / vi * (a1 - a2) * MA]

        cuts = [0.0, 1.0]
        if (t1 - onset) * (t2 - onset) < 0:
            cuts.insert(1, (onset - t1) / (t2 - t1))
        for lo, hi in zip(cuts, cuts[1:]):
            vc = solve_ivp(right, (lo, hi), [vc], "DOP853", rtol=1e-11, atol=1e-14, max_step=0.01).y[0][-1]
        top = max(top, s1, s2)
    igv = stable + (igv0 - stable) * np.exp(-beta * top)
    vi = max(igv / (1 - igv), vc)
    return (vi - vc) / (1 + vi), vc / (1 + vi)


print("name,value")
print("# SciPy", scipy.__version__)
print("isothermal,%.10g" % cement(0.26, [(100, 100, 10)], 0.65, 0.03, 0))
print("heating,%.10g" % cement(0.26, [(80, 140, 60)], 0.65, 0.03, 0))
print("coated,%.10g" % cement(0.26, [(80, 140, 60)], 0.65, 0.03, 0.9))
print("held,%.10g" % cement(0.26, [(80, 120, 40), (120, 120, 20)], 0.65, 0.03, 0))
steady = [(100, 0, 10), (60, 2000, 70), (20, 4000, 140), (0, 4000, 140)]
uplift = [(100, 0, 10), (30, 4500, 150), (0, 2500, 90)]
for name, points, c, over in [
    ("steady", steady, 0.3, None),
    ("uplift", uplift, 0.6, None),
    ("overpressured", steady, 0.9, [0, 10, 25, 25]),
]:
    phi, vc = burial(points, 0.03, 0.8, c, 0.40, 0.28, 0.06, 70, over)
    print("%s porosity,%.10g" % (name, phi))
    print("%s cement,%.10g" % (name, vc))
