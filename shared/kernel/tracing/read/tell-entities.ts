import type { Drawn } from './entity-plane.ts';
import { tellRefused, type Reason } from './entity-reasons.ts';
import type { Fault } from './entity-tags.ts';
import type { ProblemList } from './problem-list.ts';

const some = (n: number, one: string, many: string): string => (n === 1 ? `1 ${one}` : `${n} ${many}`);

export const tellCutShort = (n: number): string =>
  `${some(n, 'polyline has', 'polylines have')} no end (SEQEND); what comes behind its vertices ends it.`;

const tellLifted = (n: number): string =>
  `${some(n, 'entity lies', 'entities lie')} at a height that is not 0; it was laid flat.`;

const tellWide = (n: number): string =>
  `${some(n, 'polyline is', 'polylines are')} drawn with a width; the middle was taken.`;

/** What should be said of an entity that was kept. */
export function tellKept(problems: ProblemList, answer: Drawn, line: number): void {
  if (answer.lifted) problems.tally('flattened', tellLifted, line);
  if (answer.wide) problems.tally('width-left-out', tellWide, line);
}

/** That a curve was drawn as arcs and lines along it, and how far from it they may be. */
export function tellFitted(problems: ProblemList, type: string, within: string, line: number): void {
  const tell = (n: number): string =>
    type === 'SPLINE'
      ? `${some(n, 'spline', 'splines')} became arcs and lines, at most ${within} off.`
      : `${some(n, 'ellipse, or arc in a block of uneven scale,', 'ellipses, or arcs in blocks of uneven scale,')} became arcs and lines, at most ${within} off.`;
  problems.tally(type === 'SPLINE' ? 'spline-fitted' : 'ellipse-fitted', tell, line);
}

/**
 * What should be said of one that was refused: where a number or a block is to blame, each with what it is; otherwise how
 * many there are of a kind.
 */
export function tellRefusal(problems: ProblemList, reason: Reason, fault: Fault | null, line: number): void {
  const tell = tellRefused(reason);
  if (fault !== null && fault.reason === reason) problems.add(reason, FAULTS[fault.reason](fault, line), fault.line);
  else if (tell !== null) problems.tally(reason, tell, line);
}

/** The same for an INSERT whose block is to blame. */
export function tellBlock(problems: ProblemList, reason: Reason, name: string, line: number): void {
  problems.add(reason, `Block ${name}: ${tellRefused(reason)?.(1) ?? ''}`, line);
}

const FAULTS: Readonly<Record<Fault['reason'], (fault: Fault, line: number) => string>> = {
  'not-a-number': ({ text }, line) => `“${text}” is no number; the entity of line ${line} is left out.`,
  'missing-number': (_, line) => `The entity of line ${line} lacks a number; it is left out.`,
  'not-a-pair': (_, line) => `This line should be a group code; the entity of line ${line} is left out.`,
};
