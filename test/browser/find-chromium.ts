import { existsSync } from 'node:fs';

const USUAL_PLACES = [
  '/usr/bin/chromium',
  '/usr/bin/chromium-browser',
  '/usr/bin/google-chrome',
  '/Applications/Chromium.app/Contents/MacOS/Chromium',
  '/Applications/Google Chrome.app/Contents/MacOS/Google Chrome',
];

/** Where a Chromium is, or null: CHROME_PATH first, then the usual places. */
export function findChromium(): string | null {
  const named = process.env['CHROME_PATH'];
  return [...(named === undefined ? [] : [named]), ...USUAL_PLACES].find((path) => existsSync(path)) ?? null;
}
