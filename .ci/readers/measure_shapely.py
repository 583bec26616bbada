#!/usr/bin/env python3
"""Times the measurements that `etchloom check DIR` makes on a set's copper and holes, made with shapely.

usage: measure_shapely.py DIR
Reads the set's Gerber copper, mask and profile and its XNC holes (only what our own files use: round
pens, lines, arcs), unites each layer's copper with arcs cut to the same chord error of 1 um, and finds
by opening and closing whether a track or a gap is narrower than 0.127 mm, and then, by halving
between 0.05 and 0.5 mm until 1 um is left, how narrow the narrowest is; then the smallest ring, the
smallest gap of holes to each other and to foreign copper, of copper to the edge, and of mask openings
to each other. For a comparison of time, not a check. Needs shapely 2.
"""
import glob
import math
import re
import sys
import time

import shapely
from shapely import LineString, Point
from shapely.strtree import STRtree

CHORD = 1e-3
WORD = re.compile(r"([XYIJ])([+-]?\d+)")


def arc(a, b, c, clockwise):
    r = math.hypot(a[0] - c[0], a[1] - c[1])
    t0 = math.atan2(a[1] - c[1], a[0] - c[0])
    t1 = math.atan2(b[1] - c[1], b[0] - c[0])
    if clockwise and t1 >= t0:
        t1 -= 2 * math.pi
    if not clockwise and t1 <= t0:
        t1 += 2 * math.pi
    n = max(1, math.ceil(abs(t1 - t0) / (2 * math.acos(max(0.0, 1 - CHORD / r)))))
    return [(c[0] + r * math.cos(t0 + (t1 - t0) * i / n), c[1] + r * math.sin(t0 + (t1 - t0) * i / n))
            for i in range(1, n)] + [b]


def gerber(path):
    """(diameter, points) of every draw and flash."""
    pens, out, pen, at, mode, run = {}, [], 0.0, (0.0, 0.0), 1, None
    for line in open(path, encoding="ascii"):
        line = line.strip()
        if line.startswith("%ADD"):
            m = re.match(r"%ADD(\d+)C,([\d.]+)", line)
            pens[m.group(1)] = float(m.group(2))
        elif line.startswith("%") or line.startswith("G04"):
            continue
        elif line[:3] in ("G01", "G02", "G03"):
            mode = int(line[2])
            line = line[3:]
        if re.fullmatch(r"D[1-9]\d+\*", line):
            pen = pens[line[1:-1]]
            run = None
        elif line.startswith(("X", "Y")):
            v = {k: int(n) * 1e-6 for k, n in WORD.findall(line)}
            to = (v.get("X", at[0]), v.get("Y", at[1]))
            if line.endswith("D02*"):
                run = None
            elif line.endswith("D03*"):
                out.append((pen, [to]))
            else:
                if run is None:
                    run = [at]
                    out.append((pen, run))
                if mode == 1:
                    run.append(to)
                else:
                    c = (at[0] + v.get("I", 0.0), at[1] + v.get("J", 0.0))
                    run.extend(arc(at, to, c, mode == 2))
            at = to
    return out


def quarter(r):
    return max(2, math.ceil(math.pi / 2 / (2 * math.acos(max(0.0, 1 - CHORD / r)))))


def drawn(pen, points):
    g = Point(points[0]) if len(points) == 1 else LineString(points)
    return g.buffer(pen / 2, quad_segs=quarter(pen / 2)) if pen else g


def holes(path):
    sizes, out, size = {}, [], 0.0
    for line in open(path, encoding="ascii"):
        line = line.strip()
        m = re.match(r"T(\d+)C([\d.]+)", line)
        if m:
            sizes[int(m.group(1))] = float(m.group(2))
        elif re.fullmatch(r"T\d+", line):
            size = sizes.get(int(line[1:]), 0.0)
        else:
            m = re.match(r"X([+-]?[\d.]+)Y([+-]?[\d.]+)", line)
            if m:
                out.append((float(m.group(1)), float(m.group(2)), size))
    return out


def nearest(shapes):
    tree = STRtree(shapes)
    _, d = tree.query_nearest(shapes, return_distance=True, exclusive=True, all_matches=False)
    return d.min() if len(d) else math.inf


def opened(copper, width):
    """Area narrower than a width; what rounding of the buffers leaves at corners is left out."""
    w = width / 2
    rest = copper.difference(copper.buffer(-w, quad_segs=8).buffer(1.02 * w, quad_segs=8))
    return sum(g.area for g in getattr(rest, "geoms", [rest]) if g.area > 0.02 * width * width)


def closed(copper, width):
    w = width / 2
    rest = copper.buffer(w, quad_segs=8).buffer(-1.02 * w, quad_segs=8).difference(copper)
    return sum(g.area for g in getattr(rest, "geoms", [rest]) if g.area > 0.5 * width * width)


def narrowest(copper, area):
    low, high = 0.05, 0.5
    while high - low > 1e-3:
        middle = (low + high) / 2
        low, high = (low, middle) if area(copper, middle) > 0 else (middle, high)
    return (low + high) / 2


start = time.process_time()
layers = [gerber(p) for p in sorted(glob.glob(sys.argv[1] + "/*-copper-L*.gbr"))]
edge = [drawn(0, p) for _, p in gerber(glob.glob(sys.argv[1] + "/*-profile.gbr")[0])]
masks = [gerber(p) for p in glob.glob(sys.argv[1] + "/*-mask-*.gbr")]
drill = [h for p in glob.glob(sys.argv[1] + "/*.xnc") for h in holes(p)]
read = time.process_time()
profile = shapely.union_all(edge)
discs = [Point(x, y).buffer(d / 2, quad_segs=quarter(d / 2)) for x, y, d in drill]
print(f"holes      {nearest(discs):.4f} mm")
asked = halved = 0.0
for number, objects in enumerate(layers, 1):
    copper = shapely.union_all([drawn(w, p) for w, p in objects])
    parts = list(getattr(copper, "geoms", [copper]))
    before = time.process_time()
    thin, close = opened(copper, 0.127), closed(copper, 0.127)
    asked += time.process_time() - before
    before = time.process_time()
    width, gap = narrowest(copper, opened), narrowest(copper, closed)
    halved += time.process_time() - before
    tree = STRtree(parts)
    ring, foreign = math.inf, math.inf
    for (x, y, d), disc in zip(drill, discs):
        for k in tree.query(disc.buffer(1)):
            if parts[k].contains(Point(x, y)):
                ring = min(ring, parts[k].boundary.distance(Point(x, y)) - d / 2)
            else:
                foreign = min(foreign, parts[k].distance(disc))
    print(f"L{number} {copper.area:10.3f} mm2, thin {thin:.4f}, close {close:.4f} mm2, "
          f"width {width:.3f}, gap {gap:.3f}, "
          f"ring {ring:.4f}, foreign {foreign:.4f}, edge {copper.distance(profile):.4f} mm, "
          f"islands {len(parts)}, holes {sum(len(p.interiors) for p in parts)}")
for objects in masks:
    print(f"mask web   {nearest([drawn(w, p) for w, p in objects]):.4f} mm")
done = time.process_time()
print(f"{read - start:.2f} s to read; to measure {done - read - halved:.2f} s asking only whether, "
      f"{done - read - asked:.2f} s asking how much")
