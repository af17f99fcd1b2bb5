import { describe, expect, it } from 'vitest';
import { cautions, cautionsOf } from '../../../src/output/index.js';
import { heliocentricEvent, pairEvent, soloEvent } from '../../fixtures/events.js';

describe('cautions', () => {
  it('go with every body within 20° of the Sun, and with no other', () => {
    expect(cautionsOf(pairEvent({}, { elongationDeg: 19.9 }))).toEqual([cautions.besideTheSun]);
    expect(cautionsOf(pairEvent({}, { elongationDeg: 20 }))).toEqual([]);
    expect(cautionsOf(soloEvent())).toEqual([]);
    expect(cautionsOf(heliocentricEvent())).toEqual([]);
  });

  it('speak of the disc where an inner planet may cross it, and not where it passes behind', () => {
    const inFront = soloEvent({ kind: 'inferior-conjunction' }, { body: 'venus', elongationDeg: 0.2 });
    expect(cautionsOf(inFront)).toEqual([cautions.onTheDisc, cautions.besideTheSun]);
    const behind = soloEvent({ kind: 'superior-conjunction' }, { body: 'venus', elongationDeg: 0.2 });
    expect(cautionsOf(behind)).toEqual([cautions.besideTheSun]);
    const past = soloEvent({ kind: 'inferior-conjunction' }, { body: 'venus', elongationDeg: 4 });
    expect(cautionsOf(past)).toEqual([cautions.besideTheSun]);
  });

  it('say what matters: no filter beside the Sun, one over every aperture on its disc', () => {
    expect(cautions.besideTheSun).toContain('A filter does not help there');
    expect(cautions.onTheDisc).toMatch(/over the front of every aperture, finders and cameras too/);
    expect(cautions.onTheDisc).toContain('Eclipse glasses are never used with optics');
  });
});
