import { useEffect, useId, useRef, type KeyboardEvent, type ReactNode } from 'react';
import { Button } from './button.tsx';

interface DialogProps {
  readonly title: string;
  /** Asked for by Escape or the close button; the page then leaves the dialog out. */
  readonly onClose: () => void;
  readonly children: ReactNode;
  /** Buttons along the bottom, the main one first. */
  readonly actions?: ReactNode;
  readonly wide?: boolean;
}

/** A window over the page. Render it only while it is open; on closing, focus returns to what opened it. */
export function Dialog({ title, onClose, children, actions, wide = false }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    const opener = document.activeElement;
    const element = dialog.current;
    if (element && !element.open) element.showModal();
    return () => {
      element?.close();
      if (opener instanceof HTMLElement && opener.isConnected) opener.focus();
    };
  }, []);
  // Browsers let a page refuse to close once only: the second Escape would close a dialog that asks first. So the key is taken here.
  function press(event: KeyboardEvent) {
    if (event.key !== 'Escape' || event.defaultPrevented || event.nativeEvent.isComposing) return;
    event.preventDefault();
    event.stopPropagation();
    onClose();
  }
  return (
    <dialog
      ref={dialog}
      aria-labelledby={id}
      onKeyDown={press}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      className={`m-auto max-h-[92dvh] w-full border border-ink bg-paper p-1 text-ink backdrop:bg-ink/40 ${wide ? 'max-w-[min(64rem,100%-2rem)]' : 'max-w-[min(36rem,100%-1rem)]'}`}
    >
      <div className="border border-ink">
        <div className="flex items-baseline justify-between gap-4 border-b border-rule px-4 py-2">
          <h2 id={id} className="text-16 font-bold wrap-anywhere">
            {title}
          </h2>
          <Button kind="quiet" onClick={onClose}>
            Close
          </Button>
        </div>
        <div className="px-4 py-3">{children}</div>
        {actions !== undefined && <div className="flex flex-wrap gap-3 border-t border-rule px-4 py-3">{actions}</div>}
      </div>
    </dialog>
  );
}
