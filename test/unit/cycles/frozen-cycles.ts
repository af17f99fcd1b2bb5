import type { Planet, SkyPlanet } from '../../../src/bodies/index.js';
import type { SunConfiguration } from '../../../src/cycles/index.js';

/**
 * The constants that number events for ever: days of TT since J2000.0, and days. A change here renames events in
 * calendars that people already subscribe to, so it is never a correction but a new numbering.
 */
type Epochs = Readonly<Partial<Record<SunConfiguration, number>>>;

/** Cycle 0 and period of every configuration with the Sun, worked out from the printed table in another language. */
export const sunCycles: Readonly<
  Record<SkyPlanet, { readonly periodDays: number; readonly epochs: Epochs }>
> = {
  mercury: {
    periodDays: 115.877478,
    epochs: {
      'inferior-conjunction': -48.857084,
      'superior-conjunction': 9.081655,
      'greatest-elongation-east': 45.381604,
      'greatest-elongation-west': -27.218293,
      'stationary-retrograde': 55.570137,
      'stationary-direct': -37.406827,
      'closest-approach': -48.857084,
      farthest: 9.081655,
      'greatest-brilliancy-evening': 41.614965,
      'greatest-brilliancy-morning': -23.451654,
    },
  },
  venus: {
    periodDays: 583.921368,
    epochs: {
      'inferior-conjunction': -132.216874,
      'superior-conjunction': 159.74381,
      'greatest-elongation-east': -203.048855,
      'greatest-elongation-west': -61.384892,
      'stationary-retrograde': -153.294342,
      'stationary-direct': -111.139406,
      'closest-approach': -132.216874,
      farthest: 159.74381,
      'greatest-brilliancy-evening': -168.465736,
      'greatest-brilliancy-morning': -95.968012,
    },
  },
  mars: {
    periodDays: 779.936271,
    epochs: {
      opposition: -227.520417,
      conjunction: 162.447718,
      'east-quadrature': -121.400866,
      'west-quadrature': -333.639968,
      'stationary-retrograde': -263.886821,
      'stationary-direct': -191.154013,
      'closest-approach': -227.520417,
      farthest: 162.447718,
    },
  },
  jupiter: {
    periodDays: 398.882119,
    epochs: {
      opposition: -73.203878,
      conjunction: 126.237181,
      'east-quadrature': 14.238551,
      'west-quadrature': -160.646308,
      'stationary-retrograde': -133.520124,
      'stationary-direct': -12.887633,
      'closest-approach': -73.203878,
      farthest: 126.237181,
    },
  },
  saturn: {
    periodDays: 378.096035,
    epochs: {
      opposition: -53.049318,
      conjunction: 135.998699,
      'east-quadrature': 35.15313,
      'west-quadrature': -141.251766,
      'stationary-retrograde': -121.848025,
      'stationary-direct': 15.749388,
      'closest-approach': -53.049318,
      farthest: 135.998699,
    },
  },
  uranus: {
    periodDays: 369.656195,
    epochs: {
      opposition: -151.175488,
      conjunction: 33.65261,
      'east-quadrature': -61.828757,
      'west-quadrature': 129.133976,
      'stationary-retrograde': 142.585264,
      'stationary-direct': -75.280045,
      'closest-approach': -151.175488,
      farthest: 33.65261,
    },
  },
  neptune: {
    periodDays: 367.486431,
    epochs: {
      opposition: -158.820083,
      conjunction: 24.923133,
      'east-quadrature': -68.893876,
      'west-quadrature': 118.740141,
      'stationary-retrograde': 129.427608,
      'stationary-direct': -79.581343,
      'closest-approach': -158.820083,
      farthest: 24.923133,
    },
  },
  pluto: {
    periodDays: 366.73564,
    epochs: {
      opposition: 141.055152,
      conjunction: -42.312668,
      'east-quadrature': -135.475071,
      'west-quadrature': 50.849735,
      'stationary-retrograde': 60.15671,
      'stationary-direct': -144.782046,
      'closest-approach': 141.055152,
      farthest: -42.312668,
    },
  },
};

