#===- openqasm_timing.py - Timing as OpenQASM 3 has it -------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
#===----------------------------------------------------------------------===#
"""Source: the OpenQASM 3 specification, the chapters on delays, barriers, boxes
and stretches, from memory; where it is silent (all clocks begin at zero, an
operation starts as soon as it can), the reading is ours.

  openqasm_timing.py programs scheduled remarks

A program states what must come out in comments: `expect: x@0 cx@10` lists the
operations that are no idles with their starts in dt, `waits: 1@0+40` the sites
that wait, when and how long (`none` for no wait)."""

import re
import sys

import reader


def expectations(path):
    found, name = {}, None
    with open(path, encoding="utf-8") as file:
        for line in file:
            if start := re.match(r"func\.func @(\w+)", line):
                name = start[1]
                found[name] = {}
            if told := re.match(r"\s*// (expect|waits): (.*)", line):
                found[name][told[1]] = told[2].split()
    return found


def main():
    source, output, said = sys.argv[1:]
    functions = reader.read_file(output)
    remarks = reader.read_remarks(said)
    check = reader.Checker()
    for name, expected in expectations(source).items():
        function = functions[name]
        starts = [f"{op.name}@{op.start}" for op in function.ops
                  if op.kind != "idle"]
        check.equal(starts, expected["expect"], f"@{name}: the starts")
        written = sorted(f"{op.sites[0]}@{op.start}+{op.duration}"
                         for op in function.ops if op.kind == "idle")
        waits = [] if expected["waits"] == ["none"] else expected["waits"]
        check.equal(written, waits, f"@{name}: the idles")
        told = sorted(f"{r['Site']}@{r['Start']}+{r['Length']}"
                      for kind, r in remarks[name] if kind == "Wait")
        check.equal(told, waits, f"@{name}: the waits of the remarks")
        check.equal(function.holes(), [], f"@{name}: the holes")
    check.finish(least=40)


if __name__ == "__main__":
    main()
