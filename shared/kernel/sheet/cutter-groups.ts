import type { Cutter, CutterRole } from '../cutters/cutter.ts';
import { formatLength } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { WorkedFrame } from '../worked-frame.ts';

/** One cutter in the hand, whatever it does on the frame. */
export interface CutterGroup {
  /** C1, C2 …, in order of first use. */
  readonly tag: string;
  readonly cutter: Cutter;
  readonly roles: readonly CutterRole[];
  /** Deepest that its tip goes; what its flutes must at least be long. 0 when it cuts nothing. */
  readonly neededFlute: number;
  /** A short name for tables: "C1 T3 straight 3/8". */
  readonly short: string;
}

const sameCutter = (a: Cutter, b: Cutter): boolean => {
  const keys = new Set([...Object.keys(a), ...Object.keys(b)]) as Set<keyof Cutter>;
  return [...keys].every((k) => a[k] === b[k]);
};

function sizeWords(cutter: Cutter, unit: Unit): string {
  switch (cutter.kind) {
    case 'straight':
      return `straight ${formatLength(cutter.diameter, unit)}`;
    case 'vee':
      return `V ${cutter.includedAngle}°`;
    case 'tapered':
      return `tapered ${cutter.sideAngle}°`;
    case 'beading':
      return `beading ${formatLength(cutter.profileRadius, unit)}`;
  }
}

const shortName = (cutter: Cutter, unit: Unit): string =>
  [...(cutter.number === undefined ? [] : [`T${cutter.number}`]), cutter.name ?? sizeWords(cutter, unit)].join(' ');

/** The frame's cutters in order of first use; one that does several things is listed once. Cutters that cut nothing come last. */
export function cutterGroups(worked: WorkedFrame): CutterGroup[] {
  const { cutters, unit } = worked.particulars;
  const sets = [...worked.back.lineSets, ...worked.front.lineSets];
  const used = sets.flatMap((s) => (s.cutter === null ? [] : [s.cutter]));
  const roles = [...new Set<CutterRole>([...used, ...(Object.keys(cutters) as CutterRole[])])];
  const groups: { cutter: Cutter; roles: CutterRole[] }[] = [];
  for (const role of roles) {
    const cutter = cutters[role];
    if (cutter === undefined) continue;
    const known = groups.find((g) => sameCutter(g.cutter, cutter));
    if (known) known.roles.push(role);
    else groups.push({ cutter, roles: [role] });
  }
  return groups.map((g, i) => ({
    ...g,
    tag: `C${i + 1}`,
    neededFlute: Math.max(
      0,
      ...sets.filter((s) => s.cutter !== null && g.roles.includes(s.cutter)).map((s) => s.depth),
    ),
    short: shortName(g.cutter, unit),
  }));
}

/** How tables name the cutter of a role: "C1 straight 3/8". Throws for a role that the frame has no cutter for. */
export function cutterTag(groups: readonly CutterGroup[], role: CutterRole): string {
  const group = groups.find((g) => g.roles.includes(role));
  if (!group) throw new Error(`no cutter for ${role}`);
  return `${group.tag} ${group.short}`;
}
