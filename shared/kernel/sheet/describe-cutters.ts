import { describeCutter } from '../cutters/describe-cutter.ts';
import { formatLength, formatWithUnit } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { WorkedFrame } from '../worked-frame.ts';
import { boxPartTable } from './box-parts.ts';
import { CAUTIONS } from './cautions.ts';
import type { CutterGroup } from './cutter-groups.ts';
import { cutterPicture } from './cutter-picture.ts';
import { findingLines, offcutLines } from './finding-lines.ts';
import { proofLines } from './proof-lines.ts';
import { residueTable } from './residue-table.ts';
import type { SheetCell, SheetContext, SheetPage, SheetTable } from './sheet-model.ts';
import { dayOf } from './title-block.ts';

function cutterTable(groups: readonly CutterGroup[], unit: Unit): SheetTable {
  const rows = groups.map(({ tag, cutter, roles, neededFlute }): SheetCell[] => [
    { text: tag, bold: true },
    { text: cutter.number === undefined ? '–' : String(cutter.number), value: cutter.number },
    {
      text:
        cutter.name === undefined ? describeCutter(cutter, unit) : `${cutter.name}: ${describeCutter(cutter, unit)}`,
    },
    { text: roles.join(', ') },
    { text: formatLength(cutter.fluteLength, unit), value: cutter.fluteLength },
    neededFlute === 0
      ? { text: 'not used' }
      : {
          text: `at least ${formatLength(neededFlute, unit)}`,
          value: neededFlute,
          bold: true,
          colour: neededFlute > cutter.fluteLength ? 'stop' : 'ink',
        },
    { text: cutter.maxPass === undefined ? 'whole depth' : formatLength(cutter.maxPass, unit), value: cutter.maxPass },
  ]);
  const columns = [
    { key: 'tag', heading: 'Cutter', align: 'left' },
    { key: 'number', heading: 'Place', align: 'right' },
    { key: 'shape', heading: 'Shape', align: 'left' },
    { key: 'roles', heading: 'For', align: 'left' },
    { key: 'flute', heading: 'Flute', align: 'right' },
    { key: 'needed', heading: 'Flute needed', align: 'right' },
    { key: 'pass', heading: 'Deepest pass', align: 'right' },
  ] as const;
  return { columns, rows, whenEmpty: 'No cutters.' };
}

/** Page 4: cutters, box parts, what comes free, what the checks and the proof say, cautions, and who signs. */
export function describeCutters(worked: WorkedFrame, context: SheetContext, groups: readonly CutterGroup[]): SheetPage {
  const { unit, thickness } = worked.particulars;
  const findings = findingLines(worked.findings);
  const offcuts = offcutLines(worked.findings);
  return {
    id: 'cutters',
    colour: 'ink',
    title: 'Cutters, parts and sign-off',
    lead: `Board ${formatWithUnit(thickness, unit)} thick. Check every cutter in your hand against these numbers.`,
    blocks: [
      {
        kind: 'pictures',
        id: 'cutter-pictures',
        title: '',
        pictures: groups.map((g) => ({ caption: '', picture: cutterPicture(g, unit) })),
      },
      { kind: 'table', id: 'cutters', title: '', table: cutterTable(groups, unit), after: [] },
      { kind: 'table', id: 'box-parts', title: 'Box parts that plug in', table: boxPartTable(worked), after: [] },
      {
        kind: 'table',
        id: 'residue',
        title: 'What is left in the corners of the openings',
        table: residueTable(worked),
        after: [],
      },
      {
        kind: 'list',
        id: 'offcuts',
        title: 'Offcuts that come free',
        ordered: false,
        items: offcuts.length > 0 ? offcuts : [{ text: 'None but the rim.' }],
      },
      {
        kind: 'list',
        id: 'findings',
        title: 'Findings',
        ordered: false,
        items: findings.length > 0 ? findings : [{ text: 'None.' }],
      },
      {
        kind: 'list',
        id: 'proof',
        title: 'Proof: the files read back and held against the intended lines',
        ordered: false,
        items: proofLines(context.proof),
      },
      {
        kind: 'list',
        id: 'cautions',
        title: 'Cautions',
        ordered: false,
        beside: true,
        items: [{ text: CAUTIONS.join(' ') }],
      },
      {
        kind: 'sign-off',
        id: 'sign-off',
        title: 'Sign-off',
        boxes: [
          context.revision === ''
            ? { what: 'Drawn', name: '', date: '' }
            : { what: 'Drawn', name: context.author, date: dayOf(context.releasedAt) },
          { what: 'Checked', name: '', date: '' },
          { what: 'Cut', name: '', date: '' },
        ],
      },
    ],
  };
}
