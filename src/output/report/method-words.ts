/** Method and limits, as terms and their sentences. */
export const methodWords: readonly (readonly [term: string, words: string])[] = [
  [
    'Mean cycle',
    'From the mean longitudes of Standish’s Table 1 (Approximate Positions of the Planets, JPL). Cycle 0 is the mean instant nearest J2000.0; the number names the event for ever, so a better ephemeris moves it and never doubles it.',
  ],
  [
    'Kepler orbits',
    'Standish’s mean elements: Table 1 within 1800–2050, Table 2 with its extra terms outside. Geometric places.',
  ],
  [
    'Refined instant',
    'Apparent geocentric places: light-time, deflection by the Sun, aberration, precession (IAU 2006) and nutation (the largest terms of IAU 2000B). Each cycle’s stretch is cut at the turning points of the signal, and every branch is searched, so that no pair of roots can hide.',
  ],
  [
    'Oppositions, conjunctions with the Sun, quadratures',
    'Differences of apparent ecliptic longitude of 180°, 0° and 90°, unless right ascension was asked for.',
  ],
  ['Stations', 'Zero of the rate of right ascension, unless longitude was asked for.'],
  [
    'Two planets',
    'Conjunctions in right ascension and in longitude and the least separation (below 5° unless another limit was set) belong to one meeting. A grazing meeting has no conjunction.',
  ],
  ['Greatest elongation', 'The true angle from the Sun’s centre.'],
  ['Closest and farthest', 'True geometric distance at the instant.'],
  ['Perihelion and aphelion', 'The deepest and highest heliocentric distance of each revolution.'],
  ['Magnitudes', 'Mallama & Hilton (2018), Mars averaged over its rotation.'],
  [
    'Best look',
    'The minute of that night at which the lowest of the bodies stands highest above the site’s own horizon, at least 5° high, with the Sun 6° or more below the horizon (12° for Uranus and Neptune) and far enough below the planet for the eye to find it (arcus visionis by Schoch, 1928); bright twilight only for Venus and Jupiter, where darkness offers nothing. Refraction by Sæmundsson (1986).',
  ],
  [
    'Seasons',
    'Every fourth night: how long each planet stands at least 5° high and above the site’s own horizon between the civil twilights (the nautical ones for Uranus and Neptune). Without a site, how long its elongation alone keeps it up in a night of twelve hours.',
  ],
  [
    'Times',
    'UTC by the leap seconds of the IERS; after the last announcement by the extrapolated length of day of Morrison et al. (2021), whose growing uncertainty is in every interval. Before 1972, UT1.',
  ],
  ['Limits', 'Years 1600 to 2600. Weather, buildings and trees beyond the given horizon are not known here.'],
];
