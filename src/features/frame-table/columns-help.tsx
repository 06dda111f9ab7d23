import { newBox } from '#shared/kernel/box/new-box.ts';
import { TABLE_COLUMNS } from '#shared/kernel/frame-table/table-columns.ts';
import { formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { Section } from '../../ui/section.tsx';

/** What each column takes, and what the table leaves as it is in a new frame. */
export function ColumnsHelp({ unit }: { readonly unit: Unit }) {
  const { overhang, dado } = newBox(unit, 'box');
  const say = (length: number) => formatWithUnit(length, unit);
  return (
    <>
      <Section heading="Columns">
        <p className="mb-2 text-12">
          In any order. Columns in bold must be there, and every row must fill them. Lengths are in the row’s unit, or
          carry their own, such as 775mm; with a decimal point, not a comma. Write 0.75, not 3/4: a spreadsheet takes
          that for a date.
        </p>
        <dl className="text-12">
          {TABLE_COLUMNS.map((column) => (
            <div key={column.heading} className="border-b border-rule py-1">
              <dt className={'needed' in column ? 'font-bold' : ''}>{column.heading}</dt>
              <dd className="text-pencil">{column.says}</dd>
            </div>
          ))}
        </dl>
      </Section>
      <Section heading="Dados and the rest">
        <div className="flex flex-col gap-2 text-12">
          <p>
            With a box thickness a frame gets dados for both ends and the bottom, as the box helper begins: it stands{' '}
            {say(overhang.left)} past the box on either side, and the bottom lies {say(overhang.bottom)} above the
            frame’s lower edge, or above the feet. Dados are {say(dado.depth)} deep with {say(dado.clearance)}{' '}
            clearance. Ends run out below and above. Partitions and tops are put in on the frame’s page.
          </p>
          <p>
            Cutters, board setup and turning over are those of a new frame. The beading cutter has the bead’s radius;
            look at the cutters before you release.
          </p>
        </div>
      </Section>
    </>
  );
}
