import { renderToString } from 'preact-render-to-string';
import { describe, expect, it } from 'vitest';
import type { PairCircumstances } from '../../../../src/forecast/index.js';
import { CloseUp, fieldFor } from '../../../../src/output/charts/close-up.js';
import { PlanetDisc } from '../../../../src/output/charts/planet-disc.js';
import { aBody, pairEvent } from '../../../fixtures/events.js';

function drawn(separationDeg: number, positionAngleDeg: number) {
  const pair = pairEvent({}, { separationDeg, positionAngleDeg }).circumstances as PairCircumstances;
  const html = renderToString(
    <CloseUp id="c" pair={pair} title="t" finding="f" legend="l" tableId="table" />,
  );
  const [first, second] = [...html.matchAll(/cx="([\d.]+)" cy="([\d.]+)" r="[\d.]+" class="point"/g)].map(
    ([, x, y]) => ({ x: Number(x), y: Number(y) }),
  );
  return { html, first: first!, second: second! };
}

describe('the close-up', () => {
  it('draws the second body where its position angle points: north up, east left', () => {
    const north = drawn(0.5, 0);
    expect(north.second.y).toBeLessThan(north.first.y);
    expect(north.second.x).toBeCloseTo(north.first.x, 1);
    const east = drawn(0.5, 90);
    expect(east.second.x).toBeLessThan(east.first.x);
    expect(east.second.y).toBeCloseTo(east.first.y, 1);
  });

  it('keeps to one scale: the separation to the field as their angles', () => {
    const { html, first, second } = drawn(0.5, 37);
    const radius = Number(/r="([\d.]+)" class="field"/.exec(html)![1]);
    const apart = Math.hypot(first.x - second.x, first.y - second.y);
    // Places are rounded to a tenth of a pixel.
    expect(apart / (2 * radius)).toBeCloseTo(0.5 / fieldFor(0.5), 2);
    expect(html).toContain('The circle is a field of 1.0°.');
  });

  it('takes the smallest field that leaves some room', () => {
    expect([0.1, 0.35, 0.36, 0.8, 1.9, 4].map(fieldFor)).toEqual([0.5, 0.5, 1, 2.5, 4, 6.5]);
  });

  it('names the upper body above itself and the lower below, so that names never cross', () => {
    for (const angle of [0, 45, 90, 135, 180, 225, 270, 315]) {
      const { html } = drawn(0.1, angle);
      const heights = [...html.matchAll(/y="([\d.]+)" class="middle name inside"/g)].map(([, y]) =>
        Number(y),
      );
      expect(Math.abs(heights[0]! - heights[1]!)).toBeGreaterThan(20);
    }
  });

  it('tells sizes and phases', () => {
    expect(drawn(0.5, 0).html).toContain('13.8″, 100 % lit');
  });
});

describe('a planet’s disc', () => {
  const shapeOf = (illuminatedFraction: number): string =>
    /<path d="([^"]+)"/.exec(
      renderToString(<PlanetDisc body={aBody({ illuminatedFraction })} x={0} y={0} radius={10} />),
    )![1]!;

  it('is lit by half a circle and half an ellipse, hollow below one half and bulging above', () => {
    expect(shapeOf(1)).toBe('M-10 0A10 10 0 0 1 10 0A10 10 0 0 1 -10 0Z');
    expect(shapeOf(0.75)).toBe('M-10 0A10 10 0 0 1 10 0A10 5 0 0 1 -10 0Z');
    expect(shapeOf(0.25)).toBe('M-10 0A10 10 0 0 1 10 0A10 5 0 0 0 -10 0Z');
    expect(shapeOf(0)).toBe('M-10 0A10 10 0 0 1 10 0A10 10 0 0 0 -10 0Z');
  });

  it('turns its bright limb to the Sun: to the right in the evening sky on the equator at the equinox', () => {
    const html = renderToString(
      <PlanetDisc
        body={aBody({
          elongationDeg: 40,
          elongationSide: 'east',
          eclipticLongitudeDeg: 90,
          eclipticLatitudeDeg: 0,
        })}
        x={0}
        y={0}
        radius={10}
      />,
    );
    const turn = Number(/rotate\(([-\d.]+)\)/.exec(html)![1]);
    // At longitude 90° ecliptic and equator run side by side, so the Sun is due west but for the curve of its circle.
    expect(turn).toBeGreaterThan(70);
    expect(turn).toBeLessThan(110);
  });
});
