/** A folder or a name that nothing may be written to. Its message says why and what would be right. */
export class OutputError extends Error {
  override readonly name = 'OutputError';
}
