import { drawerEntry } from '#shared/contracts/cutters.ts';
import { cutter as cutterContract } from '#shared/contracts/particulars.ts';
import { NUMBER_COLUMNS, type NumberColumn } from '#shared/kernel/cutter-drawer/cutter-columns.ts';
import type { DrawerEntry } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import type { Cutter, CutterKind } from '#shared/kernel/cutters/cutter.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import { parseLength } from '#shared/kernel/units/parse-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { checkForm, type CheckedForm } from '../../lib/check-form.ts';
import { NO_LENGTH } from './cutter-words.ts';

export type NumberEntry = NumberColumn['entry'];

/** A cutter as typed: texts stay as they are until the whole is saved. Those of other kinds are kept, in case one comes back to them. */
export interface EntryTexts {
  readonly unit: Unit;
  readonly kind: CutterKind;
  readonly name: string;
  readonly remarks: string;
  readonly numbers: Readonly<Partial<Record<NumberEntry, string>>>;
}

export const newTexts = (unit: Unit): EntryTexts => ({ unit, kind: 'straight', name: '', remarks: '', numbers: {} });

/** Whether two say the same, letter by letter; an entry never touched is an empty one. */
export function sameTexts(a: EntryTexts, b: EntryTexts): boolean {
  return (
    a.unit === b.unit &&
    a.kind === b.kind &&
    a.name === b.name &&
    a.remarks === b.remarks &&
    NUMBER_COLUMNS.every(({ entry }) => (a.numbers[entry] ?? '') === (b.numbers[entry] ?? ''))
  );
}

/** Every digit of a length that would be rounded: typed again, the rounded one would be another length. */
function show(entry: NumberEntry, value: number, unit: Unit): string {
  const text = formatLength(value, unit);
  return NO_LENGTH.includes(entry) || text.startsWith('≈') ? String(value) : text;
}

export function textsOf({ unit, cutter, remarks }: DrawerEntry): EntryTexts {
  const values = cutter as unknown as Readonly<Record<string, number | undefined>>;
  const numbers: Partial<Record<NumberEntry, string>> = {};
  for (const { entry } of NUMBER_COLUMNS) {
    const value = values[entry];
    if (value !== undefined) numbers[entry] = show(entry, value, unit);
  }
  return { unit, kind: cutter.kind, name: cutter.name, remarks, numbers };
}

/** The entries that a kind of cutter has, those of its shape first. */
export function entriesOf(kind: CutterKind): NumberEntry[] {
  const shape = NUMBER_COLUMNS.filter(({ kinds }) => kinds?.includes(kind));
  return [...shape.map(({ entry }) => entry), 'fluteLength', 'maxPass', 'number'];
}

type Read = { readonly ok: true; readonly value: number } | { readonly ok: false; readonly takes: string };

function readNumber(entry: NumberEntry, text: string, unit: Unit): Read {
  if (!NO_LENGTH.includes(entry)) return parseLength(text, unit);
  return /^(\d+\.?\d*|\.\d+)°?$/.test(text)
    ? { ok: true, value: Number(text.replace('°', '')) }
    : { ok: false, takes: entry === 'number' ? 'a whole number from 0 to 9999' : 'an angle in degrees' };
}

/** The numbers that can be read, and by the path of its field what is wrong with the others. */
function readNumbers({ kind, unit, numbers }: EntryTexts) {
  const values: Partial<Record<NumberEntry, number>> = {};
  const wrong: Record<string, string> = {};
  for (const entry of entriesOf(kind)) {
    const text = numbers[entry]?.trim() ?? '';
    if (text === '') continue;
    const read = readNumber(entry, text, unit);
    if (read.ok) values[entry] = read.value;
    else wrong[`cutter.${entry}`] = `Got “${text}”; takes ${read.takes}.`;
  }
  return { values, wrong };
}

/** What was typed as a drawer's entry, or what is wrong with each field. */
export function readTexts(texts: EntryTexts): CheckedForm<DrawerEntry> {
  const { values, wrong } = readNumbers(texts);
  const { unit, kind, remarks } = texts;
  const name = texts.name.trim();
  const input = { unit, remarks, cutter: { kind, ...values, ...(name === '' ? {} : { name }) } };
  const checked = checkForm(drawerEntry, input);
  // The name's own message only comes with numbers that are right.
  const unnamed: Record<string, string> = name === '' ? { 'cutter.name': 'Got nothing; takes some text.' } : {};
  if (checked.ok && Object.keys(wrong).length === 0) return checked;
  return { ok: false, fields: { ...unnamed, ...(checked.ok ? {} : checked.fields), ...wrong } };
}

/** The cutter to draw while it is typed; null until its numbers make a shape. */
export function shapeOf(texts: EntryTexts): Cutter | null {
  const { values, wrong } = readNumbers(texts);
  const { maxPass: _pass, number: _place, ...shape } = values;
  const read = cutterContract.safeParse({ kind: texts.kind, ...shape });
  return read.success && Object.keys(wrong).length === 0 ? read.data : null;
}
