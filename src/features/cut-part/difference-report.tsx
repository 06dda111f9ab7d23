import type { Point } from '#shared/kernel/contour/contour.ts';
import type { Measured } from '#shared/kernel/height-field/measure-frame.ts';
import { formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { Button } from '../../ui/button.tsx';
import { classNames } from '../../ui/class-names.ts';
import { Notice } from '../../ui/notice.tsx';
import { ProgressText } from '../../ui/progress-text.tsx';
import { differenceWords, noDifferenceWords, sortDifferences } from './model/difference-words.ts';
import type { useAnswer } from './sweeping/use-answer.ts';
import type { MeasureWish } from './sweeping/picture.ts';

interface DifferenceReportProps {
  readonly worked: DrawnFrame;
  readonly asked: ReturnType<typeof useAnswer<MeasureWish>>;
  readonly onShow: (place: Point, face: 'front' | 'back') => void;
}

function Found({
  worked,
  measured,
  onShow,
}: {
  readonly worked: DrawnFrame;
  readonly measured: Measured;
  readonly onShow: DifferenceReportProps['onShow'];
}) {
  const { unit } = worked.particulars;
  return (
    <>
      <dl className="text-12">
        {(['front', 'back'] as const).map((face) => {
          const found = sortDifferences(measured[face], unit);
          return (
            <div key={face} className="mb-1.5">
              <dt className={classNames('font-bold', face === 'front' ? 'text-front' : 'text-back')}>
                {face === 'front' ? 'Front' : 'Back'}
              </dt>
              {found.length === 0 && <dd>{noDifferenceWords(unit)}</dd>}
              {found.map((difference) => (
                <dd key={difference.kind}>
                  {differenceWords(worked, difference)}{' '}
                  <Button kind="quiet" onClick={() => onShow(difference, face)}>
                    Look at it
                  </Button>
                </dd>
              ))}
            </div>
          );
        })}
      </dl>
      <p className="text-11 text-pencil">
        How far the surface that the files cut lies from the one entered: straight down or sideways, whichever is less.
        Offcuts taken away. Looked for every {formatWithUnit(measured.cell, unit)}, and every{' '}
        {formatWithUnit(measured.fineCell, unit)} about the places found.
      </p>
    </>
  );
}

/** The largest difference between the intended face and the cut one, on both faces, in words. */
export function DifferenceReport({ worked, asked, onShow }: DifferenceReportProps) {
  const { at, done, answer, reason, stop, again } = asked;
  if (at === 'working') {
    const cancel = (
      <Button kind="quiet" onClick={stop}>
        Cancel
      </Button>
    );
    return (
      <ProgressText done={done} cancel={cancel}>
        Comparing with what is entered
      </ProgressText>
    );
  }
  if (at === 'stopped')
    return (
      <p>
        Not compared.{' '}
        <Button kind="quiet" onClick={again}>
          Compare
        </Button>
      </p>
    );
  if (at === 'failed')
    return (
      <Notice level="stop" word="Not compared">
        {reason}
      </Notice>
    );
  return answer && <Found worked={worked} measured={answer} onShow={onShow} />;
}
