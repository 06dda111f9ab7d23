import { Button } from '../../../ui/button.tsx';

export type FrameView = 'faces' | 'section' | 'corners' | 'part';

const VIEWS: readonly { readonly view: FrameView; readonly label: string }[] = [
  { view: 'faces', label: 'Both faces' },
  { view: 'section', label: 'Section' },
  { view: 'corners', label: 'Corners' },
  { view: 'part', label: 'Cut part' },
];

interface ViewBarProps {
  readonly view: FrameView;
  readonly onView: (view: FrameView) => void;
}

/** What the middle of the page shows. */
export function ViewBar({ view, onView }: ViewBarProps) {
  return (
    <div
      role="group"
      aria-label="What is shown"
      className="flex h-9 shrink-0 items-center gap-x-4 border-b border-rule px-4 print:hidden"
    >
      {VIEWS.map((entry) => (
        <span key={entry.view} className={entry.view === view ? 'font-bold' : ''}>
          <Button kind="quiet" aria-pressed={entry.view === view} onClick={() => onView(entry.view)}>
            {entry.label}
          </Button>
        </span>
      ))}
    </div>
  );
}
