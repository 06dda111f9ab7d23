import type { Finding, FindingLevel } from '../checks/finding.ts';
import type { SheetLine } from './sheet-model.ts';

const WORDS: Record<FindingLevel, string> = { stop: 'Stop', caution: 'Caution', note: 'Note' };

const toLine = ({ level, text, remedy }: Finding): SheetLine => ({
  word: WORDS[level],
  colour: level === 'note' ? 'ink' : level,
  text: remedy === '' ? text : `${text} ${remedy}`,
});

const isOffcut = (f: Finding) => f.code === 'offcut-free';

/** What the checks say, but for offcuts, which have a place of their own. */
export const findingLines = (findings: readonly Finding[]): SheetLine[] =>
  findings.filter((f) => !isOffcut(f)).map(toLine);

/** What comes free when it is cut through, with its size. */
export const offcutLines = (findings: readonly Finding[]): SheetLine[] =>
  findings.filter(isOffcut).map(({ text }) => ({ text }));
