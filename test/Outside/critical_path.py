#===- critical_path.py - Longest paths of random programs ----------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
#===----------------------------------------------------------------------===#
"""Source: the critical path method (Kelley and Walker 1959, from memory): the
earliest start of a task is the length of the longest path to it, its latest one
the project's length minus the longest path from it, and the tasks without slack
are critical. NetworkX finds the paths.

  critical_path.py make > programs
  critical_path.py check programs asap asap-remarks alap alap-remarks"""

import random
import re
import sys

import networkx as nx

import reader

PROGRAMS = 300
SITES = 6


def make():
    chance = random.Random(20)
    print("lull.device @net clock 1 ns {")
    for site in range(SITES):
        print(f"  lull.site {site}")
    for second in range(SITES):
        for first in range(second):
            print(f"  lull.coupler {first}, {second}")
    print("}")
    for number in range(PROGRAMS):
        print(f"func.func @p{number}() attributes {{lull.device = @net}} {{")
        sites = chance.sample(range(SITES), chance.randint(2, SITES))
        for site in sites:
            print(f"  %q{site} = lull.qubit {site}")
        for _ in range(chance.randint(1, 40)):
            print("  " + make_op(chance, sites))
        print("  return\n}")


def make_op(chance, sites):
    def handles(count):
        chosen = chance.sample(sites, min(count, len(sites)))
        return ", ".join(f"%q{site}" for site in chosen)

    # Few different lengths, so that many paths are of one length.
    length = chance.choice([0, 1, 2, 3, 5, 8, 40])
    kind = chance.randrange(8)
    if kind == 0:
        return f"lull.barrier {handles(chance.randint(1, SITES))}"
    if kind == 1:
        return f"lull.delay {handles(chance.randint(1, 3))} for {length} dt"
    if kind == 2:
        return f"lull.idle {handles(1)} for {length} dt live"
    if kind < 5:
        return f"lull.gate h {handles(1)} for {length} dt"
    return f"lull.gate cx {handles(2)} for {length} dt"


def dependencies(ops):
    """Operations with an edge to the next one on each qubit; the length of an
    edge is the duration of the operation that it leaves."""
    graph = nx.DiGraph()
    graph.add_node("end")
    last = {}
    for number, op in enumerate(ops):
        graph.add_edge("start", number, weight=0)
        graph.add_edge(number, "end", weight=int(op.duration))
        for site in op.sites:
            if site in last:
                graph.add_edge(last[site], number,
                               weight=int(ops[last[site]].duration))
            last[site] = number
    return graph


def longest_from(graph, source):
    """Longest paths by shortest paths with the signs turned."""
    turned = nx.DiGraph()
    turned.add_weighted_edges_from(
        (u, v, -w) for u, v, w in graph.edges(data="weight"))
    lengths = nx.single_source_bellman_ford_path_length(turned, source)
    return {node: -length for node, length in lengths.items()}


def critical(graph, ops, earliest, total):
    """How many operations the longest chains have, at least and at most, and
    how many the chain of the smallest numbers has."""
    tight = nx.DiGraph()
    for u, v, weight in graph.edges(data="weight"):
        if u != "start" and v != "end" and earliest[u] + weight == earliest[v]:
            tight.add_edge(u, v, weight=1)
    for number, op in enumerate(ops):
        if earliest[number] == 0:
            tight.add_edge("start", number, weight=1)
        if earliest[number] + op.duration == total:
            tight.add_edge(number, "end", weight=0)
    at_most = longest_from(tight, "start")["end"]
    at_least = nx.shortest_path_length(tight, "start", "end", weight="weight")
    chain, node = 0, min(n for n in tight.predecessors("end"))
    while node is not None:
        chain += 1
        node = min((n for n in tight.predecessors(node) if n != "start"),
                   default=None)
    return at_least, at_most, chain


def check_waits(check, name, scheduled, remarks, given):
    """The idles that were written are those that the remarks tell of."""
    # All idles but those that the program had.
    written = sorted((op.sites[0], op.start, op.duration)
                     for op in scheduled.ops if op.kind == "idle")
    for op in given:
        written.remove(op)
    said = sorted((int(r["Site"]), int(r["Start"]), int(r["Length"]))
                  for kind, r in remarks if kind == "Wait")
    check.equal(said, written, f"@{name}: the waits of the remarks")
    check.true(all(length > 0 for _, _, length in written),
               f"@{name}: every idle is longer than nothing")


def check_one(check, name, program, outputs):
    graph = dependencies(program.ops)
    earliest = longest_from(graph, "start")
    left = longest_from(graph.reverse(), "end")
    total = nx.dag_longest_path_length(graph, weight="weight")
    latest = {n: total - left[n] for n in range(len(program.ops))}
    check.equal(program.end, total, f"@{name}: the makespan of the reader")
    for policy, (scheduled, remarks) in outputs.items():
        starts = earliest if policy == "asap" else latest
        # The output's idles are looked at by themselves.
        ops = [op for op in scheduled.ops if op.kind != "idle"]
        expected = [n for n, op in enumerate(program.ops) if op.kind != "idle"]
        check.equal([(op.kind, op.sites, op.duration, op.start) for op in ops],
                    [(program.ops[n].kind, program.ops[n].sites,
                      program.ops[n].duration, starts[n]) for n in expected],
                    f"@{name}, {policy}: the operations")
        check.equal(scheduled.end, total, f"@{name}, {policy}: the makespan")
        check.equal(scheduled.holes(), [], f"@{name}, {policy}: the holes")
        given = [(op.sites[0], starts[n], op.duration)
                 for n, op in enumerate(program.ops) if op.kind == "idle"]
        check_waits(check, name, scheduled, remarks, given)
        text = [r for kind, r in remarks if kind == "Length"][0]
        check.equal(int(text["Length"]), total, f"@{name}: the remark's length")
        k, n = map(int, re.search(r"path has (\d+) of (\d+) operations",
                                  text["Remark"]).groups())
        at_least, at_most, chain = critical(graph, program.ops, earliest, total)
        check.equal(n, len(program.ops), f"@{name}: the number of operations")
        check.true(at_least <= k <= at_most,
                   f"@{name}: {k} is from {at_least} to {at_most}")
        check.equal(k, chain, f"@{name}: the chain of the smallest numbers")
    slack = [latest[n] - earliest[n] for n in range(len(program.ops))]
    check.true(min(slack) == 0, f"@{name}: the least slack is zero")
    return sum(s > 0 for s in slack)


def main():
    if sys.argv[1] == "make":
        return make()
    source, asap, asap_remarks, alap, alap_remarks = sys.argv[2:]
    programs = reader.read_file(source)
    results = {}
    for policy, output, remarks in (("asap", asap, asap_remarks),
                                    ("alap", alap, alap_remarks)):
        results[policy] = (reader.read_file(output),
                           reader.read_remarks(remarks))
    check = reader.Checker()
    movable = 0
    for name, program in programs.items():
        movable += check_one(
            check, name, program,
            {p: (functions[name], remarks[name])
             for p, (functions, remarks) in results.items()})
    check.true(movable > 1000, f"{movable} operations with slack are enough")
    return check.finish(least=10 * PROGRAMS)


if __name__ == "__main__":
    main()
