/** What the user gave is wrong: one line a fault, each with where, what and what would be right. Exit status 2. */
export class UsageError extends Error {
  override readonly name = 'UsageError';

  constructor(readonly faults: readonly string[]) {
    super(faults.join('\n'));
  }
}
