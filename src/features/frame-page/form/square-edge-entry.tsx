import { memo, useState } from 'react';
import { Checkbox } from '../../../ui/checkbox.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import { keepsSquareEdge, setSquareEdge, type OpeningPlace } from './square-edge.ts';

/** Where the frame's edges are beaded: whether this opening keeps a square one. Nothing in a frame with square edges. */
export const SquareEdgeEntry = memo(function SquareEdgeEntry({ place }: { readonly place: OpeningPlace }) {
  const { editor, readOnly } = useDesk();
  const isBeaded = useEditor((s) => s.history.present.edge.style === 'beaded');
  const checked = useEditor((s) => keepsSquareEdge(s.history.present, place));
  const [problem, setProblem] = useState('');
  if (!isBeaded) return null;
  function change(square: boolean) {
    const { present } = editor.store.get().history;
    setProblem(editor.apply(setSquareEdge(present, place, square), square ? 'Keep an edge square' : 'Bead on an edge'));
  }
  return (
    <div
      data-entry={typeof place === 'string' ? `${place}.opening.edge` : `outline.squareOpenings.${place}`}
      className="text-12"
    >
      <Checkbox label="Keep this edge square" checked={checked} onChecked={change} disabled={readOnly} />
      {problem !== '' && <p className="text-stop">Takes {problem}.</p>}
    </div>
  );
});
