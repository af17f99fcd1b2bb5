import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  SUPPORTED_FROM,
  SUPPORTED_TO,
  isoUtc,
  leapSeconds,
  localDate,
  localDateTime,
  parseInstantUtc,
  parseLocalDate,
  ttDays,
  ttFromUtc,
  utcFromTt,
  utcMillis,
  utcOfLocal,
} from '../../src/time/index.js';

const instants = fc.integer({ min: SUPPORTED_FROM, max: SUPPORTED_TO }).map(utcMillis);
const zones = fc.constantFrom(
  'Europe/Vienna',
  'America/Santiago',
  'Australia/Lord_Howe',
  'Asia/Tehran',
  'Pacific/Apia',
  'UTC',
);
const MILLISECOND_DAYS = 1 / 86_400_000;

describe('time', () => {
  it('comes back from TT to the same UTC within a millisecond, from 1600 to 2600', () => {
    fc.assert(
      fc.property(instants, (utc) => {
        expect(Math.abs(utcFromTt(ttFromUtc(utc)) - utc)).toBeLessThan(1);
      }),
    );
  });

  it('comes back from UTC to the same TT within a millisecond, outside a leap second', () => {
    const changes = leapSeconds.map(([year, month]) => ttFromUtc(utcMillis(Date.UTC(year, month - 1, 1))));
    const days = fc.double({ min: ttFromUtc(SUPPORTED_FROM), max: ttFromUtc(SUPPORTED_TO), noNaN: true });
    fc.assert(
      fc.property(days.map(ttDays), (tt) => {
        fc.pre(changes.every((change) => tt >= change || tt < change - 1.001 / 86_400));
        expect(Math.abs(ttFromUtc(utcFromTt(tt)) - tt)).toBeLessThan(MILLISECOND_DAYS);
      }),
    );
  });

  it('never runs backwards', () => {
    fc.assert(
      fc.property(instants, fc.integer({ min: 1, max: 86_400_000 }), (utc, later) => {
        expect(ttFromUtc(utcMillis(utc + later))).toBeGreaterThan(ttFromUtc(utc));
        const tt = ttFromUtc(utc);
        expect(utcFromTt(ttDays(tt + later * MILLISECOND_DAYS))).toBeGreaterThanOrEqual(utcFromTt(tt));
      }),
    );
  });

  it('reads back what it writes, to the second', () => {
    fc.assert(
      fc.property(instants, (utc) => {
        expect(Math.abs(parseInstantUtc(isoUtc(utc))! - utc)).toBeLessThanOrEqual(500);
      }),
    );
  });

  it('reads no text that it would not write the same', () => {
    const nearly = fc.stringMatching(/^[0-9]{4}-[0-9]{2}-[0-9]{2}$/);
    fc.assert(
      fc.property(nearly, (text) => {
        const day = parseLocalDate(text);
        fc.pre(day !== null && day >= '1000');
        expect(isoUtc(parseInstantUtc(text)!)).toBe(`${text}T00:00:00Z`);
      }),
    );
  });

  it('finds the instant of a wall clock wherever the clock shows that time', () => {
    const modern = fc.integer({ min: Date.UTC(1980, 0, 1), max: Date.UTC(2037, 0, 1) });
    fc.assert(
      fc.property(modern, zones, (millis, zone) => {
        const shown = localDateTime(utcMillis(Math.floor(millis / 60_000) * 60_000), zone);
        const date = localDate(shown.toFormat('yyyy-MM-dd'));
        const found = localDateTime(utcOfLocal(date, shown.hour, shown.minute, zone), zone);
        expect(found.toFormat('yyyy-MM-dd HH:mm')).toBe(shown.toFormat('yyyy-MM-dd HH:mm'));
        expect(found.toMillis()).toBeLessThanOrEqual(shown.toMillis());
      }),
    );
  });
});
