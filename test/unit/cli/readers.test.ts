import { describe, expect, it } from 'vitest';
import { aligned } from '../../../src/cli/aligned.js';
import { failureOf } from '../../../src/cli/failure.js';
import { Faults } from '../../../src/cli/faults.js';
import { readList } from '../../../src/cli/read-list.js';
import { readNumber } from '../../../src/cli/read-number.js';
import { readPeriod } from '../../../src/cli/read-period.js';
import { readPosition } from '../../../src/cli/read-position.js';
import { readSite } from '../../../src/cli/read-site.js';
import { UsageError } from '../../../src/cli/usage-error.js';
import { readPlanet } from '../../../src/plan/words/index.js';

const faultsOf = (faults: Faults): readonly string[] => {
  try {
    faults.throwIfAny();
    return [];
  } catch (fault) {
    return (fault as UsageError).faults;
  }
};

describe('a number', () => {
  it.each([
    ['48.2', 48.2],
    ['-31', -31],
    [' +5 ', 5],
  ])('is %j', (word, value) => {
    expect(readNumber(word)).toEqual({ value });
  });

  it.each(['12abc', '', ' ', '1e9', '0x10', 'NaN', 'Infinity', '1,5', '.5', '5.', '1_000', '１'])(
    'is not %j',
    (word) => {
      expect(readNumber(word)).toHaveProperty('problem');
    },
  );
});

describe('a period', () => {
  it.each([
    ['687d', 687],
    ['1.88y', 1.88 * 365.25],
    ['24h', 1],
    ['1.88Y', 1.88 * 365.25],
  ])('of %s is %f days', (word, days) => {
    expect(readPeriod(word)).toMatchObject({ value: { body: null, periodDays: days } });
  });

  it('of a body is its sidereal one', () => {
    expect(readPeriod('Mars')).toMatchObject({ value: { name: 'mars', body: 'mars' } });
  });

  it.each([
    ['687', '"687" has no unit: write 687d, 687y or 687h'],
    ['12abc', '"12abc" is neither a body nor a period. Write mars, 687d, 1.88y or 23.93h'],
    ['marz', '"marz" is neither a body nor a period. Did you mean mars?'],
    ['-5d', '"-5d" is neither a body nor a period. Write mars, 687d, 1.88y or 23.93h'],
    ['1e5d', '"1e5d" is neither a body nor a period. Write mars, 687d, 1.88y or 23.93h'],
  ])('is not %s', (word, problem) => {
    expect(readPeriod(word)).toEqual({ problem });
  });
});

describe('a position', () => {
  it.each([
    ['6.7525,-16.716', 6.7525, -16.716],
    ['6:45:09,-16:42:58', 6 + 45 / 60 + 9 / 3600, -(16 + 42 / 60 + 58 / 3600)],
    ['6:45.15, +16:42.5', 6 + 45.15 / 60, 16 + 42.5 / 60],
    ['0,-0:30', 0, -0.5],
  ])('is %s', (words, rightAscensionHours, declinationDeg) => {
    const reading = readPosition(words);
    expect(reading).toHaveProperty('value');
    if (!('value' in reading)) return;
    expect(reading.value.rightAscensionHours).toBeCloseTo(rightAscensionHours, 9);
    expect(reading.value.declinationDeg).toBeCloseTo(declinationDeg, 9);
  });

  it.each(['6.75', '6,1,2', '6h45m,-16', '6.5:30,1', '6:60,1', '6:1.5:30,1', 'a,b', ''])(
    'is not %j',
    (words) => {
      expect(readPosition(words)).toMatchObject({
        problem: expect.stringContaining('is not a position') as string,
      });
    },
  );

  it('has hours below 24 and degrees within 90', () => {
    expect(readPosition('101.3,-16')).toEqual({
      problem: 'right ascension 101.3 h is out of range: write hours from 0 to 24, not degrees',
    });
    expect(readPosition('-1,5')).toHaveProperty('problem');
    expect(readPosition('1,90.1')).toHaveProperty('problem');
  });
});

describe('a list', () => {
  it('tells of every word that is wrong', () => {
    const faults = new Faults();
    expect(readList('--body', 'marz, venus,,ceres', readPlanet, faults)).toEqual(['venus']);
    expect(faultsOf(faults)).toHaveLength(3);
  });
});

describe('a site', () => {
  it('is made of coordinates, its zone looked up or given', async () => {
    const faults = new Faults();
    expect(await readSite({ site: '48.2,11.6,520' }, faults)).toMatchObject({
      latitudeDeg: 48.2,
      longitudeDeg: 11.6,
      elevationM: 520,
      zone: 'Europe/Berlin',
      zoneFrom: 'coordinates',
    });
    expect(await readSite({ site: '-31.2,-70.6', zone: 'America/Santiago' }, faults)).toMatchObject({
      zone: 'America/Santiago',
      zoneFrom: 'user',
    });
    expect(faultsOf(faults)).toEqual([]);
  });

  it.each(['48.2', '48.2,', '48.2,11.6,520,3', '48..2,11', '-', '48,2,11,6'])('is not %j', async (site) => {
    const faults = new Faults();
    expect(await readSite({ site }, faults)).toBeUndefined();
    expect(faultsOf(faults)[0]).toMatch(/^--site: ".*" is not a place: write LAT,LON/);
  });
});

describe('columns', () => {
  it('set numbers flush right and end no line in spaces', () => {
    const sheet = {
      header: ['what', 'days'],
      rows: [
        ['a', '1.5 d'],
        ['longer', '+10.25 d'],
      ],
    };
    expect(aligned(sheet)).toBe('what        days\na          1.5 d\nlonger  +10.25 d\n');
  });
});

describe('a failure', () => {
  it('is the user’s where the user named what is wrong, else the tool’s', () => {
    expect(failureOf(new UsageError(['a', 'b']))).toEqual({ exitCode: 2, lines: ['a', 'b'] });
    expect(failureOf(new RangeError('bad\nluck'))).toEqual({
      exitCode: 1,
      lines: ['synodos failed, through no fault of yours: bad luck'],
    });
    const denied = Object.assign(new Error('EACCES'), { code: 'EACCES', path: '/x/y' });
    expect(failureOf(denied)).toEqual({
      exitCode: 2,
      lines: ['/x/y: access is denied: name a place that you may read and write'],
    });
    const full = Object.assign(new Error('ENOSPC: no space left on device'), { code: 'ENOSPC' });
    expect(failureOf(full).exitCode).toBe(1);
  });
});
