import { describe, expect, it } from 'vitest';
import { SUPPORTED_FROM, SUPPORTED_TO, isoUtc, spanRefusal, utcMillis } from '../../../src/time/index.js';

describe('spanRefusal', () => {
  it('covers 1600 to 2600', () => {
    expect(isoUtc(SUPPORTED_FROM)).toBe('1600-01-01T00:00:00Z');
    expect(isoUtc(SUPPORTED_TO)).toBe('2600-01-01T00:00:00Z');
  });

  it('lets the two ends pass', () => {
    expect(spanRefusal(SUPPORTED_FROM)).toBeNull();
    expect(spanRefusal(SUPPORTED_TO)).toBeNull();
  });

  it('says on which side an instant lies and what would be right', () => {
    expect(spanRefusal(utcMillis(SUPPORTED_FROM - 1))).toMatch(
      /before 1600-01-01.*from 1600-01-01 to 2600-01-01/,
    );
    expect(spanRefusal(utcMillis(SUPPORTED_TO + 1))).toMatch(
      /after 2600-01-01.*from 1600-01-01 to 2600-01-01/,
    );
  });

  it('refuses what is no instant', () => {
    expect(spanRefusal(utcMillis(NaN))).not.toBeNull();
  });
});
