#!/usr/bin/python3
"""Numeric and netlist checks no viewer makes, over the subset of Gerber that we write.

usage: check_gerber.py FILE.gbr...
Fails on: wrong MD5, arc radii further apart than 3 nm, arc chord under 2 um that is not an exact
full circle, region contour not closed or with a zero-length segment, aperture number above 9999,
coordinate beyond the format, command outside the subset, copper of one net in several pieces on a
one-layer net check (reported only), copper of two nets touching.
"""
import hashlib
import math
import re
import sys

from shapely.geometry import LineString, Point, Polygon
from shapely.ops import unary_union

WORD = re.compile(r"%([^%]*)\*%|([^*%]+)\*")
OP = re.compile(r"^(?:X([+-]?\d+))?(?:Y([+-]?\d+))?(?:I([+-]?\d+)J([+-]?\d+))?D0([123])$")
RADIUS_NM, CHORD_NM, SAGITTA_NM = 3.0, 2000, 500.0


class Bad(Exception):
    pass


def arc_points(x0, y0, x1, y1, i, j, ccw):
    cx, cy = x0 + i, y0 + j
    r0, r1 = math.hypot(i, j), math.hypot(x1 - cx, y1 - cy)
    if abs(r0 - r1) > RADIUS_NM:
        raise Bad(f"arc to {x1},{y1}: radii {r0:.1f} and {r1:.1f} nm")
    chord = math.hypot(x1 - x0, y1 - y0)
    if 0 < chord < CHORD_NM:
        raise Bad(f"arc to {x1},{y1}: chord of {chord:.0f} nm")
    a0, a1 = math.atan2(y0 - cy, x0 - cx), math.atan2(y1 - cy, x1 - cx)
    sweep = (a1 - a0) % (2 * math.pi) if ccw else -((a0 - a1) % (2 * math.pi))
    if chord == 0:
        sweep = 2 * math.pi if ccw else -2 * math.pi
    step = 2 * math.acos(1 - min(1.0, SAGITTA_NM / r0))
    n = max(2, int(abs(sweep) / step) + 1)
    return [(cx + r0 * math.cos(a0 + sweep * k / n), cy + r0 * math.sin(a0 + sweep * k / n))
            for k in range(1, n)] + [(x1, y1)]


def shape(tmpl, x, y):
    kind, _, par = tmpl.partition(",")
    v = [float(p) * 1e6 for p in par.split("X")] if par else []
    if kind == "C":
        return Point(x, y).buffer(v[0] / 2, 64)
    if kind == "R":
        w, h = v[0] / 2, v[1] / 2
        return Polygon([(x - w, y - h), (x + w, y - h), (x + w, y + h), (x - w, y + h)])
    if kind == "O":
        w, h = v[0] / 2, v[1] / 2
        r = min(w, h)
        return LineString([(x - w + r, y - h + r), (x + w - r, y + h - r)]).buffer(r, 64)
    raise Bad(f"aperture {tmpl}: outside the checked subset")


