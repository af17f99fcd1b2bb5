import type { Planet } from '../bodies/index.js';
import { centuryRatePerDay, numberingElements } from './elements.js';
import { meanCycleOf } from './mean-cycle.js';
import type { MeanCycle } from './mean-cycle.js';

/** The mean cycle of a planet's perihelia or aphelia, by its mean anomaly. */
export function anomalisticCycle(planet: Planet, apsis: 'perihelion' | 'aphelion'): MeanCycle {
  const { meanLongitudeDeg: longitude, perihelionLongitudeDeg: perihelion } = numberingElements[planet];
  return meanCycleOf(
    longitude[0] - perihelion[0],
    centuryRatePerDay(longitude[1] - perihelion[1]),
    apsis === 'perihelion' ? 0 : 180,
  );
}
