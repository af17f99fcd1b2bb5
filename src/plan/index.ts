export { faultLine } from './fault.js';
export type { Fault } from './fault.js';
export { loadPlan } from './load-plan.js';
export type { Plan, ResidualWish } from './plan.js';
export { readPlan } from './read-plan.js';
export type { PlanReading } from './read-plan.js';
