import { createHash } from 'node:crypto';
import {
  mkdirSync,
  mkdtempSync,
  readFileSync,
  readdirSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { OutputError, writeOutputs, writeWhole } from '../../../src/plan/files/index.js';

let folder: string;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'synodos-'));
});
afterEach(() => {
  rmSync(folder, { recursive: true });
});

const file = (name: string) => ({ name, text: 'Grüße\n', what: 'a greeting' });

describe('outputs', () => {
  it('are written with a manifest that tells name, size, checksum and sense of each', () => {
    const place = join(folder, 'new', 'out');
    writeOutputs(place, 'T', [file('a.txt')]);
    expect(readFileSync(join(place, 'a.txt'), 'utf8')).toBe('Grüße\n');
    expect(JSON.parse(readFileSync(join(place, 'manifest.json'), 'utf8'))).toEqual({
      schema: 'synodos-manifest-1',
      title: 'T',
      files: [
        {
          name: 'a.txt',
          bytes: 8,
          sha256: createHash('sha256').update('Grüße\n').digest('hex'),
          what: 'a greeting',
        },
      ],
    });
    expect(readdirSync(place).sort()).toEqual(['a.txt', 'manifest.json']);
  });

  it.each([
    '../a.txt',
    '/etc/a.txt',
    'a/b.txt',
    '..',
    '.',
    '',
    'a\\b',
    'C:a',
    '.hidden',
    'a\n.txt',
    'a..txt',
    '-a',
  ])('are refused the name %j, and then nothing is written', (name) => {
    const place = join(folder, 'out');
    expect(() => writeOutputs(place, 'T', [file('good.txt'), file(name)])).toThrow(OutputError);
    expect(() => writeOutputs(place, 'T', [file(name)])).toThrow(
      /is not a bare file name: use letters, digits/,
    );
    expect(readdirSync(place)).toEqual([]);
  });

  it('do not follow a link out of the folder', () => {
    const outside = join(folder, 'outside.txt');
    const place = join(folder, 'out');
    mkdirSync(place);
    writeFileSync(outside, 'mine');
    symlinkSync(outside, join(place, 'a.txt'));
    expect(() => writeOutputs(place, 'T', [file('b.txt'), file('a.txt')])).toThrow(
      'a.txt in the output folder is a link: remove it, or name another folder',
    );
    expect(readFileSync(outside, 'utf8')).toBe('mine');
    expect(readdirSync(place)).toEqual(['a.txt']);
  });

  it('do not replace a folder', () => {
    mkdirSync(join(folder, 'a.txt'));
    expect(() => writeOutputs(folder, 'T', [file('a.txt')])).toThrow(
      'a.txt in the output folder is not a plain file',
    );
  });

  it('leave alone what else is in the folder', () => {
    writeFileSync(join(folder, 'notes.txt'), 'mine');
    writeOutputs(folder, 'T', [file('a.txt')]);
    expect(readFileSync(join(folder, 'notes.txt'), 'utf8')).toBe('mine');
  });
});

describe('a file written whole', () => {
  it('replaces the old one and leaves nothing else behind', () => {
    const path = join(folder, 'a.txt');
    writeFileSync(path, 'an older and longer text');
    writeWhole(path, Buffer.from('new'));
    expect(readFileSync(path, 'utf8')).toBe('new');
    expect(readdirSync(folder)).toEqual(['a.txt']);
  });

  it('leaves the old one and no litter where it cannot be written', () => {
    mkdirSync(join(folder, 'a.txt'));
    expect(() => {
      writeWhole(join(folder, 'a.txt'), Buffer.from('new'));
    }).toThrow();
    expect(readdirSync(folder)).toEqual(['a.txt']);
  });
});
