#!/usr/bin/env node
import { readFileSync } from 'node:fs';
import { failureOf } from './failure.js';
import { makeProgram } from './program.js';

/** The built command stands one folder below package.json. */
const versionOf = (): string =>
  (JSON.parse(readFileSync(new URL('../package.json', import.meta.url), 'utf8')) as { version: string })
    .version;

function endWith(fault: unknown): void {
  const { exitCode, lines } = failureOf(fault);
  for (const line of lines) process.stderr.write(`${line}\n`);
  process.exitCode = exitCode;
}

/** Whoever reads the output has seen enough: `synodos events … | head` ends quietly. A full disk is told of. */
process.stdout.on('error', (fault: NodeJS.ErrnoException) => {
  if (fault.code === 'EPIPE') process.exit(0);
  endWith(fault);
});
/** Where nobody listens to notes and faults, results and exit status are the same without them. */
process.stderr.on('error', () => undefined);

try {
  await makeProgram(versionOf()).parseAsync();
} catch (fault) {
  endWith(fault);
}
