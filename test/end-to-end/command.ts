import { execFileSync, spawnSync } from 'node:child_process';
import { mkdirSync, readdirSync, rmdirSync, statSync } from 'node:fs';
import { join, resolve } from 'node:path';

/** The command as `npm run build` makes it. */
export const COMMAND = resolve('dist/cli.js');

const LOCK = resolve('node_modules/.synodos-build-lock');
const LOCK_LEFT_BEHIND_MILLIS = 120_000;
const WAIT_MILLIS = 200;
const MOST_WAITS = 900;

/** Builds the command where a source is newer. Test files run side by side: the first one builds, the others wait. */
export function ensureBuilt(): void {
  for (let waits = 0; waits < MOST_WAITS; waits++) {
    if (tryLock()) break;
    Atomics.wait(new Int32Array(new SharedArrayBuffer(4)), 0, 0, WAIT_MILLIS);
  }
  try {
    if (!isFresh()) execFileSync('npm', ['run', '--silent', 'build'], { stdio: 'pipe' });
  } finally {
    rmdirSync(LOCK);
  }
}

function tryLock(): boolean {
  try {
    mkdirSync(LOCK);
    return true;
  } catch {
    const made = statSync(LOCK, { throwIfNoEntry: false })?.mtimeMs ?? Date.now();
    if (Date.now() - made > LOCK_LEFT_BEHIND_MILLIS) rmdirSync(LOCK);
    return false;
  }
}

function isFresh(): boolean {
  // The types are built last: where they stand, the build has ended.
  const built = statSync('dist/types/index.d.ts', { throwIfNoEntry: false });
  const command = statSync(COMMAND, { throwIfNoEntry: false });
  if (built === undefined || command === undefined) return false;
  const sources = readdirSync('src', { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name));
  return [...sources, 'esbuild.config.mjs', 'package.json'].every(
    (path) => statSync(path).mtimeMs < command.mtimeMs,
  );
}

export interface Run {
  readonly status: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

export interface RunSettings {
  readonly cwd?: string;
  readonly env?: Readonly<Record<string, string>>;
  /** Options for Node itself. */
  readonly node?: readonly string[];
}

/** Runs the built command and waits for its end. */
export function synodos(args: readonly string[], { cwd, env, node = [] }: RunSettings = {}): Run {
  const { status, stdout, stderr } = spawnSync(process.execPath, [...node, COMMAND, ...args], {
    encoding: 'utf8',
    maxBuffer: 64 * 1024 * 1024,
    ...(cwd !== undefined && { cwd }),
    env: { PATH: process.env['PATH'] ?? '', ...env },
  });
  return { status, stdout, stderr };
}
