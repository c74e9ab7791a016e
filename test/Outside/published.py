#===- published.py - Sequences from their papers -------------------------===#
#
# Part of the Lull project, under the Apache License v2.0 with LLVM Exceptions.
# See LICENSE for license information.
# SPDX-License-Identifier: Apache-2.0 WITH LLVM-exception
#
#===----------------------------------------------------------------------===#
"""Sequences made anew from their definitions, all from memory: Hahn 1950, Carr
and Purcell 1954, Meiboom and Gill 1958, Maudsley 1986, Gullion, Baker and
Conradi 1990, Viola and Lloyd 1998, Viola, Knill and Lloyd 1999, Viola and Knill
2003, Khodjasteh and Lidar 2005, Uhrig 2007, Cywinski et al. 2008, West, Fong
and Lidar 2010, Souza, Alvarez and Suter 2011, Hayes et al. 2011, Genov et al.
2017.

A sequence is a list of (instant, phases): the instant as a part of the window,
the phases (multiples of pi) of the pulses that are played there."""

from fractions import Fraction

import numpy as np

X, Y = Fraction(0), Fraction(1, 2)
LETTERS = {"X": X, "Y": Y, "-X": X + 1, "-Y": Y + 1}


def word(text):
    return [LETTERS[letter] for letter in text.split()]


def at(instants, phases):
    return [(float(x), [p]) for x, p in zip(instants, phases, strict=True)]


def centred(phases):
    n = len(phases)
    return at([(k - 0.5) / n for k in range(1, n + 1)], phases)


def trailing(phases):
    n = len(phases)
    return at([k / n for k in range(1, n + 1)], phases)


def uhrig(n):
    return [float(np.sin(np.pi * j / (2 * n + 2)) ** 2)
            for j in range(1, n + 1)]


def kdd():
    """Five pulses pi/6 + phi, phi, pi/2 + phi, phi, pi/6 + phi each."""
    block = [Fraction(1, 6), 0, Fraction(1, 2), 0, Fraction(1, 6)]
    return centred([phi + p for phi in (X, Y, X, Y) for p in block])


# The tables of Genov et al. 2017 in units of the divided pi.
UR = {
    4: (1, "0 1 1 0"),
    6: (3, "0 2 0 0 2 0"),
    8: (2, "0 1 3 2 2 3 1 0"),
    10: (5, "0 4 2 4 0 0 4 2 4 0"),
    12: (3, "0 1 3 0 4 3 3 4 0 3 1 0"),
    14: (7, "0 6 4 8 4 6 0 0 6 4 8 4 6 0"),
    16: (4, "0 1 3 6 2 7 5 4 4 5 7 2 6 3 1 0"),
    18: (9, "0 8 6 12 8 12 6 8 0 0 8 6 12 8 12 6 8 0"),
    20: (5, "0 1 3 6 0 5 1 8 6 5 5 6 8 1 5 0 6 3 1 0"),
}


def universally_robust(n):
    part, table = UR[n]
    return centred([Fraction(int(number), part) for number in table.split()])


def cdd_letters(level):
    """C_l = C_{l-1} X C_{l-1} Y C_{l-1} X C_{l-1} Y, as the word of what is
    played at the end of each of its 4^l intervals: I, X, Y or Z."""
    if level == 0:
        return "I"
    inner, joined = cdd_letters(level - 1), ""
    for letter in "XYXY":
        joined += inner[:-1] + pauli(inner[-1], letter)
    return joined


def pauli(a, b):
    """The product of two Pauli operators but for its phase."""
    order = "IXZY"
    return order[order.index(a) ^ order.index(b)]


def cdd(level):
    letters = cdd_letters(level)
    played = {"X": [X], "Y": [Y], "Z": [X, Y]}
    return [((slot + 1) / len(letters), played[letter])
            for slot, letter in enumerate(letters) if letter != "I"]


def flips(signs):
    """X wherever a function of this many steps changes sign."""
    n = len(signs)
    return [(k / n, [X]) for k in range(1, n) if signs[k] != signs[k - 1]]


def thue_morse(level):
    return flips([(-1) ** bin(k).count("1") for k in range(2**level)])


def walsh(sequency):
    """The product of the Rademacher functions sign sin(2 pi 2^(j-1) t) that the
    Gray code of the sequency selects."""
    paley = sequency ^ (sequency >> 1)
    bits = sequency.bit_length()
    middle = (np.arange(2**bits) + 0.5) / 2**bits
    signs = np.ones(2**bits)
    for j in range(1, bits + 1):
        if paley >> (j - 1) & 1:
            signs *= np.sign(np.sin(2 * np.pi * 2 ** (j - 1) * middle))
    return flips(list(signs))


def qdd(inner, outer):
    """Uhrig's instants of X, and of Y in each interval between them."""
    ends = [0.0, *uhrig(outer), 1.0]
    pulses = []
    for lower, upper in zip(ends, ends[1:]):
        pulses += [(lower + (upper - lower) * x, [Y]) for x in uhrig(inner)]
        pulses.append((upper, [X]))
    return pulses[:-1]


def closed(pulses):
    """An odd number of pulses about one axis is undone at the very end."""
    if sum(len(phases) for _, phases in pulses) % 2:
        pulses = pulses + [(1.0, [X])]
    return pulses


def sequences():
    made = {
        "hahn": centred([X]),
        "signed-x4": centred(word("X -X -X X")),
        "xy4": centred(word("X Y X Y")),
        "xy4-trailing": trailing(word("X Y X Y")),
        "xy4-signed": centred(word("X Y -X -Y")),
        "xy8": centred(word("X Y X Y Y X Y X")),
        "edd": trailing(word("X Y X Y Y X Y X")),
        "xy16": centred(word("X Y X Y Y X Y X -X -Y -X -Y -Y -X -Y -X")),
        "kdd-20": kdd(),
    }
    for n in (1, 2, 3, 4, 8):
        made[f"cp-{n}"] = centred([X] * n)
        made[f"cpmg-{n}"] = centred([X] * n)
    # With an even number these are unbalanced by definition.
    for n in (2, 3, 4, 5, 6, 7):
        made[f"pdd-{n}"] = at([k / (n + 1) for k in range(1, n + 1)], [X] * n)
    for n in (1, 2, 3, 4, 6, 8, 11):
        made[f"udd-{n}"] = at(uhrig(n), [X] * n)
    for n in UR:
        made[f"ur-{n}"] = universally_robust(n)
    for level in (1, 2, 3):
        made[f"cdd-{level}"] = cdd(level)
    for level in (1, 2, 3, 4, 5):
        made[f"cdd-axis-{level}"] = thue_morse(level)
    for orders in ((2, 2), (2, 4), (4, 2), (4, 4)):
        made["qdd-%d-%d" % orders] = qdd(*orders)
    for sequency in range(1, 17):
        made[f"walsh-{sequency}"] = walsh(sequency)
    return {name: closed(pulses) for name, pulses in made.items()}
