import { describe, expect, it } from 'vitest';
import { nightOf } from '../../../src/sky/index.js';
import { darkHours, safeHours, sunGoneAltitudeDeg } from '../../../src/sky/looking-hours.js';
import { localDate } from '../../../src/time/index.js';
import { siteAt, skyAt } from './sky-over.js';

const vienna = skyAt(48.2, 16.3, { zone: 'Europe/Vienna' });
const night = nightOf(vienna, localDate('2027-02-19'));

describe('safeHours', () => {
  it('begin at least five minutes after sunset and end at least ten before sunrise', () => {
    const [hours, ...more] = safeHours(vienna.site, night);
    expect(more).toEqual([]);
    const [after, before] = [hours!.from - night.sunset!, night.sunrise! - hours!.to].map(
      (days) => days * 1440,
    );
    expect(after).toBeGreaterThan(5);
    expect(after).toBeLessThan(8);
    expect(before).toBeGreaterThan(10);
    expect(before).toBeLessThan(13);
  });

  it('are shorter on a mountain, from which the Sun is seen longer', () => {
    expect(sunGoneAltitudeDeg(siteAt(48, 16))).toBeCloseTo(-50 / 60, 12);
    expect(sunGoneAltitudeDeg(siteAt(31, 35, { elevationM: -400 }))).toBeCloseTo(-50 / 60, 12);
    // 2.08′ · √2500 = 104′.
    expect(sunGoneAltitudeDeg(siteAt(48, 16, { elevationM: 2500 }))).toBeCloseTo(-50 / 60 - 104 / 60, 1);
    const [low] = safeHours(vienna.site, night);
    const [high] = safeHours(siteAt(48.2, 16.3, { elevationM: 2500 }), night);
    expect((high!.from - low!.from) * 1440).toBeGreaterThan(8);
  });

  it('are both parts of a night that the clock divides', () => {
    const tokyo = skyAt(35.7, 139.7, { zone: 'UTC' });
    expect(safeHours(tokyo.site, nightOf(tokyo, localDate('2027-03-01')))).toHaveLength(2);
  });

  it('see a sunrise coming that follows the end of the night', () => {
    // By a clock five hours ahead of Vienna's, noon falls on the sunrises of February.
    const sky = skyAt(48.2, 16.3, { zone: 'Etc/GMT-6' });
    let close = 0;
    for (let day = 1; day <= 28; day++) {
      const each = nightOf(sky, localDate(`2027-02-${String(day).padStart(2, '0')}`));
      const last = safeHours(sky.site, each).at(-1)!;
      const sunrise = each.sun.crossings(-50 / 60).find(({ tt, is }) => is === 'rise' && tt > last.to);
      if (sunrise === undefined) continue;
      expect((sunrise.tt - last.to) * 1440).toBeGreaterThan(10);
      if (sunrise.tt > each.to && (sunrise.tt - each.to) * 1440 < 9) close++;
    }
    expect(close).toBeGreaterThan(2);
  });

  it('are none where the Sun does not set and the whole night where it does not rise', () => {
    const sky = skyAt(78.2, 15.6);
    expect(safeHours(sky.site, nightOf(sky, localDate('2027-06-21')))).toEqual([]);
    const winter = nightOf(sky, localDate('2027-12-21'));
    expect(safeHours(sky.site, winter)).toEqual([{ from: winter.from, to: winter.to - 1 / 1440 }]);
  });
});

describe('darkHours', () => {
  it('wait for the end of nautical twilight where the planet is faint', () => {
    const [bright] = darkHours(vienna.site, night, ['venus']);
    const [faint] = darkHours(vienna.site, night, ['venus', 'neptune']);
    expect(vienna.horizontal('sun', bright!.from).altitudeDeg).toBeCloseTo(-6, 4);
    expect(vienna.horizontal('sun', faint!.to).altitudeDeg).toBeCloseTo(-12, 4);
  });
});
