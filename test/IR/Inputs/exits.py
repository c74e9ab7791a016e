"""Runs a command and checks its exit code: exits.py CODE COMMAND..."""

import subprocess
import sys

wanted, *command = sys.argv[1:]
ran = subprocess.run(command, stdout=subprocess.DEVNULL, stderr=subprocess.DEVNULL)
if ran.returncode != int(wanted):
    sys.exit(f"exit code is {ran.returncode} when it should be {wanted}")
