/** A frame cannot be drawn as its file profile asks: a matter for the person to mend, not a mistake of the program. */
export class DrawingRefused extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'DrawingRefused';
  }
}
