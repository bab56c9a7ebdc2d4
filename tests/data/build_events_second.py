"""Makes events_second.csv: a sample of events found along another path than build_events.py's.

    /tmp/reference/bin/python build_events_second.py

Kernel JPL DE421, another reader, apparent places on ERFA's routines (all in build_second_source.py), and another search:
one bracket at a time, bisection for roots, thirds for extrema. The printed lines say how far the two sources differ.
"""

import os

os.environ.setdefault("OMP_NUM_THREADS", "1")

import collections
import csv
import functools
import itertools
import pathlib

import erfa
import numpy as np

import build_second_source as second
import laws

HERE = pathlib.Path(__file__).parent
FIRST_LINE = f"# build_events_second.py; {second.VERSIONS}"
# Starts of the searches, days of TT since 2000: the first event of each kind after each is taken.
STARTS = [40.0, 4_321.0, 9_855.0, 14_210.0]
INNER, OUTER = ["mercury", "venus"], ["mars", "jupiter", "saturn", "uranus", "neptune"]


@functools.lru_cache(maxsize=200_000)
def sky(name, tt_days):
    """Apparent direction and light-retarded distance from the Earth's centre."""
    return second.apparent(name, tt_days, *second.earth(tt_days))


def of_date(name, tt_days):
    return second.of_date(sky(name, tt_days)[0], tt_days)


def half_turn(angle_deg):
    return (angle_deg + 180) % 360 - 180


def excess(name, angle_deg):
    return lambda t: half_turn(of_date(name, t)[2] - of_date("sun", t)[2] - angle_deg)


def ra_difference(first, other):
    return lambda t: half_turn(of_date(first, t)[0] - of_date(other, t)[0])


def separation_deg(first, other):
    return lambda t: np.degrees(erfa.sepp(sky(first, t)[0], sky(other, t)[0]))


def distance_au(name):
    return lambda t: sky(name, t)[1]


def vectors(name, tt_days):
    """When the light left: Sun to body and Earth to body."""
    here, _ = second.earth(tt_days)
    then = tt_days - sky(name, tt_days)[1] / second.C_AU_DAY
    body, sun = second.barycentric(name, then), second.kernel_au("sun", then)[0]
    return body - sun, body - (second.earth(then)[0] if name == "moon" else here)


def phase_angle_deg(name):
    return lambda t: np.degrees(erfa.sepp(*vectors(name, t)))


def lit_area_arcsec2(name, t):
    radius = np.degrees(np.arcsin(laws.RADIUS_KM[name] / laws.AU_KM / sky(name, t)[1])) * 3600
    return np.pi * radius**2 * (1 + np.cos(np.radians(phase_angle_deg(name)(t)))) / 2


def magnitude(name, t):
    to_sun, to_earth = vectors(name, t)
    arguments = [np.array([x]) for x in (np.linalg.norm(to_sun), np.linalg.norm(to_earth), phase_angle_deg(name)(t))]
    if name == "saturn":
        latitudes = [laws.latitude_deg(laws.SATURN_POLE, -v[:, None]) for v in (to_sun, to_earth)]
        return laws.saturn(*arguments, *latitudes)[0]
    if name == "mars":
        longitude = np.degrees(erfa.c2s(erfa.rx(np.radians(84_381.406 / 3600), np.eye(3)) @ to_sun)[0])
        return laws.mars(*arguments, *np.array([[60.0], [60.0], [longitude]]))[0]
    return getattr(laws, name)(*arguments)[0]


def heliocentric_au(name):
    return lambda t: np.linalg.norm(second.kernel_au(name, t)[0] - second.kernel_au("sun", t)[0])


def equal_phase(name):
    return lambda t: np.cos(np.radians(phase_angle_deg("moon")(t))) - np.cos(np.radians(phase_angle_deg(name)(t)))


def next_root(function, start, step, accept=lambda t: True):
    left, f_left = start, function(start)
    while True:
        right, f_right = left + step, function(left + step)
        if f_left * f_right < 0 and abs(f_left - f_right) < 180:
            a, b = left, right
            while b - a > 1e-7:
                middle = (a + b) / 2
                a, b = (middle, b) if function(middle) * f_left > 0 else (a, middle)
            if accept(a):
                return a
        left, f_left = right, f_right


def next_minimum(function, start, step, accept=lambda t: True):
    t, values = start, [function(start), function(start + step)]
    while True:
        values.append(function(t + 2 * step))
        if values[1] < values[0] and values[1] < values[2]:
            found = bottom(function, t + step, step)
            if accept(found):
                return found
        t, values = t + step, values[1:]


