"""The Tarn Hill example as a Python user would write it: the peer of the replay bench.

Needs numpy, pandas and matplotlib (Debian: python3-numpy python3-pandas python3-matplotlib).
Usage: tarn_hill.py FOLDER OUT.html
"""
import base64
import glob
import io
import os
import sys

import matplotlib

matplotlib.use("svg")
import matplotlib.pyplot as plt
import numpy as np
import pandas as pd

folder, out = sys.argv[1], sys.argv[2]
figures, kept = [], []


def show(fig):
    text = io.StringIO()
    fig.savefig(text, format="svg")
    plt.close(fig)
    figures.append(text.getvalue())


def keep(name, value):
    kept.append((name, value))


def las(path):
    names, rows, section = [], [], ""
    with open(path) as lines:
        for line in lines:
            if line.startswith("~"):
                section = line[1]
                if section == "A":
                    break
            elif section == "C" and not line.startswith("#"):
                names.append(line.split(".")[0].strip())
        data = np.loadtxt(lines)
    data[data == -999.25] = np.nan
    return pd.DataFrame(data, columns=names)


wells = {os.path.basename(p)[:-4]: las(p) for p in sorted(glob.glob(folder + "/wells/*.las"))}
plugs = pd.read_csv(folder + "/core-plugs.csv", comment="#")
plugs.columns = [c.split(" [")[0] for c in plugs.columns]
tops = pd.read_csv(folder + "/tops.csv", comment="#")
tops.columns = [c.split(" [")[0] for c in tops.columns]

matrix, fluid, clean, shale, bound, stress, cutoff = 2.65, 1.05, 22, 130, 0.12, 24, 0.08

# plugs to reservoir conditions: gas slip (Jones and Owens 1980), then stress (Jones 1988)
pm = plugs.mean_pressure.to_numpy() * 14.5037738
ka = plugs.k_air.to_numpy()
k = ka.copy()
for _ in range(60):
    with np.errstate(divide="ignore", invalid="ignore"):
        k = ka / (1 + 12.639 * k ** -0.33 / pm)
s = stress * 145.037738
k = k * np.exp(0.25 * (np.exp(-s / 3000) - 1)) / (1 + 3e-6 * s)
plugs["k"] = k
phi = plugs.porosity.to_numpy() / 100

good = (k > 0) & ~np.isnan(phi)
fig, ax = plt.subplots()
bins = np.logspace(np.log10(k[good].min()), np.log10(k[good].max()), 24)
for f, g in plugs[good].groupby("facies"):
    ax.hist(g.k, bins=bins, histtype="step", label=f)
ax.set_xscale("log")
ax.legend()
show(fig)

# transforms, leaving one well out
y = np.log10(k[good])
forms = {
    "log-linear": phi[good],
    "power": np.log10(phi[good]),
    "kozeny": np.log10(phi[good] ** 3 / (1 - phi[good]) ** 2),
}
w = plugs.well.to_numpy()[good]
for name, x in forms.items():
    e = []
    for out_well in np.unique(w):
        b, a = np.polyfit(x[w != out_well], y[w != out_well], 1)
        e.extend(y[w == out_well] - a - b * x[w == out_well])
    keep("leave out " + name, np.sqrt(np.mean(np.square(e))))
slope, intercept = np.polyfit(phi[good], y, 1)
resid = y - intercept - slope * phi[good]
scatter = np.sqrt(np.sum(resid**2) / (len(y) - 2))
factor = np.exp((np.log(10) * scatter) ** 2 / 2)
keep("scatter", scatter)
keep("mean over median", factor)

fig, ax = plt.subplots()
for f, g in plugs[good].groupby("facies"):
    ax.plot(g.porosity / 100, g.k, "o", ms=4, alpha=0.5, label=f)
xs = np.linspace(phi[good].min(), phi[good].max(), 60)
mid = intercept + slope * xs
half = 1.2858 * scatter * np.sqrt(
    1 + 1 / len(y) + (xs - phi[good].mean()) ** 2 / np.sum((phi[good] - phi[good].mean()) ** 2)
)
ax.plot(xs, 10**mid)
ax.fill_between(xs, 10 ** (mid - half), 10 ** (mid + half), alpha=0.2)
ax.set_yscale("log")
ax.legend()
show(fig)

# core shift of TH-1
d = wells["TH-1"].DEPT.to_numpy()
p1 = (matrix - wells["TH-1"].RHOB.to_numpy()) / (matrix - fluid)
c = plugs[(plugs.well == "TH-1") & plugs.porosity.notna()]
best = (-2, 0)
for sh in np.arange(-2, 2.0001, 0.05):
    v = np.interp(c.depth + sh, d, p1)
    r = np.corrcoef(v, c.porosity)[0, 1]
    if r > best[0]:
        best = (r, sh)
keep("core shift", best[1])

for well in wells.values():
    igr = np.clip((well.GR - clean) / (shale - clean), 0, 1)
    vsh = 0.33 * (2 ** (2 * igr) - 1)
    well["PHI"] = np.maximum((matrix - well.RHOB) / (matrix - fluid) - vsh * bound, 0)
    well["K"] = factor * 10 ** (intercept + slope * well.PHI)

th3 = wells["TH-3"]
c3 = plugs[plugs.well == "TH-3"]
fig, axes = plt.subplots(1, 3, sharey=True, figsize=(7, 9))
axes[0].plot(th3.GR, th3.DEPT)
axes[1].plot(th3.PHI, th3.DEPT)
axes[1].plot(c3.porosity / 100, c3.depth, "o", ms=3)
axes[2].plot(th3.K, th3.DEPT)
axes[2].plot(c3.k, c3.depth, "o", ms=3)
axes[2].set_xscale("log")
axes[0].invert_yaxis()
show(fig)

rows = []
for name, well in wells.items():
    t = tops[tops.well == name].sort_values("top")
    for (z, top), base in zip(zip(t.zone[:-1], t.top[:-1]), t.top[1:]):
        part = well[(well.DEPT >= top) & (well.DEPT < base) & (well.PHI > cutoff)].dropna(subset=["K"])
        rows.append((z, name, base - top, len(part) * 0.125, part.PHI.mean(), part.K.mean(),
                     len(part) / (1 / part.K).sum() if len(part) else np.nan))
layers = pd.DataFrame(rows, columns=["zone", "well", "gross", "net", "phi", "along", "across"])
sand = layers[layers.zone == "Lower Sand"]
along = np.average(sand.along, weights=sand.net)
keep("porosity", np.average(sand.phi, weights=sand.net))
keep("k along", along)
keep("k across", np.average(sand.across, weights=sand.net))
keep("rate", 2 * np.pi * along * 9.869233e-16 * 18 * 35e5 / (0.9e-3 * np.log(400 / 0.11)) * 86400)

with open(out, "w") as page:
    page.write("<html><body><table>")
    for name, value in kept:
        page.write(f"<tr><td>{name}<td>{value:.6g}")
    page.write("</table>" + layers.to_html())
    for svg in figures:
        page.write(svg[svg.index("<svg"):])
    page.write("</body></html>")
