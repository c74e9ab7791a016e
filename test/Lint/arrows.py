# ===- arrows.py - Rooms know only the rooms to their left -----------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
# ===-----------------------------------------------------------------------===#

import re

import tree

# What each room may include besides itself.
LAW = {
    "Timing": [],
    "Sequence": ["Timing"],
    "Physics": ["Timing", "Sequence"],
    "IR": ["Timing"],
    "Analysis": ["Timing", "IR"],
    "Transforms": ["Timing", "Sequence", "Physics", "IR", "Analysis"],
    "Target": ["Timing", "IR", "Analysis"],
    "Check": ["Timing", "IR", "Analysis"],
}
LAW["Registration"] = list(LAW)
# These three know nothing of MLIR.
PLAIN = ("Timing", "Sequence", "Physics")
# Tools call Registration; what a tool may know besides.
TOOLS = {
    "lull-show": [
        "lull/Timing/",
        "lull/Sequence/",
        "lull/Transforms/DemoDevices.h",
    ]
}

INCLUDE = re.compile(
    r'^[ \t]*#?[ \t]*include[ \t]*["<]([^">]+)[">]', re.MULTILINE
)
ROOM_CALL = re.compile(r"\blull_room\s*\(\s*(\w+)(.*?)\)", re.DOTALL)


def room_of(path):
    parts = path.split("/")
    if parts[0] == "lib" and len(parts) > 2:
        return parts[1]
    if parts[:2] == ["include", "lull"] and len(parts) > 3:
        return parts[2]
    return None


def why_not(room, included):
    """What is wrong with a file of `room` including `included`; or None."""
    if included.startswith("mlir/"):
        if room in PLAIN:
            return "the plain room %s includes '%s'" % (room, included)
        return None
    if included.split("/")[0] == ".." or "/../" in included:
        return "'%s' leaves its folder: include by the full path" % included
    match = re.match(r"lull/(\w+)/", included)
    if match and match.group(1) != room and match.group(1) not in LAW[room]:
        return "%s includes '%s', but knows only %s" % (
            room,
            included,
            ", ".join(LAW[room]) or "itself",
        )
    return None


def tool_why_not(path, included):
    allowed = ["lull/Registration/"] + TOOLS.get(path.split("/")[1], [])
    if included.startswith("lull/") and not included.startswith(tuple(allowed)):
        return "a tool includes '%s', but knows only %s" % (
            included,
            ", ".join(allowed),
        )
    return None


def check(root):
    suffixes = (".h", ".cpp", ".td")
    for path in tree.sources(root, suffixes, ("include", "lib", "tools")):
        text = tree.read(root, path)
        room = room_of(path)
        if path.startswith("tools/"):
            judge = lambda included: tool_why_not(path, included)
        elif room in LAW:
            judge = lambda included: why_not(room, included)
        else:
            yield path, 1, "stands in no room that the law of arrows knows"
            continue
        for match in INCLUDE.finditer(text):
            why = judge(match.group(1))
            if why:
                yield path, text.count("\n", 0, match.start(1)) + 1, why
    # The build links rooms by the same law.
    for path in tree.sources(root, "CMakeLists.txt", ("lib",)):
        text = tree.read(root, path)
        for match in ROOM_CALL.finditer(text):
            line = text.count("\n", 0, match.start()) + 1
            room = match.group(1)
            if room not in LAW:
                yield path, line, "the law of arrows knows no room %s" % room
                continue
            linked = re.search(r"\bROOMS\b([\w\s]*)", match.group(2))
            for other in linked.group(1).split() if linked else []:
                if other == "DEPENDS":
                    break
                if other not in LAW[room]:
                    yield path, line, "room %s links room %s" % (room, other)


tree.main(check)
