import { closeSync, fsyncSync, openSync, renameSync, rmSync, writeSync } from 'node:fs';
import { basename, dirname, join } from 'node:path';

/**
 * Writes a file whole or not at all: into a neighbour of the same folder first, which then takes the name in one step.
 * Whoever reads, or a process that is killed in the middle, finds the old file or the new one, never a part.
 */
export function writeWhole(path: string, content: Uint8Array | Iterable<string>): void {
  const neighbour = join(dirname(path), `.${basename(path)}.${process.pid}.part`);
  try {
    // What a killed process with our number left behind.
    rmSync(neighbour, { force: true });
    writeThrough(neighbour, content);
    renameSync(neighbour, path);
  } catch (fault) {
    rmSync(neighbour, { force: true });
    // A refusal speaks of the file that was asked for, not of its neighbour.
    throw fault instanceof Error && 'path' in fault ? Object.assign(fault, { path }) : fault;
  }
}

/** Writes a new file and waits until the disk has it. `wx`: never through a link that somebody put there. */
function writeThrough(path: string, content: Uint8Array | Iterable<string>): void {
  const file = openSync(path, 'wx', 0o644);
  try {
    for (const bytes of content instanceof Uint8Array ? [content] : inChunks(content)) {
      for (let done = 0; done < bytes.length;) done += writeSync(file, bytes, done);
    }
    fsyncSync(file);
  } finally {
    closeSync(file);
  }
}

const CHUNK_CHARACTERS = 1 << 16;

/** Pieces of text gathered into writes of a fair size, as UTF-8. */
export function* inChunks(pieces: Iterable<string>): Generator<Uint8Array> {
  let gathered = '';
  for (const piece of pieces) {
    gathered += piece;
    if (gathered.length < CHUNK_CHARACTERS) continue;
    yield Buffer.from(gathered);
    gathered = '';
  }
  yield Buffer.from(gathered);
}
