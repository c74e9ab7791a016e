#===- sequences.py - Sequences as they are emitted -----------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
#===----------------------------------------------------------------------===#
"""Source: the papers named in published.py. In a long window on a fine grid the
pulses must be where the papers have them, to a few ticks.

  sequences.py make > program
  sequences.py check program"""

import sys

import published
import reader

LENGTH = 1 << 20
WIDTH = 10
# Pulses at one instant are played one after the other.
NEAR = 2 * WIDTH + 3
# One interval of an odd number of equal ones is left.
UNBALANCED = ("pdd-2", "pdd-4", "pdd-6")


def make():
    print("lull.device @fine clock 1 ns {\n  lull.site 0")
    print(f"  lull.operation r for {WIDTH} dt native plays equatorial\n}}")
    for name in published.sequences():
        label = name.replace("-", "_")
        print(f"func.func @{label}() attributes {{lull.device = @fine}} {{")
        print("  %q0 = lull.qubit 0")
        print(f'  lull.idle %q0 for {LENGTH} dt live plan "{name}"')
        print("  return\n}")


def group(pulses, expected):
    """Splits what was emitted into the pulses of each instant."""
    groups, rest = [], list(pulses)
    for _, phases in expected:
        groups.append(rest[: len(phases)])
        rest = rest[len(phases):]
    return groups, rest


def imbalance(flips):
    sign, last, integral = 1, 0, 0
    for flip in flips:
        integral += sign * (flip - last)
        sign, last = -sign, flip
    return integral + sign * (LENGTH - last)


def check_one(check, name, function, expected):
    pulses = [op for op in function.ops if op.kind == "pulse"]
    check.equal(function.end, LENGTH, f"{name}: the length")
    check.equal([p.last for p in pulses],
                [False] * (len(pulses) - 1) + [True], f"{name}: the last mark")
    check.true(all(p.duration == WIDTH for p in pulses), f"{name}: the widths")
    # One anchor for the whole sequence: ends if there is a pulse at the end.
    ends = expected[-1][0] == 1.0
    groups, rest = group(pulses, expected)
    check.equal(rest, [], f"{name}: pulses too many")
    for (instant, phases), played in zip(expected, groups):
        what = f"{name}: at {instant:.6f}"
        check.equal(sorted(p.angles[0] for p in played),
                    sorted(phase % 2 for phase in phases), f"{what} the phases")
        for pulse in played:
            where = pulse.end if ends else pulse.start + pulse.duration / 2
            near = 3 if len(phases) == 1 else NEAR
            check.true(abs(where - instant * LENGTH) <= near,
                       f"{what} the place {where / LENGTH} is near")
    if ends:
        check.equal(pulses[-1].end, LENGTH, f"{name}: the end of the last")
    # The time in + minus that in -: zero, a static detuning is refocused, but
    # for sequences that do not. An even number of pulses keeps it even.
    flips = [p.start + p.duration / 2 for p in pulses]
    own = imbalance([x * LENGTH for x, phases in expected for _ in phases])
    check.equal(imbalance(flips), 2 * round(own / 2), f"{name}: the residual")
    check.equal(abs(own) < 1e-6, name not in UNBALANCED,
                f"{name}: balanced by definition")


def check_merged_word(check):
    """CDD-2 on one line, worked out by hand."""
    check.equal(published.cdd_letters(2), "XYXZXYXIXYXZXYXI",
                "the word of cdd-2")
    merged = published.cdd_letters(3)
    check.equal((len(merged), len(merged.replace("I", "")), merged.count("Z")),
                (64, 60, 8), "instants, pulses and Zs of cdd-3")


def main():
    if sys.argv[1] == "make":
        return make()
    functions = reader.read_file(sys.argv[2])
    check = reader.Checker()
    check_merged_word(check)
    for name, expected in published.sequences().items():
        check_one(check, name, functions[name.replace("-", "_")], expected)
    return check.finish(least=1000)


if __name__ == "__main__":
    main()
