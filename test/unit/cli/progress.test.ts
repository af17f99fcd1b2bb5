import { afterEach, describe, expect, it, vi } from 'vitest';
import { withProgress } from '../../../src/cli/progress.js';

const work = (tell: (fraction: number) => void): string => {
  for (const fraction of [0, 0.004, 0.5, 0.504, 1]) tell(fraction);
  return 'done';
};

/** What is written to a standard error that is, or is not, a terminal. */
function written(isTerminal: boolean, quiet: boolean, task: typeof work): string {
  const told: string[] = [];
  vi.spyOn(process.stderr, 'write').mockImplementation((text) => told.push(String(text)) > 0);
  Object.defineProperty(process.stderr, 'isTTY', { value: isTerminal, configurable: true });
  try {
    withProgress('searching', quiet, task);
  } catch {
    // How the work ends is not asked here.
  }
  return told.join('');
}

const wasTerminal = process.stderr.isTTY;
afterEach(() => {
  vi.restoreAllMocks();
  Object.defineProperty(process.stderr, 'isTTY', { value: wasTerminal, configurable: true });
});

describe('progress', () => {
  it('is told once a percent on a terminal, and is gone afterwards', () => {
    expect(written(true, false, work)).toBe(
      '\r\u001B[Ksearching 0 %\r\u001B[Ksearching 50 %\r\u001B[Ksearching 100 %\r\u001B[K',
    );
  });

  it('is gone even where the work fails', () => {
    const fails = (): never => {
      throw new Error('no');
    };
    expect(written(true, false, fails)).toBe('\r\u001B[K');
  });

  it('is kept out of pipes and away from those who want quiet', () => {
    expect(written(false, false, work)).toBe('');
    expect(written(true, true, work)).toBe('');
  });

  it('gives back what the work gives', () => {
    expect(withProgress('searching', true, work)).toBe('done');
  });
});
