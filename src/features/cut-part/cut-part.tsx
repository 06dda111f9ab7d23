import { useEffect, useMemo, useState } from 'react';
import { BUILTIN_PROFILES } from '#shared/kernel/profiles/builtin-profiles.ts';
import type { FileProfile } from '#shared/kernel/profiles/file-profile.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { Checkbox } from '../../ui/checkbox.tsx';
import { Choice } from '../../ui/choice.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';
import { Select } from '../../ui/select.tsx';
import { DifferenceReport } from './difference-report.tsx';
import { readTokens, stepColours } from './model/palette.ts';
import { usePartView, type Shown } from './model/use-part-view.ts';
import { useSettledFrame } from './model/use-settled-frame.ts';
import { FlatPicture, SolidPicture } from './part-picture.tsx';
import { PlaneControls } from './plane-controls.tsx';
import { hasWebgl } from './scene/has-webgl.ts';
import { StepList } from './step-list.tsx';
import { useAnswer } from './sweeping/use-answer.ts';
import { WorkshopClient } from './sweeping/workshop-client.ts';

interface CutPartProps {
  readonly worked: DrawnFrame;
  /** How many stops the frame has: lines may be missing then. */
  readonly stops: number;
  /** The files looked at are those of this profile; the product's own when it is left out. */
  readonly profile?: FileProfile;
}

/**
 * A look at the cut part: what the lines of the files leave of the board, in three dimensions, step by step, with the
 * largest difference from what is entered. It works in a worker of its own, and is large: a route loads it lazily,
 *
 *     const CutPart = lazy(async () => ({ default: (await import('../../features/cut-part/cut-part.tsx')).CutPart }));
 *     <Suspense fallback={…}><CutPart worked={worked} stops={stops} profile={profile} /></Suspense>
 *
 * in a box that says how high it is (a flex column or a height of its own): the picture takes what is left beside its
 * controls. `worked` may change with every key typed: work under way is given up and begun anew once it stays the same.
 * `profile` must be the same object as long as it is the same profile. Nothing else is needed: no provider, no styles of its own.
 */
export function CutPart({ worked, stops, profile = BUILTIN_PROFILES[0]!.profile }: CutPartProps) {
  const files = useSettledFrame(worked, profile);
  const [client] = useState(() => new WorkshopClient());
  useEffect(() => () => client.end(), [client]);
  const [tokens] = useState(readTokens);
  const [isSolid, setIsSolid] = useState(hasWebgl);
  const view = usePartView(files);
  const measured = useAnswer(client, files, { kind: 'measure' });
  const { steps, done, place } = view;
  const colours = useMemo(() => stepColours(steps, done < steps.length ? done - 1 : -1, tokens), [steps, done, tokens]);
  const faces: { value: Shown; label: string }[] = [
    { value: 'front', label: 'Front' },
    { value: 'back', label: 'Back' },
  ];
  if (isSolid) faces.push({ value: 'both', label: 'Both' });
  const shared = { client, files, view, colours, tokens };

  return (
    <div className="@container flex min-h-0 flex-1 flex-col">
      <div className="flex min-h-0 flex-1 flex-col gap-4 @2xl:flex-row">
        <div className="relative flex min-w-0 flex-1 flex-col gap-1.5 @max-2xl:shrink-0 @2xl:min-h-0">
          <div className="flex flex-wrap items-center gap-x-6 gap-y-1">
            <div className="w-56">
              <Choice label="Seen from" hideLabel options={faces} value={view.shown} onValue={view.show} />
            </div>
            <Select
              label="Look at"
              layout="row"
              options={view.places.map(({ key, words }) => ({ value: key, label: words }))}
              value={place.key}
              onValue={view.goTo}
            />
            {isSolid && <Checkbox label="Leave what has come free" checked={view.loose} onChecked={view.setLoose} />}
          </div>
          {stops > 0 && (
            <Notice level="caution">
              This frame has {plural(stops, 'stop')}: lines may be missing, here and in what is compared.
            </Notice>
          )}
          {isSolid ? <SolidPicture {...shared} onLost={() => setIsSolid(false)} /> : <FlatPicture {...shared} />}
        </div>
        <div className="relative w-full shrink-0 @2xl:w-72 @2xl:overflow-y-auto">
          <Section heading="Steps" aside={`${done} of ${steps.length}`} level={3}>
            <StepList steps={steps} colours={colours} done={done} onDone={view.setDone} />
          </Section>
          {isSolid && (
            <Section heading="Section plane" level={3}>
              <PlaneControls
                region={place.region ?? frameExtents(files.worked)}
                unit={files.worked.particulars.unit}
                plane={view.plane}
                onPlane={view.setPlane}
              />
            </Section>
          )}
          <Section heading="Intended against cut" level={3}>
            <DifferenceReport
              worked={files.worked}
              asked={measured}
              onShow={(at, face) => {
                view.show(face);
                view.pick(at);
              }}
            />
          </Section>
        </div>
      </div>
    </div>
  );
}

const frameExtents = ({ contours: { width, height } }: DrawnFrame) => ({
  minX: 0,
  minY: 0,
  maxX: width,
  maxY: height,
});
