import { lstatSync, mkdirSync, realpathSync } from 'node:fs';
import { join } from 'node:path';
import { manifestOf } from './manifest.js';
import type { OutputFile } from './manifest.js';
import { OutputError } from './output-error.js';
import { writeWhole } from './write-whole.js';

/** Letters, digits, hyphens and single dots: nothing that leads anywhere else, on any system. */
const BARE_NAME = /^[A-Za-z0-9][A-Za-z0-9-]*(?:\.[A-Za-z0-9-]+)*$/;

/** Makes an output folder where it is missing, and says where it really is. Done before the work, it spares it. */
export function readyFolder(folder: string): string {
  mkdirSync(folder, { recursive: true });
  return realpathSync(folder);
}

/**
 * Writes a plan's outputs and their manifest into a folder, each whole or not at all, the manifest last. Nothing is
 * written outside it: a name that leads out, a link or a folder in the place of a file is refused before the first byte.
 */
export function writeOutputs(folder: string, title: string, files: readonly OutputFile[]): OutputFile[] {
  const place = readyFolder(folder);
  const all = [...files, manifestOf(title, files)];
  for (const { name } of all) refuseUnsafe(place, name);
  for (const { name, text } of all) writeWhole(join(place, name), Buffer.from(text));
  return all;
}

function refuseUnsafe(place: string, name: string): void {
  if (!BARE_NAME.test(name)) {
    throw new OutputError(
      `${JSON.stringify(name)} is not a bare file name: use letters, digits, dots and hyphens`,
    );
  }
  const there = lstatSync(join(place, name), { throwIfNoEntry: false });
  if (there !== undefined && !there.isFile()) {
    throw new OutputError(
      `${name} in the output folder is ${there.isSymbolicLink() ? 'a link' : 'not a plain file'}: remove it, or name another folder`,
    );
  }
}
