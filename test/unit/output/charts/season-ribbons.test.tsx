import { scaleLinear } from 'd3-scale';
import { renderToString } from 'preact-render-to-string';
import { describe, expect, it } from 'vitest';
import { SeasonRibbons } from '../../../../src/output/charts/index.js';
import { Ribbon, reachAt } from '../../../../src/output/charts/ribbon.js';
import { SeasonMark, isMarked } from '../../../../src/output/charts/season-marks.js';
import { placesOfWords } from '../../../../src/output/charts/tie-words.js';
import { ttDays } from '../../../../src/time/index.js';
import { aForecast, at, soloEvent } from '../../../fixtures/events.js';
import { aMeeting, aSeason } from '../../../fixtures/report.js';

const scale = {
  x: scaleLinear()
    .domain([at('2027-01-01T00:00:00Z'), at('2027-01-17T00:00:00Z')])
    .range([0, 160]),
  pixelsPerHour: 2,
};

describe('a ribbon', () => {
  const season = aSeason([
    ['dusk', 5, 0],
    ['full', 4, 3],
    ['dawn', 0, 6],
    ['sun', 0, 0],
    ['sun', 0, 0],
  ]);

  it('reaches above its thread for the evening and below it for the morning', () => {
    const reaches = season.samples.map(({ utc }) => reachAt(season, utc, scale));
    expect(reaches.slice(0, 4)).toEqual([
      { above: 10, below: 0 },
      { above: 8, below: 6 },
      { above: 0, below: 12 },
      { above: 0, below: 0 },
    ]);
  });

  it('has the reach of the nearest sample in between', () => {
    expect(reachAt(season, at('2027-01-02T00:00:00Z'), scale).above).toBe(10);
    expect(reachAt(season, at('2027-01-04T00:00:00Z'), scale).above).toBe(8);
  });

  it('stays visible where it is thin, on its own side', () => {
    const thin = aSeason([['dusk', 0.1, 0]]);
    const { above, below } = reachAt(thin, thin.samples[0]!.utc, scale);
    expect(above).toBeGreaterThan(1);
    expect(below).toBe(0);
  });

  it('changes its colour without a gap, and is dotted near the Sun', () => {
    const html = renderToString(<Ribbon season={season} scale={scale} middle={50} />);
    expect([...html.matchAll(/class="ribbon fill-(\w+)"/g)].map(([, state]) => state)).toEqual([
      'dusk',
      'full',
      'dawn',
    ]);
    // From the first sample to the second, whose reach belongs to both colours.
    expect(html).toContain('d="M0,40L40,42L40,56L0,50Z" class="ribbon fill-dusk"');
    expect(html).toContain('d="M40,42L80,50L80,62L40,56Z" class="ribbon fill-full"');
    expect(html).toContain('d="M120 50H160" class="glare"');
  });

  it('leaves its bare thread where the planet never stands high enough', () => {
    const html = renderToString(
      <Ribbon
        season={aSeason([
          ['none', 0, 0],
          ['none', 0, 0],
        ])}
        scale={scale}
        middle={50}
      />,
    );
    expect(html).not.toContain('<path');
    expect(html).toContain('class="thread"');
  });
});

describe('the marks on a ribbon', () => {
  const drawn = (event: Parameters<typeof SeasonMark>[0]['event']): string =>
    renderToString(<SeasonMark event={event} x={scale.x} middle={50} reach={{ above: 10, below: 4 }} />);
  const utc = at('2027-01-09T00:00:00Z');

  it('stand on the side of their sky', () => {
    expect(drawn(soloEvent({ kind: 'opposition', utc }))).toContain('M80 44.5l5 5.5');
    expect(drawn(soloEvent({ kind: 'greatest-elongation-east', utc }))).toContain('M80 28l4.5 8h-9z');
    expect(drawn(soloEvent({ kind: 'greatest-elongation-west', utc }))).toContain('M80 66l4.5 -8h-9z');
  });

  it('are as wide as the date is unsure', () => {
    const event = soloEvent({ kind: 'greatest-brilliancy', utc });
    const interval = {
      from: ttDays(event.tt - 3),
      to: ttDays(event.tt + 3),
      meaning: 'within 0.01 magnitude',
    };
    expect(drawn({ ...event, interval })).toContain('M50 71H110');
    const vague = { uncertaintySeconds: { tt: 86_400, utc: 86_400 } };
    expect(drawn({ ...event, ...vague })).toContain('M70 71H90');
  });

  it('leave out what does not change the view, and Mercury’s stations', () => {
    expect(isMarked(soloEvent({ kind: 'perihelion' }))).toBe(false);
    expect(isMarked(soloEvent({ kind: 'stationary-direct' }))).toBe(true);
    expect(isMarked(soloEvent({ kind: 'stationary-direct' }, { body: 'mercury' }))).toBe(false);
    expect(drawn(soloEvent({ kind: 'perihelion', utc }))).toBe('');
  });
});

describe('the words of meetings', () => {
  it('stand above the upper end, below the lower one where others are, and inside the picture', () => {
    const ties = [
      { at: 100, upper: 50, lower: 150 },
      { at: 110, upper: 50, lower: 200 },
      { at: 139, upper: 50, lower: 150 },
      { at: 498, upper: 50, lower: 150 },
    ];
    expect(placesOfWords(ties, 500)).toEqual([
      { x: 100, y: 38 },
      { x: 110, y: 220 },
      { x: 139, y: 38 },
      { x: 481, y: 38 },
    ]);
  });
});

describe('the season ribbons', () => {
  const html = renderToString(
    <SeasonRibbons
      seasons={[
        aSeason([
          ['full', 6, 7],
          ['full', 6, 7],
        ]),
        aSeason([['dusk', 2, 0]], { body: 'venus' }),
      ]}
      forecast={aForecast([soloEvent()])}
      meetings={[aMeeting(), aMeeting({ bodies: ['venus', 'mars'], leastSeparationDeg: 0.25 })]}
      title="Mars is at its best in January"
      finding="Mars is at its best."
      tableId="season-table"
      thickness="hours"
      tiedWithin="within 3°"
    />,
  );

  it('are told in words and lead to their numbers', () => {
    expect(html).toContain('<title id="season-title">Mars is at its best in January</title>');
    expect(html).toContain('<desc id="season-desc">Mars is at its best.</desc>');
    expect(html).toContain('href="#season-table"');
  });

  it('name every planet beside its ribbon, and tie only those that are drawn', () => {
    expect([...html.matchAll(/class="planet">(\w+)/g)].map(([, name]) => name)).toEqual(['Mars', 'Venus']);
    expect([...html.matchAll(/class="word middle">([^<]+)/g)].map(([, words]) => words)).toEqual(['15′']);
  });

  it('fill the room of a row with the longest half of a night, and no more', () => {
    const [, above, below] =
      /M1,([\d.]+)L[\d.]+,[\d.]+L[\d.]+,[\d.]+L1,([\d.]+)Z" class="ribbon fill-full"/.exec(html)!;
    // Seven hours take 21 px, so thirteen take 39.
    expect(Math.abs(Number(above) - Number(below))).toBeCloseTo(39, 1);
  });
});
