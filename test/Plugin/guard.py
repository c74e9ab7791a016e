# ===- guard.py - A program that loads the plugin --------------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
# ===------------------------------------------------------------------------===#
"""Stands for a program that loads the plugin: guard.py PLUGIN [LIBRARY]...

Loads the libraries, then the plugin (all its symbols at once), and prints what
it says of itself.
"""

import ctypes
import os
import sys


class Info(ctypes.Structure):
    """What a plugin returns, by mlir/Tools/Plugins/PassPlugin.h."""

    _fields_ = [
        ("version", ctypes.c_uint32),
        ("name", ctypes.c_char_p),
        ("release", ctypes.c_char_p),
        ("callback", ctypes.c_void_p),
    ]


def main(plugin, *libraries):
    now = os.RTLD_NOW | os.RTLD_GLOBAL
    for library in libraries:
        ctypes.CDLL(library, now)
    loaded = ctypes.CDLL(plugin, now)
    for entry in ("mlirGetDialectPluginInfo", "mlirGetPassPluginInfo"):
        function = getattr(loaded, entry)
        function.restype = Info
        info = function()
        name, release = info.name.decode(), info.release.decode()
        print(f"{entry}: {name} {release}, API version {info.version}", flush=True)


main(*sys.argv[1:])
