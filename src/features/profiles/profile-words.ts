import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';

/** Every choice of a file profile in a few words, for switches and for reading. */
export const FLAVOUR_WORDS: Record<FileProfile['flavour'], string> = { R2007: 'R2007', R12: 'R12' };
export const UNIT_WORDS: Record<FileProfile['unit'], string> = {
  'as drawn': 'As drawn',
  in: 'Inches',
  mm: 'Millimetres',
};
export const ORIGIN_WORDS: Record<FileProfile['origin'], string> = { pins: 'At the pins', frame: "Frame's lower left" };
export const OPENING_WORDS: Record<FileProfile['openingLines'], string> = {
  entered: 'Entered size',
  axis: 'Cutter axis',
  both: 'Both',
};

/** Options of a switch from a table of words, in its order. */
export const optionsOf = <T extends string>(words: Record<T, string>): { value: T; label: string }[] =>
  (Object.entries(words) as [T, string][]).map(([value, label]) => ({ value, label }));
