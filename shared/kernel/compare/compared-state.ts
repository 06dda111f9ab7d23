import type { Contour, Extents } from '../contour/contour.ts';
import type { Member, Opening } from '../frame/members.ts';
import type { DadoOutline } from '../frame/dado-outline.ts';
import type { Dado, Flip } from '../particulars/particulars.ts';
import { convertLength } from '../units/convert-length.ts';
import type { Unit } from '../units/unit.ts';
import type { DrawnFrame } from '../worked-frame.ts';

/** A dado as it is cut, with what was entered for it. */
export interface ComparedDado extends DadoOutline {
  readonly entered: Dado;
}

/** What of a drawn frame is held against another; frame view, in a unit that both have. */
export interface ComparedState {
  readonly outline: 'members' | 'traced';
  readonly width: number;
  readonly height: number;
  readonly perimeter: Contour;
  readonly openings: readonly Opening[];
  readonly members: readonly Member[];
  readonly dados: readonly ComparedDado[];
  readonly flip: Flip;
}

/** The state of a drawn frame in `unit`; in its own unit every number stays the very same. */
export function comparedState({ particulars, contours, dados }: DrawnFrame, unit: Unit): ComparedState {
  const to = (length: number) => convertLength(length, particulars.unit, unit);
  const extentsTo = ({ minX, minY, maxX, maxY }: Extents): Extents => ({
    minX: to(minX),
    minY: to(minY),
    maxX: to(maxX),
    maxY: to(maxY),
  });
  const contourTo = ({ closed, vertices }: Contour): Contour => ({
    closed,
    vertices: vertices.map(({ x, y, bulge }) => ({ x: to(x), y: to(y), bulge })),
  });
  const enteredTo = (dado: Dado): Dado => ({
    ...dado,
    at: to(dado.at),
    panel: to(dado.panel),
    clearance: to(dado.clearance),
    depth: to(dado.depth),
    from: to(dado.from),
    to: to(dado.to),
  });
  return {
    outline: particulars.outline.kind,
    width: to(contours.width),
    height: to(contours.height),
    perimeter: contourTo(contours.perimeter),
    openings: contours.openings.map((opening) => ({
      ...opening,
      contour: contourTo(opening.contour),
      extents: extentsTo(opening.extents),
      width: to(opening.width),
      height: to(opening.height),
      arch: to(opening.arch),
    })),
    members: numbered(
      contours.members.map((member) => ({
        ...member,
        extents: extentsTo(member.extents),
        width: to(member.width),
        length: to(member.length),
      })),
    ),
    dados: dados.map((dado) => ({
      ...dado,
      extents: extentsTo(dado.extents),
      depth: to(dado.depth),
      entered: enteredTo(particulars.dados[dado.index]!),
    })),
    flip: particulars.setup.flip,
  };
}

/** Members that share a name with others are told apart by number. */
function numbered(members: readonly Member[]): Member[] {
  return members.map((member, i) => {
    const alike = members.filter(({ label }) => label === member.label);
    if (alike.length === 1) return member;
    const before = members.slice(0, i).filter(({ label }) => label === member.label).length;
    return { ...member, label: `${member.label} ${before + 1}` };
  });
}
