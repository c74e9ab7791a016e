# ===- tree.py - What the lints share --------------------------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
# ===-----------------------------------------------------------------------===#
"""Every lint is called with the root of a source tree, prints one line for each
fault (`file:line: what`) and exits with 1 if there was any."""

import os
import re
import sys

ROOMS = ("include", "lib", "tools", "test")
SKIPPED = ("Inputs", "__pycache__")


def sources(root, suffixes, tops=ROOMS):
    """Paths relative to `root` below `tops` that end in one of `suffixes`."""
    found = []
    for top in tops:
        for folder, folders, files in os.walk(os.path.join(root, top)):
            folders[:] = [f for f in folders if f not in SKIPPED]
            found += [
                os.path.relpath(os.path.join(folder, f), root)
                for f in files
                if f.endswith(suffixes)
            ]
    return sorted(found)


def read(root, path):
    with open(os.path.join(root, path), encoding="utf-8") as file:
        return file.read()


def main(check):
    """Runs `check(root)`, which yields (path, line, what)."""
    if len(sys.argv) != 2 or not os.path.isdir(sys.argv[1]):
        sys.exit("usage: %s ROOT" % sys.argv[0])
    faults = sorted(set(check(sys.argv[1])))
    for path, line, what in faults:
        print("%s:%d: %s" % (path, line, what))
    sys.exit(1 if faults else 0)


TOKEN = re.compile(
    r"""(?P<comment>//[^\n]*|/\*.*?\*/)
      | (?P<raw>(?:u8|[uUL])?R"
            (?P<mark0>[^\s()\\]*)\((?P<rawtext>.*?)\)(?P=mark0)")
      | (?P<string>(?:u8|[uUL])?"(?P<text>(?:\\.|[^"\\\n])*)")
      | (?P<char>(?:u8|[uUL])?'(?:\\.|[^'\\\n])+')
      | (?P<number>\.?\d(?:[eEpP][+-]|'?[\w.])*)
      | (?P<word>[A-Za-z_]\w*)
      | (?P<mark><<=|>>=|\+\+|--|->|::|<<|[-+*/%&|^<>=!]=|[^\s\w])""",
    re.VERBOSE | re.DOTALL,
)


class Token:
    """A C++ token: its kind (string, word, mark, ...), its text (of a string:
    what stands between the quotes) and its line."""

    def __init__(self, kind, text, line):
        self.kind, self.text, self.line = kind, text, line


def tokens(text):
    """The C++ tokens of `text` without comments, neighbouring string literals
    joined."""
    result = []
    line, end = 1, 0
    for match in TOKEN.finditer(text):
        line += text.count("\n", end, match.start())
        end = match.start()
        if match.group("comment"):
            continue
        if match.group("raw"):
            kind, what = "string", match.group("rawtext")
        elif match.group("string"):
            kind, what = "string", match.group("text")
        else:
            kinds = ("char", "number", "word", "mark")
            kind = next(k for k in kinds if match.group(k))
            what = match.group(0)
        if kind == "string" and result and result[-1].kind == "string":
            result[-1].text += what
        else:
            result.append(Token(kind, what, line))
    return result


def statement(stream, start):
    """The tokens from `start` to the end of the statement: a `;`, `,`, `:` or
    `{` outside brackets, or a bracket that was opened before."""
    depth = 0
    for i in range(start, len(stream)):
        text = stream[i].text if stream[i].kind == "mark" else ""
        if depth == 0 and text in (";", ",", "{", "}", ":"):
            return stream[start:i]
        if text in ("(", "[", "{"):
            depth += 1
        elif text in (")", "]", "}"):
            depth -= 1
            if depth < 0:
                return stream[start:i]
    return stream[start:]