def negative(function):
    return lambda t: -function(t)


def bottom(function, middle, width):
    """The least of a bracket by thirds: it holds where brightness has a corner, as at full phase."""
    a, b = middle - width, middle + width
    while b - a > 2e-5:
        left, right = a + (b - a) / 3, b - (b - a) / 3
        a, b = (a, right) if function(left) < function(right) else (left, b)
    return (a + b) / 2


def transit(name, near):
    """Greatest transit next to an instant and the contacts there are."""
    separation = separation_deg(name, "sun")
    middle = bottom(separation, near, 0.5)

    def gap(t, sign):
        sun = np.arcsin(np.sin(np.radians(959.63 / 3600)) / sky("sun", t)[1])
        planet = np.arcsin(laws.RADIUS_KM[name] / laws.AU_KM / sky(name, t)[1])
        return separation(t) - np.degrees(sun + sign * planet)

    yield "transits", "transit", name, "", middle, separation(middle) * 3600
    for number, start, sign in ((1, middle - 0.3, 1), (2, middle - 0.3, -1), (3, middle, -1), (4, middle, 1)):
        if gap(middle, sign) < 0:
            yield "transits", f"contact-{number}", name, "", next_root(lambda t: gap(t, sign), start, 0.3), None


def found(start):
    """The first event of each kind after the start: file, kind, body, other, instant, value."""
    for name in INNER:
        both = [("inferior-conjunction", True), ("superior-conjunction", False)]
        for kind, near in both:
            accept = lambda t, near=near: (sky(name, t)[1] < sky("sun", t)[1]) == near  # noqa: E731
            t = next_root(excess(name, 0), start, 4.0, accept)
            yield "sun", kind, name, "", t, separation_deg(name, "sun")(t)
        for kind, east in (("greatest-elongation-east", True), ("greatest-elongation-west", False)):
            accept = lambda t, east=east: (excess(name, 0)(t) > 0) == east  # noqa: E731
            t = next_minimum(negative(separation_deg(name, "sun")), start, 4.0, accept)
            yield "sun", kind, name, "", t, separation_deg(name, "sun")(t)
        t = next_root(lambda t: phase_angle_deg(name)(t) - 90, start, 4.0)
        yield "sun", "half-phase", name, "", t, separation_deg(name, "sun")(t)
        t = next_minimum(lambda t: -lit_area_arcsec2(name, t), start, 3.0)
        yield "light", "greatest-illuminated-extent", name, "", t, lit_area_arcsec2(name, t)
    for name in [*INNER, "mars", "jupiter", "saturn"]:
        wanted = lambda t: phase_angle_deg(name)(t) < 160 if name in INNER else separation_deg(name, "sun")(t) > 120  # noqa: E731
        t = next_minimum(lambda t: magnitude(name, t), start, 3.0, wanted)
        yield "light", "greatest-brightness", name, "", t, magnitude(name, t)
    for name in OUTER:
        for kind, angle in (("conjunction", 0), ("opposition", 180), ("quadrature-east", 90), ("quadrature-west", 270)):
            t = next_root(excess(name, angle), start, 8.0)
            yield "sun", kind, name, "", t, separation_deg(name, "sun")(t)
    for name in [*INNER, *OUTER]:
        centre = of_date(name, start)[0]
        # Right ascension counted on from turn to turn.
        kept = [centre]

        def running(t):
            kept[0] += half_turn(of_date(name, t)[0] - kept[0])
            return kept[0]

        t = next_minimum(running, start, 3.0)
        yield "motion", "station-direct", name, "", t, of_date(name, t)[0]
        kept[0] = centre
        t = next_minimum(negative(running), start, 3.0)
        yield "motion", "station-retrograde", name, "", t, of_date(name, t)[0]
        t = next_minimum(distance_au(name), start, 3.0)
        yield "motion", "closest-approach", name, "", t, distance_au(name)(t)
    for name in [*INNER, "mars"]:
        t = next_minimum(heliocentric_au(name), start, 3.0)
        yield "motion", "perihelion", name, "", t, heliocentric_au(name)(t)
        t = next_minimum(negative(heliocentric_au(name)), start, 3.0)
        yield "motion", "aphelion", name, "", t, heliocentric_au(name)(t)
    for kind, angle in (("new-moon", 0), ("first-quarter", 90), ("full-moon", 180), ("last-quarter", 270)):
        yield "moon", kind, "", "", next_root(excess("moon", angle), start, 1.0), None
    yield "moon", "moon-perigee", "", "", next_minimum(distance_au("moon"), start, 1.0), None
    yield "moon", "moon-apogee", "", "", next_minimum(negative(distance_au("moon")), start, 1.0), None
    for name in [*INNER, *OUTER]:
        t = next_root(ra_difference("moon", name), start, 0.5)
        yield "moon_meetings", "moon-conjunction", name, "", t, separation_deg("moon", name)(t) * 3600
        t = next_minimum(separation_deg("moon", name), start, 0.5)
        yield "moon_meetings", "moon-closest", name, "", t, separation_deg("moon", name)(t) * 3600
    for name in ["mercury", "venus", "mars"]:
        t = next_root(equal_phase(name), start, 0.5)
        yield "same_phase", "same-phase", name, "", t, separation_deg("moon", name)(t)
    for first, other in (("mercury", "venus"), ("venus", "jupiter"), ("mars", "saturn")):
        t = next_root(ra_difference(first, other), start, 1.0)
        yield "planet_conjunctions", "planet-conjunction", first, other, t, separation_deg(first, other)(t)
        t = next_minimum(separation_deg(first, other), start, 1.0, lambda t: separation_deg(first, other)(t) < 5)
        yield "planet_closest", "planet-closest", first, other, t, separation_deg(first, other)(t)


