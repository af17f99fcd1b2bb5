// Builds the command and the library face into dist/. Rooms that only some commands need (the calendar writer,
// the report, the plan reader) are imported lazily in the source, and so become chunks that start-up never reads.
import { execFileSync } from 'node:child_process';
import { rmSync } from 'node:fs';
import { build } from 'esbuild';

rmSync('dist', { recursive: true, force: true });

await build({
  entryPoints: { cli: 'src/cli/main.ts', index: 'src/index.ts' },
  outdir: 'dist',
  bundle: true,
  splitting: true,
  format: 'esm',
  platform: 'node',
  target: 'node20.19',
  jsx: 'automatic',
  jsxImportSource: 'preact',
  // Bundled packages that are CommonJS inside may call require.
  banner: {
    js: "import { createRequire as __createRequire } from 'node:module'; const require = __createRequire(import.meta.url);",
  },
  chunkNames: 'chunks/[name]-[hash]',
  // A command that answers at once is read at once: half the bytes are a third of the start-up.
  minify: true,
  legalComments: 'linked',
});

execFileSync(process.execPath, ['node_modules/typescript/bin/tsc', '-p', 'tsconfig.types.json'], {
  stdio: 'inherit',
});
