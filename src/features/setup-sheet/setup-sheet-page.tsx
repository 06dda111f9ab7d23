import { useEffect } from 'react';
import type { SheetModel, SheetPage } from '#shared/kernel/sheet/sheet-model.ts';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Notice } from '../../ui/notice.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';
import { KeepAwake } from './keep-awake.tsx';
import { SheetPages } from './sheet-pages.tsx';

interface SetupSheetPageProps {
  readonly model: SheetModel;
  readonly frame: { readonly id: string; readonly name: string };
  readonly jobName: string;
  /** Letter of the newest revision, when the one shown is older; '' otherwise. */
  readonly newerRevision: string;
  readonly pdf: string;
  readonly shown: SheetPage['id'];
  readonly addressOf: (id: SheetPage['id']) => string;
}

/** Everything on this page grows with the root's size: it is read at arm's length. */
function useLargeType(): void {
  useEffect(() => {
    document.documentElement.classList.add('at-the-machine');
    return () => document.documentElement.classList.remove('at-the-machine');
  }, []);
}

/** The setup sheet on a tablet at the machine. */
export function SetupSheetPage({ model, frame, jobName, newerRevision, pdf, shown, addressOf }: SetupSheetPageProps) {
  useLargeType();
  const { titleBlock } = model;
  return (
    <Sheet
      title={`Setup sheet of ${frame.name}`}
      showTitle={false}
      crumbs={[{ label: frame.name, to: `/frames/${frame.id}` }, { label: 'Setup sheet' }]}
      titleBlock={
        <TitleBlock
          action={
            <ButtonLink kind="main" wide newTab to={pdf}>
              Setup sheet as PDF
            </ButtonLink>
          }
          actionNote="opens beside this page"
        >
          <TitleCell label="Frame" main detail={jobName}>
            {frame.name}
          </TitleCell>
          <TitleCell label="Revision" detail={titleBlock.dateOfIssue}>
            <span className="font-bold">{titleBlock.revision}</span>
          </TitleCell>
          <KeepAwake />
        </TitleBlock>
      }
    >
      {model.draft && (
        <Notice level="stop" word="Draft, not for cutting">
          This has not been released. Release a revision on the frame's page, then cut by that.
        </Notice>
      )}
      {newerRevision !== '' && (
        <Notice
          level="caution"
          word="Not the newest"
          action={
            <ButtonLink
              to={`/frames/${frame.id}/sheet?revision=${encodeURIComponent(newerRevision)}`}
            >{`Open revision ${newerRevision}`}</ButtonLink>
          }
        >
          {`Revision ${newerRevision} has been released since.`}
        </Notice>
      )}
      <SheetPages model={model} shown={shown} addressOf={addressOf} />
    </Sheet>
  );
}
