import type { Cutter, CutterRole } from '../cutters/cutter.ts';
import type { Edge } from '../particulars/particulars.ts';
import { convertLength } from '../units/convert-length.ts';
import type { Unit } from '../units/unit.ts';
import type { DrawnFrame } from '../worked-frame.ts';
import type { SettingChange } from './comparison.ts';

/** One setting of a state. */
export interface Setting {
  readonly subject: string;
  readonly name: string;
  readonly measure: SettingChange['measure'];
  readonly value: number | string;
}

/** In cutting order. */
const ROLES = ['dado', 'squaring', 'bead', 'quirk', 'opening', 'corner', 'perimeter'] as const satisfies CutterRole[];

/** All that a frame is cut by beside its lines, lengths in `unit`; what the cut depends on first, names last. */
export function listSettings({ particulars: p, blank }: DrawnFrame, unit: Unit): Setting[] {
  const length = (subject: string, name: string, value: number): Setting => ({
    subject,
    name,
    measure: 'length',
    value: convertLength(value, p.unit, unit),
  });
  const other = (subject: string, name: string, value: number | string, measure: Setting['measure'] = 'word') => ({
    subject,
    name,
    measure,
    value,
  });
  const cutter = (role: CutterRole, c: Cutter): Setting[] => {
    const subject = `${role[0]!.toUpperCase()}${role.slice(1)} cutter`;
    return [
      other(subject, 'kind', c.kind),
      ...shape(c).map(([name, value, measure]) =>
        measure === 'angle' ? other(subject, name, value, 'angle') : length(subject, name, value),
      ),
      length(subject, 'flute length', c.fluteLength),
      ...(c.maxPass === undefined ? [] : [length(subject, 'deepest pass', c.maxPass)]),
    ];
  };
  const cutterWords = (role: CutterRole, c: Cutter): Setting[] => {
    const subject = `${role[0]!.toUpperCase()}${role.slice(1)} cutter`;
    return [
      ...(c.name === undefined ? [] : [other(subject, 'name', c.name)]),
      ...(c.number === undefined ? [] : [other(subject, 'number', c.number, 'count')]),
    ];
  };
  const cutters = ROLES.flatMap((role) => {
    const found = p.cutters[role];
    return found === undefined ? [] : [{ role, found }];
  });
  const { rough } = blank;
  return [
    other('Frame', 'outline', p.outline.kind),
    length('Board', 'thickness', p.thickness),
    ...edge(p.edge).map(([name, value]) =>
      typeof value === 'number' ? length('Edge', name, value) : other('Edge', name, value),
    ),
    ...cutters.flatMap(({ role, found }) => cutter(role, found)),
    other('Turning over', 'flip', p.setup.flip.replaceAll('-', ' ')),
    other('Turning over', 'squaring', p.setup.squaring.replaceAll('-', ' ')),
    length('Turning over', 'allowance', p.setup.allowance),
    length('Turning over', 'trim', p.setup.trim),
    length('Turning over', 'into the spoilboard', p.setup.spoilboard),
    length('Blank', 'width', rough.maxX - rough.minX),
    length('Blank', 'height', rough.maxY - rough.minY),
    other('Blank', 'size', blank.given ? 'given' : 'follows from the frame'),
    ...cutters.flatMap(({ role, found }) => cutterWords(role, found)),
    other('Frame', 'name', p.name),
  ];
}

function shape(c: Cutter): (readonly [name: string, value: number, measure: 'length' | 'angle'])[] {
  switch (c.kind) {
    case 'straight':
      return [['diameter', c.diameter, 'length']];
    case 'vee':
      return [['included angle', c.includedAngle, 'angle']];
    case 'tapered':
      return [
        ['tip radius', c.tipRadius, 'length'],
        ['side angle', c.sideAngle, 'angle'],
      ];
    case 'beading':
      return [
        ['profile radius', c.profileRadius, 'length'],
        ['tip flat', c.tipFlat, 'length'],
      ];
  }
}

const edge = (e: Edge): (readonly [name: string, value: string | number])[] => [
  ['style', e.style],
  ['size held at', e.sizeHeldAt ?? 'bead base'],
  ['corners', e.corners ?? 'lift'],
  ...(e.style === 'square'
    ? []
    : ([
        ['bead radius', e.bead.radius],
        ['bead drop', e.bead.drop],
        ['quirk', e.bead.quirk],
      ] as const)),
];
