import type { Painted, PaintedWords } from './painted.ts';
import { PIN_RADIUS_PX } from './paint-pins.ts';

const SVG = 'http://www.w3.org/2000/svg';
/** From the middle of the type down to its baseline. */
const BASELINE_PX = 4;
/** Height of the 11 px type with a little above and below. */
const GROUND_PX = 14;

interface Shown {
  readonly element: SVGElement;
  readonly attributes: Map<string, string>;
  text: string;
}

function create(tag: string): Shown {
  return { element: document.createElementNS(SVG, tag), attributes: new Map(), text: '' };
}

function set({ element, attributes }: Shown, name: string, value: string): void {
  if (attributes.get(name) === value) return;
  attributes.set(name, value);
  element.setAttribute(name, value);
}

/**
 * Words are moved by a group about them: moving the words themselves, by x and y or a transform of their own, has the browser
 * lay them out anew, which takes longer than all lines of both faces together.
 */
const place = ({ x, y, turned }: PaintedWords): string =>
  turned ? `translate(${x} ${y}) rotate(-90)` : `translate(${x} ${y})`;

/** One element of a group, made once and then only changed where what it shows has changed. */
class Piece {
  private readonly outer: Shown;
  private readonly inner: Shown;
  private ground: Shown | null = null;

  constructor(readonly kind: Painted['kind']) {
    this.outer = create(kind === 'path' ? 'path' : kind === 'pin' ? 'circle' : 'g');
    this.inner = kind === 'words' ? create('text') : this.outer;
    if (kind === 'path') set(this.outer, 'fill-rule', 'evenodd');
    if (kind === 'words') {
      this.outer.element.append(this.inner.element);
      set(this.inner, 'y', String(BASELINE_PX));
      set(this.inner, 'text-anchor', 'middle');
    }
  }

  get element(): SVGElement {
    return this.outer.element;
  }

  private showGround(width: number): void {
    if (this.ground === null) {
      this.ground = create('rect');
      set(this.ground, 'class', 'fill-board');
      set(this.ground, 'y', String(-GROUND_PX / 2));
      set(this.ground, 'height', String(GROUND_PX));
      this.outer.element.prepend(this.ground.element);
    }
    set(this.ground, 'x', String(-width / 2));
    set(this.ground, 'width', String(width));
  }

  show(painted: Painted): void {
    if (painted.kind === 'path') {
      set(this.outer, 'class', painted.look);
      set(this.outer, 'd', painted.d);
    } else if (painted.kind === 'pin') {
      set(this.outer, 'class', 'fill-paper stroke-ink [stroke-width:1.25]');
      set(this.outer, 'r', String(PIN_RADIUS_PX));
      set(this.outer, 'cx', String(painted.x));
      set(this.outer, 'cy', String(painted.y));
    } else {
      set(this.outer, 'transform', place(painted));
      set(this.inner, 'class', painted.look);
      if (painted.ground > 0) this.showGround(painted.ground);
      if (this.inner.text !== painted.text) this.inner.element.textContent = this.inner.text = painted.text;
    }
  }
}

/** Shows painted things as the children of a group, in their order; each call changes only what is different from the last. */
export function showIn(group: SVGGElement): (painted: readonly Painted[]) => void {
  let pieces = new Map<string, Piece>();
  return (painted) => {
    const next = new Map<string, Piece>();
    for (const thing of painted) {
      const known = pieces.get(thing.key);
      const piece = known?.kind === thing.kind ? known : new Piece(thing.kind);
      piece.show(thing);
      next.set(thing.key, piece);
    }
    const before = [...pieces.keys()];
    const same =
      next.size === before.length &&
      painted.every(({ key }, i) => before[i] === key && next.get(key) === pieces.get(key));
    if (!same) group.replaceChildren(...[...next.values()].map((piece) => piece.element));
    pieces = next;
  };
}
