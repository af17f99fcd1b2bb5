import { forecast, residuals } from '../forecast/index.js';
import type { OutputFile } from './files/index.js';
import { outputs } from './outputs.js';
import type { Plan } from './plan.js';

/** The part of a run's time that the forecast takes, by measure; the residuals take the rest. */
const FORECAST_SHARE = 0.8;

/** Runs a plan from end to end: the same plan gives the same files, byte for byte. Nothing is written here. */
export function runPlan(plan: Plan, onProgress: (fraction: number) => void): OutputFile[] {
  const { from, to, sites, kinds, bodies, reckoning, withinDeg } = plan;
  const results = {
    plan,
    forecast: forecast({
      ...{ from, to, sites },
      ...(kinds && { kinds }),
      ...(bodies && { bodies }),
      ...(reckoning && { reckoning }),
      ...(withinDeg !== undefined && { withinDeg }),
      onProgress: (fraction) => {
        onProgress(fraction * FORECAST_SHARE);
      },
    }),
    residuals: plan.residuals.map((wish, i) => {
      onProgress(FORECAST_SHARE + (1 - FORECAST_SHARE) * (i / plan.residuals.length));
      return residuals(wish);
    }),
  };
  return outputs.map(({ name, what, render }) => ({ name, what, text: render(results) }));
}
