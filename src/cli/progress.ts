/** A line on standard error that tells how much of a long work is done: on a terminal alone, and gone afterwards. */
export interface Progress {
  readonly tell: (fraction: number) => void;
  readonly end: () => void;
}

const CLEAR_LINE = '\r\u001B[K';

export function progressOf(what: string, quiet: boolean): Progress {
  if (quiet || !process.stderr.isTTY) return { tell: () => undefined, end: () => undefined };
  let told = -1;
  return {
    tell: (fraction) => {
      const percent = Math.floor(fraction * 100);
      if (percent === told) return;
      told = percent;
      process.stderr.write(`${CLEAR_LINE}${what} ${percent} %`);
    },
    end: () => {
      process.stderr.write(CLEAR_LINE);
    },
  };
}
