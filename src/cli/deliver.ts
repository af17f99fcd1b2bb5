import { realpathSync, statSync, writeFileSync } from 'node:fs';
import { writeWhole } from '../plan/files/index.js';

export interface DeliveryOptions {
  readonly out?: string;
  readonly quiet?: boolean;
}

/** Brings a result to --out FILE, whole or not at all, or to standard output. Notes about it go to standard error. */
export function deliver(
  text: string,
  notes: readonly string[],
  { out, quiet = false }: DeliveryOptions,
): void {
  if (out === undefined) {
    process.stdout.write(text);
  } else {
    const there = statSync(out, { throwIfNoEntry: false });
    if (there === undefined) writeWhole(out, Buffer.from(text));
    // A link's target is replaced, not the link.
    else if (there.isFile()) writeWhole(realpathSync(out), Buffer.from(text));
    // A pipe or a device has no whole to wait for; a folder refuses by itself.
    else writeFileSync(out, text);
  }
  const all = out === undefined ? notes : [...notes, `written to ${out}`];
  if (!quiet) process.stderr.write(all.map((note) => `${note}\n`).join(''));
}
