import type { Proof } from './proof.ts';
import type { SheetLine } from './sheet-model.ts';

/** Names such as "back: unit" and "front: unit" told together: "back, front: unit". */
function gatherNames(names: readonly string[]): string {
  const whereByWhat = new Map<string, string[]>();
  for (const name of names) {
    const at = name.indexOf(': ');
    const what = at < 0 ? name : name.slice(at + 2);
    whereByWhat.set(what, [...(whereByWhat.get(what) ?? []), ...(at < 0 ? [] : [name.slice(0, at)])]);
  }
  const whatsByWhere = new Map<string, string[]>();
  for (const [what, where] of whereByWhat) {
    const key = where.join(' and ');
    whatsByWhere.set(key, [...(whatsByWhere.get(key) ?? []), what]);
  }
  return [...whatsByWhere]
    .map(([where, whats]) => (where === '' ? whats.join(', ') : `${where}: ${whats.join(', ')}`))
    .join('; ');
}

/** What reading the files back found: passed with what was looked at, or each check that does not hold. */
export function proofLines(proof: Proof | null): SheetLine[] {
  if (proof === null) return [{ word: 'Not proved.', text: 'No files have been written for this sheet.' }];
  const { checks } = proof;
  if (proof.ok)
    return [
      {
        word: 'Passed.',
        text: `${checks.length} of ${checks.length} checks hold. ${gatherNames(checks.map((c) => c.name))}.`,
      },
    ];
  const failed = checks.filter((c) => !c.ok);
  return [
    { word: 'Failed.', colour: 'stop', text: `${failed.length} of ${checks.length} checks do not hold. Do not cut.` },
    ...failed.map((c): SheetLine => ({ word: c.name, colour: 'stop', text: `wanted ${c.wanted}, got ${c.got}` })),
  ];
}
