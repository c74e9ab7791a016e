#===- reader.py - A second reader of Lull's text -------------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
#===----------------------------------------------------------------------===#
"""Reads devices and programs from the text of the IR, line by line, and times
programs by the timing rule alone (docs/Spec.md): an operation starts as soon as
all its qubits are free. Shares nothing with the library."""

import re
from dataclasses import dataclass, field
from fractions import Fraction

SECONDS = {
    "ns": Fraction(1, 10**9),
    "us": Fraction(1, 10**6),
    "ms": Fraction(1, 10**3),
    "s": Fraction(1),
}


@dataclass
class Entry:
    """A line of the device's table of operations."""

    duration: Fraction
    native: bool
    # ("rotation", turn, phase), ("equatorial",), ("frame",) or None
    plays: tuple = None


@dataclass
class Device:
    dt: Fraction  # in seconds
    step: Fraction = Fraction(1)
    gap: Fraction = Fraction(0)
    entries: dict = field(default_factory=dict)

    def ticks(self, number, unit):
        if unit == "dt":
            return Fraction(number)
        return Fraction(number) * SECONDS[unit] / self.dt


@dataclass
class Op:
    kind: str
    name: str
    sites: list
    duration: Fraction
    # Multiples of pi as fractions, radians as floats.
    angles: list
    state: str = None
    last: bool = False
    start: Fraction = None

    @property
    def end(self):
        return self.start + self.duration


@dataclass
class Function:
    name: str
    device: Device
    ops: list = field(default_factory=list)
    end: Fraction = Fraction(0)

    def on(self, site):
        return [op for op in self.ops if site in op.sites]

    @property
    def sites(self):
        return sorted({site for op in self.ops for site in op.sites})

    def time(self):
        clock = {}
        for op in self.ops:
            op.start = max((clock.get(s, Fraction(0)) for s in op.sites))
            for site in op.sites:
                clock[site] = op.end
        self.end = max(clock.values(), default=Fraction(0))
        return self

    def holes(self):
        """Times in which a qubit waits though nothing says so."""
        found = []
        for site in self.sites:
            now = Fraction(0)
            for op in self.on(site):
                if op.start != now:
                    found.append((site, now, op.start))
                now = op.end
            if now != self.end:
                found.append((site, now, self.end))
        return found


def angle(text):
    text = text.strip()
    if text.endswith("pi"):
        multiple = text[:-2].strip()
        return Fraction({"": "1", "-": "-1"}.get(multiple, multiple))
    return float(text)


def duration(device, text):
    found = re.search(r"\bfor (-?[\d.]+) (\w+)", text)
    return device.ticks(*found.groups()) if found else Fraction(0)


def read_entry(device, line):
    found = re.match(r"lull\.operation (\w+)", line)
    plays = None
    if rotation := re.search(r"plays rotation\((.*?), (.*?)\)", line):
        plays = ("rotation", angle(rotation[1]), angle(rotation[2]))
    elif general := re.search(r"plays (equatorial|frame)", line):
        plays = (general[1],)
    native = re.search(r"\bnative\b", line) is not None
    device.entries[found[1]] = Entry(duration(device, line), native, plays)


def read_op(line, handles, device):
    line = line.split("{")[0]
    found = re.match(r"(?:%\w+ = )?lull\.(\w+) (.*)", line)
    kind, rest = found.groups()
    name, angles = kind, []
    if kind == "gate":
        name, listed, rest = re.match(r"(\w+)(?:\((.*?)\))?(.*)", rest).groups()
        angles = [angle(a) for a in listed.split(",")] if listed else []
    if about := re.search(r"\babout (.*?) for", rest):
        angles = [angle(about[1])]
    sites = [handles[h] for h in re.findall(r"%\w+", rest)]
    state = re.search(r"\b(live|basis|spent)\b", rest)
    last = rest.rstrip().endswith(" last")
    return Op(kind, name, sites, duration(device, rest), angles,
              state and state[1], last)


def read(text):
    """All functions by name, timed."""
    devices, functions = {}, {}
    device = function = None
    for line in text.splitlines():
        line = re.sub(r"//.*", "", line).strip()
        if found := re.match(r"lull\.device @(\w+) clock (\S+) (\w+)(.*)",
                             line):
            device = Device(Fraction(found[2]) * SECONDS[found[3]])
            devices[found[1]] = device
            for word in ("step", "gap"):
                if grid := re.search(rf"\b{word} ([\d.]+) (\w+)", found[4]):
                    setattr(device, word, device.ticks(*grid.groups()))
        elif line.startswith("lull.operation"):
            read_entry(device, line)
        elif found := re.match(r"func\.func @(\w+)", line):
            where = re.search(r"lull\.device = @(\w+)", line)
            function = Function(found[1], devices[where[1]])
            functions[found[1]] = function
            handles = {}
        elif found := re.match(r"(%\w+) = lull\.qubit (\d+)", line):
            handles[found[1]] = int(found[2])
        elif re.match(r"(%\w+ = )?lull\.(?!site|coupler|sequence)\w+ ", line):
            function.ops.append(read_op(line, handles, function.device))
    for function in functions.values():
        function.time()
    return functions


def read_file(path):
    with open(path, encoding="utf-8") as file:
        return read(file.read())


REMARK = re.compile(
    r"remark: \[\w+\] (?P<name>\w+) \| Category:(?P<pass>[\w-]+) \| "
    r"Function=(?P<function>\w+) \|(?P<rest>.*)")


def read_remarks(path):
    """Remarks by function: name and a dictionary of what they say."""
    remarks = {}
    with open(path, encoding="utf-8") as file:
        for line in file:
            if found := REMARK.search(line):
                said = dict(re.findall(r'(\w+)=("[^"]*"|-?\d+)', found["rest"]))
                remarks.setdefault(found["function"], []).append(
                    (found["name"], said))
    return remarks


class Checker:
    """Counts what was checked and collects what is wrong."""

    def __init__(self):
        self.checks = 0
        self.wrong = []

    def equal(self, found, expected, what):
        self.checks += 1
        if found != expected:
            self.wrong.append(f"{what} is {found} when it should be {expected}")

    def true(self, holds, what):
        self.equal(bool(holds), True, what)

    def finish(self, least):
        """Ends the script; too few checks are a failure as well."""
        for text in self.wrong[:20]:
            print(text)
        print(f"{self.checks} checks, {len(self.wrong)} wrong")
        if self.wrong or self.checks < least:
            raise SystemExit(1)
