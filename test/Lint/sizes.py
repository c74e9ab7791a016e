# ===- sizes.py - No source file over 400 lines ----------------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
# ===-----------------------------------------------------------------------===#

import tree

MOST = 400
SOURCES = (".cpp", ".h", ".td", ".py", ".cmake", "CMakeLists.txt", "tools/dev")


def check(root):
    for path in tree.sources(root, ("",)):
        if not path.endswith(SOURCES):
            continue
        lines = tree.read(root, path).count("\n")
        if lines > MOST:
            what = "has %d lines when it may have %d"
            yield path, lines, what % (lines, MOST)


tree.main(check)
