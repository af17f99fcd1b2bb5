import { describe, expect, it } from 'vitest';
import { SiteError, horizonAltitudeDeg, makeSite } from '../../../src/sky/index.js';
import type { SiteWords } from '../../../src/sky/index.js';
import { isZone } from '../../../src/time/index.js';

const vienna: SiteWords = { id: 'hill', latitudeDeg: 48.2, longitudeDeg: 16.3 };

describe('makeSite', () => {
  it('keeps what the user says', () => {
    expect(makeSite({ ...vienna, name: 'The Hill', elevationM: 380, zone: 'Europe/Berlin' })).toEqual({
      id: 'hill',
      name: 'The Hill',
      latitudeDeg: 48.2,
      longitudeDeg: 16.3,
      elevationM: 380,
      zone: 'Europe/Berlin',
      zoneFrom: 'user',
      horizon: [],
    });
  });

  it('finds the zone from the coordinates where none is given, and says so', () => {
    const site = makeSite(vienna);
    expect(site.zone).toBe('Europe/Vienna');
    expect(site.zoneFrom).toBe('coordinates');
    expect(site.name).toBe('hill');
    expect(site.elevationM).toBe(0);
  });

  it('finds a zone that the clock knows everywhere on Earth', () => {
    const zones = new Set<string>();
    for (let latitudeDeg = -90; latitudeDeg <= 90; latitudeDeg += 5) {
      for (let longitudeDeg = -180; longitudeDeg <= 180; longitudeDeg += 5) {
        zones.add(makeSite({ id: 'x', latitudeDeg, longitudeDeg }).zone);
      }
    }
    expect([...zones].filter((zone) => !isZone(zone))).toEqual([]);
    expect(zones.size).toBeGreaterThan(100);
  });

  it('orders the horizon by azimuth without touching the list given', () => {
    const horizon = [
      { azimuthDeg: 200, altitudeDeg: 3 },
      { azimuthDeg: 20, altitudeDeg: 1 },
    ];
    expect(makeSite({ ...vienna, horizon }).horizon.map(({ azimuthDeg }) => azimuthDeg)).toEqual([20, 200]);
    expect(horizon[0]!.azimuthDeg).toBe(200);
  });

  it.each<[Partial<SiteWords>, string]>([
    [{ id: 'my hill' }, 'site id "my hill": use letters, digits and hyphens only'],
    [{ id: '../x' }, 'site id "../x": use letters, digits and hyphens only'],
    [{ id: '' }, 'site id "": use letters, digits and hyphens only'],
    [{ latitudeDeg: 90.1 }, 'latitude 90.1 is outside -90 … 90 (degrees, north positive)'],
    [{ latitudeDeg: NaN }, 'latitude NaN is outside -90 … 90 (degrees, north positive)'],
    [{ longitudeDeg: 181 }, 'longitude 181 is outside -180 … 180 (degrees, east positive)'],
    [{ longitudeDeg: -Infinity }, 'longitude -Infinity is outside -180 … 180 (degrees, east positive)'],
    [{ elevationM: 12_000 }, 'elevation 12000 is outside -500 … 9000 (metres above sea level)'],
    [{ zone: 'Vienna' }, 'zone "Vienna" is not an IANA zone: write one like Europe/Paris'],
    [{ zone: '' }, 'zone "" is not an IANA zone: write one like Europe/Paris'],
    [
      { horizon: [{ azimuthDeg: 400, altitudeDeg: 3 }] },
      'horizon azimuth 400 is outside 0 … 360 (degrees from north through east)',
    ],
    [{ horizon: [{ azimuthDeg: 40, altitudeDeg: 95 }] }, 'horizon altitude 95 is outside -10 … 90 (degrees)'],
  ])('refuses %j and says what would be right', (words, message) => {
    expect(() => makeSite({ ...vienna, ...words })).toThrow(new SiteError(message));
  });
});

describe('horizonAltitudeDeg', () => {
  const site = makeSite({
    ...vienna,
    horizon: [
      { azimuthDeg: 10, altitudeDeg: 2 },
      { azimuthDeg: 90, altitudeDeg: 10 },
      { azimuthDeg: 350, altitudeDeg: 4 },
    ],
  });

  it.each([
    [10, 2],
    [50, 6],
    [90, 10],
    [220, 7],
    [350, 4],
    [355, 3.5],
    [0, 3],
    [360, 3],
    [5, 2.5],
  ])('at azimuth %d° is %d°', (azimuthDeg, altitudeDeg) => {
    expect(horizonAltitudeDeg(site, azimuthDeg)).toBeCloseTo(altitudeDeg, 10);
  });

  it('is flat without points, and even with one', () => {
    expect(horizonAltitudeDeg(makeSite(vienna), 123)).toBe(0);
    const wall = makeSite({ ...vienna, horizon: [{ azimuthDeg: 180, altitudeDeg: 7 }] });
    for (const azimuthDeg of [0, 90, 180, 270, 359]) expect(horizonAltitudeDeg(wall, azimuthDeg)).toBe(7);
  });

  it('takes a wall that rises straight up', () => {
    const wall = makeSite({
      ...vienna,
      horizon: [
        { azimuthDeg: 100, altitudeDeg: 0 },
        { azimuthDeg: 100, altitudeDeg: 30 },
        { azimuthDeg: 200, altitudeDeg: 30 },
        { azimuthDeg: 200, altitudeDeg: 0 },
      ],
    });
    expect(horizonAltitudeDeg(wall, 99)).toBe(0);
    expect(horizonAltitudeDeg(wall, 101)).toBe(30);
    expect(horizonAltitudeDeg(wall, 150)).toBe(30);
    expect(horizonAltitudeDeg(wall, 201)).toBe(0);
  });
});
