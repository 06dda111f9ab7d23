import type { Unit } from '../units/unit.ts';
import type { FileProfile } from './file-profile.ts';

/** The unit that a profile's files are written in, for a frame drawn in `drawn`. */
export const fileUnit = (profile: FileProfile, drawn: Unit): Unit =>
  profile.unit === 'as drawn' ? drawn : profile.unit;
