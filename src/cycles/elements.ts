import type { Planet } from '../bodies/index.js';
import { DAYS_PER_JULIAN_CENTURY, DAYS_PER_JULIAN_YEAR } from '../time/index.js';
import type { TtDays } from '../time/index.js';

/**
 * Keplerian elements and their rates per Julian century, mean ecliptic and equinox of J2000.0; the Earth is the
 * Earth–Moon barycentre.
 * Source: E. M. Standish, Approximate Positions of the Planets (JPL Solar System Dynamics), Tables 1, 2a and 2b.
 */
export interface MeanElements {
  /** Semi-major axis, au. */
  readonly a: Linear;
  readonly eccentricity: Linear;
  readonly inclinationDeg: Linear;
  readonly meanLongitudeDeg: Linear;
  readonly perihelionLongitudeDeg: Linear;
  readonly nodeLongitudeDeg: Linear;
  /** Table 2b: b·T² + c·cos(f·T) + s·sin(f·T), degrees, added to the mean anomaly; f in degrees per century. */
  readonly anomalyTerms?: {
    readonly b: number;
    readonly c: number;
    readonly s: number;
    readonly fDeg: number;
  };
}

/** Value at J2000.0 and change per Julian century. */
type Linear = readonly [value: number, perCentury: number];

/** `table-1` was fitted to 1800–2050, `table-2` (with its extra terms) to 3000 BC–3000 AD. */
export type ElementTable = 'table-1' | 'table-2';

const TABLE_1_FROM_DAYS = (1800 - 2000) * DAYS_PER_JULIAN_YEAR;
const TABLE_1_TO_DAYS = (2050 - 2000) * DAYS_PER_JULIAN_YEAR;

/** Table 1 for the years that it was made for, Table 2 for all others. */
export const keplerTableFor = (tt: TtDays): ElementTable =>
  tt >= TABLE_1_FROM_DAYS && tt < TABLE_1_TO_DAYS ? 'table-1' : 'table-2';

export const centuryRatePerDay = (perCentury: number): number => perCentury / DAYS_PER_JULIAN_CENTURY;

/** One row as printed: a, e, I, L, ϖ, Ω, and under them their rates. */
function row(values: readonly number[], rates: readonly number[]): MeanElements {
  const linear = (i: number): Linear => [values[i]!, rates[i]!];
  return {
    a: linear(0),
    eccentricity: linear(1),
    inclinationDeg: linear(2),
    meanLongitudeDeg: linear(3),
    perihelionLongitudeDeg: linear(4),
    nodeLongitudeDeg: linear(5),
  };
}

/* prettier-ignore */
const table1: Readonly<Record<Planet, MeanElements>> = {
  mercury: row([0.38709927, 0.20563593, 7.00497902, 252.2503235, 77.45779628, 48.33076593], [0.00000037, 0.00001906, -0.00594749, 149472.67411175, 0.16047689, -0.12534081]),
  venus: row([0.72333566, 0.00677672, 3.39467605, 181.9790995, 131.60246718, 76.67984255], [0.0000039, -0.00004107, -0.0007889, 58517.81538729, 0.00268329, -0.27769418]),
  earth: row([1.00000261, 0.01671123, -0.00001531, 100.46457166, 102.93768193, 0], [0.00000562, -0.00004392, -0.01294668, 35999.37244981, 0.32327364, 0]),
  mars: row([1.52371034, 0.0933941, 1.84969142, -4.55343205, -23.94362959, 49.55953891], [0.00001847, 0.00007882, -0.00813131, 19140.30268499, 0.44441088, -0.29257343]),
  jupiter: row([5.202887, 0.04838624, 1.30439695, 34.39644051, 14.72847983, 100.47390909], [-0.00011607, -0.00013253, -0.00183714, 3034.74612775, 0.21252668, 0.20469106]),
  saturn: row([9.53667594, 0.05386179, 2.48599187, 49.95424423, 92.59887831, 113.66242448], [-0.0012506, -0.00050991, 0.00193609, 1222.49362201, -0.41897216, -0.28867794]),
  uranus: row([19.18916464, 0.04725744, 0.77263783, 313.23810451, 170.9542763, 74.01692503], [-0.00196176, -0.00004397, -0.00242939, 428.48202785, 0.40805281, 0.04240589]),
  neptune: row([30.06992276, 0.00859048, 1.77004347, -55.12002969, 44.96476227, 131.78422574], [0.00026291, 0.00005105, 0.00035372, 218.45945325, -0.32241464, -0.00508664]),
  pluto: row([39.48211675, 0.2488273, 17.14001206, 238.92903833, 224.06891629, 110.30393684], [-0.00031596, 0.0000517, 0.00004818, 145.20780515, -0.04062942, -0.01183482]),
};