def check(path):
    raw = open(path, encoding="utf-8", newline="").read()
    m = re.search(r"%TF\.MD5,([0-9a-fA-F]{32})\*%\s*M02\*\s*$", raw)
    if m:
        want = hashlib.md5(raw[:m.start()].replace("\r", "").replace("\n", "").encode()).hexdigest()
        if want != m.group(1).lower():
            raise Bad("MD5 does not match")
    apert, cur, mode, x, y = {}, None, None, None, None
    multi = region = False
    contour, limit, attrs, objs, tf = None, None, {}, [], {}

    def close_contour():
        if contour is None:
            return
        if contour[0] != contour[-1]:
            raise Bad(f"contour from {contour[0]} ends at {contour[-1]}")
        p = Polygon(contour)
        if not p.is_valid:
            raise Bad(f"contour from {contour[0]} is not simple")
        objs.append((attrs.get(".N"), p))

    for ext, word in WORD.findall(raw):
        if ext:
            if region:
                raise Bad(f"%{ext}*% inside a region")
            if ext.startswith("FSLA"):
                limit = 10 ** (int(ext[5]) + int(ext[6]))
                if ext[6] != "6":
                    raise Bad("coordinate format is not x.6")
            elif ext.startswith("AD"):
                d = re.match(r"ADD(\d+)(.*)$", ext)
                if not 10 <= int(d[1]) <= 9999:
                    raise Bad(f"aperture number {d[1]}")
                if d[1] in apert:
                    raise Bad(f"aperture {d[1]} is defined twice")
                apert[d[1]] = d[2]
            elif ext.startswith("TF"):
                name, *val = ext[2:].split(",")
                if name in tf:
                    raise Bad(f"file attribute {name} is set twice")
                tf[name] = val
            elif ext.startswith("TO"):
                name, *val = ext[2:].split(",")
                attrs[name] = ",".join(val)
            elif ext.startswith("TD"):
                attrs = {} if ext == "TD" else {k: v for k, v in attrs.items() if k != ext[2:]}
            elif not (ext.startswith("TA") or ext in ("MOMM", "LPD")):
                raise Bad(f"%{ext}*% is outside the subset")
            continue
        word = word.strip()
        if word.startswith("G04") or word == "M02":
            continue
        if word in ("G01", "G02", "G03"):
            mode = word
        elif word == "G75":
            multi = True
        elif word == "G36":
            region, contour = True, None
        elif word == "G37":
            close_contour()
            region, contour = False, None
        elif re.match(r"D\d{2,}$", word):
            cur = word[1:].lstrip("0")
            if cur not in apert:
                raise Bad(f"aperture {cur} is not defined")
        elif (o := OP.match(word)):
            nx = x if o[1] is None else int(o[1])
            ny = y if o[2] is None else int(o[2])
            if nx is None or ny is None or max(abs(nx), abs(ny)) >= limit:
                raise Bad(f"{word}: coordinate missing or beyond the format")
            if o[5] == "2":
                if region:
                    close_contour()
                    contour = [(nx, ny)]
            elif o[5] == "3":
                if region:
                    raise Bad("flash inside a region")
                objs.append((attrs.get(".N"), shape(apert[cur], nx, ny)))
            else:
                if mode is None:
                    raise Bad("D01 before G01/G02/G03")
                if mode == "G01":
                    pts = [(nx, ny)]
                    if (nx, ny) == (x, y):
                        raise Bad(f"zero-length draw at {x},{y}")
                else:
                    if not multi:
                        raise Bad("arc before G75")
                    if o[3] is None:
                        raise Bad(f"{word}: arc without I and J")
                    pts = arc_points(x, y, nx, ny, int(o[3]), int(o[4]), mode == "G03")
                if region:
                    contour += pts
                else:
                    kind, _, dia = apert[cur].partition(",")
                    if kind != "C" or "X" in dia:
                        raise Bad(f"D01 with aperture {apert[cur]}")
                    objs.append((attrs.get(".N"), LineString([(x, y)] + pts).buffer(float(dia) * 5e5, 32)))
            x, y = nx, ny
        else:
            raise Bad(f"{word} is outside the subset")
    if not raw.rstrip().endswith("M02*"):
        raise Bad("no M02 at the end")
    nets = {}
    for net, s in objs:
        nets.setdefault(net, []).append(s)
    merged = {n: unary_union(v) for n, v in nets.items()}
    out = []
    if tf.get(".FileFunction", [""])[0] == "Copper":
        names = sorted(merged, key=str)
        for i, a in enumerate(names):
            for b in names[i + 1:]:
                gap = merged[a].distance(merged[b]) / 1e6
                if gap <= 0:
                    raise Bad(f"nets {a!r} and {b!r} touch")
                out.append(f"{a or '(none)'}/{b or '(none)'} gap {gap:.4f}")
    for n, s in merged.items():
        parts = len(getattr(s, "geoms", [s]))
        out.append(f"{n or '(none)'}: {s.area / 1e12:.4f} mm2 in {parts} piece(s)")
    print(f"{path}: " + "; ".join(out))


bad = 0
for p in sys.argv[1:]:
    try:
        check(p)
    except Bad as e:
        print(f"{p}: {e}")
        bad = 1
sys.exit(bad)