# Days near some transits of 1900-2050: the grazing one of 1937, central and short ones, and both of Venus.
TRANSITS = [("mercury", day) for day in (-22_880.1, -9_548.1, -46.6, 2_503.4, 5_973.1, 7_254.1, 14_554.9)] + [("venus", 1_619.8), ("venus", 4_539.6)]
# The column of the first source that holds what is compared beside the instant; the file's own otherwise.
VALUE = {
    "greatest-brightness": "magnitude", "greatest-illuminated-extent": "lit_area_arcsec2", "station-direct": "ra_deg",
    "station-retrograde": "ra_deg", "moon-conjunction": "separation_arcsec", "moon-closest": "least_separation_arcsec",
}  # fmt: skip
VALUE_OF_FILE = {"sun": "elongation_deg", "motion": "distance_au", "transits": "separation_arcsec"}


def listed(file):
    """Events of the first source: kind, body, other, instant, row."""
    with open(HERE / f"events_{file}.csv", newline="") as lines:
        next(lines)
        for row in csv.DictReader(lines):
            names, tt = [row.get("body", ""), row.get("other", "")], float(row["tt_days_since_j2000"])
            if file == "moon_meetings":
                yield "moon-conjunction", *names, tt, row
                yield "moon-closest", *names, tt + float(row["closest_after_days"]), row
            elif file == "transits":
                yield "transit", *names, tt, row
                for number in (1, 2, 3, 4):
                    if row[f"contact_{number}_tt"]:
                        yield f"contact-{number}", *names, float(row[f"contact_{number}_tt"]), row
            else:
                kinds = {"same_phase": "same-phase", "planet_conjunctions": "planet-conjunction", "planet_closest": "planet-closest"}
                yield row.get("kind") or kinds[file], *names, tt, row


def main():
    sources, worst, rows = {}, collections.defaultdict(lambda: [0, 0.0, 0.0]), []
    sample = [found(start) for start in STARTS] + [transit(*which) for which in TRANSITS]
    for file, kind, body, other, t, value in itertools.chain(*sample):
        if file not in sources:
            sources[file] = list(listed(file))
        same = [event for event in sources[file] if event[:3] == (kind, body, other)]
        *_, tt, nearest = min(same, key=lambda event: abs(event[3] - t))
        entry = worst[kind, body if body in ("uranus", "neptune") else ""]
        entry[0] += 1
        entry[1] = max(entry[1], abs(tt - t) * 86_400)
        column = "" if value is None else VALUE.get(kind) or VALUE_OF_FILE.get(file, "separation_deg")
        if column:
            entry[2] = max(entry[2], abs(float(nearest[column]) - value))
        rows.append([kind, body, other, f"{t:.5f}", f"{value:.6f}" if column else ""])
    for (kind, body), (count, seconds, difference) in sorted(worst.items()):
        print(f"{kind:28} {body:8} {count:3} events, {seconds:9.1f} s, value {difference:.6f}")
    with open(HERE / "events_second.csv", "w", newline="") as file:
        file.write(FIRST_LINE + "\n")
        writer = csv.writer(file, lineterminator="\n")
        writer.writerow(["kind", "body", "other", "tt_days_since_j2000", "value"])
        writer.writerows(sorted(rows, key=lambda row: (*row[:3], float(row[3]))))


if __name__ == "__main__":
    main()
