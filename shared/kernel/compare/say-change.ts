import { formatDecimal, formatLength } from '../units/format-length.ts';
import type { Unit } from '../units/unit.ts';
import type { Comparison, FeatureChange, NumberChange, SettingChange } from './comparison.ts';

/** Digits of areas and angles behind the point. */
const OTHER_DIGITS = 3;

/** One line of the table of changes, in words as people read them; '' where a cell says nothing. */
export interface ChangeLine {
  readonly name: string;
  readonly was: string;
  readonly is: string;
  readonly by: string;
  /** The whole line as a sentence, where it is not "name was → is (by)". */
  readonly said?: string;
}

type Value = number | string | null;

function sayValue(value: Value, measure: NumberChange['measure'] | 'word', unit: Unit): string {
  if (value === null) return 'none';
  if (typeof value === 'string') return value === '' ? 'none' : value;
  switch (measure) {
    case 'length':
      return formatLength(value, unit);
    case 'area':
      return `${formatDecimal(value, OTHER_DIGITS)} ${unit}²`;
    case 'angle':
      return `${formatDecimal(value, OTHER_DIGITS)}°`;
    default:
      return String(value);
  }
}

function line(name: string, measure: NumberChange['measure'] | 'word', was: Value, is: Value, unit: Unit): ChangeLine {
  const by =
    typeof was === 'number' && typeof is === 'number' && measure !== 'count'
      ? `${is > was ? '+' : '−'}${sayValue(Math.abs(is - was), measure, unit)}`
      : '';
  return { name, was: sayValue(was, measure, unit), is: sayValue(is, measure, unit), by };
}

/** What is to be said of a changed part, a line each. */
export function featureLines(change: FeatureChange, unit: Unit): ChangeLine[] {
  if (change.before === null) return [{ name: 'came', was: 'not there', is: 'there', by: '', said: 'came' }];
  if (change.after === null) return [{ name: 'went', was: 'there', is: 'not there', by: '', said: 'went' }];
  const lines = [
    ...change.numbers.map(({ name, measure, was, is }) => line(name, measure, was, is, unit)),
    ...change.words.map(({ name, was, is }) => line(name, 'word', was, is, unit)),
  ];
  if (change.line !== null) {
    const { distance, at, verticesGone, verticesNew } = change.line;
    const place = `${formatLength(at.x, unit)}, ${formatLength(at.y, unit)}`;
    const gone = `${verticesGone.length} ${verticesGone.length === 1 ? 'vertex' : 'vertices'} gone`;
    const most = formatLength(distance, unit);
    lines.push({
      name: `line, most at ${place}`,
      was: gone,
      is: `${verticesNew.length} new`,
      by: `up to ${most}`,
      said: `line moved by up to ${most} at ${place} (${gone}, ${verticesNew.length} new)`,
    });
  }
  return lines;
}

export const settingLine = ({ name, measure, was, is }: SettingChange, unit: Unit): ChangeLine =>
  line(name, measure, was, is, unit);

/** "width 14 → 14 1/2 (+1/2)". */
export const sayLine = ({ name, was, is, by, said }: ChangeLine): string =>
  said ?? `${name} ${was} → ${is}${by === '' ? '' : ` (${by})`}`;

/** "Opening A: width 14 → 14 1/2 (+1/2), from left 2 → 1 3/4 (−1/4)". */
export const sayFeature = (change: FeatureChange, unit: Unit): string =>
  `${change.label}: ${featureLines(change, unit).map(sayLine).join(', ')}`;

/** True when neither a part nor a setting differs; another unit alone is no change. */
export const isUnchanged = ({ features, settings }: Comparison): boolean =>
  features.length === 0 && settings.length === 0;
