import { useId, useMemo } from 'react';
import { formatWithUnit } from '#shared/kernel/units/format-length.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { ProgressText } from '../../ui/progress-text.tsx';
import { describePart, stepSentence } from './model/describe-part.ts';
import { facePalette, type Tokens } from './model/palette.ts';
import type { PartView } from './model/use-part-view.ts';
import { PartStage } from './scene/part-stage.tsx';
import { ReliefStage } from './scene/relief-stage.tsx';
import type { Rgb } from './sweeping/picture.ts';
import { useAnswer, type Asked } from './sweeping/use-answer.ts';
import type { FrameFiles, WorkshopClient } from './sweeping/workshop-client.ts';

interface PartPictureProps {
  readonly client: WorkshopClient;
  readonly files: FrameFiles;
  readonly view: PartView;
  readonly colours: readonly Rgb[];
  readonly tokens: Tokens;
}

/** Over the picture: what goes on while one is made, and why there is none. */
function PictureNews({
  asked,
  stop,
  again,
}: {
  readonly asked: Asked<unknown>;
  readonly stop: () => void;
  readonly again: () => void;
}) {
  if (asked.at === 'ready') return null;
  return (
    <div className="absolute bottom-0 left-0 bg-paper px-3 py-1.5">
      {asked.at === 'working' && (
        <ProgressText
          done={asked.done}
          cancel={
            <Button kind="quiet" onClick={stop}>
              Cancel
            </Button>
          }
        >
          Cutting
        </ProgressText>
      )}
      {asked.at === 'stopped' && (
        <p role="status">
          Stopped.{' '}
          <Button kind="quiet" onClick={again}>
            Cut again
          </Button>
        </p>
      )}
      {(asked.at === 'refused' || asked.at === 'failed') && (
        <Notice
          level="stop"
          word={asked.at === 'refused' ? 'Cannot be cut' : 'Not shown'}
          live
          action={asked.at === 'failed' && <Button onClick={again}>Try again</Button>}
        >
          {asked.reason}
        </Notice>
      )}
    </div>
  );
}

/** Room for two lines, so that the picture keeps its size from step to step. */
const STATUS_LOOK = 'min-h-9 text-12';
const KEYS = 'Arrows turn, with Shift they move; + and − zoom, 0 holds as at first, Enter looks closer at the middle.';

/** The part in three dimensions. */
export function SolidPicture({
  client,
  files,
  view,
  colours,
  tokens,
  onLost,
}: PartPictureProps & { readonly onLost: () => void }) {
  const id = useId();
  const { steps, done, place, shown, plane, loose, hold } = view;
  const { unit, setup } = files.worked.particulars;
  const picture = useAnswer(client, files, { kind: 'look', steps: done, region: place.region });
  const slice = useAnswer(client, files, plane && { kind: 'slice', steps: done, region: place.region, plane });
  const palettes = useMemo(
    () => ({
      palettes: {
        front: facePalette('front', steps, colours, tokens),
        back: facePalette('back', steps, colours, tokens),
      },
      inside: tokens['board'],
      ink: tokens.ink,
    }),
    [steps, colours, tokens],
  );
  const facts = picture.answer?.facts ?? null;
  return (
    <>
      <div className="relative min-h-80 flex-1 border border-rule">
        <PartStage
          picture={picture.answer}
          colours={palettes}
          showing={{ shown, loose, flip: setup.flip }}
          plane={plane}
          slice={slice.answer}
          hold={hold}
          onHold={view.setHold}
          onReset={view.reset}
          onPick={view.pick}
          onLost={onLost}
          label="Cut part"
          describedBy={`${id}-says ${id}-keys`}
        />
        <PictureNews asked={picture} stop={picture.stop} again={picture.again} />
      </div>
      <p id={`${id}-says`} className="sr-only">
        {describePart({ steps, done, place, shown, plane, facts, unit })}
      </p>
      <p id={`${id}-keys`} className="text-11 text-pencil">
        Drag to turn, with Shift or the right button to move, wheel or two fingers to zoom, double-click to look closer.{' '}
        {KEYS}
      </p>
      <p role="status" className={STATUS_LOOK}>
        {stepSentence({ steps, done, facts, unit })}
        {picture.answer && ` Worked out every ${formatWithUnit(picture.answer.cell, unit)}.`}
      </p>
    </>
  );
}

/** One face, shaded, for browsers without WebGL. */
export function FlatPicture({ client, files, view, colours, tokens }: PartPictureProps) {
  const id = useId();
  const { steps, done, place, shown } = view;
  const { unit } = files.worked.particulars;
  const face = shown === 'back' ? 'back' : 'front';
  const relief = useAnswer(client, files, {
    kind: 'relief',
    steps: done,
    region: place.region,
    face,
    palette: facePalette(face, steps, colours, tokens),
  });
  const facts = relief.answer?.facts ?? null;
  return (
    <>
      <Notice level="note" word="Flat picture">
        This browser shows no three-dimensional drawings (WebGL is missing or switched off), so one face at a time is
        shown shaded. Everything else works the same.
      </Notice>
      <div className="relative min-h-80 flex-1 border border-rule">
        <ReliefStage relief={relief.answer} label={`Cut part, ${face}`} describedBy={`${id}-says`} />
        <PictureNews asked={relief} stop={relief.stop} again={relief.again} />
      </div>
      <p id={`${id}-says`} className="sr-only">
        {describePart({ steps, done, place, shown: face, plane: null, facts, unit })}
      </p>
      <p role="status" className={STATUS_LOOK}>
        {stepSentence({ steps, done, facts, unit })}
      </p>
    </>
  );
}
