import { spawn } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { COMMAND, ensureBuilt, synodos } from './command.js';

const events = [
  'events',
  '--from',
  '2027-01-01',
  '--to',
  '2027-06-01',
  '--format',
  'csv',
  '--quiet',
  '--out',
];

let folder: string;
beforeAll(() => {
  ensureBuilt();
  folder = mkdtempSync(join(tmpdir(), 'synodos-'));
});
afterAll(() => {
  rmSync(folder, { recursive: true });
});

/** Makes Node write only the first `bytes` of a file, and then die as by SIGKILL: no handler, no clean-up. */
function preloadThatDiesAfter(bytes: number): string {
  const preload = join(folder, `die-${bytes}.mjs`);
  writeFileSync(
    preload,
    `import fs from 'node:fs';
import { syncBuiltinESMExports } from 'node:module';
const write = fs.writeSync;
fs.writeSync = (file, data, from) => {
  if (file < 3) return write(file, data, from);
  write(file, data, from, Math.min(${bytes}, data.length - from));
  process.kill(process.pid, 'SIGKILL');
  for (;;);
};
syncBuiltinESMExports();
`,
  );
  return preload;
}

describe('a kill in the middle of writing', () => {
  it.each([0, 1, 5000])('after %d bytes leaves the old file as it was', (bytes) => {
    const file = join(folder, `old-${bytes}.csv`);
    writeFileSync(file, 'the old file\n');
    const { status } = synodos([...events, file], { node: ['--import', preloadThatDiesAfter(bytes)] });
    expect(status).toBeNull();
    expect(readFileSync(file, 'utf8')).toBe('the old file\n');
    // And the next run is not in its way.
    expect(synodos([...events, file]).status).toBe(0);
    expect(readFileSync(file, 'utf8')).toMatch(/^id,kind,/);
  });

  it('at any moment leaves the old file or the new one', async () => {
    const file = join(folder, 'raced.csv');
    const whole = join(folder, 'whole.csv');
    const started = Date.now();
    synodos([...events, whole]);
    const duration = Date.now() - started;
    const fresh = readFileSync(whole, 'utf8');
    for (let i = 0; i < 6; i++) {
      writeFileSync(file, 'old');
      const run = spawn(process.execPath, [COMMAND, ...events, file]);
      const closed = new Promise((resolve) => run.on('close', resolve));
      // From a little before to a little after the time that a whole run takes.
      await new Promise((resolve) => setTimeout(resolve, duration * (0.7 + 0.1 * i)));
      run.kill('SIGKILL');
      await closed;
      expect(['old', fresh]).toContain(readFileSync(file, 'utf8'));
    }
  });
});
