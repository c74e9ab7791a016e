# ===- banners.py - Every source file says what it is ----------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
# ===-----------------------------------------------------------------------===#

import os
import re

import tree

LICENCE = """\
Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
See LICENSE for license information.
SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
"""


def check(root):
    for path in tree.sources(root, (".h", ".cpp", ".td")):
        lines = tree.read(root, path).split("\n")
        name = re.escape(os.path.basename(path))
        if not re.fullmatch(r"//===-+ %s - .*-\*?===//" % name, lines[0]):
            yield path, 1, "does not start with a banner that names the file"
        elif len(lines[0]) > 80:
            what = "banner has %d columns when it may have 80"
            yield path, 1, what % len(lines[0])
        if [line[3:] for line in lines[2:5]] != LICENCE.split("\n")[:3]:
            yield path, 3, "does not state the licence"


tree.main(check)
