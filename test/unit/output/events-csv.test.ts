import { describe, expect, it } from 'vitest';
import { eventsCsv } from '../../../src/output/index.js';
import type { Forecast } from '../../../src/forecast/index.js';
import type { Site } from '../../../src/sky/index.js';
import {
  aForecast,
  aSite,
  heliocentricEvent,
  pairEvent,
  seenFrom,
  soloEvent,
} from '../../fixtures/events.js';
import { readCsv } from '../../fixtures/read-csv.js';

function recordsOf(forecast: Forecast, sites: readonly Site[]): Record<string, string>[] {
  const [header, ...rows] = readCsv(eventsCsv(forecast, sites));
  expect(new Set(header).size).toBe(header!.length);
  return rows.map((row) => {
    expect(row).toHaveLength(header!.length);
    return Object.fromEntries(header!.map((name, i) => [name, row[i]!]));
  });
}

describe('events as CSV', () => {
  it('writes instants in ISO 8601 and numbers with the digits that they deserve', () => {
    const [mars] = recordsOf(aForecast([soloEvent()]), []);
    expect(mars).toMatchObject({
      id: 'opposition.mars.+13.a',
      utc: '2027-02-19T15:45:12Z',
      uncertainty_tt_s: '120',
      mean_residual_d: '-0.5',
      kepler_residual_d: '0.01',
      mean_estimate_utc: '2027-02-20T03:45:12Z',
      body1_distance_au: '0.678012',
      body1_distance_km: '101429000',
      body1_magnitude: '-1.23',
      body1_diameter_arcsec: '13.81',
      body1_ring_tilt_deg: '',
      body2_distance_au: '',
      separation_deg: '',
      certain: 'yes',
    });
  });

  it('names the unit of every measured column', () => {
    const header = readCsv(eventsCsv(aForecast([]), [aSite()]))[0]!;
    const words = /^(id|kind|bodies|cycle|series|reckoning|meeting|certain)$|_utc$|^utc$/;
    const perBody = /^body[12]_(elongation_side|constellation|magnitude|illuminated_fraction)$/;
    const units = /_(s|d|deg|au|km|min|h|arcsec|days_since_j2000)$/;
    const local = /^hill_(local_time|visible_at_instant|best_look|best_direction|verdict)$/;
    expect(header.filter((name) => ![words, perBody, units, local].some((rule) => rule.test(name)))).toEqual(
      [],
    );
  });

  it('has the columns of every site, empty where the event is not in the sky', () => {
    const [hill, south] = [aSite(), aSite({ id: 'south', zone: 'America/Santiago' })];
    const seen = seenFrom(seenFrom(pairEvent(), hill), south, {
      bestLook: null,
      verdict: 'Not visible from here.',
    });
    const [pair, helio] = recordsOf(aForecast([seen, heliocentricEvent()]), [hill, south]);
    expect(pair).toMatchObject({
      hill_local_time: '2027-06-09T21:12:40+02:00',
      hill_best_look: '2027-06-09T22:10:00+02:00',
      hill_best_altitude_deg: '12.3',
      south_local_time: '2027-06-09T15:12:40-04:00',
      south_best_look: '',
      south_verdict: 'Not visible from here.',
      separation_deg: '0.4',
      position_angle_deg: '180',
    });
    expect(helio).toMatchObject({ hill_local_time: '', hill_verdict: '', body1_distance_au: '' });
  });
});
