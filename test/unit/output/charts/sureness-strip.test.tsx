import { renderToString } from 'preact-render-to-string';
import { describe, expect, it } from 'vitest';
import { SurenessStrip } from '../../../../src/output/charts/index.js';

const drawn = (best: number, middle: number, worst: number): string =>
  renderToString(
    <SurenessStrip
      kinds={[{ title: 'opposition', bestSeconds: best, middleSeconds: middle, worstSeconds: worst }]}
      title="t"
      finding="f"
      tableId="table"
    />,
  );

describe('the strip of sureness', () => {
  it('runs between the ticks that hold all the dates, in equal steps for equal powers', () => {
    const html = drawn(60, 600, 3599);
    expect([...html.matchAll(/class="middle">([^<]+)/g)].map(([, words]) => words)).toEqual([
      '1 min',
      '10 min',
      '1 h',
    ]);
    const [first, second, third] = [...html.matchAll(/M([\d.]+) 18V/g)].map(([, x]) => Number(x));
    expect((second! - first!) / (third! - first!)).toBeCloseTo(Math.log(10) / Math.log(60), 2);
    expect(html).toContain(`cx="${second}"`);
  });

  it('stays in the picture for what is surer or vaguer than its ticks', () => {
    const html = drawn(0.01, 5, 1e9);
    const [, from, to] = /d="M([\d.]+) [\d.]+H([\d.]+)" class="range"/.exec(html)!;
    expect(Number(from)).toBeGreaterThan(200);
    expect(Number(to)).toBeLessThan(704);
  });
});
