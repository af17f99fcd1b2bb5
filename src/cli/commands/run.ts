import { writeOutputs } from '../../plan/files/index.js';
import { runPlan } from '../../plan/index.js';
import { quoted } from '../../plan/words/index.js';
import { planFrom } from '../plan-from.js';
import { progressOf } from '../progress.js';

export interface RunOptions {
  readonly into?: string;
  readonly quiet?: boolean;
}

/** A whole plan, end to end. */
export async function run(file: string, { into = 'out', quiet = false }: RunOptions): Promise<void> {
  const plan = await planFrom(file);
  const progress = progressOf(`running ${quoted(plan.title)}`, quiet);
  const files = runPlan(plan, progress.tell);
  progress.end();
  const written = writeOutputs(into, plan.title, files);
  if (!quiet) {
    const names = written.map(({ name }) => name);
    process.stderr.write(`written into ${into}: ${names.join(', ')}\n`);
  }
}
