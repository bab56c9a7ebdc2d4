"""Where the tables go in the repository, and how a generated Rust file begins."""

import hashlib
from pathlib import Path

BUILDER = "pkg-config/tables/build.py"

NUTATION = Path("src/frames/nutation_table.rs")
DELTA_T = Path("src/time/delta_t_table.rs")
ZONES = Path("src/place/zones.bin")
PLANETS = Path("src/series/planets.bin")
MOON = Path("src/series/moon.bin")
REFERENCE = Path("src/series/reference.rs")
MANIFEST = Path("pkg-config/tables/manifest.json")


def rust_header(*lines: str) -> str:
    """The first lines of a generated file: the builder's name, then what the file holds."""
    first = f"// Written by {BUILDER}; change the builder, not this file."
    return "\n".join([first, *(f"//! {line}" if line else "//!" for line in lines), ""])


def sha256(data: bytes) -> str:
    """The checksum by which the manifest knows a file."""
    return hashlib.sha256(data).hexdigest()
