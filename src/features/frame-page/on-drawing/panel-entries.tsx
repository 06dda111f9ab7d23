import { memo, type ReactNode } from 'react';
import type { Member, Opening } from '#shared/kernel/frame/members.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import { Entry } from '../form/entry.tsx';
import { SquareEdgeEntry } from '../form/square-edge-entry.tsx';
import { tracedPlace } from '../form/square-edge.ts';
import { useFormFacts } from '../form/form-facts.ts';
import type { SizeFields } from './size-fields.ts';

const Editable = ({ as, children }: { readonly as: string; readonly children: ReactNode }) => (
  <div data-edit={as}>{children}</div>
);

interface OpeningEntriesProps extends SizeFields {
  /** Path of the opening's part. */
  readonly field: string;
  /** Sizes as solved: what holds while none is given. */
  readonly solvedWidth: string;
  readonly solvedHeight: string;
}

/** Label, sizes, arch and edge of an opening in the layout. */
export const OpeningEntries = memo(function OpeningEntries({
  field,
  width,
  height,
  solvedWidth,
  solvedHeight,
}: OpeningEntriesProps) {
  // The size that is its own, and not that of a column or row it lies in, is what the S key means.
  const isColumn = width === `${field}.size`;
  return (
    <>
      <div className="grid grid-cols-2 gap-x-2.5 gap-y-1.5">
        <Editable as="label">
          <Entry key={field} path={`${field}.opening.label`} label="Label" kind="text" layout="cell" optional />
        </Editable>
        <Editable as="arch">
          <Entry key={field} path={`${field}.opening.arch`} label="Arch" layout="cell" optional placeholder="none" />
        </Editable>
        {width !== '' && (
          <Editable as={isColumn || height === '' ? 'size' : 'width'}>
            <Entry key={width} path={width} label="Width" layout="cell" optional placeholder={solvedWidth} />
          </Editable>
        )}
        {height !== '' && (
          <Editable as={isColumn ? 'height' : 'size'}>
            <Entry key={height} path={height} label="Height" layout="cell" optional placeholder={solvedHeight} />
          </Editable>
        )}
      </div>
      {(width === '' || height === '') && (
        <p className="text-11 text-pencil">
          {width === '' && height === ''
            ? 'Its size follows'
            : width === ''
              ? 'Its width follows'
              : 'Its height follows'}{' '}
          from the frame and its members.
        </p>
      )}
      <SquareEdgeEntry key={field} place={field} />
    </>
  );
});

/** A traced opening: its numbers to read, and its edge. */
export function TracedEntries({ opening }: { readonly opening: Opening }) {
  const { unit } = useFormFacts();
  const { minX, minY } = opening.extents;
  return (
    <>
      <p className="text-12">
        {formatLength(minX, unit)} from the left, {formatLength(minY, unit)} from below. Its outline is traced.
      </p>
      <SquareEdgeEntry key={opening.id} place={tracedPlace(opening)} />
    </>
  );
}

/** Width of a member. `alike` mid-stiles or mid-rails of one divided part have one width. */
export const MemberEntries = memo(function MemberEntries({
  kind,
  field,
  alike,
}: {
  readonly kind: Member['kind'];
  readonly field: string;
  readonly alike: number;
}) {
  return (
    <Editable as="size">
      <Entry
        key={field}
        path={field}
        label={alike > 1 ? `Width of all ${alike} ${kind}s here` : 'Width'}
        layout="cell"
      />
    </Editable>
  );
});
