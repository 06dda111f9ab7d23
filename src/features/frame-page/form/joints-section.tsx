import { memo, useState } from 'react';
import { copyDado } from '#shared/kernel/particulars/copy-dado.ts';
import { newDado } from '#shared/kernel/particulars/new-dado.ts';
import type { Dado } from '#shared/kernel/particulars/particulars.ts';
import { Button } from '../../../ui/button.tsx';
import { Section } from '../../../ui/section.tsx';
import { useDesk, useEditor } from '../model/desk.ts';
import { goToEntry } from '../model/find-entry.ts';
import { Entry } from './entry.tsx';
import { LightsUp } from './lights-up.tsx';
import { SwitchEntry } from './switch-entry.tsx';

const RUNS = [
  { value: 'vertical', label: 'vertical' },
  { value: 'horizontal', label: 'horizontal' },
] as const;

const ENDS = [
  { value: 'open', label: 'open' },
  { value: 'stopped', label: 'stopped' },
  { value: 'meets', label: 'meets' },
] as const;

function useDadoEdits() {
  const { editor } = useDesk();
  function change(edit: (dados: readonly Dado[]) => readonly Dado[], label: string, focusOn: number): string {
    const { present } = editor.store.get().history;
    const dados = edit(present.dados);
    const problem = editor.apply({ ...present, dados }, label);
    if (problem === '')
      requestAnimationFrame(() =>
        goToEntry(dados.length > 0 ? `dados.${Math.min(focusOn, dados.length - 1)}.part` : 'dados'),
      );
    return problem;
  }
  const now = () => editor.store.get().history.present;
  return {
    add: () => change((dados) => [...dados, newDado(now())], 'Add dado', now().dados.length),
    copy: (index: number) => change(() => copyDado(now(), index), 'Copy dado', index + 1),
    remove: (index: number) => change((dados) => dados.toSpliced(index, 1), 'Remove dado', index),
  };
}

const DadoRows = memo(function DadoRows({ index }: { readonly index: number }) {
  const { readOnly } = useDesk();
  const edits = useDadoEdits();
  const [problem, setProblem] = useState('');
  const part = useEditor((s) => s.history.present.dados[index]?.part);
  const path = `dados.${index}`;
  if (part === undefined) return null;
  return (
    <div role="group" aria-label={part}>
      <LightsUp
        of={(worked) => worked.dados.filter((d) => d.index === index).map((d) => d.id)}
        className="border-b border-rule py-1.5"
      >
        <div className="grid grid-cols-4 gap-x-1.5 gap-y-0.5">
          <div className="col-span-2">
            <Entry path={`${path}.part`} label="Part" kind="text" layout="cell" />
          </div>
          <div className="col-span-2">
            <Labelled text="Runs">
              <SwitchEntry path={`${path}.runs`} label="Runs" options={RUNS} asList hideLabel />
            </Labelled>
          </div>
          <Entry path={`${path}.at`} label="At" layout="cell" />
          <Entry path={`${path}.panel`} label="Panel" layout="cell" />
          <Entry path={`${path}.clearance`} label="Clearance" layout="cell" />
          <Entry path={`${path}.depth`} label="Depth" layout="cell" />
        </div>
        <div className="grid grid-cols-[1fr_1.5fr_1fr_1.5fr] gap-x-1 gap-y-0.5">
          <Entry path={`${path}.from`} label="From" layout="cell" />
          <Labelled text="ends">
            <SwitchEntry path={`${path}.ends.0`} label="End at from" options={ENDS} asList hideLabel />
          </Labelled>
          <Entry path={`${path}.to`} label="To" layout="cell" />
          <Labelled text="ends">
            <SwitchEntry path={`${path}.ends.1`} label="End at to" options={ENDS} asList hideLabel />
          </Labelled>
        </div>
        {!readOnly && (
          <div className="flex flex-wrap gap-x-3 text-12">
            <Button kind="quiet" onClick={() => setProblem(edits.copy(index))}>
              Copy
            </Button>
            <Button kind="quiet" onClick={() => setProblem(edits.remove(index))}>
              Remove
            </Button>
            {problem !== '' && <p className="w-full text-stop">Takes {problem}.</p>}
          </div>
        )}
      </LightsUp>
    </div>
  );
});

function Labelled({ text, children }: { readonly text: string; readonly children: React.ReactNode }) {
  return (
    <div className="min-w-0">
      <span aria-hidden="true" className="block text-11 text-pencil">
        {text}
      </span>
      {children}
    </div>
  );
}

/** The dados that lock the box into the frame, one block of entries each. */
export function JointsSection() {
  const { readOnly } = useDesk();
  const edits = useDadoEdits();
  const [problem, setProblem] = useState('');
  const count = useEditor((s) => s.history.present.dados.length);
  return (
    <Section heading="Box joints" aside={`${count} ${count === 1 ? 'dado' : 'dados'}`}>
      {count === 0 && <p className="mb-1 text-pencil">No dados yet: the box has nothing to plug into.</p>}
      {Array.from({ length: count }, (_, i) => (
        <DadoRows key={i} index={i} />
      ))}
      {!readOnly && (
        <div data-entry="dados" className="mt-1.5">
          <Button onClick={() => setProblem(edits.add())}>Add a dado</Button>
          {problem !== '' && <p className="text-12 text-stop">Takes {problem}.</p>}
        </div>
      )}
    </Section>
  );
}
