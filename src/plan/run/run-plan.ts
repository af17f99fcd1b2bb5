import { skyPlanets } from '../../bodies/index.js';
import { forecast, residuals, seasonsOf } from '../../forecast/index.js';
import type { OutputFile } from '../files/index.js';
import { outputs } from './outputs.js';
import type { Plan } from '../plan.js';

/** How much of a run is done after each step, by measure on the demo plan; the outputs take the rest. */
const DONE = { forecast: 0.4, residuals: 0.5, seasons: 0.6 } as const;

/** Runs a plan from end to end: the same plan gives the same files, byte for byte. Nothing is written here. */
export function runPlan(plan: Plan, onProgress: (fraction: number) => void): OutputFile[] {
  const { title, stamp, from, to, sites, kinds, bodies, reckoning, withinDeg } = plan;
  const [home] = sites;
  const found = forecast({
    ...{ from, to, sites },
    ...(kinds && { kinds }),
    ...(bodies && { bodies }),
    ...(reckoning && { reckoning }),
    ...(withinDeg !== undefined && { withinDeg }),
    onProgress: (fraction) => {
      onProgress(fraction * DONE.forecast);
    },
  });
  const series = plan.residuals.map((wish) => residuals(wish));
  onProgress(DONE.residuals);
  const seasons = seasonsOf({
    ...{ from, to },
    bodies: skyPlanets.filter((planet) => found.bodies.includes(planet)),
    ...(home && { site: home }),
  });
  onProgress(DONE.seasons);
  const results = { title, stamp, sites, forecast: found, residuals: series, seasons };
  return outputs.map(({ name, what, render }, i) => {
    const text = render(results);
    onProgress(DONE.seasons + (1 - DONE.seasons) * ((i + 1) / outputs.length));
    return { name, what, text };
  });
}
