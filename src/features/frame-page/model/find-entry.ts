import type { FeatureId } from '#shared/kernel/frame/members.ts';
import { childrenOf, partField } from '#shared/kernel/particulars/layout-parts.ts';
import type { LayoutPart, Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';

/**
 * The path of an entry that a finding names. Findings count steps down the layout by number alone
 * ('outline.layout.0.1.size'); entries say columns or rows ('outline.layout.columns.0.rows.1.size').
 */
export function entryOf(particulars: Particulars, field: string): string {
  const found = /^outline\.layout\.((?:\d+\.)*)(.*)$/.exec(field);
  if (!found || particulars.outline.kind !== 'members') return field;
  const steps = found[1]!.split('.').filter(Boolean).map(Number);
  const { layout } = particulars.outline;
  let part: LayoutPart | undefined = layout;
  for (const step of steps) part = part && childrenOf(part)[step];
  return part === undefined ? 'outline.layout' : [partField(layout, steps), found[2]!].filter(Boolean).join('.');
}

const MEMBER_ENTRIES: Readonly<Record<FeatureId, string>> = {
  perimeter: 'outline.width',
  blank: 'setup.allowance',
  'stile-left': 'outline.stiles.left',
  'stile-right': 'outline.stiles.right',
  'rail-top': 'outline.rails.top',
  'rail-bottom': 'outline.rails.bottom',
};

/** The entry that a feature of the drawing comes from; '' when it has none, as with a traced outline. */
export function entryOfFeature(worked: DrawnFrame, id: FeatureId): string {
  const { outline } = worked.particulars;
  const dado = worked.dados.find((d) => d.id === id);
  if (dado) return `dados.${dado.index}.at`;
  if (outline.kind !== 'members') return '';
  const opening = worked.contours.openings.find((o) => o.id === id);
  if (opening?.path) return `${partField(outline.layout, opening.path)}.opening.label`;
  const member = worked.contours.members.find((m) => m.id === id);
  if (member?.path) return `${partField(outline.layout, member.path)}.between`;
  return MEMBER_ENTRIES[id] ?? '';
}

/** Puts the keyboard into an entry of the form, or the nearest one that holds it. Answers false when there is none. */
export function goToEntry(path: string): boolean {
  for (let at = path; at !== ''; at = at.split('.').slice(0, -1).join('.')) {
    const exact = document.querySelector<HTMLElement>(`[data-entry="${CSS.escape(at)}"]`);
    const marked = exact ?? document.querySelector<HTMLElement>(`[data-entry^="${CSS.escape(at)}."]`);
    // A switch is marked as a whole.
    const entry = marked?.matches('fieldset, div')
      ? marked.querySelector<HTMLElement>('input:checked, select, input, button')
      : marked;
    if (!entry) continue;
    entry.focus({ preventScroll: true });
    entry.scrollIntoView({ block: 'center' });
    if (entry instanceof HTMLInputElement) entry.select();
    return true;
  }
  return false;
}
