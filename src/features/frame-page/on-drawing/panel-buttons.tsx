import { Button } from '../../../ui/button.tsx';
import { useDesk } from '../model/desk.ts';
import { removeSelected, splitSelected } from './edit-selected.ts';
import { focusSpread } from './focus-panel.ts';

/** What can be done with the selected opening, each with its key. */
export function PanelButtons({ removable }: { readonly removable: boolean }) {
  const desk = useDesk();
  function remove() {
    removeSelected(desk);
    // The button goes with the last opening that can be removed, and the keyboard must not go with it.
    focusSpread();
  }
  return (
    <div className="flex flex-wrap gap-x-2">
      <Button kind="quiet" onClick={() => splitSelected(desk, 'columns')}>
        Into columns C
      </Button>
      <Button kind="quiet" onClick={() => splitSelected(desk, 'rows')}>
        Into rows R
      </Button>
      {removable && (
        <Button kind="quiet" onClick={remove}>
          Remove Del
        </Button>
      )}
    </div>
  );
}
