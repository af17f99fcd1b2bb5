import { createHash } from 'node:crypto';

/** Something to be written: its bare file name, its bytes, and what it is in a sentence. */
export interface OutputFile {
  readonly name: string;
  readonly text: string;
  readonly what: string;
}

export const MANIFEST_NAME = 'manifest.json';
export const MANIFEST_SCHEMA = 'synodos-manifest-1';

/** The list of what was written, with sizes and checksums. No clock and no path: the same plan gives the same bytes. */
export function manifestOf(title: string, files: readonly OutputFile[]): OutputFile {
  const manifest = {
    schema: MANIFEST_SCHEMA,
    title,
    files: files.map(({ name, text, what }) => ({
      name,
      bytes: Buffer.byteLength(text),
      sha256: createHash('sha256').update(text).digest('hex'),
      what,
    })),
  };
  return { name: MANIFEST_NAME, text: `${JSON.stringify(manifest, null, 2)}\n`, what: 'what was written' };
}
