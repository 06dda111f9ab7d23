import type { CensusRow, EntityFate } from '#shared/kernel/tracing/found-drawing.ts';
import type { TraceOptions } from '#shared/kernel/tracing/traced-drawing.ts';
import { Checkbox } from '../../ui/checkbox.tsx';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';
import { Table, type Column } from '../../ui/table.tsx';
import { LayerSwitches } from './layer-switches.tsx';
import { FATE_WORDS, sayReason } from './model/words.ts';

interface CensusSectionProps {
  readonly census: readonly CensusRow[];
  readonly placed: readonly CensusRow[];
  readonly options: TraceOptions;
  readonly onOptions: (options: TraceOptions) => void;
}

const SWITCHES: readonly { readonly key: keyof TraceOptions['include']; readonly label: string }[] = [
  { key: 'paperSpace', label: 'Paper space' },
  { key: 'offLayers', label: 'Layers that are off' },
  { key: 'frozenLayers', label: 'Frozen layers' },
  { key: 'invisible', label: 'Invisible entities' },
];

const COLUMNS: readonly Column<CensusRow>[] = [
  {
    key: 'type',
    head: 'Type and layer',
    names: true,
    sortBy: (row) => row.type,
    cell: (row) => (
      <span className="wrap-anywhere">
        {row.type} <span className="text-pencil">on {row.layer}</span>
      </span>
    ),
  },
  {
    key: 'fate',
    head: 'Became',
    sortBy: (row) => row.fate,
    cell: (row) => (
      <>
        <span className={row.fate === 'refused' ? 'font-bold text-caution' : undefined}>{FATE_WORDS[row.fate]}</span>
        {row.reason !== null && <span className="block text-11 text-pencil">{sayReason(row.reason)}</span>}
        {row.fate !== 'kept' && (
          <span className="block text-11 text-pencil">
            line {row.lines.join(', ')}
            {row.count > row.lines.length && ' …'}
          </span>
        )}
      </>
    ),
  },
  { key: 'count', head: 'Count', align: 'right', sortBy: (row) => row.count, cell: (row) => row.count },
];

const sum = (rows: readonly CensusRow[], fate?: EntityFate): number =>
  rows.reduce((total, row) => total + (fate === undefined || row.fate === fate ? row.count : 0), 0);

const rowKey = (row: CensusRow): string => [row.type, row.layer, row.fate, row.reason].join('|');

const EntityTable = ({ caption, rows }: { readonly caption: string; readonly rows: readonly CensusRow[] }) => (
  <div className="max-h-96 overflow-y-auto text-12" tabIndex={0} role="group" aria-label={caption}>
    <Table caption={caption} columns={COLUMNS} rows={rows} rowKey={rowKey} />
  </div>
);

/** Every entity of the file and what became of it; what is set aside can be switched on. */
export function CensusSection({ census, placed, options, onOptions }: CensusSectionProps) {
  return (
    <Section heading="Entities of the file" aside={String(sum(census))}>
      <p className="mb-2 text-12">
        {sum(census, 'kept')} kept + {sum(census, 'aside')} set aside + {sum(census, 'refused')} refused ={' '}
        {plural(sum(census), 'entity', 'entities')}
      </p>
      {census.length > 0 && <EntityTable caption="Entities of the file" rows={census} />}
      {placed.length > 0 && (
        <>
          <h3 className="mt-3 mb-1 text-12 font-bold">Put there by blocks</h3>
          <EntityTable caption="Entities that blocks put there" rows={placed} />
        </>
      )}
      <LayerSwitches census={census} placed={placed} options={options} onOptions={onOptions} />
      <fieldset className="mt-3">
        <legend className="mb-1 text-12 font-bold">What is read besides</legend>
        {SWITCHES.map(({ key, label }) => (
          <Checkbox
            key={key}
            label={label}
            checked={options.include[key]}
            onChecked={(on) => onOptions({ ...options, include: { ...options.include, [key]: on } })}
          />
        ))}
      </fieldset>
    </Section>
  );
}
