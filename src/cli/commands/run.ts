import { readyFolder, writeOutputs } from '../../plan/files/index.js';
import { runPlan } from '../../plan/run/index.js';
import { planFrom } from '../plan-from.js';
import { withProgress } from '../progress.js';
import { zoneNotes } from '../zone-notes.js';

export interface RunOptions {
  readonly into?: string;
  readonly quiet?: boolean;
}

/** A whole plan, end to end. */
export async function run(file: string, { into = 'out', quiet = false }: RunOptions): Promise<void> {
  const plan = await planFrom(file);
  readyFolder(into);
  const files = withProgress('running the plan', quiet, (tell) => runPlan(plan, tell));
  const written = writeOutputs(into, plan.title, files);
  if (!quiet) {
    const names = written.map(({ name }) => name);
    const notes = [`written into ${into}: ${names.join(', ')}`, ...zoneNotes(plan.sites)];
    process.stderr.write(notes.map((note) => `${note}\n`).join(''));
  }
}
