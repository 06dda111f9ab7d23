import type { Face } from '../line-sets/line-set.ts';
import { placeExtents } from '../placing/place.ts';
import type { FileProfile } from '../profiles/file-profile.ts';
import { fileUnit } from '../profiles/file-unit.ts';
import { formatLength } from '../units/format-length.ts';
import { UNIT_WORDS } from '../units/unit.ts';
import type { WorkedFrame } from '../worked-frame.ts';

/** What the programmer must know of a face's DXF: release, unit, and where its 0, 0 lies. */
export function fileLine(worked: WorkedFrame, face: Face, profile: FileProfile): string {
  const { unit } = worked.particulars;
  const written = fileUnit(profile, unit);
  const units = written === unit ? UNIT_WORDS[unit] : `${UNIT_WORDS[written]} (this sheet is in ${UNIT_WORDS[unit]})`;
  return `DXF of the ${face}: ${profile.flavour}, ${units}, ${profile.decimals} decimals, ${originWords(worked, face, profile.origin)}.`;
}

function originWords(worked: WorkedFrame, face: Face, origin: FileProfile['origin']): string {
  if (origin === 'pins') return '0, 0 where the board meets the pins';
  const { width, height } = worked.contours;
  const { unit } = worked.particulars;
  const lies = placeExtents(worked[face].placement, { minX: 0, minY: 0, maxX: width, maxY: height });
  return `0, 0 at the lower left corner of the frame as it lies here, ${formatLength(lies.minX, unit)} right of and ${formatLength(lies.minY, unit)} above the pins' corner`;
}
