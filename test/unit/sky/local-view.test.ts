import { describe, expect, it } from 'vitest';
import { localViewer } from '../../../src/sky/index.js';
import { isoUtc } from '../../../src/time/index.js';
import { paths, siteAt, ttOf } from './sky-over.js';

const view = localViewer(siteAt(48.2, 16.3, { id: 'hill', zone: 'Europe/Vienna' }), paths);

describe('localViewer', () => {
  it('tells an opposition whole', () => {
    const mars = view(['mars'], ttOf('2027-02-19T15:45:12Z'));
    expect(mars).toMatchObject({
      site: 'hill',
      zone: 'Europe/Vienna',
      localTime: '2027-02-19T16:45:12+01:00',
      evening: '2027-02-19',
      topocentricSeparationDeg: null,
      visibleAtInstant: false,
    });
    expect(mars.sunAltitudeDeg).toBeGreaterThan(0);
    const [body] = mars.bodies;
    expect(body!.rise! < body!.transit! && body!.transit! < body!.set!).toBe(true);
    expect(isoUtc(body!.transit!)).toMatch(/^2027-02-19T23:13/);
    expect(mars.verdict).toMatch(/^Look high in the south at 00:1[34] on Saturday 20 February\.$/);
  });

  it('says whether an instant itself can be seen', () => {
    expect(view(['mars'], ttOf('2027-02-19T22:00:00Z')).visibleAtInstant).toBe(true);
    expect(view(['mars', 'venus'], ttOf('2027-02-19T22:00:00Z')).visibleAtInstant).toBe(false);
  });

  it('gives the separation as the site sees it', () => {
    const here = view(['venus', 'jupiter'], ttOf('2026-06-09T20:00:00Z'));
    expect(here.topocentricSeparationDeg).toBeCloseTo(1.61, 1);
    expect(here.verdict).toBe('Look in the west-north-west at 21:35 on Tuesday 9 June.');
  });

  it('shares a night between events without mixing them up', () => {
    const tt = ttOf('2027-02-19T22:00:00Z');
    const alone = localViewer(siteAt(48.2, 16.3, { id: 'hill', zone: 'Europe/Vienna' }), paths);
    for (let day = 0; day < 200; day++) view(['jupiter'], ttOf('2027-03-01T22:00:00Z'));
    expect(view(['mars'], tt)).toEqual(alone(['mars'], tt));
  });

  it.each([
    [48.2, ['mars'], '2026-01-09T12:00:00Z', 'Not observable: less than 1° from the Sun.'],
    [48.2, ['mars', 'venus'], '2026-01-20T12:00:00Z', 'Not observable: only 2° from the Sun.'],
    [48.2, ['saturn'], '2027-04-01T12:00:00Z', 'Not observable: only 5° from the Sun.'],
    [78.2, ['mars'], '2027-06-21T12:00:00Z', 'Not visible from here: the Sun does not set.'],
    [62, ['neptune'], '2027-06-21T12:00:00Z', 'Not visible from here: the sky does not get dark enough.'],
    [
      -77,
      ['jupiter'],
      '2027-07-01T12:00:00Z',
      'Not visible from here: Jupiter is below the horizon while the sky is dark.',
    ],
    [
      -77,
      ['mars', 'jupiter'],
      '2027-05-05T12:00:00Z',
      'Not visible from here: both are below the horizon while the sky is dark.',
    ],
    [
      48.2,
      ['mercury', 'jupiter'],
      '2027-01-28T12:00:00Z',
      'Not visible from here: Mercury and Jupiter are not both high enough while the sky is dark.',
    ],
    [48.2, ['mars'], '2026-04-25T12:00:00Z', 'Not visible from here: Mars is too low while the sky is dark.'],
  ] as const)('at latitude %d for %j on %s: %s', (latitudeDeg, bodies, iso, sentence) => {
    expect(localViewer(siteAt(latitudeDeg, 16.3), paths)(bodies, ttOf(iso)).verdict).toBe(sentence);
  });
});
