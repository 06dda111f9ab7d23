import { useQueryClient } from '@tanstack/react-query';
import { useMemo, useState, useSyncExternalStore, type ReactNode } from 'react';
import type { Frame } from '#shared/contracts/frames.ts';
import type { StoredEdgePreset } from '#shared/contracts/edge-presets.ts';
import type { StoredProfile } from '#shared/contracts/profiles.ts';
import type { DrawerCutter } from '#shared/kernel/cutter-drawer/drawer-cutter.ts';
import type { Finding } from '#shared/kernel/checks/finding.ts';
import type { Particulars } from '#shared/kernel/particulars/particulars.ts';
import type { DrawnFrame } from '#shared/kernel/worked-frame.ts';
import { nextLetter } from '#shared/kernel/revisions/next-letter.ts';
import { Button } from '../../ui/button.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { frameQuery } from './api/get-frame.ts';
import { FindingsList } from './findings/findings-list.tsx';
import { DrawerProvider } from './form/drawer.ts';
import { FormBar } from './form/form-bar.tsx';
import { ParticularsForm } from './form/particulars-form.tsx';
import { SavedEdgesProvider } from './form/saved-edges.ts';
import { useUndoKeys } from './form/use-undo-keys.ts';
import { FrameTitleBlock } from './frame-title-block.tsx';
import { createDesk, DeskProvider, useDesk, useEditor } from './model/desk.ts';
import { useStore } from './model/store.ts';
import { FilesDialog } from './release/files-dialog.tsx';
import { ReleaseDialog } from './release/release-dialog.tsx';
import { EarlierCopyNotice } from './saving/earlier-copy-notice.tsx';
import { FrameFileButtons } from './saving/frame-file-buttons.tsx';
import { LeaveDialog } from './saving/leave-dialog.tsx';
import { SavingCell } from './saving/saving-cell.tsx';
import { StaleDialog, type TwoDrafts } from './saving/stale-dialog.tsx';
import { useDraft } from './saving/use-draft.ts';
import { Spread } from './spread/spread.tsx';
import { TracedFrom } from './traced-from.tsx';
import { CornerView } from './views/corner-view.tsx';
import { SectionView } from './views/section-view.tsx';
import { ViewBar, type FrameView } from './views/view-bar.tsx';

interface FramePageProps {
  /** As the server has it now; the work starts from its draft. */
  readonly frame: Frame;
  readonly profiles: readonly StoredProfile[];
  readonly defaultProfileId: string;
  /** The shop's cutters, to take numbers from. */
  readonly drawer: readonly DrawerCutter[];
  readonly savedEdges: readonly StoredEdgePreset[];
  readonly shopName: string;
  readonly mayEdit: boolean;
  readonly mayRelease: boolean;
  /** The look at the cut part, which is a feature of its own. */
  readonly renderCutPart: (worked: DrawnFrame, stops: number) => ReactNode;
}

const countStops = (findings: readonly Finding[]): number => findings.filter((f) => f.level === 'stop').length;

/** What the middle shows beside the findings. */
function Shown({
  view,
  renderCutPart,
}: {
  readonly view: FrameView;
  readonly renderCutPart: (worked: DrawnFrame, stops: number) => ReactNode;
}) {
  const worked = useEditor((s) => s.drawn);
  const stops = useStore(useDesk().findings, countStops);
  if (view === 'faces') return <Spread />;
  return (
    <div className="flex min-h-0 min-w-0 flex-1 flex-col overflow-y-auto p-4">
      {view === 'section' && <SectionView />}
      {view === 'corners' && <CornerView />}
      {view === 'part' && renderCutPart(worked, stops)}
    </div>
  );
}

/** Form, drawings and findings: beside or below each other as the board is turned. Follows nothing but the flip. */
function FrameWork({ renderCutPart }: Pick<FramePageProps, 'renderCutPart'>) {
  const isUpright = useEditor((s) => s.drawn.blank.flip === 'side-to-side');
  const [view, setView] = useState<FrameView>('faces');
  return (
    <div className="flex min-h-0 min-w-0 flex-1 flex-col">
      <ViewBar view={view} onView={setView} />
      <div className={`flex min-h-0 min-w-0 flex-1 flex-col ${isUpright ? '' : 'xl:flex-row'}`}>
        <Shown view={view} renderCutPart={renderCutPart} />
        <FindingsList
          className={
            isUpright
              ? 'max-h-24 shrink-0 border-t border-ink [@media(min-height:60rem)]:max-h-44'
              : 'max-h-24 shrink-0 border-t border-ink xl:max-h-none xl:w-80 xl:border-t-0 xl:border-l'
          }
        />
      </div>
    </div>
  );
}

