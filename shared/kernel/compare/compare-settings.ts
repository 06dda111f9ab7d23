import type { SettingChange } from './comparison.ts';
import type { Setting } from './list-settings.ts';
import { SAME_ANGLE } from './compare-tolerances.ts';

const keyOf = ({ subject, name }: Setting) => `${subject} ${name}`;

function isSame(a: Setting, b: Setting, within: number): boolean {
  if (typeof a.value !== 'number' || typeof b.value !== 'number') return a.value === b.value;
  return Math.abs(a.value - b.value) <= (a.measure === 'length' ? within : SAME_ANGLE);
}

/** Settings that differ, in the newer state's order; those that went come after. */
export function compareSettings(
  before: readonly Setting[],
  after: readonly Setting[],
  within: number,
): SettingChange[] {
  const was = new Map(before.map((setting) => [keyOf(setting), setting]));
  const is = new Map(after.map((setting) => [keyOf(setting), setting]));
  const changes: SettingChange[] = [];
  for (const b of after) {
    const a = was.get(keyOf(b));
    if (a !== undefined && isSame(a, b, within)) continue;
    changes.push({ subject: b.subject, name: b.name, measure: b.measure, was: a?.value ?? null, is: b.value });
  }
  for (const a of before)
    if (!is.has(keyOf(a)))
      changes.push({ subject: a.subject, name: a.name, measure: a.measure, was: a.value, is: null });
  return changes;
}
