import { useEffect, useEffectEvent, useState } from 'react';
import { Button } from '../../ui/button.tsx';
import { classNames } from '../../ui/class-names.ts';
import { hexOf } from './model/palette.ts';
import type { Step } from './model/steps.ts';
import type { Rgb } from './sweeping/picture.ts';

/** How long each step stays while they play. */
const PLAY_MS = 1600;

interface StepListProps {
  readonly steps: readonly Step[];
  readonly colours: readonly Rgb[];
  /** How many are cut. */
  readonly done: number;
  readonly onDone: (done: number) => void;
}

const FACE_WORDS = { back: 'Back, cut first', front: 'Front, cut second' } as const;

/** The line sets in cutting order, to be walked one by one. */
export function StepList({ steps, colours, done, onDone }: StepListProps) {
  const [isPlaying, setIsPlaying] = useState(false);
  const plays = isPlaying && done < steps.length;
  const next = useEffectEvent(() => {
    onDone(done + 1);
    if (done + 1 >= steps.length) setIsPlaying(false);
  });
  useEffect(() => {
    if (!plays) return;
    const timer = setTimeout(() => next(), PLAY_MS);
    return () => clearTimeout(timer);
  }, [plays, done]);

  function play(): void {
    if (done >= steps.length) onDone(0);
    setIsPlaying(!plays);
  }
  function walk(to: number): void {
    setIsPlaying(false);
    onDone(to);
  }
  return (
    <div>
      <div role="group" aria-label="Steps" className="mb-2 flex flex-wrap gap-2">
        <Button disabled={done === 0} onClick={() => walk(done - 1)}>
          Step back
        </Button>
        <Button onClick={play}>{plays ? 'Stop' : 'Play'}</Button>
        <Button disabled={done === steps.length} onClick={() => walk(done + 1)}>
          Next step
        </Button>
      </div>
      <ol className="text-12">
        <StepRow words="Board as loaded" detail="" isCut isLast={done === 0} swatch={null} onWalk={() => walk(0)} />
        {steps.map((step, i) => (
          <StepRow
            key={step.key}
            heading={steps[i - 1]?.face === step.face ? '' : FACE_WORDS[step.face]}
            words={`${i + 1} ${step.words}`}
            detail={step.detail}
            isCut={i < done}
            isLast={i === done - 1}
            swatch={hexOf(colours[i]!)}
            onWalk={() => walk(i + 1)}
          />
        ))}
      </ol>
    </div>
  );
}

interface StepRowProps {
  readonly heading?: string;
  readonly words: string;
  readonly detail: string;
  readonly isCut: boolean;
  readonly isLast: boolean;
  /** Colour of its surfaces; null for the board. */
  readonly swatch: string | null;
  readonly onWalk: () => void;
}

function StepRow({ heading = '', words, detail, isCut, isLast, swatch, onWalk }: StepRowProps) {
  const isBack = heading.startsWith('Back');
  return (
    <li>
      {heading !== '' && (
        <p className={classNames('mt-1.5 font-bold', isBack ? 'text-back' : 'text-front')}>{heading}</p>
      )}
      <button
        type="button"
        aria-current={isLast ? 'step' : undefined}
        onClick={onWalk}
        className={classNames(
          'flex min-h-6 w-full items-baseline gap-2 border-l-4 py-0.5 pl-1.5 text-left hover:border-pencil',
          isLast ? 'border-ink font-bold' : 'border-paper',
          !isCut && 'text-pencil',
        )}
      >
        <svg aria-hidden="true" viewBox="0 0 10 10" className="size-2.5 shrink-0 translate-y-px">
          {swatch === null ? (
            <rect width="10" height="10" className="fill-board-light stroke-pencil" />
          ) : (
            <rect width="10" height="10" fill={swatch} opacity={isCut ? 1 : 0.35} />
          )}
        </svg>
        <span>
          {words}
          {!isCut && <span className="sr-only"> (not cut yet)</span>}
          {isLast && detail !== '' && <span className="block text-11 font-normal text-pencil">{detail}</span>}
        </span>
      </button>
    </li>
  );
}
