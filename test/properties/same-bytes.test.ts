import { execFileSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const script = fileURLToPath(new URL('../fixtures/print-outputs.ts', import.meta.url));
const printUnder = (environment: Record<string, string>): string =>
  execFileSync(process.execPath, ['--import', 'tsx', script], {
    env: { ...process.env, ...environment },
    encoding: 'utf8',
    maxBuffer: 64 << 20,
  });

describe('every output', () => {
  it('has the same bytes whatever the host’s zone and locale', () => {
    const here = printUnder({ TZ: 'UTC', LC_ALL: 'C' });
    expect(here.length).toBeGreaterThan(100_000);
    expect(printUnder({ TZ: 'Asia/Kathmandu', LC_ALL: 'ar_EG.UTF-8', LANG: 'ar_EG.UTF-8' })).toBe(here);
    expect(printUnder({ TZ: 'America/St_Johns', LC_ALL: 'tr_TR.UTF-8', LANG: 'tr_TR.UTF-8' })).toBe(here);
  });
});
