# ===- timeline.py - One program in several dialects -----------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
# ===------------------------------------------------------------------------===#
"""Compares the timelines of one program written in several dialects.

timeline.py FILE...: each file holds one function in lull, mill or weave, with
every duration in dt. Prints the timeline of the first, and fails if another
one differs. Reads the text by itself and shares nothing with the passes: an
operation starts when the last of its qubits is free.
"""

import itertools
import math
import re
import sys

KINDS = {
    "mill.cnot": "cx",
    "mill.read": "measure",
    "mill.prep": "reset",
    "mill.sync": "barrier",
    "mill.wait": "delay",
    "mill.slack": "idle",
    "weave.look": "measure",
    "weave.fresh": "reset",
    "weave.knot": "barrier",
}


def read(path):
    """Site -> list of (name, angle or None, start, duration)."""
    sites, angles, clock, lines = {}, {}, {}, {}
    inside = False
    for line in open(path):
        inside = inside or "func.func" in line
        if not inside:
            continue
        made = re.match(r"\s*(%[\w#:, %]+?)\s*=\s*", line)
        results = expand(made.group(1)) if made else []
        text = line[made.end():] if made else line.strip()
        op = re.match(r"[\w.]+", text)
        op = op.group(0) if op else ""
        text = text.split(" : ")[0] if op.startswith("weave") else text
        values = re.findall(r"%\w+(?:#\d+)?", text)
        if source := re.match(r"(?:lull\.qubit|mill\.qubit|weave\.spin) (\d+)", text):
            sites[results[0]] = int(source.group(1))
            continue
        if constant := re.match(r"arith\.constant (\S+)", text):
            angles[results[0]] = float(constant.group(1))
            continue
        if op.split(".")[0] not in ("lull", "mill", "weave"):
            continue
        qubits = [sites[v] for v in values if v in sites]
        if op == "mill.cnot":
            qubits.reverse()
        name, angle = name_of(op, text), None
        if name == "rz":
            given = re.search(r"rz\((?!%)(\S+?)( pi)?\)", text)
            angle = number(given.group(1)) if given else angles[values[0]]
            angle = round(angle * (math.pi if given and given.group(2) else 1), 12)
        lasts = re.search(r"(?:takes |for |lasts <)(-?\d+)", text)
        duration = int(lasts.group(1)) if lasts else 0
        start = max(clock.get(q, 0) for q in qubits)
        for index, qubit in enumerate(qubits):
            ordered = len(qubits) > 1 and name != "barrier"
            role = f"{name}.{index}" if ordered else name
            clock[qubit] = start + duration
            lines.setdefault(qubit, []).append((role, angle, start, duration))
        carriers = results[1:] if op == "weave.look" else results
        if op.startswith("weave") or " -> " in line:
            for carrier, qubit in zip(carriers, qubits):
                sites[carrier] = qubit
    return lines


def expand(names):
    """The values of `%a, %b` or `%3:2`."""
    out = []
    for name in names.split(","):
        base, _, count = name.strip().partition(":")
        out += [f"{base}#{i}" for i in range(int(count))] if count else [base]
    return out


def number(text):
    above, _, below = text.partition("/")
    return float(above) / float(below or 1)


def name_of(op, text):
    if op == "lull.gate":
        return re.match(r"lull\.gate (\w+)", text).group(1)
    if op == "weave.apply":
        return re.match(r'weave\.apply "(\w+)"', text).group(1)
    return KINDS.get(op, op.split(".")[1])


def main(paths):
    first = read(paths[0])
    if not first:
        sys.exit(f"{paths[0]} holds no timed operation")
    for site in sorted(first):
        ops = [op for op in first[site] if op[0] != "rz"]
        words = [f"{op[0].split('.')[0]}@{op[2]}+{op[3]}" for op in ops]
        print(f"site {site}:", *words)
    for path in paths[1:]:
        other = read(path)
        for site in sorted(set(first) | set(other)):
            mine, its = first.get(site, []), other.get(site, [])
            for at, (one, two) in enumerate(itertools.zip_longest(mine, its)):
                if one != two:
                    print(f"{paths[0]} and {path} differ on site {site}")
                    print(f"at operation {at}: {one} and {two}")
                    sys.exit(1)
    print(f"{len(paths)} programs agree")


main(sys.argv[1:])
