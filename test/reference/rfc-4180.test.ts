import { describe, expect, it } from 'vitest';
import { csv } from '../../src/output/index.js';

/** The rules of RFC 4180 (Shafranovich, 2005), section 2, with the RFC's own examples where it gives them. */
describe('CSV by RFC 4180, section 2', () => {
  it('1 and 2: each record on a line of its own, ended by CRLF, the last one too', () => {
    expect(csv(['aaa', 'bbb', 'ccc'], [['zzz', 'yyy', 'xxx']])).toBe('aaa,bbb,ccc\r\nzzz,yyy,xxx\r\n');
  });

  it('3: a header line in the same form', () => {
    expect(csv(['field_name', 'field_name'], [['aaa', 'bbb']])).toBe('field_name,field_name\r\naaa,bbb\r\n');
  });

  it('4: spaces are part of a field', () => {
    expect(csv(['a'], [[' b ']])).toBe('a\r\n b \r\n');
  });

  it('6: fields with line breaks, quotes and commas are quoted', () => {
    expect(csv(['aaa', 'b\r\nbb', 'ccc'], [])).toBe('aaa,"b\r\nbb",ccc\r\n');
    expect(csv(['a,b'], [['c\nd']])).toBe('"a,b"\r\n"c\nd"\r\n');
  });

  it('7: a quote inside a field is doubled', () => {
    expect(csv(['aaa', 'b"bb', 'ccc'], [])).toBe('aaa,"b""bb",ccc\r\n');
  });
});
