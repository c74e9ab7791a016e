# ===- options.py - Pipelines printed and fed back -------------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
# ===------------------------------------------------------------------------===#
"""Prints pipelines and feeds them back: options.py MLIR_OPT FLAG...

Takes the passes and their options from the tool's own help, sets each option to
something other than its default (text with a space in it, where text is
allowed), and fails unless what MLIR prints reads back to the same pipeline.
"""

import re
import subprocess
import sys

TOOL = sys.argv[1:]


def listed():
    """Pass or pipeline -> its options as (name, kind, last choice)."""
    done = subprocess.run([*TOOL, "--help"], capture_output=True, text=True)
    found, current = {}, None
    for line in done.stdout.splitlines():
        if entry := re.match(r" {6}--([\w-]+) ", line):
            name = entry.group(1)
            ours = name.startswith("lull-")
            current = found.setdefault(name, []) if ours else None
        elif current is None:
            continue
        elif option := re.match(r" {8}--([\w-]+)(?:=<(\w+)>)? ", line):
            current.append([option.group(1), option.group(2), None])
        elif choice := re.match(r" +=([\w-]+) ", line):
            current[-1][2] = choice.group(1)
    return found


def dump(pipeline):
    """The pipeline as MLIR prints it, on one line."""
    command = [
        *TOOL,
        f"--pass-pipeline=builtin.module({pipeline})",
        "--dump-pass-pipeline",
    ]
    done = subprocess.run(
        command, input="module {}", capture_output=True, text=True
    )
    printed = re.search(r"^builtin\.module\((.*?)^\)", done.stderr, re.M | re.S)
    if not printed:
        sys.exit(f"{pipeline}: no pipeline printed: {done.stderr}")
    return re.sub(r"\s+", " ", printed.group(1)).strip()


def other_than_default(name, kind, choice, default):
    if kind is None:
        now = re.search(rf"\b{name}=(\w+)", default)
        return "false" if now and now.group(1) == "true" else "true"
    return {"uint": "7", "value": choice}.get(kind, "{500 ns}")


def main():
    passes = listed()
    pipeline = passes.pop("lull-protect")
    for name, options in passes.items():
        default = dump(name)
        values = [f"{o[0]}={other_than_default(*o, default)}" for o in options]
        text = f"{name}{{{' '.join(values)}}}" if values else name
        printed = dump(text)
        for value in values:
            if value not in printed or value in default:
                sys.exit(f"{name}: {value} is lost in {printed} or the default")
        if dump(printed) != printed:
            sys.exit(f"{name}: {printed} reads back as {dump(printed)}")
        print(f"{name}:", *values)

    default = dump("lull-protect")
    for option, kind, choice in pipeline:
        values = [other_than_default(option, kind, choice, default)]
        if kind is None:
            values = ["true", "false"]
        texts = [f"lull-protect{{{option}={value}}}" for value in values]
        if all(dump(text) == default for text in texts):
            sys.exit(f"lull-protect: {option} reaches no pass")
    if dump(default) != default:
        sys.exit(f"lull-protect: {default} reads back as {dump(default)}")
    print(f"lull-protect: {len(pipeline)} options arrive")
    print(f"{len(passes)} passes come back as they were")


main()
