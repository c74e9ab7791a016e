"""Holds the numbered constraints of docs/Spec.md, the checks and the tests
together.

usage: constraints.py SPEC CODE TESTS

Every number that the specification defines (`- **T1** ...`) has a check that
carries it in a comment of the code and a negative test that carries it at the
start of a comment (`// T1: ...`); neither has a number that is not defined. A
list of numbers in a comment counts for each (`// Q3, Q4: ...`).
"""

import pathlib
import re
import sys

number = r"[TQPSDUAW][1-9][0-9]?"


def main(spec_path, code, tests):
    faults = []
    defined = re.findall(rf"^- \*\*({number})\*\* ", read(spec_path), re.M)
    for name in sorted({n for n in defined if defined.count(n) > 1}):
        faults.append(f"{spec_path}: {name} is defined {defined.count(name)} times")
    if not defined:
        faults.append(f"{spec_path}: defines no constraint")

    tested = {}
    for path in files(tests, "*.mlir", "*.test"):
        for name in re.findall(rf"^// ({number}): ", read(path), re.M):
            tested.setdefault(name, path)
    checked = {}
    for path in files(code, "*.cpp", "*.h", "*.td"):
        for comment in re.findall(r"//+ ?(.*)$", read(path), re.M):
            listed = re.match(rf"({number}(?:, {number})*):", comment)
            for name in listed[1].split(", ") if listed else []:
                checked.setdefault(name, path)

    for name in defined:
        if name not in tested:
            faults.append(f"{name} has no negative test: a line '// {name}: ...'")
        if name not in checked:
            faults.append(f"{name} has no check: a comment '// {name}: ...'")
    for what, found in (("test", tested), ("check", checked)):
        for name in sorted(set(found) - set(defined)):
            faults.append(f"{found[name]}: {what} of {name}, which is not defined")
    for fault in faults:
        print(fault)
    print(
        f"{len(set(defined))} constraints, {len(tested)} tested, "
        f"{len(checked)} checked, {len(faults)} faults"
    )
    return 1 if faults else 0


def files(folder, *patterns):
    found = {p for pattern in patterns for p in pathlib.Path(folder).rglob(pattern)}
    # The tests of this script break the rule on purpose.
    return sorted(p for p in found if p.name != "constraints.test")


def read(path):
    return pathlib.Path(path).read_text(encoding="utf-8")


if __name__ == "__main__":
    sys.exit(main(*sys.argv[1:]))
