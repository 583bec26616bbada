#!/usr/bin/python3
"""Column check of an IPC-D-356A file (the subset that we write). usage: check_ipc.py FILE..."""
import re
import sys

HEAD = ["JOB", "CODE", "UNITS", "TITLE", "NUM", "REV", "VER"]
TEST = re.compile(
    r"(?P<op>317|017|327|027|367)(?P<net>[\x21-\x7e ]{14})   (?P<ref>.{6})(?P<dash>[- ])(?P<pin>.{4})"
    r"(?P<mid>[M ])(?P<hole>D\d{4}[PU]| {6})A(?P<acc>\d\d)X(?P<x>[+-]\d{6})Y(?P<y>[+-]\d{6})"
    r"X(?P<w>\d{4})(?:Y(?P<h>\d{4})| {5})R(?P<rot>\d{3}) S(?P<mask>[0-3]) {0,6}$")
CHAIN = re.compile(r"^(?:[ *]?(?:X[+-]?\d{1,6})?(?:Y[+-]?\d{1,6})?)+$")


def check(path):
    bad, alias, used, last, state = [], {}, set(), None, 0
    lines = open(path, newline="", encoding="ascii").read().split("\n")
    if lines and lines[-1] == "":
        lines.pop()
    params = []
    for n, line in enumerate(lines, 1):
        line = line.rstrip("\r")
        if len(line) > 80:
            bad.append(f"{n}: {len(line)} columns")
        op = line[:3]
        if line[:1] == "C":
            if line[1:3].strip():
                bad.append(f"{n}: columns 2-3 of a comment are not blank")
            continue
        if line[:1] == "P":
            name = line[3:].split(" ")[0]
            if name.startswith("NNAME"):
                m = re.fullmatch(r"P  (NNAME\d{1,5}) {1,5}(\S{15,58})", line)
                if not m or line[14:] != m[2]:
                    bad.append(f"{n}: NNAME record is not aligned (alias 4-13, name from 15)")
                else:
                    alias[m[1]] = m[2]
            else:
                params.append(name)
                if len(line) > 9 and (line[9] == " " or line[8] != " "):
                    bad.append(f"{n}: parameter value does not start in column 10")
            continue
        if op == "999":
            last = n
            if n != len(lines):
                bad.append(f"{n}: records after 999")
        elif op in ("317", "017", "327", "027", "367"):
            m = TEST.match(line)
            if not m:
                bad.append(f"{n}: record {op} is out of columns")
                continue
            net = m["net"].rstrip()
            used.add(net)
            if " " in net or not net:
                bad.append(f"{n}: net name {net!r}")
            if m["hole"].strip() and op[1] not in "16":
                bad.append(f"{n}: hole in a {op} record")
            if op in ("317", "017") and not m["hole"].strip():
                bad.append(f"{n}: {op} without a hole")
        elif op in ("378", "389"):
            if op == "378" and not re.match(r"378\S[ -~]{13} L\d\d X\d+(Y\d+)? ", line):
                bad.append(f"{n}: 378 is out of columns")
            if op == "389" and line[3:17].rstrip() not in ("BOARD_EDGE", "PANEL_EDGE", "SCORE_LINE", "OTHER_FAB"):
                bad.append(f"{n}: outline type {line[3:17]!r}")
            if not CHAIN.match(line[22:]):
                bad.append(f"{n}: coordinates of {op}")
        elif op in ("078", "089"):
            if not CHAIN.match(line[3:]):
                bad.append(f"{n}: coordinates of {op}")
        elif op not in ("379", "079"):
            bad.append(f"{n}: operation {op!r}")
    if last is None:
        bad.append("no 999")
    if params[:7] != HEAD or "IMAGE" not in params:
        bad.append(f"header parameters {params}")
    for a in alias:
        if a not in used:
            bad.append(f"alias {a} is not used")
    for b in bad:
        print(f"{path}:{b}")
    print(f"{path}: nets {sorted(used)}")
    return bool(bad)


sys.exit(any([check(p) for p in sys.argv[1:]]))
