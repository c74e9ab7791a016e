# ===- messages.py - How messages are worded, and what lib/ does not do ----===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
# ===-----------------------------------------------------------------------===#
"""Messages start lower-case and do not end in a period; lib/ writes nothing to
stderr; an assert does no work, since a release build drops it."""

import re

import tree

# Calls whose string literals are a message, and how many literals (names) go
# before it.
MESSAGES = {
    "emitError": 0,
    "emitOpError": 0,
    "emitWarning": 0,
    "emitRemark": 0,
    "attachNote": 0,
    "fault": 0,
    "createStringError": 0,
    "passed": 1,
    "missed": 1,
    "analysis": 1,
    "leave": 0,
    "format": 0,
}
# Their first literal is a format string: what follows are arguments.
FORMATS = (
    "fault",
    "createStringError",
    "passed",
    "missed",
    "analysis",
    "format",
)
# A capitalized word. Names with more than one capital or with a digit
# (OpenQASM, T1) and single letters (X) are none.
CAPITALIZED = re.compile(r"([A-Z][a-z']+|A)(?![\w'])")

STDERR = ("errs", "cerr", "stderr")
ASSIGNMENTS = "++ -- = += -= *= /= %= &= |= ^= <<= >>=".split()
WORK = re.compile(
    r"^(succeeded|failed|cantFail|insert|erase|clear|push_back|pop_back"
    r"|emplace\w*|try_emplace|consume\w*|parse\w*|emit\w*|set[A-Z]\w*"
    r"|add[A-Z]\w*|verify|run\w*)$"
)


def messages(stream):
    for i, token in enumerate(stream[:-1]):
        if token.kind != "word" or token.text not in MESSAGES:
            continue
        if stream[i + 1].text != "(":
            continue
        parts = tree.statement(stream, i)
        literals = [p for p in parts if p.kind == "string"]
        literals = literals[MESSAGES[token.text] :]
        if not literals:
            continue
        first, last = literals[0], literals[-1]
        if token.text in FORMATS:
            last = first
        else:
            # Only what ends the statement ends the message.
            tail = [p for p in parts if p.text not in (")", "]", "}")][-1]
            if tail is not last:
                last = None
        yield first, last


def check_words(path, stream):
    for first, last in messages(stream):
        if CAPITALIZED.match(first.text):
            what = "message starts upper-case: '%s'"
            yield path, first.line, what % first.text
        if last and re.search(r"[.!?](\\n|\s)*$", last.text):
            what = "message ends in punctuation: '%s'"
            yield path, last.line, what % last.text


def check_asserts(path, stream):
    for i, token in enumerate(stream[:-1]):
        if token.text != "assert" or stream[i + 1].text != "(":
            continue
        parts = tree.statement(stream, i + 2)
        for part, after in zip(parts, parts[1:] + [None]):
            changes = part.kind == "mark" and part.text in ASSIGNMENTS
            called = part.kind == "word" and after and after.text == "("
            if changes or (called and WORK.match(part.text)):
                yield path, part.line, "work inside assert: '%s'" % part.text


def check(root):
    for path in tree.sources(root, (".h", ".cpp"), ("include", "lib", "tools")):
        stream = tree.tokens(tree.read(root, path))
        yield from check_words(path, stream)
        yield from check_asserts(path, stream)
        if path.startswith("tools/"):
            continue
        for token in stream:
            if token.kind == "word" and token.text in STDERR:
                what = "the library writes to stderr: '%s'"
                yield path, token.line, what % token.text


tree.main(check)
