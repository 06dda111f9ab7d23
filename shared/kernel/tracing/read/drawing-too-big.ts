export type TooBig = 'too-many-bytes' | 'too-many-entities' | 'too-many-segments' | 'too-much-to-fit';

/** A drawing goes beyond what is read of one; nothing of it is kept. `code` is stable, the message is for a person. */
export class DrawingTooBig extends Error {
  readonly code: TooBig;

  constructor(code: TooBig, message: string) {
    super(message);
    this.name = 'DrawingTooBig';
    this.code = code;
  }
}
