import { mkdtempSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import axe from 'axe-core';
import { chromium } from 'playwright-core';
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { skyPlanets } from '../../src/bodies/index.js';
import { forecast, residuals, seasonsOf } from '../../src/forecast/index.js';
import { renderReport } from '../../src/output/report/index.js';
import { loadPlan } from '../../src/plan/index.js';
import { runPlan } from '../../src/plan/run/index.js';
import { at } from '../fixtures/events.js';
import { findChromium } from './find-chromium.js';

const executablePath = findChromium();
const inCi = process.env['CI'] !== undefined;
if (executablePath === null && !inCi) {
  console.warn(
    'No Chromium found: install one (Debian: apt-get install chromium) or set CHROME_PATH to look at the report.',
  );
}

/** The report of the demo plan: two years, all kinds, three sites. */
function demoReport(): string {
  const reading = loadPlan('data/demo/plan.yaml');
  if (!('plan' in reading)) throw new Error('the demo plan has faults');
  return runPlan(reading.plan, () => undefined).find(({ name }) => name === 'report.html')!.text;
}

/** A year for nobody in particular. */
function geocentricReport(): string {
  const span = { from: at('2028-01-01T00:00:00Z'), to: at('2029-01-01T00:00:00Z') };
  return renderReport({
    title: 'A year of planets',
    forecast: forecast(span),
    sites: [],
    residuals: [residuals({ pair: ['earth', 'saturn'], from: at('2000-01-01T00:00:00Z'), to: span.to })],
    seasons: seasonsOf({ ...span, bodies: skyPlanets.filter((body) => body !== 'pluto') }),
  });
}

describe.skipIf(executablePath === null && !inCi).each([
  // Two years with three sites: a booklet, neither a torn page nor a ream.
  { of: 'of the demo plan', makeReport: demoReport, sheets: [15, 45] },
  { of: 'without a site', makeReport: geocentricReport, sheets: [8, 30] },
] as const)('the report $of in Chromium', ({ makeReport, sheets: [fewest, most] }) => {
  let folder: string;
  let file: string;
  let browser: Browser;

  beforeAll(async () => {
    folder = mkdtempSync(join(tmpdir(), 'synodos-report-'));
    file = join(folder, 'report.html');
    writeFileSync(file, makeReport());
    browser = await chromium.launch({
      ...(executablePath !== null && { executablePath }),
      args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking'],
    });
  });
  afterAll(async () => {
    await browser.close();
    rmSync(folder, { recursive: true });
  });

  interface Opened {
    readonly page: Page;
    readonly complaints: string[];
    readonly requests: string[];
  }

  async function open(width: number, options: BrowserContextOptions = {}): Promise<Opened> {
    const page = await browser.newPage({ viewport: { width, height: 900 }, ...options });
    const complaints: string[] = [];
    const requests: string[] = [];
    page.on('console', (message) => complaints.push(message.text()));
    page.on('pageerror', (error) => complaints.push(error.message));
    page.on('request', (request) => requests.push(request.url()));
    await page.goto(pathToFileURL(file).href);
    return { page, complaints, requests };
  }

  it('weighs less than 900 kB', () => {
    expect(statSync(file).size).toBeLessThan(900_000);
  });

  it('opens without a complaint and asks for nothing but itself', async () => {
    const { page, complaints, requests } = await open(1280);
    expect(complaints).toEqual([]);
    expect(requests).toEqual([pathToFileURL(file).href]);
    await page.close();
  });

  it.each([
    [1280, 'light'],
    [360, 'dark'],
  ] as const)('has no serious fault of access at %i px, %s', async (width, colorScheme) => {
    // The page forbids every script, so the checker needs leave to run beside it.
    const { page } = await open(width, { colorScheme, bypassCSP: true });
    await page.evaluate(axe.source);
    const faults = await page.evaluate(async () => {
      const { violations } = await (globalThis as unknown as { axe: typeof axe }).axe.run();
      return violations.map(({ id, impact, nodes }) => ({ id, impact, first: nodes[0]?.html }));
    });
    expect(faults.filter(({ impact }) => impact === 'serious' || impact === 'critical')).toEqual([]);
    await page.close();
  });

  it.each([360, 768, 1280])('fits a window of %i px', async (width) => {
    const { page } = await open(width);
    expect(await page.evaluate('document.documentElement.scrollWidth')).toBeLessThanOrEqual(width);
    await page.close();
  });

  it('shows no word smaller than 12 px in a picture on a phone, and cuts none off', async () => {
    const { page } = await open(360);
    const words = await page.evaluate(wordsInPictures);
    expect(words.length).toBeGreaterThan(50);
    expect(words.filter(({ shownPx }) => shownPx < 12)).toEqual([]);
    expect(words.filter(({ inside }) => !inside)).toEqual([]);
    await page.close();
  });

  it('lets the keyboard reach every picture that scrolls', async () => {
    const { page } = await open(360);
    const unreachable = await page.evaluate(
      `[...document.querySelectorAll('*')].filter((e) => e.scrollWidth > e.clientWidth + 1 &&
          ['auto', 'scroll'].includes(getComputedStyle(e).overflowX) && e.tabIndex !== 0).length`,
    );
    expect(unreachable).toBe(0);
    await page.close();
  });

  it('lets the skip link lead past the header', async () => {
    const { page } = await open(1280);
    await page.keyboard.press('Tab');
    expect(await page.evaluate('document.activeElement.textContent')).toBe('To the content');
    expect(await page.evaluate('document.activeElement.getBoundingClientRect().left')).toBeGreaterThan(0);
    await page.keyboard.press('Enter');
    expect(await page.evaluate('location.hash')).toBe('#content');
    await page.close();
  });

  it('lets every picture speak: a title, a description and the way to its numbers', async () => {
    const { page } = await open(1280);
    const mute = await page.evaluate(
      `[...document.querySelectorAll('figure')].filter((figure) => {
          const target = figure.querySelector('a[href^="#"]')?.getAttribute('href').slice(1);
          return !figure.querySelector('svg > title')?.textContent || !figure.querySelector('svg > desc')?.textContent ||
            document.getElementById(target ?? '')?.tagName !== 'TABLE';
        }).map((figure) => figure.textContent.slice(0, 60))`,
    );
    expect(mute).toEqual([]);
    expect(await page.locator('figure').count()).toBeGreaterThan(3);
    expect(await page.locator('script').count()).toBe(0);
    await page.close();
  });

  it.each(['A4', 'Letter'] as const)('prints on %s', async (format) => {
    const { page } = await open(1280, { colorScheme: 'dark' });
    const pdf = (await page.pdf({ format })).toString('latin1');
    const sheets = pdf.match(/\/Type\s*\/Page\b/g)?.length ?? 0;
    expect(sheets).toBeGreaterThanOrEqual(fewest);
    expect(sheets).toBeLessThanOrEqual(most);
    await page.emulateMedia({ media: 'print' });
    const ground = await page.evaluate('getComputedStyle(document.body).backgroundColor');
    expect(ground).toBe('rgba(0, 0, 0, 0)');
    expect(await page.evaluate('getComputedStyle(document.documentElement).backgroundColor')).toBe(
      'rgba(0, 0, 0, 0)',
    );
    await page.close();
  });
});

interface WordInPicture {
  readonly words: string;
  readonly shownPx: number;
  readonly inside: boolean;
}

/** Runs in the page. A pixel of overhang is the rounding of letter shapes. */
function wordsInPictures(): WordInPicture[] {
  interface Box {
    readonly left: number;
    readonly right: number;
    readonly top: number;
    readonly bottom: number;
    readonly width: number;
  }
  interface Svg {
    readonly textContent: string;
    readonly ownerSVGElement: Svg;
    getBoundingClientRect(): Box;
    getAttribute(name: string): string;
  }
  const page = globalThis as unknown as {
    document: { querySelectorAll(selector: string): Iterable<Svg> };
    getComputedStyle(element: Svg): { fontSize: string };
  };
  return [...page.document.querySelectorAll('svg text')].map((text) => {
    const svg = text.ownerSVGElement;
    const [frame, box] = [svg.getBoundingClientRect(), text.getBoundingClientRect()];
    const scale = frame.width / Number(svg.getAttribute('width'));
    return {
      words: text.textContent,
      shownPx: parseFloat(page.getComputedStyle(text).fontSize) * scale,
      inside:
        box.left > frame.left - 1 &&
        box.right < frame.right + 1 &&
        box.top > frame.top - 1 &&
        box.bottom < frame.bottom + 1,
    };
  });
}
