import type { Role } from '#shared/contracts/roles.ts';

/** An invented shop with invented people: one of each role. The domain is reserved for examples (RFC 2606). */
export const DEMO_SHOP = { name: 'Tern & Alder Joinery', unit: 'in', paper: 'Letter' } as const;

export const DEMO_PEOPLE: readonly { role: Role; name: string; email: string }[] = [
  { role: 'owner', name: 'Maren Alder', email: 'maren@tern-and-alder.example' },
  { role: 'designer', name: 'Joss Quillby', email: 'joss@tern-and-alder.example' },
  { role: 'programmer', name: 'Ines Tarrow', email: 'ines@tern-and-alder.example' },
  { role: 'operator', name: 'Piet Holloway', email: 'piet@tern-and-alder.example' },
];

export const DEMO_JOB = 'Fenwick Lane kitchen';

/** The frames of the job, in order: file in samples/, and the note of its release; those without stay drafts. */
export const DEMO_FRAMES: readonly { file: string; note?: string }[] = [
  { file: 'two-door-base', note: 'Sizes from the site survey' },
  { file: 'drawer-stack', note: 'Drawer heights agreed' },
  { file: 'wall-three-doors', note: 'First issue' },
  { file: 'pantry-with-feet', note: 'Tall and thin: support it when lifting' },
  { file: 'arched-bookcase', note: 'First issue' },
  { file: 'vanity-mm' },
  { file: 'hearth-surround-traced', note: 'Outline traced from the mason’s template' },
  { file: 'corner-base-unfinished' },
];
