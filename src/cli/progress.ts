const CLEAR_LINE = '\r\u001B[K';

/**
 * Does a long work with a line on standard error that tells how much of it is done: on a terminal alone, and gone
 * afterwards, however the work ends.
 */
export function withProgress<T>(
  what: string,
  quiet: boolean,
  work: (tell: (fraction: number) => void) => T,
): T {
  if (quiet || !process.stderr.isTTY) return work(() => undefined);
  let told = -1;
  try {
    return work((fraction) => {
      const percent = Math.floor(fraction * 100);
      if (percent === told) return;
      told = percent;
      process.stderr.write(`${CLEAR_LINE}${what} ${percent} %`);
    });
  } finally {
    process.stderr.write(CLEAR_LINE);
  }
}
