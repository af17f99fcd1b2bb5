import { renderToString } from 'preact-render-to-string';
import { describe, expect, it } from 'vitest';
import type { ResidualSeries } from '../../../../src/forecast/index.js';
import { OcStems } from '../../../../src/output/charts/index.js';
import { aResidualSeries } from '../../../fixtures/report.js';

const drawn = (series: ResidualSeries): string =>
  renderToString(<OcStems id="oc" series={series} title="t" finding="f" tableId="table" />);
const count = (html: string, pattern: RegExp): number => html.match(pattern)?.length ?? 0;

/** Heliocentric distances give the ring: the third event is the nearest. */
const distancesAu = [1.66, 1.5, 1.38, 1.45, 1.6];
function withPerihelion(): ResidualSeries {
  const series = aResidualSeries([
    [-26, 0.05],
    [-10, 0.01],
    [4, -0.02],
    [12, 0.02],
    [20, 0.01],
  ]);
  return {
    ...series,
    rows: series.rows.map((row, i) => ({
      ...row,
      event: {
        ...row.event,
        circumstances: {
          ...row.event.circumstances,
          heliocentricDistanceAu: distancesAu[i]!,
        } as typeof row.event.circumstances,
      },
    })),
  };
}

describe('the O−C stems', () => {
  const html = drawn(withPerihelion());

  it('have one stem an event and estimate', () => {
    expect(count(html, /class="stem"/g)).toBe(10);
    expect(
      count(
        drawn(
          aResidualSeries([
            [1, 0.1],
            [2, null],
          ]),
        ),
        /class="stem"/g,
      ),
    ).toBe(3);
  });

  it('stand above the line where the event came late, in proportion', () => {
    const [zero] = [...html.matchAll(/d="M0 ([\d.]+)H628" class="zero"/g)].map(([, y]) => Number(y));
    const tips = [...html.matchAll(/V([\d.]+)" class="stem"/g)].slice(0, 5).map(([, y]) => zero! - Number(y));
    expect(tips[0]).toBeLessThan(0);
    expect(tips[4]).toBeGreaterThan(0);
    expect(tips[4]! / tips[0]!).toBeCloseTo(20 / -26, 2);
  });

  it('have scales of their own: days above, hours below', () => {
    expect([...html.matchAll(/class="end quiet">([^<]+)/g)].map(([, words]) => words)).toEqual([
      '+26 d',
      '0 d',
      '−26 d',
      '+1.2 h',
      '0 h',
      '−1.2 h',
    ]);
  });

  it('mark where the planet is nearest to the Sun, and show how sure each refined instant is', () => {
    expect(count(html, /class="ring"/g)).toBe(1);
    expect(html).toContain('nearest to the planet’s perihelion');
    expect(count(html, /class="bar"/g)).toBe(5);
  });

  it('say so where there is no estimate', () => {
    expect(drawn(aResidualSeries([[null, 0.1]]))).toContain(
      'refined − mean cycle, days: these events have no such estimate',
    );
    expect(drawn(aResidualSeries([]))).not.toMatch(/NaN|Infinity/);
  });
});
