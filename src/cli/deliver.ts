import { realpathSync, statSync, writeFileSync } from 'node:fs';
import { inChunks, writeWhole } from '../plan/files/index.js';

export interface DeliveryOptions {
  readonly out?: string;
  readonly quiet?: boolean;
}

/**
 * Brings a result, in pieces or as one, to --out FILE, whole or not at all, or to standard output. Notes about it go to
 * standard error.
 */
export function deliver(
  text: string | Iterable<string>,
  notes: readonly string[],
  { out, quiet = false }: DeliveryOptions,
): void {
  const pieces = typeof text === 'string' ? [text] : text;
  if (out === undefined) {
    for (const chunk of inChunks(pieces)) process.stdout.write(chunk);
  } else {
    const there = statSync(out, { throwIfNoEntry: false });
    if (there === undefined) writeWhole(out, pieces);
    // A link's target is replaced, not the link.
    else if (there.isFile()) writeWhole(realpathSync(out), pieces);
    // A pipe or a device has no whole to wait for; a folder refuses by itself.
    else writeFileSync(out, [...pieces].join(''));
  }
  const all = out === undefined ? notes : [...notes, `written to ${out}`];
  if (!quiet) process.stderr.write(all.map((note) => `${note}\n`).join(''));
}
