import type { FrameContours } from '../frame/members.ts';
import { SAME, slenderLength, slenderWidth } from '../tolerances.ts';
import { formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { Finding } from './finding.ts';

/** Long members that are too narrow to stay straight. */
export function checkMembers({ members }: FrameContours, unit: Unit): Finding[] {
  return members.flatMap((m): Finding[] => {
    if (m.width >= slenderWidth(unit) - SAME || m.length <= slenderLength(unit) + SAME) return [];
    return [
      {
        code: 'slender-member',
        level: 'caution',
        text: `${m.label} is ${formatWithUnit(m.width, unit)} wide over a length of ${formatWithUnit(m.length, unit)}: it may bend or break in handling.`,
        remedy: `Make it at least ${formatWithUnit(slenderWidth(unit), unit)} wide, or handle it with care.`,
        numbers: { width: m.width, length: m.length },
        places: [{ face: 'both', features: [m.id], extents: m.extents }],
      },
    ];
  });
}
