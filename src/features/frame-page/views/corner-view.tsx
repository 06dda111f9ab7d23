import { useDeferredValue, useMemo, useState } from 'react';
import { frameResidues } from '#shared/kernel/line-sets/find-corner-residue.ts';
import type { CornerMethod } from '#shared/kernel/particulars/particulars.ts';
import { cornerPicture } from '#shared/kernel/section/corner-picture.ts';
import { Button } from '../../../ui/button.tsx';
import { Section } from '../../../ui/section.tsx';
import { Select } from '../../../ui/select.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import { WordedPicture } from './worded-picture.tsx';

const METHODS: readonly { readonly method: CornerMethod; readonly heading: string }[] = [
  { method: 'lift', heading: 'The opening cutter climbs into the corner' },
  { method: 'vee', heading: 'A V-cutter after it' },
  { method: 'round', heading: 'Left round' },
];

const degrees = (angle: number) => String(Number(((angle * 180) / Math.PI).toFixed(2)));

/** What is left in the inside corners, at the face and three depths, by each method. */
export function CornerView() {
  const { editor, readOnly } = useDesk();
  const { particulars, contours } = useDeferredValue(useEditor((s) => s.drawn));
  const residues = useMemo(() => frameResidues(particulars, contours.openings), [particulars, contours]);
  const angles = useMemo(() => [...new Map(residues.map((r) => [degrees(r.angle), r.angle])).entries()], [residues]);
  const [wanted, setWanted] = useState('');
  const [name, angle] = angles.find(([key]) => key === wanted) ?? angles[0] ?? ['', 0];
  const chosen = particulars.edge.corners ?? 'lift';
  const pictures = useMemo(
    () => (name === '' ? [] : METHODS.map((m) => ({ ...m, picture: cornerPicture(particulars, m.method, angle) }))),
    [particulars, name, angle],
  );
  if (name === '') return <p>No opening has an inside corner.</p>;

  const take = (corners: CornerMethod) => {
    const { present } = editor.store.get().history;
    editor.apply({ ...present, edge: { ...present.edge, corners } }, 'Inside corners');
  };
  return (
    <>
      {angles.length > 1 && (
        <div className="mb-4 w-72">
          <Select
            label="Inside angle"
            layout="row"
            options={angles.map(([key]) => ({ value: key, label: `${key}°` }))}
            value={name}
            onValue={setWanted}
          />
        </div>
      )}
      {pictures.map(({ method, heading, picture }) => (
        <Section
          key={method}
          heading={heading}
          aside={
            method === chosen ? (
              'this frame'
            ) : method === 'vee' && !particulars.cutters.corner ? (
              'needs a V-cutter: choose it under the edge'
            ) : readOnly ? undefined : (
              <Button kind="quiet" onClick={() => take(method)}>
                Take this
              </Button>
            )
          }
        >
          <WordedPicture picture={picture} className="max-w-4xl" />
        </Section>
      ))}
    </>
  );
}
