import { describe, expect, it } from 'vitest';
import { terminalLines } from '../../../src/output/index.js';
import type { TerminalStyle } from '../../../src/output/index.js';
import { aSite, heliocentricEvent, pairEvent, soloEvent } from '../../fixtures/events.js';

const plain: TerminalStyle = { strong: (text) => text, quiet: (text) => text };
const london = aSite({ zone: 'Europe/London' });
const mixed = [
  soloEvent(),
  pairEvent({
    series: { index: 2, of: 3 },
    estimates: { mean: null, kepler: null },
    residualDays: { mean: null, kepler: null },
  }),
  heliocentricEvent({ kind: 'heliocentric-opposition', cycle: -104 }),
];

describe('events on a terminal', () => {
  it('has the form of the house: when, how sure, what, the circumstances, the three answers', () => {
    expect(terminalLines([soloEvent()], london, 200, plain)).toEqual([
      '2027-02-19 Fri 15:45 GMT  ± 2 min  opposition  Mars, Leo, 13.8″, mag −1.2, 0.678 au  cycle +13  mean −0.5 d  kepler +0.2 h',
    ]);
  });

  it('aligns its columns', () => {
    const lines = terminalLines(mixed, undefined, 200, plain);
    const cycles = lines.map((line) => line.indexOf('cycle '));
    expect(new Set(cycles).size).toBe(1);
    expect(cycles[0]).toBeGreaterThan(0);
  });

  it('keeps the three answers at 120 columns, and gives up columns, then letters, below', () => {
    const widths = [200, 120, 100, 80, 60, 40, 10];
    const shapes = widths.map((width) => terminalLines(mixed, undefined, width, plain)[0]!);
    expect(shapes[1]).toMatch(/cycle \+13 +mean −0\.5 d +kepler \+0\.2 h$/);
    expect(shapes[3]).toMatch(/± 2 min +opposition +Mars$/);
    expect(shapes[4]).toMatch(/Mars +opposition$/);
    expect(shapes[6]).toBe('2027-02-19');
  });

  it.each([1, 17, 40, 60, 61, 79, 80, 100, 119, 120, 130])('never wraps: %d columns', (width) => {
    for (const line of terminalLines(mixed, london, width, plain))
      expect(line.length).toBeLessThanOrEqual(width);
  });

  it('styles words without moving them, and never blank ones', () => {
    const tagged: TerminalStyle = { strong: (text) => `<${text}>`, quiet: (text) => `{${text}}` };
    const noMean = pairEvent({ residualDays: { mean: null, kepler: 0.1 } });
    for (const width of [60, 120, 200]) {
      const styled = terminalLines([...mixed, noMean], london, width, tagged);
      expect(styled.map((line) => line.replace(/[<>{}]/g, ''))).toEqual(
        terminalLines([...mixed, noMean], london, width, plain),
      );
      expect(styled.join('')).not.toMatch(/\{\}|<>/);
    }
  });

  it('tells a Kepler residual of days in days', () => {
    const event = soloEvent({ residualDays: { mean: -107.4, kepler: 2.4 } });
    expect(terminalLines([event], undefined, 200, plain)[0]).toMatch(/mean −107\.4 d {2}kepler \+2\.4 d$/);
  });

  it('writes nothing for no events', () => {
    expect(terminalLines([], undefined, 120, plain)).toEqual([]);
  });
});
