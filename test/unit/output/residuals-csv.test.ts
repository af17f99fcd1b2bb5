import { describe, expect, it } from 'vitest';
import type { ResidualSeries } from '../../../src/forecast/index.js';
import { residualsCsv, residualsJson } from '../../../src/output/index.js';
import { ttDays } from '../../../src/time/index.js';
import { at, soloEvent } from '../../fixtures/events.js';
import { readCsv } from '../../fixtures/read-csv.js';

const event = soloEvent();
const series: ResidualSeries = {
  kind: 'opposition',
  bodies: ['mars'],
  from: at('2027-01-01T00:00:00Z'),
  to: at('2028-01-01T00:00:00Z'),
  source: { name: 'invented', description: 'invented for tests' },
  rows: [
    {
      event,
      mean: null,
      keplerTable1: ttDays(event.tt - 0.018),
      keplerTable2: ttDays(event.tt + 0.25),
      meanDays: null,
      keplerTable1Days: 0.0180049,
      keplerTable2Days: -0.25,
    },
  ],
  mean: null,
  keplerTable1: { count: 1, rmsDays: 0.0180049, worstDays: 0.0180049 },
  keplerTable2: { count: 1, rmsDays: 0.25, worstDays: 0.25 },
  beyondTable1: false,
};

describe('residuals', () => {
  it('stand beside the refined instant, empty where there is no estimate', () => {
    const [header, row] = readCsv(residualsCsv([series]));
    expect(Object.fromEntries(header!.map((name, i) => [name, row![i]]))).toEqual({
      kind: 'opposition',
      bodies: 'mars',
      cycle: '13',
      id: 'opposition.mars.+13.a',
      refined_utc: '2027-02-19T15:45:12Z',
      uncertainty_tt_s: '120',
      mean_utc: '',
      kepler_table1_utc: '2027-02-19T15:19:17Z',
      kepler_table2_utc: '2027-02-19T21:45:12Z',
      mean_residual_d: '',
      kepler_table1_residual_d: '0.018',
      kepler_table2_residual_d: '-0.25',
    });
  });

  it('follow each other series by series under one header', () => {
    expect(readCsv(residualsCsv([series, series]))).toHaveLength(3);
    expect(readCsv(residualsCsv([]))).toHaveLength(1);
  });

  it('are the same numbers as JSON, with rms and worst', () => {
    const document: unknown = JSON.parse(residualsJson(series));
    expect(document).toMatchObject({
      schema: 'synodos-residuals-1',
      mean: null,
      keplerTable1: { count: 1, rmsDays: 0.018, worstDays: 0.018 },
      rows: [{ id: 'opposition.mars.+13.a', mean: null, meanDays: null, keplerTable2Days: -0.25 }],
    });
  });
});
