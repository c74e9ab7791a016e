#===- frames.py - Windows in the operations of devices, by matrices ------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
#===----------------------------------------------------------------------===#
"""Source: McKay et al. 2017 for virtual Z, from memory; R_phi(theta) =
exp(-i theta/2 (cos phi X + sin phi Y)), Rz(a) = exp(-i a Z/2). The sign is
settled by what everybody agrees on: Ry(pi/2)|0> has <X> = +1, Rx(pi/2)|0> has
<Y> = -1.

  frames.py make > program
  frames.py check protected"""

import sys

import numpy as np

import published
import reader

# At every start modulo the step, and of several lengths.
WINDOWS = [(0, 70000), (3, 70001), (5, 123456)]

PAULI = {
    "X": np.array([[0, 1], [1, 0]], dtype=complex),
    "Y": np.array([[0, -1j], [1j, 0]]),
    "Z": np.diag([1, -1]).astype(complex),
}


def exponential(theta, axis):
    """exp(-i theta/2 axis) for a matrix that squares to one."""
    return np.cos(theta / 2) * np.eye(2) - 1j * np.sin(theta / 2) * axis


def rotation(theta, phi):
    return exponential(
        theta, np.cos(phi) * PAULI["X"] + np.sin(phi) * PAULI["Y"])


def frame(a):
    return exponential(a, PAULI["Z"])


def bloch(state):
    return np.array([np.real(state.conj() @ PAULI[p] @ state) for p in "XYZ"])


def make():
    for name in published.sequences():
        for number, (start, length) in enumerate(WINDOWS):
            label = name.replace("-", "_")
            print(f"func.func @{label}_{number}() {{\n  %q0 = lull.qubit 0")
            print(f"  lull.delay %q0 for {start} dt")
            print(f"  lull.idle %q0 for {length} dt live "
                  f'{{lull.protect = "{name}"}}')
            # The program's own frame changes are none of the window's business.
            print("  lull.gate rz(0.3) %q0\n  return\n}")


def pulses_of(check, name, ops, device):
    """Plays a window: pi pulses as (start, end, programme phase, operator of
    half the angle), and the product of everything."""
    net, turned, played, halves = np.eye(2), 0.0, [], []
    for op in ops:
        if op.kind == "delay":
            continue
        entry = device.entries[op.name]
        check.true(entry.native, f"{name}: {op.name} is native")
        if entry.plays[0] == "frame":
            net = frame(float(op.angles[0]) * np.pi) @ net
            turned += float(op.angles[0])
            continue
        if entry.plays[0] == "equatorial":
            turn, phase = map(float, op.angles)
        else:
            turn, phase = map(float, entry.plays[1:])
        net = rotation(turn * np.pi, phase * np.pi) @ net
        check.equal(op.start % device.step, 0, f"{name}: a start on the grid")
        # As the programme sees it: undo the frame changes before it.
        undo = frame(turned * np.pi)
        half = undo.conj().T @ rotation(turn * np.pi / 2, phase * np.pi) @ undo
        played.append(op)
        halves.append(half)
        check.equal(turn, 1.0, f"{name}: the turn of a pulse")
    return net, turned, played, halves


def check_window(check, name, function, expected):
    # After the delay, before the program's own frame change.
    ops = function.ops[1:-1]
    net, turned, played, halves = pulses_of(check, name, ops, function.device)
    check.true(np.allclose(net, net[0, 0] * np.eye(2), atol=1e-10, rtol=0),
               f"{name}: the net is the identity")
    check.true(abs(turned / 2 - round(turned / 2)) < 1e-12,
               f"{name}: the sum {turned} pi of the frame changes is zero")
    for before, after in zip(played, played[1:]):
        check.true(after.start >= before.end + function.device.gap,
                   f"{name}: pulses are apart")
    phases = [p for _, group in expected for p in group]
    check.equal(len(played), len(phases), f"{name}: the number of pulses")
    position = 0
    for _, group in expected:
        found = [bloch(half @ np.array([1, 0]))
                 for half in halves[position: position + len(group)]]
        position += len(group)
        # R_phi(pi/2)|0> points to (sin phi, -cos phi, 0). Two pulses at one
        # instant make a Z in either order.
        wanted = [np.array([np.sin(float(p) * np.pi),
                            -np.cos(float(p) * np.pi), 0]) for p in group]
        orders = [wanted, wanted[::-1]]
        check.true(any(np.allclose(found, order, atol=1e-9)
                       for order in orders),
                   f"{name}: where half a pulse takes |0>, "
                   f"{np.round(found, 3)}, to be {np.round(wanted, 3)},")


def check_conventions(check):
    zero = np.array([1, 0])
    turn = np.pi / 2
    check.true(np.allclose(bloch(rotation(turn, turn) @ zero), [1, 0, 0]),
               "Ry(pi/2)|0> with <X> = 1")
    check.true(np.allclose(bloch(rotation(turn, 0) @ zero), [0, -1, 0]),
               "Rx(pi/2)|0> with <Y> = -1")
    # In time order Rz(-phi), X, Rz(phi).
    phi = 0.7
    check.true(np.allclose(frame(phi) @ rotation(1.1, 0) @ frame(-phi),
                           rotation(1.1, phi)), "a turned frame is a phase")


def main():
    if sys.argv[1] == "make":
        return make()
    functions = reader.read_file(sys.argv[2])
    check = reader.Checker()
    check_conventions(check)
    for name, expected in published.sequences().items():
        for number in range(len(WINDOWS)):
            label = f"{name.replace('-', '_')}_{number}"
            function = functions[label]
            check.equal(function.holes(), [], f"{label}: the holes")
            check.equal(function.end, sum(WINDOWS[number]),
                        f"{label}: the length")
            check_window(check, label, function, expected)
    return check.finish(least=5000)


if __name__ == "__main__":
    main()
