#!/usr/bin/python3
"""Holds the files of one set against each other.

usage: check_set.py DIR [RASTER]
RASTER: a text file with lines `L1 1234.5`, the copper's area in mm² as drawn by a viewer.
Fails where: a sum of the manifest differs or a file is not listed; XNC and Gerber drill files hold
different holes; the outlines of the DXF enclose another area than the report says (0.02 %); the
viewer's area differs from it by more than 1.5 %; the fab's archive lacks a file its job names.
"""
import hashlib
import json
import math
import os
import re
import sys
import zipfile

import ezdxf

LISTED_ALONE = (".ipc", "-notes.txt", ".gbrjob")
bad = []


def area(points):
    """Signed area of a closed polyline with bulges: chords, and the sliver on each arc."""
    total = 0.0
    for (x0, y0, b), (x1, y1, _) in zip(points, points[1:] + points[:1]):
        total += (x0 * y1 - y0 * x1) / 2
        if b:
            sweep = 4 * math.atan(b)
            r = math.hypot(x1 - x0, y1 - y0) / (2 * math.sin(abs(sweep) / 2))
            total += r * r / 2 * (sweep - math.sin(sweep))
    return total


def gerber_holes(path):
    text = open(path, encoding="ascii").read()
    size = dict(re.findall(r"%ADD(\d+)C,([0-9.]+)\*%", text))
    cur, out = None, []
    for word in re.findall(r"([^*%\n]+)\*", text):
        if re.fullmatch(r"D\d+", word):
            cur = float(size[word[1:]])
        elif m := re.fullmatch(r"X(-?\d+)Y(-?\d+)D03", word):
            out.append((cur, int(m[1]), int(m[2])))
    return sorted(out)


def xnc_holes(path):
    size, cur, out = {}, None, []
    for line in open(path, encoding="ascii").read().splitlines():
        if m := re.fullmatch(r"T(\d+)C([0-9.]+)", line):
            size[m[1]] = float(m[2])
        elif m := re.fullmatch(r"T(\d+)", line):
            cur = size[m[1]]
        elif m := re.fullmatch(r"X([-+]?[0-9.]+)Y([-+]?[0-9.]+)", line):
            out.append((cur, round(float(m[1]) * 1e6), round(float(m[2]) * 1e6)))
    return sorted(out)


folder = sys.argv[1]
names = sorted(os.listdir(folder))
manifest = json.load(open(os.path.join(folder, "manifest.json"), encoding="utf-8"))["files"]
if sorted(manifest) + ["manifest.json"] != sorted(names, key=lambda n: (n == "manifest.json", n)):
    bad.append("the manifest lists other files than are there")
for name, want in manifest.items():
    if hashlib.sha256(open(os.path.join(folder, name), "rb").read()).hexdigest() != want:
        bad.append(f"{name}: the manifest has another sum")

for name in names:
    path = os.path.join(folder, name)
    if name.endswith(".xnc"):
        gerber = gerber_holes(path[:-4] + ".gbr")
        if not gerber or gerber != xnc_holes(path):
            bad.append(f"{name}: other holes than in the Gerber file")
    if name.endswith("-fab.zip"):
        with zipfile.ZipFile(path) as z:
            inside = z.namelist()
            job = next(n for n in inside if n.endswith(".gbrjob"))
            listed = [f["Path"] for f in json.loads(z.read(job))["FilesAttributes"]]
        rest = [n for n in inside if n not in listed and not n.endswith(LISTED_ALONE)]
        missing = [n for n in listed if n not in inside]
        if rest or missing:
            bad.append(f"{name}: not in its job {rest}, not in the archive {missing}")

report = json.load(open(os.path.join(folder, "report.json"), encoding="utf-8"))
said = {f"L{c['layer']}" if isinstance(c["layer"], int) else c["layer"]: c["areaMm2"]
        for c in report["geometry"]["copperLayers"]}
outlines = next(n for n in names if n.endswith("-outlines.dxf"))
dxf = {}
for e in ezdxf.readfile(os.path.join(folder, outlines)).modelspace().query("LWPOLYLINE"):
    if e.dxf.layer.startswith("COPPER_"):
        layer = e.dxf.layer[7:]
        dxf[layer] = dxf.get(layer, 0.0) + area([tuple(p) for p in e.get_points("xyb")])
raster = {}
if len(sys.argv) > 2:
    raster = {k: float(v) for k, v in (line.split() for line in open(sys.argv[2]))}
    if sorted(raster) != sorted(said):
        bad.append(f"the viewer drew {sorted(raster)}, the report has {sorted(said)}")
for layer, want in sorted(said.items()):
    got = dxf.get(layer, 0.0)
    line = f"{layer}: report {want:.3f} mm2, DXF outlines {100 * (got / want - 1):+.4f} %"
    if abs(got / want - 1) > 2e-4:
        bad.append(line)
    if layer in raster:
        line += f", viewer {100 * (raster[layer] / want - 1):+.3f} %"
        if abs(raster[layer] / want - 1) > 0.015:
            bad.append(line)
    print(f"{folder}: {line}")

for b in bad:
    print(f"{folder}: BAD: {b}")
sys.exit(1 if bad else 0)
