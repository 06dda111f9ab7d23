import { useMemo, useState } from 'react';
import type { Point } from '#shared/kernel/contour/contour.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import type { Plane } from '../sweeping/picture.ts';
import type { FrameFiles } from '../sweeping/workshop-client.ts';
import { listPlaces, regionAbout, WHOLE, type Place } from './places.ts';
import { listSteps } from './steps.ts';
import { firstHold, type Hold } from './turning.ts';

export type Shown = 'front' | 'back' | 'both';

/** Key of the place that a person picked in the picture. */
export const PICKED = 'picked';

/** What of a frame is looked at, and how; the choices of the person who looks. */
export function usePartView(files: FrameFiles) {
  const { worked, profile } = files;
  const { unit, setup } = worked.particulars;
  const steps = useMemo(() => listSteps(worked, profile), [worked, profile]);
  const listed = useMemo(() => listPlaces(worked), [worked]);
  const [picked, setPicked] = useState<Place | null>(null);
  const [placeKey, setPlaceKey] = useState(WHOLE.key);
  /** null: all of them, however many there will be. */
  const [doneSteps, setDoneSteps] = useState<number | null>(null);
  const [shown, setShown] = useState<Shown>('front');
  const [loose, setLoose] = useState(false);
  const [plane, setPlane] = useState<Plane | null>(null);
  const [hold, setHold] = useState<Hold>(() => firstHold('front', setup.flip));

  const places = picked ? [...listed, picked] : listed;
  // A frame that has changed may have lost the opening looked at.
  const place = places.find((p) => p.key === placeKey) ?? WHOLE;
  const reset = (face: Shown = shown) => setHold(firstHold(face, setup.flip));
  const show = (face: Shown) => {
    setShown(face);
    reset(face);
  };
  const goTo = (key: string) => {
    setPlaceKey(key);
    setPlane(null);
    setHold((before) => ({ ...before, zoom: 1, pan: { x: 0, y: 0 } }));
  };
  return {
    steps,
    done: Math.min(doneSteps ?? steps.length, steps.length),
    setDone: (done: number) => setDoneSteps(done >= steps.length ? null : done),
    shown,
    show,
    places,
    place,
    goTo,
    /** Looks at the surroundings of a point as closely as can be. */
    pick: (at: Point) => {
      setPicked({
        key: PICKED,
        words: `About ${formatLength(at.x, unit)}, ${formatLength(at.y, unit)}`,
        region: regionAbout(at, unit),
      });
      goTo(PICKED);
    },
    loose,
    setLoose,
    plane,
    setPlane,
    hold,
    setHold,
    reset: () => reset(),
  };
}

export type PartView = ReturnType<typeof usePartView>;
