"""Writes the packed tables of the ephemeris, and manifest.json, which says what they were made from and what they leave.

    python build.py            everything; the two fits take some minutes
    python build.py --check    only proves the files: tables that build in seconds are built again and compared,
                               fitted ones, their inputs and the builder itself are compared by checksum
"""

import argparse
import json
import sys
from importlib.metadata import version
from pathlib import Path

import brotli

import delta_t
import kernel
import measure
import moon
import nutation
import outputs
import planets
import reference
import zones
from basis import PLANETS
from outputs import sha256

HERE = Path(__file__).parent

# What decides the fitted tables beside the inputs.
FIT_MODULES = ["basis.py", "greedy.py", "kernel.py", "moon.py", "planets.py", "series.py"]


def requirements() -> dict[str, str]:
    """The packages in use, which must be those of requirements.txt."""
    rows = (HERE / "requirements.txt").read_text(encoding="utf-8").splitlines()
    wanted = dict(row.split("==") for row in rows if "==" in row)
    for name, number in wanted.items():
        if version(name) != number:
            raise SystemExit(f"{name} {version(name)} is installed; requirements.txt wants {number}")
    return wanted


def inputs() -> dict[str, str]:
    """Checksums of everything that is read."""
    paths = [
        kernel.path(),
        nutation.source_path(),
        delta_t.spline_path(),
        delta_t.measured_path(),
        *(zones.source(name) for name in ("zone.tab", "zone1970.tab", "tzdata.zi")),
        *sorted((HERE / "inputs").iterdir()),
    ]
    return {path.name: sha256(path.read_bytes()) for path in paths}


def builder() -> dict[str, str]:
    """Checksums of the modules that decide the fits."""
    return {name: sha256((HERE / name).read_bytes()) for name in FIT_MODULES}


def quick_tables() -> dict[Path, bytes]:
    """The tables that build in seconds."""
    return {
        outputs.NUTATION: nutation.build().encode(),
        outputs.DELTA_T: delta_t.build().encode(),
        outputs.ZONES: zones.build(),
        outputs.REFERENCE: reference.build().encode(),
    }


def build(root: Path) -> None:
    """Writes every table and the manifest."""
    packages = requirements()
    tables = quick_tables()
    fits = {}
    for body in PLANETS:
        fits[body] = planets.fit(body)
        print(f"{body}: {fits[body].term_counts()} terms, {len(fits[body].pack())} bytes", flush=True)
    moon_fit = moon.fit()
    print(f"moon: {moon_fit.term_counts()} terms, {len(moon_fit.pack())} bytes", flush=True)
    tables[outputs.PLANETS] = b"".join(fits[body].pack() for body in PLANETS)
    tables[outputs.MOON] = moon_fit.pack()
    for path, data in tables.items():
        (root / path).write_bytes(data)
    manifest = {
        "packages": packages,
        "inputs_sha256": inputs(),
        "builder_sha256": builder(),
        "outputs": {
            path.as_posix(): {"sha256": sha256(data), "bytes": len(data), "brotli": len(brotli.compress(data))}
            for path, data in sorted(tables.items())
        },
        "series": {
            name: {"terms": fit.term_counts(), "arguments": len(fit.slots), "bytes": len(fit.pack())}
            for name, fit in [*fits.items(), ("moon", moon_fit)]
        },
        "errors_rms_and_max": measure.measure(fits, moon_fit),
    }
    (root / outputs.MANIFEST).write_text(json.dumps(manifest, indent=1) + "\n", encoding="utf-8")


def check(root: Path) -> list[str]:
    """What differs between the files and what the builder would write."""
    packages = requirements()
    manifest = json.loads((root / outputs.MANIFEST).read_text(encoding="utf-8"))
    found = {"packages": packages, "inputs_sha256": inputs(), "builder_sha256": builder()}
    wrong = [f"{key}: {name}" for key, of in found.items() for name in of if manifest[key].get(name) != of[name]]
    tables = quick_tables()
    for name, entry in manifest["outputs"].items():
        data = (root / name).read_bytes()
        if sha256(data) != entry["sha256"]:
            wrong.append(f"outputs: {name} differs from the manifest")
        if data != tables.get(Path(name), data):
            wrong.append(f"outputs: {name} differs from what the builder writes")
    return wrong


def main() -> int:
    """The command line."""
    parser = argparse.ArgumentParser(description=__doc__, formatter_class=argparse.RawDescriptionHelpFormatter)
    parser.add_argument("--out", type=Path, default=HERE.parents[1], help="the repository; this one if left out")
    parser.add_argument("--check", action="store_true", help="compare, write nothing")
    choice = parser.parse_args()
    if not choice.check:
        build(choice.out)
        return 0
    wrong = check(choice.out)
    for line in wrong:
        print(line, file=sys.stderr)
    print("The tables differ." if wrong else "The tables are what the builder writes.")
    return 1 if wrong else 0


if __name__ == "__main__":
    sys.exit(main())
