import { memo, useCallback, useState } from 'react';
import { childrenOf } from '#shared/kernel/particulars/layout-parts.ts';
import type { LayoutPart } from '#shared/kernel/particulars/particulars.ts';
import { readField } from '#shared/kernel/particulars/read-field.ts';
import { formatLength } from '#shared/kernel/units/format-length.ts';
import { Button } from '../../../ui/button.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import type { EditorState } from '../model/frame-editor.ts';
import { useSettled } from '../model/use-settled.ts';
import { Entry } from './entry.tsx';
import { betweensOf, layoutPathOf, openingsUnder, solvedSize } from './layout-words.ts';
import { LightsUp } from './lights-up.tsx';
import { SquareEdgeEntry } from './square-edge-entry.tsx';
import { useLayoutEdits } from './use-layout-edits.ts';

interface PartProps {
  /** Path of the part within the particulars: 'outline.layout.columns.0'. */
  readonly field: string;
}

/** What kind of part stands at a path: a change within it draws nothing here. */
const useKind = (field: string): 'opening' | 'columns' | 'rows' | 'none' =>
  useEditor((s) => {
    const part = readField(s.history.present, field) as LayoutPart | undefined;
    return part === undefined ? 'none' : 'opening' in part ? 'opening' : 'columns' in part ? 'columns' : 'rows';
  });

/** Fixed size of a part among its neighbours; empty, it shares what is left, which the placeholder shows. */
function SizeEntry({ field }: PartProps) {
  const along = /columns\.\d+$/.test(field) ? 'width' : 'height';
  const words = useCallback(
    (s: EditorState) => {
      const size = solvedSize(s.lines, layoutPathOf(field), along);
      return size === null ? '' : formatLength(size, s.lines.particulars.unit);
    },
    [field, along],
  );
  return (
    <Entry
      path={`${field}.size`}
      label={along === 'width' ? 'Width' : 'Height'}
      layout="cell"
      optional
      placeholder={useSettled(words)}
    />
  );
}

function PartButtons({ field, kind }: PartProps & { readonly kind: 'opening' | 'columns' | 'rows' }) {
  const edits = useLayoutEdits();
  const [problem, setProblem] = useState('');
  const path = layoutPathOf(field);
  const button = (words: string, act: () => string) => (
    <Button kind="quiet" onClick={() => setProblem(act())}>
      {words}
    </Button>
  );
  return (
    <div className="flex flex-wrap gap-x-3 text-12">
      {kind === 'columns' && button('Add column', () => edits.add(path))}
      {kind === 'rows' && button('Add row', () => edits.add(path))}
      {kind !== 'columns' &&
        button(kind === 'opening' ? 'Into columns' : 'Column beside', () => edits.split(path, 'columns'))}
      {kind !== 'rows' && button(kind === 'opening' ? 'Into rows' : 'Row below', () => edits.split(path, 'rows'))}
      {path.length > 0 && button('Remove', () => edits.remove(path))}
      {problem !== '' && <p className="w-full text-stop">Takes {problem}.</p>}
    </div>
  );
}

const OpeningRow = memo(function OpeningRow({ field }: PartProps) {
  const { readOnly } = useDesk();
  const path = layoutPathOf(field);
  return (
    <LightsUp of={(worked) => openingsUnder(worked, path)} className="border-b border-rule py-1">
      <div className="grid grid-cols-3 gap-1.5">
        <Entry path={`${field}.opening.label`} label="Opening" kind="text" layout="cell" optional />
        {path.length > 0 ? <SizeEntry field={field} /> : <span />}
        <Entry path={`${field}.opening.arch`} label="Arch" layout="cell" optional placeholder="none" />
      </div>
      <SquareEdgeEntry place={field} />
      {!readOnly && <PartButtons field={field} kind="opening" />}
    </LightsUp>
  );
});

const DividedRow = memo(function DividedRow({ field, kind }: PartProps & { readonly kind: 'columns' | 'rows' }) {
  const { readOnly } = useDesk();
  const path = layoutPathOf(field);
  const count = useEditor((s) => childrenOf(readField(s.history.present, field) as LayoutPart).length);
  const words = `${count} ${kind === 'columns' ? (count === 1 ? 'column' : 'columns') : count === 1 ? 'row' : 'rows'}`;
  return (
    <div role="group" aria-label={words}>
      <LightsUp of={(worked) => betweensOf(worked, path)} className="border-b border-rule py-1">
        <div className="grid grid-cols-3 gap-1.5">
          <span className="self-end pb-1 font-medium">{words}</span>
          {path.length > 0 ? <SizeEntry field={field} /> : <span />}
          <Entry path={`${field}.between`} label={kind === 'columns' ? 'Mid-stile' : 'Mid-rail'} layout="cell" />
        </div>
        {!readOnly && <PartButtons field={field} kind={kind} />}
      </LightsUp>
      <div className="border-l border-rule pl-2">
        {Array.from({ length: count }, (_, i) => (
          <PartRow key={i} field={`${field}.${kind}.${i}`} />
        ))}
      </div>
    </div>
  );
});

/** One part of the layout tree and what is in it, as rows to type in. */
export const PartRow = memo(function PartRow({ field }: PartProps) {
  const kind = useKind(field);
  if (kind === 'none') return null;
  return kind === 'opening' ? <OpeningRow field={field} /> : <DividedRow field={field} kind={kind} />;
});
