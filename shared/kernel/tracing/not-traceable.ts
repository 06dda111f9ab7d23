/** A file, or what a person wants of it, cannot be done. `code` is stable; the message says what to do. */
export class NotTraceable extends Error {
  readonly code: string;

  constructor(code: string, message: string) {
    super(message);
    this.name = 'NotTraceable';
    this.code = code;
  }
}
