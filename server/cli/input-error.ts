/** An input that cannot be read or is not valid: the command ends with 2. */
export class InputError extends Error {
  /** One line for each wrong field. */
  readonly details: readonly string[];

  constructor(message: string, details: readonly string[] = []) {
    super(message);
    this.name = 'InputError';
    this.details = details;
  }
}
