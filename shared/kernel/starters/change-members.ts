import type { Finding } from '../checks/finding.ts';
import { membersContours } from '../frame/members-contours.ts';
import type { FrameContours } from '../frame/members.ts';
import { tracedContours } from '../frame/traced-contours.ts';
import type { Particulars } from '../particulars/particulars.ts';
import { formatWithUnit } from '../units/format-length.ts';
import { UNIT_WORDS } from '../units/unit.ts';
import { workFrame } from '../work-frame.ts';
import { followMembers } from './follow-members.ts';
import { MAY_BE_NONE, type ChangedFrame, type MemberChange } from './member-change.ts';
import { setMember } from './set-member.ts';

const OF_ANY_OUTLINE: readonly MemberChange['what'][] = ['thickness', 'dado clearance', 'dado depth'];

/** Why a frame cannot take a change whatever its numbers; `undefined` when it can. */
function whyNot({ unit, outline }: Particulars, change: MemberChange): string | undefined {
  if (change.unit !== unit) return `The frame is in ${UNIT_WORDS[unit]}, the change in ${UNIT_WORDS[change.unit]}.`;
  if (outline.kind === 'traced' && !OF_ANY_OUTLINE.includes(change.what))
    return `Its outline is traced, so it has no ${change.what} to change.`;
  return undefined;
}

function checkNumber({ what, to }: MemberChange): void {
  const none = MAY_BE_NONE.includes(what);
  if (!Number.isFinite(to) || to < 0 || (to === 0 && !none))
    throw new RangeError(`${what}: got ${to}, takes a length${none ? ', 0 or more' : ' above 0'}`);
}

const contoursOf = ({ outline, unit }: Particulars): FrameContours =>
  (outline.kind === 'members' ? membersContours(outline, unit) : tracedContours(outline)).contours;

const stopKey = ({ code, field, places }: Finding): string =>
  `${code} ${field ?? ''} ${places.flatMap((p) => p.features).join(' ')}`;

/**
 * A frame with some of its members changed. The frame keeps its size: openings without a size of their own give or take
 * what is needed, fixed sizes stay. Dados behind a member that moves go along where there is one way to. Refused, with
 * the reason, for a traced outline, for a change in the other unit, and when it would bring a stop that was not there
 * before, such as fixed sizes that no longer add up. Throws for a length that is none.
 */
export function changeMembers(particulars: Particulars, changes: readonly MemberChange[]): ChangedFrame {
  for (const change of changes) checkNumber(change);
  const refused = changes.map((change) => whyNot(particulars, change)).find((why) => why !== undefined);
  if (refused !== undefined) return { ok: false, why: refused };

  const say = (value: number): string => formatWithUnit(value, particulars.unit);
  const list = (values: readonly number[]): string => values.map(say).join(', ');
  const changed: string[] = [];
  const skipped: string[] = [];
  let next = particulars;
  for (const change of changes) {
    const set = setMember(next, change);
    next = set.particulars;
    if (set.was.length > 0) changed.push(`${change.what}: ${say(change.to)}, was ${list(set.was)}`);
    else if (set.others.length > 0) skipped.push(`${change.what}: ${list(set.others)}, not ${say(change.from!)}`);
    else skipped.push(`${change.what}: ${set.found ? `${say(change.to)} already` : 'there is none'}`);
  }
  if (next === particulars) return { ok: true, particulars, changed, skipped, moved: [], stayed: [] };

  const before = workFrame(particulars);
  const { dados, moved, stayed } = followMembers(before.contours, contoursOf(next), next.dados);
  const followed: Particulars = { ...next, dados };
  const known = new Set(before.findings.filter((f) => f.level === 'stop').map(stopKey));
  const stop = workFrame(followed).findings.find((f) => f.level === 'stop' && !known.has(stopKey(f)));
  if (stop) return { ok: false, why: `${stop.text} ${stop.remedy}` };
  return { ok: true, particulars: followed, changed, skipped, moved, stayed };
}

/** The same for one change. */
export const changeMember = (particulars: Particulars, change: MemberChange): ChangedFrame =>
  changeMembers(particulars, [change]);

/** The same for many frames: what becomes of each, in the order given; no frame stands in another's way. */
export const changeManyFrames = <Frame extends { readonly id: string; readonly particulars: Particulars }>(
  frames: readonly Frame[],
  changes: readonly MemberChange[],
): { readonly id: string; readonly result: ChangedFrame }[] =>
  frames.map(({ id, particulars }) => ({ id, result: changeMembers(particulars, changes) }));
