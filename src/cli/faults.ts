import type { Reading } from '../plan/words/index.js';
import { UsageError } from './usage-error.js';

/** Gathers the faults of a command line, so that all of them are told at once. */
export class Faults {
  readonly #lines: string[] = [];

  add(where: string, problem: string): void {
    this.#lines.push(`${where}: ${problem}`);
  }

  /** The value of a reading; where there is none, its problem is noted and undefined comes back. */
  take<T>(where: string, reading: Reading<T>): T | undefined {
    if ('value' in reading) return reading.value;
    this.add(where, reading.problem);
    return undefined;
  }

  /** Notes what another reader has found wrong. */
  include({ faults }: UsageError): void {
    this.#lines.push(...faults);
  }

  /** Throws what was gathered, if anything was. */
  throwIfAny(): void {
    if (this.#lines.length > 0) throw new UsageError(this.#lines);
  }
}
