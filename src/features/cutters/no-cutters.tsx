import { startingCutters } from '#shared/kernel/cutter-drawer/starting-cutters.ts';
import { writeCuttersCsv } from '#shared/kernel/cutter-drawer/write-cutters-csv.ts';
import { UNIT_WORDS, type Unit } from '#shared/kernel/units/unit.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Empty } from '../../ui/empty.tsx';
import { Notice } from '../../ui/notice.tsx';
import { useImportCutters } from './api/import-cutters.ts';

interface NoCuttersProps {
  readonly unit: Unit;
  readonly mayEdit: boolean;
  readonly onNew: () => void;
}

/** In place of an empty drawer: offers common sizes to begin from. */
export function NoCutters({ unit, mayEdit, onNew }: NoCuttersProps) {
  const take = useImportCutters();
  const file = () => new File([writeCuttersCsv(startingCutters(unit))], 'common-sizes.csv', { type: 'text/csv' });
  if (!mayEdit) return <Empty title="The drawer is empty">Programmers and the owner put cutters into it.</Empty>;
  return (
    <>
      {take.isError && (
        <Notice level="stop" word="Nothing taken" live>
          {sayError(take.error)}
        </Notice>
      )}
      <Empty
        title="The drawer is empty"
        actions={
          <>
            <Button
              busy={take.isPending ? 'Putting them in' : ''}
              onClick={() => take.mutate({ file: file(), take: true })}
            >
              Begin with common sizes in {UNIT_WORDS[unit]}
            </Button>
            <Button onClick={onNew}>Put in a cutter</Button>
          </>
        }
      >
        Put in the cutters that the shop has. Frames then take their numbers from here.
      </Empty>
    </>
  );
}
