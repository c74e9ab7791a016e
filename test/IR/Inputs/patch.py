"""Replaces one stretch of bytes in a file by another of the same length.

usage: patch.py INPUT OUTPUT FOUND WANTED (both in hexadecimal). Fails unless
the stretch occurs exactly once.
"""

import pathlib
import sys

source, target, found, wanted = sys.argv[1:]
data = pathlib.Path(source).read_bytes()
old, new = bytes.fromhex(found), bytes.fromhex(wanted)
if data.count(old) != 1 or len(old) != len(new):
    sys.exit(f"{found} occurs {data.count(old)} times when it should once")
pathlib.Path(target).write_bytes(data.replace(old, new))
