import { newFrame } from '../particulars/new-frame.ts';
import type { Dado, DadoEnd, Particulars } from '../particulars/particulars.ts';
import type { Unit } from '../units/unit.ts';
import type { TracedFrame } from './frames/apply-roles.ts';
import { membersFromTraced } from './frames/members-from-traced.ts';
import type { TracedDado } from './frames/read-dado.ts';
import { NotTraceable } from './not-traceable.ts';

/**
 * A dado as it is drawn: the panel as wide as the rectangle, no clearance, ends where the rectangle ends. One that reaches the
 * frame's edge is open there. How deep it is no drawing says: as deep as a new frame's are.
 */
function dadoOf({ runs, at, width, from, to }: TracedDado, i: number, frame: TracedFrame, depth: number): Dado {
  const length = runs === 'vertical' ? frame.height : frame.width;
  const end = (open: boolean): DadoEnd => (open ? 'open' : 'meets');
  return {
    part: `Part ${i + 1}`,
    runs,
    at,
    panel: width,
    clearance: 0,
    depth,
    from: Math.max(0, from),
    to: Math.min(length, to),
    ends: [end(from <= 0), end(to >= length)],
  };
}

/**
 * The particulars of a traced frame; edge, cutters, board and turning over are a new frame's. With `asMembers` the outline is
 * stiles, rails and a layout; throws NotTraceable ('no-members') when it cannot be.
 */
export function tracedParticulars(frame: TracedFrame, name: string, unit: Unit, asMembers: boolean): Particulars {
  const base = newFrame(unit, name);
  const depth = base.dados[0]!.depth;
  const dados = frame.dados.map((dado, i) => dadoOf(dado, i, frame, depth));
  if (!asMembers) return { ...base, outline: frame.outline, dados };
  const members = membersFromTraced(frame.outline, unit);
  if (!members.ok) throw new NotTraceable('no-members', `${name}: ${members.problem.message}`);
  return { ...base, outline: members.outline, dados };
}
