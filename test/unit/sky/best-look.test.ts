import { describe, expect, it } from 'vitest';
import type { SkyPlanet } from '../../../src/bodies/index.js';
import { LOWEST_LOOK_DEG, SkyOverSite, nightOf, twilightsOf } from '../../../src/sky/index.js';
import type { SiteWords } from '../../../src/sky/index.js';
import { bestLook } from '../../../src/sky/best-look.js';
import { localDate } from '../../../src/time/index.js';
import { paths, siteAt } from './sky-over.js';

const vienna = { zone: 'Europe/Vienna' };
function look(bodies: readonly SkyPlanet[], date: string, more: Partial<SiteWords> = vienna) {
  const sky = new SkyOverSite(siteAt(48.2, 16.3, more), paths);
  return bestLook(sky, bodies, nightOf(sky, localDate(date)));
}

describe('bestLook', () => {
  it('is at the transit for a planet at opposition', () => {
    const mars = look(['mars'], '2027-02-19')!;
    expect(mars.direction).toBe('south');
    expect(mars.azimuthDeg).toBeCloseTo(180, 0);
    expect(mars.separationDeg).toBeNull();
    expect(mars.inBrightTwilight).toBe(false);
  });

  it('is at the end of civil twilight for an evening planet, on a whole minute', () => {
    const meeting = look(['venus', 'jupiter'], '2026-06-09')!;
    expect(meeting.localTime).toBe('2026-06-09T21:35:00+02:00');
    expect(meeting.sunAltitudeDeg).toBeLessThan(-6);
    expect(meeting.sunAltitudeDeg).toBeGreaterThan(-6.2);
    expect(meeting.direction).toBe('west-north-west');
    expect(meeting.separationDeg).toBeCloseTo(1.61, 2);
  });

  it('moves or vanishes with the horizon of the site', () => {
    const hidden = look(['venus', 'jupiter'], '2026-06-09', {
      ...vienna,
      horizon: [
        { azimuthDeg: 200, altitudeDeg: 30 },
        { azimuthDeg: 359, altitudeDeg: 30 },
      ],
    });
    expect(hidden).toBeNull();
    const wall = { azimuthDeg: 180, altitudeDeg: 89 };
    const east = look(['mars'], '2027-02-19', {
      ...vienna,
      horizon: [
        { azimuthDeg: 120, altitudeDeg: 0 },
        wall,
        { azimuthDeg: 240, altitudeDeg: 89 },
        { azimuthDeg: 300, altitudeDeg: 89 },
      ],
    })!;
    expect(east.azimuthDeg).toBeLessThan(160);
  });

  it('is none where a planet stays below 5°', () => {
    for (let day = 10; day < 28; day++) {
      const found = look(['mercury'], `2027-09-${day}`);
      expect(found?.altitudeDeg ?? 90).toBeGreaterThanOrEqual(LOWEST_LOOK_DEG);
    }
  });

  it('tries bright twilight for Venus and Jupiter, and says so', () => {
    // Days before its inferior conjunction of 2025-03-23 Venus stands far north of the Sun, and sets soon after it.
    const venus = look(['venus'], '2025-03-19')!;
    expect(venus.inBrightTwilight).toBe(true);
    expect(venus.sunAltitudeDeg).toBeLessThan(-1);
    expect(venus.sunAltitudeDeg).toBeGreaterThan(-6);
    expect(venus.altitudeDeg).toBeGreaterThan(LOWEST_LOOK_DEG);
  });

  it('never sends anybody to look for a lesser planet in bright twilight', () => {
    for (let day = 1; day <= 31; day++) {
      for (const body of ['mercury', 'mars', 'saturn', 'uranus'] as const) {
        expect(look([body], `2025-03-${String(day).padStart(2, '0')}`)?.inBrightTwilight ?? false).toBe(
          false,
        );
      }
      const both = look(['mercury', 'venus'], `2025-03-${String(day).padStart(2, '0')}`);
      expect(both?.inBrightTwilight ?? false).toBe(false);
    }
    expect(look(['neptune'], '2027-06-21', { zone: 'Europe/Oslo', latitudeDeg: 62 })).toBeNull();
  });

  it('gives a planet up that the twilight drowns, although it stands above 5° after civil dusk', () => {
    const quito = { zone: 'America/Guayaquil', latitudeDeg: -2, longitudeDeg: -80 };
    const sky = new SkyOverSite(siteAt(-2, -80, quito), paths);
    let [shown, drowned] = [0, 0];
    for (let day = 1; day <= 30; day++) {
      const date = `2025-11-${String(day).padStart(2, '0')}`;
      const mars = look(['mars'], date, quito);
      const { civil } = twilightsOf(nightOf(sky, localDate(date)));
      if (mars !== null) {
        shown++;
        // Mars sinks a little faster than the Sun, and the altitude is refracted.
        expect(mars.altitudeDeg - mars.sunAltitudeDeg).toBeGreaterThan(13.9);
      } else if (sky.horizontal('mars', civil.dusk!).altitudeDeg > LOWEST_LOOK_DEG) drowned++;
    }
    expect(shown).toBeGreaterThan(5);
    expect(drowned).toBeGreaterThan(2);
  });
});
