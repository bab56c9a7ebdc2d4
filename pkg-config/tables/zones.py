"""Packs the rough place of every time zone: the coordinates that the tz database itself prints for its zones.

The database (public domain) is read from the PyPI package tzdata: zone.tab and zone1970.tab for the coordinates,
tzdata.zi for old and alternative names. An old name gets the place and the city of the zone that replaced it. Where the
database has merged zones of distant places because their clocks agree since 1970, inputs/zone_names.txt says which
place is meant.
"""

import re
from pathlib import Path

import tzdata

INPUTS = Path(__file__).parent / "inputs"
TENTHS = 10


def source(name: str) -> Path:
    """One file of the database."""
    return Path(tzdata.__file__).parent / "zoneinfo" / name


def degrees(text: str) -> float:
    """ISO 6709: +DDMM, +DDDMM, +DDMMSS or +DDDMMSS."""
    sign = -1 if text[0] == "-" else 1
    digits = text[1:]
    seconds = int(digits[-2:]) if len(digits) > 5 else 0
    digits = digits[:-2] if len(digits) > 5 else digits
    return sign * (int(digits[:-2]) + int(digits[-2:]) / 60 + seconds / 3600)


def coordinates() -> dict[str, tuple[int, int]]:
    """Latitude and longitude in tenths of a degree for every zone that has them."""
    places = {}
    for name in ("zone.tab", "zone1970.tab"):
        for line in source(name).read_text(encoding="utf-8").splitlines():
            if line.startswith("#") or not line:
                continue
            _, position, zone = line.split("\t")[:3]
            latitude, longitude = re.fullmatch(r"([+-]\d+)([+-]\d+)", position).groups()
            places.setdefault(zone, (round(degrees(latitude) * TENTHS), round(degrees(longitude) * TENTHS)))
    return places


def old_names(places: dict[str, tuple[int, int]]) -> dict[str, str]:
    """Other names and the zone whose place they mean."""
    targets = {}
    for line in source("tzdata.zi").read_text(encoding="utf-8").splitlines():
        if line.startswith("L "):
            _, target, name = line.split()
            targets[name] = target
    for line in (INPUTS / "zone_names.txt").read_text(encoding="ascii").splitlines():
        if line and not line.startswith("#"):
            name, target = line.split()
            if target != "-" and target not in places:
                raise ValueError(f"inputs/zone_names.txt: {target} has no coordinates")
            targets[name] = target
    found = {}
    for name, target in targets.items():
        while target not in places and target in targets:
            target = targets[target]
        if name not in places and target in places:
            found[name] = target
    return found


def build() -> bytes:
    """The packed table, as src/place/zone.rs reads it.

    Two counts (16 bits, little endian): zones with a place, and other names. For each zone its latitude, then for each
    its longitude (tenths of a degree, 16 bits, low bytes apart from high bytes); for each other name the number of its
    zone, bytes apart likewise; then every name, zones first, one a line, with the part up to the last slash left out
    where the name before has the same.
    """
    places = coordinates()
    zones = sorted(places)
    others = old_names(places)
    names = sorted(others)
    columns = [
        [places[zone][0] for zone in zones],
        [places[zone][1] for zone in zones],
        [zones.index(others[name]) for name in names],
    ]
    out = bytearray(len(zones).to_bytes(2, "little") + len(names).to_bytes(2, "little"))
    for column in columns:
        out += bytes(value & 255 for value in column)
        out += bytes(value >> 8 & 255 for value in column)
    return bytes(out) + "".join(shortened(zones + names)).encode("ascii")


def shortened(names: list[str]) -> list[str]:
    """Lines in which a region that stays the same is not repeated: `Europe/Oslo`, `Paris`, then `/GB` for a name without."""
    lines, region = [], ""
    for name in names:
        here, _, last = name.rpartition("/")
        lines.append(f"{last}\n" if here == region else f"{here}/{last}\n")
        region = here
    return lines
