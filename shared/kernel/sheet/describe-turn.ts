import type { WorkedFrame } from '../worked-frame.ts';
import type { SheetBlock, SheetCell, SheetLine, SheetPage, SheetTable } from './sheet-model.ts';
import { movingEdge, squaredCornerPlaces, turnedEdges, type TurnedEdge } from './turn-edges.ts';
import { turnPicture } from './turn-picture.ts';
import { turnSection } from './turn-section.ts';

function edgeTable(edges: readonly TurnedEdge[], allSquared: boolean): SheetTable {
  const rows = edges.map((e): SheetCell[] => [
    { text: e.letter, bold: true },
    { text: e.before },
    { text: e.after, bold: true },
    { text: e.squared || allSquared ? 'squared' : 'rough' },
    { text: e.squared ? 'against the pins' : 'free', bold: e.squared },
  ]);
  const columns = ['Edge', 'Lies, back up', 'Lies, front up', 'Is', 'Then'].map(
    (heading) => ({ key: heading, heading, align: 'left' }) as const,
  );
  return { columns, rows, whenEmpty: '' };
}

/** The spread and the same turn seen along the fold: one below the other, or side by side when the spread is upright. */
function turnPictures(worked: WorkedFrame): SheetBlock[] {
  const { flip } = worked.blank;
  const sideToSide = flip === 'side-to-side';
  const spread = {
    caption:
      'Not to scale. Heavy lines: squared edges. Filled corner: where they meet. Black letters: edges that go to the pins.',
    picture: turnPicture(worked),
  };
  const from = sideToSide ? 'bottom' : 'left';
  const section = {
    caption: `The same turn seen along the fold, from the ${from} edge of the machine. Then slide the board back to the pins.`,
    picture: turnSection(flip, sideToSide ? 44 : 28),
  };
  const block = (id: string, pictures: (typeof spread)[]): SheetBlock => ({
    kind: 'pictures',
    id,
    title: '',
    pictures,
  });
  return sideToSide
    ? [block('turn-picture', [spread]), block('turn-section', [section])]
    : [block('turn-picture', [spread, section])];
}

/** Page 2: how the board is turned over, so that nobody can take it the other way. */
export function describeTurn(worked: WorkedFrame): SheetPage {
  const { flip, squaredEdges } = worked.blank;
  const sideToSide = flip === 'side-to-side';
  const allSquared = worked.particulars.setup.squaring === 'all-edges';
  const edges = turnedEdges(flip, squaredEdges);
  const letter = (side: string) => edges.find((e) => e.before === side)!.letter;
  const { lifted, pivot } = movingEdge(flip);
  const corner = squaredCornerPlaces(flip);
  const stays = sideToSide
    ? 'Top stays at the top, bottom at the bottom.'
    : 'Left stays at the left, right at the right.';
  const onPins = edges.filter((e) => e.squared);
  const steps: SheetLine[] = [
    {
      word: 'Loosen',
      text: 'the board only when dados and squaring edge are both cut. Take away what came free; brush pins and bed clean.',
    },
    {
      word: 'Lift',
      text: `edge ${letter(lifted)} (${lifted}) and carry it over edge ${letter(pivot)} (${pivot}) until the front face lies up. ${stays}`,
    },
    {
      word: 'Push',
      text: `${onPins.map((e) => `edge ${e.letter} to the pins at the ${e.after}`).join(' and ')}. Both are freshly cut.`,
    },
    {
      word: 'Check',
      text:
        `the marked corner: it was ${corner.before} with the back up and is now ${corner.after}, at the pins, its mark underneath. ` +
        (allSquared
          ? 'With all edges squared the corner alone tells: look for the mark.'
          : 'A rough edge at a pin means that the board was turned the wrong way: turn it back and begin this sheet again.'),
    },
  ];
  return {
    id: 'turn',
    colour: 'ink',
    title: sideToSide ? 'Turn over, side to side' : 'Turn over, end over end',
    lead: sideToSide
      ? `Like a page of a book: the left edge goes over to the right. The squared corner moves from ${corner.before} to ${corner.after}.`
      : `Like a page of a wall calendar: the top edge comes down to the bottom. The squared corner moves from ${corner.before} to ${corner.after}.`,
    blocks: [
      ...turnPictures(worked),
      { kind: 'list', id: 'turn-steps', title: 'How', ordered: true, items: steps },
      {
        kind: 'table',
        id: 'turn-edges',
        title: 'Where each edge goes',
        table: edgeTable(edges, allSquared),
        after: [],
      },
    ],
  };
}
