import { useDesk } from '../model/desk.ts';
import { useStore } from '../model/store.ts';
import { selectedNow } from './edit-selected.ts';
import { selectedName, selectedSize } from './selected-words.ts';

/** Says to people who do not see the drawing what is selected, each time something else is. */
export function SelectionStatus() {
  const desk = useDesk();
  useStore(desk.selection, (value) => value);
  const selected = selectedNow(desk);
  const { unit } = desk.editor.store.get().history.present;
  return (
    <p role="status" className="sr-only">
      {selected && `${selectedName(selected)}, ${selectedSize(selected, unit)}, selected`}
    </p>
  );
}
