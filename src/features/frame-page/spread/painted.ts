/** Something painted on a page, in its pixels. `key` tells it from the others of its group. */
export type Painted = PaintedPath | PaintedWords | PaintedPin;

export interface PaintedPath {
  readonly kind: 'path';
  readonly key: string;
  readonly d: string;
  /** Class names. */
  readonly look: string;
}

export interface PaintedWords {
  readonly kind: 'words';
  readonly key: string;
  readonly text: string;
  readonly x: number;
  readonly y: number;
  /** Read from below to above. */
  readonly turned: boolean;
  readonly look: string;
  /** Pixels of board put beneath the words, as wide as they are, so that lines do not run through them; 0: none. */
  readonly ground: number;
}

export interface PaintedPin {
  readonly kind: 'pin';
  readonly key: string;
  readonly x: number;
  readonly y: number;
}