/** The frame page: particulars at the left, both faces, findings, and the title block with the release. */
export function FramePage({
  frame,
  profiles,
  defaultProfileId,
  drawer,
  savedEdges,
  shopName,
  mayEdit,
  mayRelease,
  renderCutPart,
}: FramePageProps) {
  const client = useQueryClient();
  const { editor, autosave, copyKept } = useDraft(frame);
  const desk = useMemo(() => createDesk(editor, !mayEdit), [editor, mayEdit]);
  const [dialog, setDialog] = useState<'release' | 'files' | null>(null);
  const [released, setReleased] = useState('');
  /** The kept copy of an earlier visit, when it was started from a draft that has changed since. */
  const [earlier, setEarlier] = useState<TwoDrafts | null>(null);
  const [later, setLater] = useState(false);
  const saving = useSyncExternalStore(autosave.store.subscribe, autosave.store.get);
  useUndoKeys(editor, !mayEdit);

  const present = () => editor.store.get().history.present;
  const stale: TwoDrafts | null =
    saving.kind === 'stale'
      ? {
          base: saving.base,
          mine: present(),
          theirs: saving.stale.particulars,
          changedBy: saving.stale.changedBy,
          changedAt: saving.stale.changedAt,
        }
      : earlier;

  /** Goes on with `chosen`; the other draft is one step back. */
  function settle(drafts: TwoDrafts, chosen: Particulars) {
    if (saving.kind === 'stale') autosave.goOnFrom(saving.stale.version, drafts.theirs);
    if (chosen !== drafts.theirs) editor.apply(drafts.theirs, `Draft of ${drafts.changedBy}`);
    else editor.apply(drafts.mine, 'Your draft');
    editor.apply(chosen, 'Choice between two drafts');
    autosave.change(present());
    setEarlier(null);
    setLater(false);
  }

  function onReleased(answer: Frame) {
    client.setQueryData(frameQuery(frame.id).queryKey, answer);
    autosave.goOnFrom(answer.version, present());
    setReleased(answer.revisions[0]?.letter ?? '');
    setDialog('files');
    void client.invalidateQueries({ queryKey: ['jobs'] });
  }

  const newest = frame.revisions[0]?.letter ?? '';
  const letter = nextLetter(newest);
  const hasChanges = newest === '' || frame.draftChanged || saving.kind !== 'saved';
  const openFiles = () => {
    setReleased('');
    setDialog('files');
  };
  const canRelease = mayRelease && hasChanges;
  const action = canRelease ? (
    <Button kind="main" wide onClick={() => setDialog('release')}>
      Release revision {letter}
    </Button>
  ) : newest === '' ? (
    <p className="text-pencil">Nothing released yet.</p>
  ) : (
    <Button kind="main" wide onClick={openFiles}>
      Download revision {newest}
    </Button>
  );

  return (
    <DeskProvider value={desk}>
      <Sheet
        bare
        title={frame.particulars.name}
        showTitle={false}
        crumbs={[
          { label: 'Jobs', to: '/jobs' },
          { label: frame.jobName, to: `/jobs/${frame.jobId}` },
          { label: frame.particulars.name },
        ]}
        titleBlock={
          <FrameTitleBlock
            frame={frame}
            shopName={shopName}
            hasChanges={hasChanges}
            savingCell={<SavingCell autosave={autosave} copyKept={copyKept} onChoose={() => setLater(false)} />}
            action={action}
            actionNote={canRelease ? 'then download' : hasChanges ? '' : 'nothing has changed since'}
            onFiles={openFiles}
          />
        }
      >
        <div className="flex min-h-0 flex-1 flex-col-reverse md:flex-row">
          <div className="flex min-h-0 shrink-0 flex-col border-t border-ink md:w-84 md:border-t-0 md:border-r max-md:h-2/5 2xl:w-96">
            <FormBar>
              <FrameFileButtons />
            </FormBar>
            <div className="relative min-h-0 flex-1 overflow-y-auto px-4 pt-4 contain-content">
              {frame.tracing && <TracedFrom tracing={frame.tracing} />}
              {mayEdit && <EarlierCopyNotice frame={frame} editor={editor} onConflict={setEarlier} />}
              <DrawerProvider value={drawer}>
                <SavedEdgesProvider value={savedEdges}>
                  <ParticularsForm />
                </SavedEdgesProvider>
              </DrawerProvider>
            </div>
          </div>
          <FrameWork renderCutPart={renderCutPart} />
        </div>
        <LeaveDialog autosave={autosave} copyKept={copyKept} />
        {stale !== null && !later && (
          <StaleDialog
            drafts={stale}
            onMine={() => settle(stale, stale.mine)}
            onTheirs={() => settle(stale, stale.theirs)}
            onMerged={(merged) => settle(stale, merged)}
            onLater={() => setLater(true)}
          />
        )}
        {dialog === 'release' && (
          <ReleaseDialog
            frameId={frame.id}
            letter={letter}
            autosave={autosave}
            onReleased={onReleased}
            onClose={() => setDialog(null)}
          />
        )}
        {dialog === 'files' && (
          <FilesDialog
            frame={frame}
            profiles={profiles}
            defaultProfileId={defaultProfileId}
            released={released}
            onClose={() => setDialog(null)}
          />
        )}
      </Sheet>
    </DeskProvider>
  );
}
