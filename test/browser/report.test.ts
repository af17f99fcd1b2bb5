import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import { chromium } from 'playwright-core';
import type { Browser, BrowserContextOptions, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { loadPlan } from '../../src/plan/index.js';
import { writeOutputs } from '../../src/plan/files/index.js';
import { runPlan } from '../../src/plan/run/index.js';
import { findChromium } from './find-chromium.js';

const executablePath = findChromium();
const inCi = process.env['CI'] !== undefined;
if (executablePath === null && !inCi) {
  console.warn(
    'No Chromium found: install one (Debian: apt-get install chromium) or set CHROME_PATH to look at the report.',
  );
}

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');
const PHONE = { width: 360, height: 740 };
const SMALLEST_TEXT_PX = 12;

interface Look {
  readonly page: Page;
  /** What the page said on its console, and what it tried to fetch. */
  readonly complaints: string[];
}

describe.skipIf(executablePath === null && !inCi)('the report of the demo plan in Chromium', () => {
  const folder = mkdtempSync(join(tmpdir(), 'report-'));
  let browser: Browser;

  beforeAll(async () => {
    const plan = loadPlan('data/demo/plan.yaml');
    if (!('plan' in plan)) throw new Error('the demo plan has faults');
    writeOutputs(
      folder,
      plan.plan.title,
      runPlan(plan.plan, () => undefined),
    );
    browser = await chromium.launch({
      ...(executablePath !== null && { executablePath }),
      args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking'],
    });
  });

  afterAll(async () => {
    await browser.close();
    rmSync(folder, { recursive: true, force: true });
  });

  async function open(options: BrowserContextOptions): Promise<Look> {
    const page = await (await browser.newContext(options)).newPage();
    const complaints: string[] = [];
    const address = pathToFileURL(join(folder, 'report.html')).href;
    page.on('console', (message) => complaints.push(`console: ${message.text()}`));
    page.on('pageerror', (error) => complaints.push(`error: ${error.message}`));
    page.on('request', (request) => {
      if (request.url() !== address) complaints.push(`request: ${request.url()}`);
    });
    await page.goto(address, { waitUntil: 'networkidle' });
    return { page, complaints };
  }

  it.each(['light', 'dark'] as const)('is quiet and free of serious barriers, %s', async (colorScheme) => {
    // The page forbids every script, so the checker needs leave to run beside it.
    const { page, complaints } = await open({ colorScheme, bypassCSP: true });
    await page.evaluate(axeSource);
    const violations = await page.evaluate(async () => {
      const { axe } = globalThis as unknown as {
        axe: {
          run: () => Promise<{ violations: { id: string; impact: string; nodes: { html: string }[] }[] }>;
        };
      };
      const found = await axe.run();
      return found.violations
        .filter(({ impact }) => impact === 'serious' || impact === 'critical')
        .map(({ id, nodes }) => `${id}: ${nodes[0]?.html ?? ''}`);
    });
    expect(violations).toEqual([]);
    expect(complaints).toEqual([]);
  });

  it('forbids scripts and fetching, and asks for neither', async () => {
    const { page, complaints } = await open({});
    expect(await page.locator('script').count()).toBe(0);
    expect(complaints).toEqual([]);
  });

  it('fits a phone: no sideways scrolling of the page, no picture with text too small to read', async () => {
    const { page } = await open({ viewport: PHONE });
    const widths = await page.evaluate(() => [document.documentElement.scrollWidth, window.innerWidth]);
    expect(widths[0]).toBeLessThanOrEqual(widths[1]!);
    const smallest = await page.evaluate(() =>
      Math.min(
        ...[...document.querySelectorAll('svg[role=img]')].map((svg) => {
          const { width } = svg.getBoundingClientRect();
          const scale = width / (svg as SVGSVGElement).viewBox.baseVal.width;
          const sizes = [...svg.querySelectorAll('text')].map((text) =>
            parseFloat(getComputedStyle(text).fontSize),
          );
          return scale * Math.min(...sizes);
        }),
      ),
    );
    expect(smallest).toBeGreaterThanOrEqual(SMALLEST_TEXT_PX);
  });

  it('can be read with the keyboard: every region that scrolls takes the focus, and the first stop leads to the content', async () => {
    const { page } = await open({ viewport: PHONE });
    await page.keyboard.press('Tab');
    expect(await page.evaluate(() => document.activeElement?.textContent.trim())).toBe('To the content');
    const unreachable = await page.evaluate(
      () =>
        [...document.querySelectorAll('*')].filter((element) => {
          const { overflowX } = getComputedStyle(element);
          return (
            overflowX === 'auto' &&
            element.scrollWidth > element.clientWidth &&
            (element as HTMLElement).tabIndex < 0
          );
        }).length,
    );
    expect(unreachable).toBe(0);
  });

  it.each(['A4', 'Letter'] as const)('prints on %s', async (format) => {
    const { page } = await open({});
    const pdf = (await page.pdf({ format })).toString('latin1');
    const pages = Math.max(...[...pdf.matchAll(/\/Count (\d+)/g)].map(([, count]) => Number(count)));
    // Two years with three sites: a booklet, neither a torn page nor a ream.
    expect(pages).toBeGreaterThan(10);
    expect(pages).toBeLessThan(80);
  });

  it('lets every picture speak: a title, a description and the way to its numbers', async () => {
    const { page } = await open({});
    const mute = await page.evaluate(() =>
      [...document.querySelectorAll('figure')]
        .filter((figure) => {
          const link = figure.querySelector('a[href^="#"]');
          const target = link && document.getElementById(link.getAttribute('href')!.slice(1));
          return (
            !figure.querySelector('title')?.textContent ||
            !figure.querySelector('desc')?.textContent ||
            !target
          );
        })
        .map((figure) => figure.textContent.slice(0, 60)),
    );
    expect(mute).toEqual([]);
  });
});
