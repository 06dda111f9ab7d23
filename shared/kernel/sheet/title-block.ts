import type { Particulars } from '../particulars/particulars.ts';
import type { SheetContext, SheetTitleBlock } from './sheet-model.ts';

/** Word for the revision of what is not released. */
export const DRAFT = 'draft';

/** Title block fields after ISO 7200 (from memory). Throws when `releasedAt` is not a date. */
export function describeTitleBlock({ name }: Pick<Particulars, 'name'>, context: SheetContext): SheetTitleBlock {
  return {
    legalOwner: context.shopName,
    identification: `${context.jobName} / ${name}`,
    title: name,
    documentType: 'Setup sheet',
    revision: context.revision === '' ? DRAFT : context.revision,
    dateOfIssue: dayOf(context.releasedAt),
    createdBy: context.author,
    approvedBy: '',
  };
}

/** The UTC day of an ISO date-time. Throws when it is none. */
export function dayOf(dateTime: string): string {
  const date = new Date(dateTime);
  if (Number.isNaN(date.getTime())) throw new RangeError(`date of issue: got "${dateTime}", takes an ISO date-time`);
  return date.toISOString().slice(0, 10);
}
