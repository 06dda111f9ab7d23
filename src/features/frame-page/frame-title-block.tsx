import type { ReactNode } from 'react';
import type { Frame } from '#shared/contracts/frames.ts';
import type { Finding, FindingLevel } from '#shared/kernel/checks/finding.ts';
import { UNIT_WORDS, MM_PER_INCH, type Unit } from '#shared/kernel/units/unit.ts';
import { Button } from '../../ui/button.tsx';
import { plural } from '../../ui/plural.ts';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { useDesk, useEditor } from './model/desk.ts';
import type { View } from './model/view.ts';
import { useStore } from './model/store.ts';

/** A CSS pixel is 1/96 in by definition (CSS Values and Units, absolute lengths); screens come near to it. */
const PX_PER_INCH = 96;

function scaleWords(pxPerUnit: number, unit: Unit): string {
  const ratio = PX_PER_INCH / (pxPerUnit * (unit === 'in' ? 1 : MM_PER_INCH));
  const rounded = (n: number): string => (n >= 10 ? n.toFixed(0) : String(Number(n.toFixed(1))));
  return ratio >= 1 ? `≈ 1 : ${rounded(ratio)}` : `≈ ${rounded(1 / ratio)} : 1`;
}

function countWords(findings: readonly Finding[]): string {
  const count = (level: FindingLevel) => findings.filter((f) => f.level === level).length;
  return `${plural(count('stop'), 'stop')}, ${plural(count('caution'), 'caution')}|${plural(count('note'), 'note')}`;
}

function FindingsCell() {
  const words = useStore(useDesk().findings, countWords);
  const [first = '', second] = words.split('|');
  return (
    <TitleCell label="Findings" detail={second}>
      <span className={first.startsWith('0 stops') ? undefined : 'font-bold text-stop'}>{first}</span>
    </TitleCell>
  );
}

const scaleOf = (view: View): number => view.scale;

function ScaleCell() {
  const desk = useDesk();
  const unit = useEditor((s) => s.history.present.unit);
  const words = scaleWords(useStore(desk.settledView, scaleOf), unit);
  return (
    <TitleCell label="Scale" detail={UNIT_WORDS[unit]}>
      {words}
    </TitleCell>
  );
}

interface FrameTitleBlockProps {
  readonly frame: Frame;
  readonly shopName: string;
  /** The draft differs from the newest revision. */
  readonly hasChanges: boolean;
  readonly savingCell: ReactNode;
  readonly action: ReactNode;
  readonly actionNote: string;
  readonly onFiles: () => void;
}

/** Along the bottom of the frame page: where one is, how it stands, and the main action. */
export function FrameTitleBlock({
  frame,
  shopName,
  hasChanges,
  savingCell,
  action,
  actionNote,
  onFiles,
}: FrameTitleBlockProps) {
  const name = useEditor((s) => s.history.present.name);
  const [newest] = frame.revisions;
  return (
    <TitleBlock action={action} actionNote={actionNote}>
      <TitleCell label="Shop">{shopName}</TitleCell>
      <TitleCell label="Frame" main detail={frame.jobName}>
        {name}
      </TitleCell>
      <FindingsCell />
      <TitleCell
        label="Revision"
        detail={
          <Button kind="quiet" onClick={onFiles}>
            Files
          </Button>
        }
      >
        {newest === undefined ? (
          <strong>draft</strong>
        ) : hasChanges ? (
          <>
            <strong>draft</strong> after {newest.letter}
          </>
        ) : (
          <strong>{newest.letter}</strong>
        )}
      </TitleCell>
      <ScaleCell />
      {savingCell}
    </TitleBlock>
  );
}
