import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

export type NoticeLevel = 'stop' | 'caution' | 'note';

const WORDS: Record<NoticeLevel, string> = { stop: 'Stop', caution: 'Caution', note: 'Note' };
const COLOURS: Record<NoticeLevel, string> = { stop: 'border-stop', caution: 'border-caution', note: 'border-ink' };
const WORD_COLOURS: Record<NoticeLevel, string> = { stop: 'text-stop', caution: 'text-caution', note: 'text-ink' };

interface NoticeProps {
  readonly level: NoticeLevel;
  /** In place of the level's own word, such as "Not saved". */
  readonly word?: string;
  /** Read out as soon as it appears. */
  readonly live?: boolean;
  /** What one can do about it. */
  readonly action?: ReactNode;
  readonly children: ReactNode;
}

/** Something to know, always with its word: never by colour alone. */
export function Notice({ level, word = WORDS[level], live = false, action, children }: NoticeProps) {
  return (
    <div
      role={live ? (level === 'stop' ? 'alert' : 'status') : undefined}
      className={classNames('mb-3 flex flex-wrap items-baseline gap-x-4 gap-y-1 border-l-4 py-1 pl-3', COLOURS[level])}
    >
      <div className="min-w-0 flex-1 wrap-anywhere">
        <strong className={classNames('font-bold', WORD_COLOURS[level])}>{word}: </strong>
        {children}
      </div>
      {action}
    </div>
  );
}
