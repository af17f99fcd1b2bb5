#!/usr/bin/env node
import { readFileSync } from 'node:fs';
import { failureOf } from './failure.js';
import { makeProgram } from './program.js';

/** The built command stands one folder below package.json. */
const versionOf = (): string =>
  (JSON.parse(readFileSync(new URL('../package.json', import.meta.url), 'utf8')) as { version: string })
    .version;

/** Whoever reads the output has seen enough: `synodos events … | head` ends quietly. */
process.stdout.on('error', (fault: NodeJS.ErrnoException) => {
  if (fault.code !== 'EPIPE') throw fault;
  process.exit(0);
});

try {
  await makeProgram(versionOf()).parseAsync();
} catch (fault) {
  const { exitCode, lines } = failureOf(fault);
  for (const line of lines) process.stderr.write(`${line}\n`);
  process.exitCode = exitCode;
}
