import { describe, expect, it } from 'vitest';
import {
  didYouMean,
  nearestName,
  quoted,
  readBody,
  readInstant,
  readKind,
  readPlanet,
  readZone,
} from '../../../src/plan/words/index.js';

describe('the nearest name', () => {
  const names = ['mercury', 'venus', 'mars', 'saturn'];
  it.each([
    ['marz', 'mars'],
    ['MARS', 'mars'],
    ['mras', 'mars'],
    ['satrun', 'saturn'],
    ['mercurry', 'mercury'],
    ['vneus', 'venus'],
    ['moon', null],
    ['', null],
  ])('to %s is %s', (word, name) => {
    expect(nearestName(word, names)).toBe(name);
  });

  it('is offered in a sentence, or not at all', () => {
    expect(didYouMean('marz', names)).toBe(' Did you mean mars?');
    expect(didYouMean('moon', names)).toBe('');
    expect(didYouMean('moon', [])).toBe('');
  });
});

describe('a quoted word', () => {
  it('stays on one line, harmless to a terminal and short', () => {
    expect(quoted('a\n\u001b[31mb\u2028c\u202e')).toBe('"a\uFFFD\uFFFD[31mb\uFFFDc\uFFFD"');
    expect(quoted('x'.repeat(100))).toBe(`"${'x'.repeat(60)}…"`);
  });
});

describe('a date', () => {
  it('is 00:00 UTC without a site and midnight there with one', () => {
    expect(readInstant('2027-07-01', null)).toEqual({ value: Date.UTC(2027, 6, 1) });
    expect(readInstant('2027-07-01', 'Europe/Vienna')).toEqual({ value: Date.UTC(2027, 5, 30, 22) });
  });

  it('with its own offset is the same anywhere', () => {
    expect(readInstant('2027-07-01T12:00+02:00', 'America/Santiago')).toEqual({
      value: Date.UTC(2027, 6, 1, 10),
    });
  });

  it.each(['2027', '1 July 2027', '2027-7-1', '2027-02-30', '2027-01-01T25:00Z', '2027-01-01 00:00', ''])(
    'is not %j',
    (word) => {
      expect(readInstant(word, null)).toMatchObject({
        problem: expect.stringContaining('is not a date of the calendar') as string,
      });
    },
  );

  it('outside 1600–2600 is refused with the reason', () => {
    expect(readInstant('1599-12-31', null)).toEqual({
      problem:
        '"1599-12-31" lies before 1600-01-01: the positions are proven against an independent ephemeris only from 1600-01-01 to 2600-01-01',
    });
    expect(readInstant('2600-01-01', null)).toEqual({ value: Date.UTC(2600, 0, 1) });
    expect(readInstant('2600-01-01T00:01Z', null)).toHaveProperty('problem');
  });
});

describe('a name', () => {
  it('may be written in capitals', () => {
    expect(readBody('Sun')).toEqual({ value: 'sun' });
    expect(readPlanet('MARS')).toEqual({ value: 'mars' });
    expect(readKind('Opposition')).toEqual({ value: 'opposition' });
  });

  it('that is unknown is answered with the right one, or with all', () => {
    expect(readPlanet('jupitre')).toEqual({ problem: '"jupitre" is not a planet. Did you mean jupiter?' });
    expect(readPlanet('sun')).toHaveProperty('problem');
    expect(readBody('ceres')).toEqual({
      problem:
        '"ceres" is not a body. There are: sun, mercury, venus, earth, mars, jupiter, saturn, uranus, neptune, pluto',
    });
    expect(readZone('Europe/Lodnon')).toEqual({
      problem: '"Europe/Lodnon" is not a time zone. Did you mean Europe/London?',
    });
  });
});
