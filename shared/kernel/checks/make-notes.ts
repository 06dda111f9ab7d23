import type { FrameContours } from '../frame/members.ts';
import { radiusAtHeight } from '../cutters/radius-at-height.ts';
import type { CornerResidue } from '../line-sets/corner-residue.ts';
import type { OpeningCut } from '../line-sets/opening-cut.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { NOTHING_LEFT, SAME } from '../tolerances.ts';
import { formatDecimal, formatWithUnit } from '../units/format-length.ts';
import type { Finding } from './finding.ts';
import { noteBeadNubs } from './note-bead-nubs.ts';
import { atOpening, wholeFrame } from './place-finding.ts';

/** What a person should know before cutting, without having to change it. */
export function makeNotes(
  p: Particulars,
  contours: FrameContours,
  cut: OpeningCut,
  residues: readonly CornerResidue[],
): Finding[] {
  if (contours.openings.length === 0) return notchNote(p, contours);
  return [
    ...heldNote(p, contours, cut),
    ...residueNotes(p, contours, residues),
    ...noteBeadNubs(p, contours, residues),
    ...offcutNotes(p, contours, cut),
    ...notchNote(p, contours),
  ];
}

/** Which edge is entered and which follows from the cutter. */
function heldNote(p: Particulars, contours: FrameContours, cut: OpeningCut): Finding[] {
  if (cut.atFace - cut.atBack < SAME) return [];
  const say = (n: number) => formatWithUnit(n, p.unit);
  const where =
    cut.heldDepth === 0
      ? 'the face'
      : cut.heldDepth === p.thickness
        ? 'the back'
        : `the bead’s base, ${say(cut.heldDepth)} below the face`;
  const follows = [
    ...(cut.atFace > SAME ? [`at the face each opening is larger by ${say(cut.atFace)} a side`] : []),
    ...(cut.atBack < -SAME
      ? [`at the back ${cut.atFace > SAME ? '' : 'each opening is '}smaller by ${say(-cut.atBack)} a side`]
      : []),
  ];
  return [
    {
      code: 'size-held',
      level: 'note',
      text: `Entered opening sizes are true at ${where}; ${follows.join(', ')}.`,
      remedy: '',
      numbers: { heldDepth: cut.heldDepth, atFace: cut.atFace, atBack: cut.atBack },
      places: contours.openings.map((o) => atOpening(o)),
    },
  ];
}

/** One note for each way a corner comes out. */
function residueNotes(p: Particulars, contours: FrameContours, residues: readonly CornerResidue[]): Finding[] {
  const alike = new Map<string, CornerResidue[]>();
  for (const r of residues) {
    const key = `${r.angle.toFixed(6)} ${r.levels[0]!.depth}`;
    alike.set(key, [...(alike.get(key) ?? []), r]);
  }
  return [...alike.values()].map((group) => {
    const { angle, levels } = group[0]!;
    const degrees = formatDecimal((angle * 180) / Math.PI, 2);
    const face = levels[0]!;
    const middle = levels[2]!;
    const left = (l: typeof face) => l.followed ?? l.lifted.diagonal;
    const leaves = (l: typeof face) => (left(l) < NOTHING_LEFT ? 'nothing' : formatWithUnit(left(l), p.unit));
    const ids = new Set(group.map((r) => r.opening));
    return {
      code: 'corner-residue',
      level: 'note',
      text: `Inside corners of ${degrees}°: ${leaves(face)} is left on the diagonal at ${face.depth === 0 ? 'the face' : 'the bead’s base'}, ${leaves(middle)} at half the thickness.`,
      remedy: '',
      numbers: { angle, face: left(face), half: left(middle), back: left(levels[3]!) },
      places: contours.openings.filter((o) => ids.has(o.id)).map((o) => atOpening(o)),
    } satisfies Finding;
  });
}

/** Size of the piece that comes free in each opening, at its larger face: the opening less the cutter's way on both sides. */
function offcutNotes(p: Particulars, contours: FrameContours, cut: OpeningCut): Finding[] {
  const kerf = cut.axisOffset + radiusAtHeight(p.cutters.opening, cut.tipDepth - p.thickness);
  const bySize = new Map<string, { width: number; height: number; of: (typeof contours.openings)[number][] }>();
  for (const o of contours.openings) {
    const width = o.width - 2 * kerf;
    const height = o.height - 2 * kerf;
    if (width <= 0 || height <= 0) continue;
    const key = `${width.toFixed(6)}/${height.toFixed(6)}`;
    const known = bySize.get(key);
    if (known) known.of.push(o);
    else bySize.set(key, { width, height, of: [o] });
  }
  return [...bySize.values()].map(({ width, height, of }) => ({
    code: 'offcut-free',
    level: 'note',
    text: `Opening${of.length > 1 ? 's' : ''} ${of.map((o) => o.label).join(', ')}: an offcut of ${formatWithUnit(width, p.unit)} × ${formatWithUnit(height, p.unit)} comes free${of.length > 1 ? ' in each' : ''}. Hold it down.`,
    remedy: '',
    numbers: { width, height },
    places: of.map((o) => atOpening(o)),
  }));
}

/** The corners of a foot notch stay round: the perimeter cutter runs outside. */
function notchNote(p: Particulars, contours: FrameContours): Finding[] {
  if (p.outline.kind !== 'members' || p.outline.feet === 0 || p.cutters.perimeter.kind !== 'straight') return [];
  const radius = p.cutters.perimeter.diameter / 2;
  return [
    {
      code: 'notch-corner',
      level: 'note',
      text: `The two inside corners between the feet keep the perimeter cutter’s radius of ${formatWithUnit(radius, p.unit)}.`,
      remedy: '',
      numbers: { radius },
      places: [wholeFrame(contours, 'front')],
    },
  ];
}
