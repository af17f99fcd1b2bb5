import { describe, expect, it } from 'vitest';
import { csv } from '../../../src/output/index.js';

describe('csv', () => {
  it('leaves numbers alone and writes nothing for null', () => {
    expect(csv(['a', 'b', 'c'], [[-1.5, null, 'text']])).toBe('a,b,c\r\n-1.5,,text\r\n');
  });

  it.each(['=HYPERLINK("x")', '+1', '-1', '@SUM(A1)', '\tx', '\rx', '\n=1', '＝1'])(
    'makes text that a spreadsheet would run harmless: %j',
    (text) => {
      const cell = csv(['h'], [[text]]).slice('h\r\n'.length);
      expect(cell.replace(/^"/, '').startsWith("'")).toBe(true);
    },
  );

  it('disarms the header too', () => {
    expect(csv(['=1'], [])).toBe("'=1\r\n");
  });
});
