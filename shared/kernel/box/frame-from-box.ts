import type { Finding } from '../checks/finding.ts';
import { newFrame } from '../particulars/new-frame.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { workFrame } from '../work-frame.ts';
import type { Box } from './box.ts';
import type { BoxProblem } from './box-problem.ts';
import { checkBox } from './check-box.ts';
import { layOutBox } from './lay-out-box.ts';

export type FrameFromBox =
  | {
      readonly ok: true;
      readonly particulars: Particulars;
      /** Cautions and notes of the frame; no stop. */ readonly findings: readonly Finding[];
    }
  | { readonly ok: false; readonly problems: readonly BoxProblem[] };

/**
 * The frame that covers a box: size, members, and the dados of every part that plugs in. `base` lends its board,
 * edge, setup and cutters. Never a frame with a stop among its findings: what would stop it comes back as a problem.
 * Throws when `base` is in another unit than the box.
 */
export function frameFromBox(box: Box, base: Particulars = newFrame(box.unit, box.name)): FrameFromBox {
  if (base.unit !== box.unit) throw new RangeError(`base: got a frame in ${base.unit}, takes one in ${box.unit}`);
  const problems = checkBox(box, base);
  if (problems.length > 0) return { ok: false, problems };
  const { width, height, stiles, rails, layout, dados } = layOutBox(box);
  const particulars: Particulars = {
    ...base,
    name: box.name,
    outline: { kind: 'members', width, height, stiles, rails, feet: box.feet, layout },
    dados,
  };
  const { findings } = workFrame(particulars);
  const stops = findings.filter((finding) => finding.level === 'stop');
  if (stops.length > 0)
    return { ok: false, problems: stops.map(({ text, remedy }) => ({ field: '', got: text, takes: remedy })) };
  return { ok: true, particulars, findings };
}
