# ===- suite.py - The suite in lull-opt and in a stock mlir-opt ------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
# ===------------------------------------------------------------------------===#
"""Runs every input of the suite through lull-opt and through a stock mlir-opt.

suite.py OWN STOCK DIRECTORY... -- PLUGIN_FLAG...: prints what differs and fails
if anything does.
"""

import pathlib
import subprocess
import sys

RUNS = [
    ["--split-input-file"],
    [
        "--split-input-file",
        "--remarks-filter=lull-.*",
        "--pass-pipeline=builtin.module(lull-protect{device=barley})",
    ],
]


def run(command):
    done = subprocess.run(command, capture_output=True)
    # The list of all dialects that a tool has is the tool's own affair.
    errors = [e for e in done.stderr.splitlines() if b"Available" not in e]
    return done.returncode, done.stdout, errors


def main():
    split = sys.argv.index("--")
    own, stock, *directories = sys.argv[1:split]
    flags = sys.argv[split + 1:]
    count = different = pulses = failures = 0
    for directory in directories:
        for path in sorted(pathlib.Path(directory).rglob("*.mlir")):
            for options in RUNS:
                mine = run([own, str(path), *options])
                its = run([stock, *flags, str(path), *options])
                count += 1
                pulses += b"protected by" in b"".join(mine[2])
                failures += mine[0] != 0
                if mine != its:
                    different += 1
                    print("differs:", path.name, *options, mine[0], its[0])
    if different:
        print(f"{different} of {count} runs differ")
    else:
        print(f"all of {count} runs alike")
    print(f"{pulses} of them wrote pulses")
    print(f"{failures} of them failed")
    sys.exit(different != 0)


main()