/** Perihelion 0, aphelion 0 and the anomalistic period. */
export const anomalisticCycles: Readonly<
  Record<Planet, readonly [perihelion: number, aphelion: number, periodDays: number]>
> = {
  mercury: [-42.712181, 1.272494, 87.969351],
  venus: [-31.443528, 80.906878, 224.700811],
  earth: [2.509243, -180.120581, 365.259647],
  mars: [-37.002728, 306.495114, 686.995683],
  jupiter: [-236.732348, 1929.827943, 4333.120581],
  saturn: [1273.676686, -4102.422989, 10752.19935],
  uranus: [-12140.230727, 3218.096065, 30716.653585],
  neptune: [16708.866514, -13341.612821, 60100.958671],
  pluto: [-3736.811065, 41527.015836, 90527.653802],
};

/** Heliocentric conjunction 0, opposition 0 and the synodic period of every pair. */
export const heliocentricCycles: readonly (readonly [
  a: Planet,
  b: Planet,
  conjunction: number,
  opposition: number,
  periodDays: number,
])[] = [
  ['mercury', 'venus', -28.219014, 44.064095, 144.566219],
  ['mercury', 'earth', -48.857084, 9.081655, 115.877478],
  ['mercury', 'mars', 28.920235, -21.523871, 100.888213],
  ['mercury', 'jupiter', 35.454523, -9.441632, 89.792311],
  ['mercury', 'saturn', 38.854156, -5.493176, 88.694664],
  ['mercury', 'uranus', 14.94576, -29.165318, 88.222156],
  ['mercury', 'neptune', 12.879354, -31.169653, 88.098015],
  ['mercury', 'pluto', -3.258342, 40.769057, 88.054799],
  ['venus', 'earth', -132.216874, 159.74381, 583.921368],
  ['venus', 'mars', 160.90146, -6.059314, 333.921548],
  ['venus', 'jupiter', -97.154982, 21.340625, 236.991215],
  ['venus', 'saturn', -84.164076, 30.583512, 229.495177],
  ['venus', 'uranus', 82.532108, -30.647018, 226.358253],
  ['venus', 'neptune', 76.998352, -35.773049, 225.5428],
  ['venus', 'pluto', 35.634805, -76.995078, 225.259767],
  ['earth', 'mars', -227.520417, 162.447718, 779.936271],
  ['earth', 'jupiter', -73.203878, 126.237181, 398.882119],
  ['earth', 'saturn', -53.049318, 135.998699, 378.096035],
  ['earth', 'uranus', -151.175488, 33.65261, 369.656195],
  ['earth', 'neptune', -158.820083, 24.923133, 367.486431],
  ['earth', 'pluto', 141.055152, -42.312668, 366.73564],
  ['mars', 'jupiter', 88.332501, -319.88065, 816.426303],
  ['mars', 'saturn', 111.112518, -255.812924, 733.850883],
  ['mars', 'uranus', -82.389852, 268.965589, 702.710882],
  ['mars', 'neptune', -97.609147, 249.846432, 694.911158],
  ['mars', 'pluto', -224.04746, 122.06821, 692.231341],
  ['jupiter', 'saturn', 313.559385, -3314.246332, 7255.611433],
  ['jupiter', 'uranus', -1137.378297, 1385.197984, 5045.152562],
  ['jupiter', 'neptune', -1160.957478, 1173.499472, 4668.9139],
  ['jupiter', 'pluto', -1965.174443, 310.102527, 4550.55394],
  ['saturn', 'uranus', -4448.999271, 3831.106522, 16560.211585],
  ['saturn', 'neptune', -3822.417577, 2725.666347, 13096.167849],
  ['saturn', 'pluto', -5798.549974, 304.287265, 12205.674478],
  ['uranus', 'neptune', -1453.562086, 29850.215675, 62607.555521],
  ['uranus', 'pluto', -9581.311763, 13627.647871, 46417.919268],
  ['neptune', 'pluto', -32884.690694, 56867.556123, 179504.493633],
];
