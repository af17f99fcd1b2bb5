import { execFileSync, spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ensureBuilt } from './command.js';

let folder: string;
beforeAll(() => {
  ensureBuilt();
  folder = mkdtempSync(join(tmpdir(), 'synodos-'));
});
afterAll(() => {
  rmSync(folder, { recursive: true });
});

describe('the package', () => {
  it('packed and installed elsewhere gives a command and a library that work', { timeout: 120_000 }, () => {
    // The build that stands is packed; building again would pull it from under the other tests.
    const packed = execFileSync('npm', ['pack', '--ignore-scripts', '--json', '--pack-destination', folder], {
      encoding: 'utf8',
    });
    const [{ filename, files }] = JSON.parse(packed) as [{ filename: string; files: { path: string }[] }];
    expect(files.map(({ path }) => path)).toEqual(
      expect.arrayContaining([
        'dist/cli.js',
        'dist/index.js',
        'dist/types/index.d.ts',
        'data/demo/plan.yaml',
        'README.md',
      ]),
    );
    expect(files.filter(({ path }) => /^(src|test|out)\//.test(path))).toEqual([]);

    const elsewhere = join(folder, 'elsewhere');
    mkdirSync(elsewhere);
    writeFileSync(
      join(elsewhere, 'package.json'),
      '{ "name": "elsewhere", "private": true, "type": "module" }\n',
    );
    execFileSync('npm', ['install', '--prefer-offline', '--no-audit', '--no-fund', join(folder, filename)], {
      cwd: elsewhere,
      stdio: 'pipe',
    });
    const command = join(elsewhere, 'node_modules/.bin/synodos');
    const run = (args: readonly string[]) => spawnSync(command, args, { cwd: elsewhere, encoding: 'utf8' });
    expect(run(['period', 'mars', 'earth'])).toMatchObject({
      status: 0,
      stdout: expect.stringContaining('779.936') as string,
    });
    const demo = 'node_modules/synodos/data/demo/plan.yaml';
    expect(run(['run', demo, '--into', 'out'])).toMatchObject({ status: 0, stdout: '' });

    writeFileSync(
      join(elsewhere, 'use.js'),
      `import { forecast } from 'synodos';
const { events } = forecast({ from: Date.UTC(2027, 0, 1), to: Date.UTC(2028, 0, 1), kinds: ['opposition'], bodies: ['mars'] });
process.stdout.write(events.map(({ id }) => id).join());
`,
    );
    const used = spawnSync(process.execPath, ['use.js'], { cwd: elsewhere, encoding: 'utf8' });
    expect(used).toMatchObject({ status: 0, stdout: 'opposition.mars.+13.a', stderr: '' });
  });
});
