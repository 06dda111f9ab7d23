import { useDeferredValue, useMemo } from 'react';
import { edgeOfOpening } from '#shared/kernel/line-sets/held-depth.ts';
import type { Edge, Particulars } from '#shared/kernel/particulars/particulars.ts';
import { sectionPicture } from '#shared/kernel/section/section-picture.ts';
import { pictureSvg } from '#shared/kernel/sheet/picture-svg.ts';
import { safeFileName, saveFile } from '../../../lib/save-file.ts';
import { Button } from '../../../ui/button.tsx';
import { Section } from '../../../ui/section.tsx';
import { useEditor } from '../model/desk.ts';
import { WordedPicture } from './worded-picture.tsx';

interface EdgeSectionPictureProps {
  readonly heading: string;
  readonly particulars: Particulars;
  readonly edge: Edge;
}

function EdgePicture({ heading, particulars, edge }: EdgeSectionPictureProps) {
  const picture = useMemo(() => sectionPicture(particulars, edge), [particulars, edge]);
  const save = () =>
    saveFile(safeFileName(`${particulars.name} section`, '.svg'), pictureSvg(picture), 'image/svg+xml');
  return (
    <Section
      heading={heading}
      aside={
        <Button kind="quiet" onClick={save}>
          Save as SVG
        </Button>
      }
    >
      <WordedPicture picture={picture} className="max-w-5xl" />
    </Section>
  );
}

/** The true section across the edges of this frame's openings, to scale. */
export function SectionView() {
  const { particulars, contours } = useDeferredValue(useEditor((s) => s.drawn));
  const { edge } = particulars;
  const isBeaded = edge.style === 'beaded';
  const hasOwn = contours.openings.some((o) => !isBeaded || !o.square);
  const hasSquare = isBeaded && contours.openings.some((o) => o.square);
  const square = useMemo(() => edgeOfOpening(edge, { square: true }), [edge]);
  return (
    <>
      {hasOwn && (
        <EdgePicture
          heading={isBeaded ? 'Section across the beaded edge' : 'Section across the square edge'}
          particulars={particulars}
          edge={edge}
        />
      )}
      {hasSquare && (
        <EdgePicture heading="Section across the edge that stays square" particulars={particulars} edge={square} />
      )}
      {contours.openings.length === 0 && <p>There is no opening to cut across.</p>}
      {isBeaded && (
        <p className="text-12 text-pencil">
          Thick: what is left. Thin: each cutter at its axis. Red dots over it: the bead as entered.
        </p>
      )}
    </>
  );
}
