import { useMemo } from 'react';
import type { PaperPicture } from '#shared/kernel/sheet/paper-picture.ts';
import { pictureSvg } from '#shared/kernel/sheet/picture-svg.ts';
import { SvgPicture } from '../../../ui/svg-picture.tsx';

interface WordedPictureProps {
  readonly picture: PaperPicture;
  /** Its greatest width. */
  readonly className: string;
}

/** A picture to scale. Its words shrink with it: where they are too small to be read they stand below it as well. */
export function WordedPicture({ picture, className }: WordedPictureProps) {
  const svg = useMemo(() => pictureSvg(picture), [picture]);
  return (
    <div className="@container">
      <SvgPicture svg={svg} className={`mx-auto ${className}`} />
      <p aria-hidden="true" className="mt-2 text-12 @2xl:hidden">
        {picture.description}
      </p>
    </div>
  );
}