/* prettier-ignore */
const table2: Readonly<Record<Planet, MeanElements>> = {
  mercury: row([0.38709843, 0.20563661, 7.00559432, 252.25166724, 77.45771895, 48.33961819], [0, 0.00002123, -0.00590158, 149472.67486623, 0.15940013, -0.12214182]),
  venus: row([0.72332102, 0.00676399, 3.39777545, 181.9797085, 131.76755713, 76.67261496], [-0.00000026, -0.00005107, 0.00043494, 58517.8156026, 0.05679648, -0.27274174]),
  earth: row([1.00000018, 0.01673163, -0.00054346, 100.46691572, 102.93005885, -5.11260389], [-0.00000003, -0.00003661, -0.01337178, 35999.37306329, 0.3179526, -0.24123856]),
  mars: row([1.52371243, 0.09336511, 1.85181869, -4.56813164, -23.91744784, 49.71320984], [0.00000097, 0.00009149, -0.00724757, 19140.29934243, 0.45223625, -0.26852431]),
  jupiter: { ...row([5.20248019, 0.0485359, 1.29861416, 34.33479152, 14.27495244, 100.29282654], [-0.00002864, 0.00018026, -0.00322699, 3034.90371757, 0.18199196, 0.13024619]), anomalyTerms: { b: -0.00012452, c: 0.0606406, s: -0.35635438, fDeg: 38.35125 } },
  saturn: { ...row([9.54149883, 0.05550825, 2.49424102, 50.07571329, 92.86136063, 113.63998702], [-0.00003065, -0.00032044, 0.00451969, 1222.11494724, 0.54179478, -0.25015002]), anomalyTerms: { b: 0.00025899, c: -0.13434469, s: 0.87320147, fDeg: 38.35125 } },
  uranus: { ...row([19.18797948, 0.0468574, 0.77298127, 314.20276625, 172.43404441, 73.96250215], [-0.00020455, -0.0000155, -0.00180155, 428.49512595, 0.09266985, 0.05739699]), anomalyTerms: { b: 0.00058331, c: -0.97731848, s: 0.17689245, fDeg: 7.67025 } },
  neptune: { ...row([30.06952752, 0.00895439, 1.7700552, 304.22289287, 46.68158724, 131.78635853], [0.00006447, 0.00000818, 0.000224, 218.46515314, 0.01009938, -0.00606302]), anomalyTerms: { b: -0.00041348, c: 0.68346318, s: -0.10162547, fDeg: 7.67025 } },
  pluto: { ...row([39.48686035, 0.24885238, 17.1410426, 238.96535011, 224.09702598, 110.30167986], [0.00449751, 0.00006016, 0.00000501, 145.18042903, -0.00968827, -0.00809981]), anomalyTerms: { b: -0.01262724, c: 0, s: 0, fDeg: 0 } },
};

export const meanElements: Readonly<Record<ElementTable, Readonly<Record<Planet, MeanElements>>>> = {
  'table-1': table1,
  'table-2': table2,
};

/** Cycles are numbered by Table 1 at every date, whatever else is used: its linear mean longitudes never change. */
export const numberingElements = meanElements['table-1'];
