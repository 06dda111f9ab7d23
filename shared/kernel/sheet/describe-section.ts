import { cornerPicture } from '../section/corner-picture.ts';
import { sectionPicture } from '../section/section-picture.ts';
import { UNIT_WORDS } from '../units/unit.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import type { SheetBlock, SheetPage } from './sheet-model.ts';

/** What is left in each kind of inside corner by the method that this frame takes. */
function cornerBlocks({ particulars, residues }: WorkedFrame): SheetBlock[] {
  const angles = new Map(residues.map((r) => [((r.angle * 180) / Math.PI).toFixed(1), r.angle]));
  return [...angles].map(([degrees, angle]) => ({
    kind: 'pictures',
    id: `corner-${degrees}`,
    title: `Inside corners of ${Number(degrees)}°`,
    pictures: [{ caption: '', picture: cornerPicture(particulars, particulars.edge.corners ?? 'lift', angle) }],
  }));
}

/** The page after the front of a beaded frame: its section drawn large with every axis, and its corners. None for square edges, which the sizes describe. */
export function describeSection(worked: WorkedFrame): SheetPage[] {
  const { particulars, contours } = worked;
  if (particulars.edge.style !== 'beaded' || contours.openings.every((o) => o.square)) return [];
  return [
    {
      id: 'section',
      colour: 'front',
      title: 'Edge and corners of the openings',
      lead: `The lines that the cutters leave, from the same numbers as the files. All lengths in ${UNIT_WORDS[particulars.unit]}.`,
      blocks: [
        {
          kind: 'pictures',
          id: 'section',
          title: 'Section across the beaded edge',
          pictures: [{ caption: '', picture: sectionPicture(particulars) }],
        },
        ...cornerBlocks(worked),
      ],
    },
  ];
}
