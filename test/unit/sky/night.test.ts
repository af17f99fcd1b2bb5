import { describe, expect, it } from 'vitest';
import { eveningOf, nightOf, twilightsOf } from '../../../src/sky/index.js';
import { isoUtc, localDate, utcFromTt } from '../../../src/time/index.js';
import { skyAt, utcOf } from './sky-over.js';

const night = (latitudeDeg: number, longitudeDeg: number, zone: string, date: string) =>
  nightOf(skyAt(latitudeDeg, longitudeDeg, { zone }), localDate(date));

describe('eveningOf', () => {
  it.each([
    ['2027-02-19T10:59:59Z', 'Europe/Vienna', '2027-02-18'],
    ['2027-02-19T11:00:00Z', 'Europe/Vienna', '2027-02-19'],
    ['2027-02-20T04:00:00Z', 'Europe/Vienna', '2027-02-19'],
    ['2027-01-01T05:00:00Z', 'America/Denver', '2026-12-31'],
    ['2027-03-01T10:00:00Z', 'Pacific/Kiritimati', '2027-03-01'],
    ['2027-03-01T10:00:00Z', 'Asia/Kolkata', '2027-03-01'],
  ])('%s in %s is of %s', (iso, zone, date) => {
    expect(eveningOf(utcOf(iso), zone)).toBe(date);
  });
});

describe('nightOf', () => {
  it('runs from local noon to the next', () => {
    const { from, to } = night(48.2, 16.3, 'Europe/Vienna', '2027-02-19');
    expect(isoUtc(utcFromTt(from))).toBe('2027-02-19T11:00:00Z');
    expect(isoUtc(utcFromTt(to))).toBe('2027-02-20T11:00:00Z');
  });

  it('has 23 hours when clocks go forward and 25 when they go back', () => {
    const hours = (date: string) => {
      const { from, to } = night(48.2, 16.3, 'Europe/Vienna', date);
      return (to - from) * 24;
    };
    expect(hours('2027-03-27')).toBeCloseTo(23, 6);
    expect(hours('2027-10-30')).toBeCloseTo(25, 6);
  });

  it('has no sunset and no sunrise in the polar summer and winter', () => {
    for (const date of ['2027-06-21', '2027-12-21']) {
      const { sunset, sunrise } = night(78.2, 15.6, 'Arctic/Longyearbyen', date);
      expect([sunset, sunrise]).toEqual([null, null]);
    }
  });

  it('has no astronomical darkness in a northern summer, though a dusk and a dawn', () => {
    const { civil, nautical, astronomical } = twilightsOf(night(52.5, 13.4, 'Europe/Berlin', '2027-06-21'));
    expect(civil.dusk).not.toBeNull();
    expect(nautical.dawn! > nautical.dusk!).toBe(true);
    expect(astronomical).toEqual({ dusk: null, dawn: null });
  });

  it('orders sunset, the dusks, the dawns and sunrise', () => {
    const here = night(-33.9, 18.4, 'Africa/Johannesburg', '2027-07-10');
    const { civil, nautical, astronomical } = twilightsOf(here);
    const order = [
      here.from,
      here.sunset,
      civil.dusk,
      nautical.dusk,
      astronomical.dusk,
      astronomical.dawn,
      nautical.dawn,
      civil.dawn,
      here.sunrise,
      here.to,
    ];
    expect([...order].sort((a, b) => a! - b!)).toEqual(order);
    expect(order).not.toContain(null);
  });

  it('takes the sunrise there is where noon by the clock is in the dark', () => {
    // Tokyo by UTC: noon is 21:00 there, so the interval begins at night and holds a day before the next evening.
    const { sunset, sunrise } = night(35.7, 139.7, 'UTC', '2027-03-01');
    expect(isoUtc(utcFromTt(sunrise!))).toMatch(/^2027-03-01T21:/);
    expect(isoUtc(utcFromTt(sunset!))).toMatch(/^2027-03-02T08:/);
  });

  it('takes the later of two sunrises, the one that ends the night', () => {
    // Vienna by a clock five hours ahead: in February the Sun rises a minute earlier each day, once across noon.
    const sky = skyAt(48.2, 16.3, { zone: 'Etc/GMT-6' });
    const nights = Array.from({ length: 28 }, (_, i) =>
      nightOf(sky, localDate(`2027-02-${String(i + 1).padStart(2, '0')}`)),
    );
    const withTwo = nights.filter(
      ({ sun, from, to }) =>
        sun.crossings(-50 / 60).filter(({ tt, is }) => is === 'rise' && tt >= from && tt < to).length === 2,
    );
    expect(withTwo).toHaveLength(1);
    expect(withTwo[0]!.sunrise! > withTwo[0]!.sunset!).toBe(true);
  });
});
