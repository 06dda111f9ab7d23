import { useMemo, useRef, useState } from 'react';
import type { Box } from '#shared/kernel/box/box.ts';
import { givenOfBox } from '#shared/kernel/box/given-of-box.ts';
import { listBoxParts } from '#shared/kernel/box/list-box-parts.ts';
import { newBox } from '#shared/kernel/box/new-box.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import { usualEdgePresets } from '#shared/kernel/starters/usual-edge-presets.ts';
import { formatLength, formatWithUnit } from '#shared/kernel/units/format-length.ts';
import type { Unit } from '#shared/kernel/units/unit.ts';
import { fieldMessagesOf } from '../../lib/field-messages.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { plural } from '../../ui/plural.ts';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { BoxFindings } from './box-findings.tsx';
import { BoxForm, type FormEdge } from './box-form.tsx';
import { BoxFrameFacts } from './box-frame-facts.tsx';
import { BoxPartsTable } from './box-parts-table.tsx';
import { BoxSpread } from './box-spread.tsx';
import { judgeBox } from './judge-box.ts';

interface BoxPageProps {
  readonly shopName: string;
  readonly job: { readonly id: string; readonly name: string };
  /** Where the choice of unit begins. */
  readonly unit: Unit;
  readonly mayEdit: boolean;
  readonly busy: boolean;
  /** Of the last try to create; null when there was none. */
  readonly error: Error | null;
  readonly onCreate: (particulars: Particulars) => void;
}

const NAME = 'Frame of a box';

/** From a box to the frame that covers it, and to the list of its parts with their growth. */
export function BoxPage({ shopName, job, unit: shopUnit, mayEdit, busy, error, onCreate }: BoxPageProps) {
  const [boxes, setBoxes] = useState(() => ({ in: newBox('in', NAME), mm: newBox('mm', NAME) }));
  const [unit, setUnit] = useState(shopUnit);
  const [edge, setEdge] = useState<FormEdge>('square');
  const [refusal, setRefusal] = useState('');
  const form = useRef<HTMLDivElement>(null);
  const box = boxes[unit];

  const { worked, wrong } = useMemo(
    () =>
      judgeBox(
        box,
        usualEdgePresets(box.unit).find((preset) => preset.edge.style === edge)!,
      ),
    [box, edge],
  );
  // While an entry is wrong the last frame that fitted stays in sight, and says so.
  const [last, setLast] = useState(worked);
  if (worked !== undefined && worked !== last) setLast(worked);
  const shown = worked ?? (last?.particulars.unit === unit ? last : undefined);
  const parts = useMemo(() => (worked ? listBoxParts(worked.particulars, givenOfBox(box)) : []), [worked, box]);

  function enter(next: Box) {
    setRefusal('');
    setBoxes((now) => ({ ...now, [unit]: next }));
  }

  function changeUnit(next: Unit) {
    setBoxes((now) => ({ ...now, [next]: { ...now[next], name: box.name } }));
    setUnit(next);
  }

  function create() {
    const first = form.current?.querySelector<HTMLElement>('[aria-invalid=true]');
    if (worked === undefined || Object.keys(wrong).length > 0 || first) {
      setRefusal('An entry of the box is wrong. Mend what is marked, then create the frame.');
      first?.focus({ preventScroll: true });
      // In the middle, so that what it takes is seen below it.
      first?.scrollIntoView({ block: 'center' });
      return;
    }
    setRefusal('');
    onCreate(worked.particulars);
  }

  const refusedFields = Object.entries(fieldMessagesOf(error));
  const whole = wrong[''];
  return (
    <Sheet
      title="Frame from a box"
      crumbs={[{ label: 'Jobs', to: '/jobs' }, { label: job.name, to: `/jobs/${job.id}` }, { label: 'From a box' }]}
      titleBlock={
        <TitleBlock
          action={
            mayEdit ? (
              <Button kind="main" wide busy={busy ? 'Creating' : ''} onClick={create}>
                Create the frame
              </Button>
            ) : undefined
          }
          actionNote={mayEdit ? refusal || 'then change it on its page' : 'Designers and the owner create frames'}
        >
          <TitleCell label="Shop">{shopName}</TitleCell>
          <TitleCell label="Job" main>
            {job.name}
          </TitleCell>
          <TitleCell label="Frame" detail={box.name}>
            {worked
              ? `${formatLength(worked.contours.width, unit)} × ${formatWithUnit(worked.contours.height, unit)}`
              : 'no frame yet'}
          </TitleCell>
          <TitleCell label="Findings">
            {worked
              ? plural(worked.findings.filter(({ level }) => level === 'caution').length, 'caution')
              : 'entries to mend'}
          </TitleCell>
        </TitleBlock>
      }
    >
      {error !== null && (
        <Notice level="stop" word="Not created" live>
          {sayError(error)} {refusedFields.map(([path, message]) => `${path}: ${message}`).join(' ')}
        </Notice>
      )}
      {refusal !== '' && (
        <Notice level="stop" word="Not created" live>
          {refusal}
        </Notice>
      )}
      <div className="grid gap-x-10 lg:grid-cols-[minmax(0,1fr)_minmax(0,1fr)]">
        <div ref={form}>
          <BoxForm box={box} onBox={enter} onUnit={changeUnit} edge={edge} onEdge={setEdge} wrong={wrong} />
        </div>
        <div className="min-w-0">
          <Section heading="Frame that follows">
            {whole !== undefined && <Notice level="stop">{whole}</Notice>}
            {worked === undefined && (
              <Notice level="stop" word="No frame">
                Mend the entries that are marked.{shown && ' Until then the drawing is of the last frame that fitted.'}
              </Notice>
            )}
            {worked && <BoxFrameFacts worked={worked} />}
            {shown && <BoxSpread worked={shown} faint={worked === undefined} />}
          </Section>
          {worked && (
            <>
              <Section heading="Box parts">
                <BoxPartsTable parts={parts} unit={unit} name={box.name} />
              </Section>
              <Section heading="Findings">
                <BoxFindings findings={worked.findings} />
              </Section>
            </>
          )}
        </div>
      </div>
    </Sheet>
  );
}
