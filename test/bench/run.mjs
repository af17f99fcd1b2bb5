// Bundles the bench as the command itself is bundled, and runs it: loaders that keep function names for debugging
// would slow both sides, and not alike.
import { build } from 'esbuild';

const outfile = 'dist/bench.mjs';
await build({
  entryPoints: ['test/bench/bench.ts'],
  outfile,
  bundle: true,
  platform: 'node',
  format: 'esm',
  external: ['astronomy-engine'],
});
await import(`../../${outfile}`);
