"""A quantised series: how it is summed, and the bytes that hold it (read by src/series/packed.rs)."""

from dataclasses import dataclass, field
from pathlib import Path

import numpy as np

from basis import CENTRE_MILLENNIA, DELAUNAY, HALF_WIDTH_MILLENNIA, PLANET_LONGITUDES, PLANET_RATES

ARCSEC = 180 * 3600 / np.pi
INPUTS = Path(__file__).parent / "inputs"
POWERS = 4

# Rounding may add at most this part of the tolerance, taken over all amplitudes of a coordinate.
ROUNDING_SHARE = 0.35


@dataclass
class Term:
    """x^power (cosine cos(phase) + sine sin(phase)) in arcseconds."""

    multiples: tuple[int, ...]
    power: int
    cosine: float
    sine: float


def read_arguments(name: str, body: str) -> list[tuple[int, ...]]:
    """The listed combinations of one body."""
    rows = [line.split() for line in (INPUTS / name).read_text(encoding="ascii").splitlines()]
    return [tuple(map(int, row[1:])) for row in rows if row and row[0] == body]


def angles(kind: str, t: np.ndarray) -> np.ndarray:
    """The basic angles in radians at t millennia from J2000: planets' longitudes, for the Moon behind Delaunay's five."""
    planets = np.array(PLANET_LONGITUDES)[:, None] + np.array(PLANET_RATES)[:, None] * t
    if kind == "planets":
        return planets
    century = 10 * t
    delaunay = [sum(c * century**k for k, c in enumerate(row)) / ARCSEC for row in DELAUNAY]
    return np.vstack([delaunay, planets])


def window_part(t: np.ndarray) -> np.ndarray:
    """Millennia from J2000 as x, from -1 to 1 over the fit window."""
    return (t - CENTRE_MILLENNIA) / HALF_WIDTH_MILLENNIA


def instants_millennia(count: int, seed: int) -> np.ndarray:
    """Instants over the window, one at random in each of many equal strata, closer together at both ends."""
    strata = (np.arange(count) + np.random.default_rng(seed).random(count)) / count
    u = 2 * strata - 1
    return CENTRE_MILLENNIA + HALF_WIDTH_MILLENNIA * (0.8 * u + 0.2 * np.sin(np.pi / 2 * u))


def varint(value: int) -> bytes:
    """Little-endian base 128 of a whole number not below zero."""
    out = bytearray()
    while value > 127:
        out.append(value & 127 | 128)
        value >>= 7
    out.append(value)
    return bytes(out)


def zigzag(value: int) -> bytes:
    """The same for any sign: 0, -1, 1, -2 become 0, 1, 2, 3."""
    return varint(2 * value if value >= 0 else -2 * value - 1)


@dataclass
class Series:
    """Three coordinates over one set of arguments.

    `single_below` is the number of leading angles whose combinations alone have only a sine (coordinates 0 and 1) or
    only a cosine (coordinate 2): the Moon's main problem is symmetric in that way. Zero for the planets.
    """

    single_below: int = 0
    shifts: list[int] = field(default_factory=list)
    polynomials: list[list[int]] = field(default_factory=list)
    slots: dict[tuple[int, ...], dict[tuple[int, int], tuple[int, int]]] = field(default_factory=dict)

    def is_single(self, multiples: tuple[int, ...]) -> bool:
        """Whether an argument stores one amplitude per slot instead of two."""
        return self.single_below > 0 and not any(multiples[self.single_below :])

    def add(self, coordinate: int, polynomial, terms: list[Term], tolerance: float) -> None:
        """Rounds one coordinate to the coarsest power-of-two step that the tolerance allows."""
        shift = 0
        while 2.0**-shift * np.sqrt(max(len(terms), 1) / 12) > ROUNDING_SHARE * tolerance:
            shift += 1
        self.shifts.append(shift)
        self.polynomials.append([round(float(c) * 2**shift) for c in polynomial])
        for term in terms:
            pair = (round(float(term.cosine) * 2**shift), round(float(term.sine) * 2**shift))
            if pair != (0, 0):
                self.slots.setdefault(term.multiples, {})[(coordinate, term.power)] = pair

    def term_counts(self) -> list[int]:
        """Terms per coordinate."""
        return [sum(slot[0] == c for slots in self.slots.values() for slot in slots) for c in range(3)]

    def evaluate(self, turning: np.ndarray, t: np.ndarray) -> list[np.ndarray]:
        """The three sums in arcseconds."""
        x = window_part(t)
        sums = [
            sum(c * 2.0**-shift * x**k for k, c in enumerate(polynomial))
            for polynomial, shift in zip(self.polynomials, self.shifts)
        ]
        for multiples, slots in self.slots.items():
            phase = np.array(multiples) @ turning
            cosine, sine = np.cos(phase), np.sin(phase)
            for (coordinate, power), (c, s) in slots.items():
                sums[coordinate] = sums[coordinate] + 2.0 ** -self.shifts[coordinate] * x**power * (c * cosine + s * sine)
        return sums

    def pack(self) -> bytes:
        """Planar streams: heads, masks of the angles used, multiples, masks of the slots used, amplitudes."""
        out = bytearray(self.shifts)
        for polynomial in self.polynomials:
            out.append(len(polynomial))
            for coefficient in polynomial:
                out += zigzag(coefficient)
        arguments = sorted(self.slots, key=lambda m: ([k != 0 for k in m], m))
        out += varint(len(arguments))
        for multiples in arguments:
            out += varint(sum(1 << i for i, k in enumerate(multiples) if k))
        for multiples in arguments:
            out += bytes(k & 255 for k in multiples if k)
        for multiples in arguments:
            out += varint(sum(1 << (POWERS * c + p) for c, p in self.slots[multiples]))
        for slot in ((c, p) for c in range(3) for p in range(POWERS)):
            for multiples in arguments:
                if slot in self.slots[multiples]:
                    cosine, sine = self.slots[multiples][slot]
                    if not self.is_single(multiples):
                        out += zigzag(cosine) + zigzag(sine)
                    else:
                        out += zigzag(cosine if slot[0] == 2 else sine)
        return bytes(out)
