export { runPlan } from './run-plan.js';
