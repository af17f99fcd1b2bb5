import type { Plan } from '../plan/index.js';
import { UsageError } from './usage-error.js';

/** The plan of a file; all its faults as one UsageError. The plan reader is loaded only here. */
export async function planFrom(file: string): Promise<Plan> {
  const { faultLine, loadPlan } = await import('../plan/index.js');
  const reading = loadPlan(file);
  if ('plan' in reading) return reading.plan;
  throw new UsageError(reading.faults.map((fault) => faultLine(file, fault)));
}
