/** Something in the panel to put the keyboard into. */
export type PanelEntry = 'first' | 'label' | 'size' | 'arch';

const PANEL = '[data-selection-panel]';

/** Puts the keyboard into an entry of the open panel once it is drawn; into the panel itself where it has no such entry. */
export function focusPanel(entry: PanelEntry): void {
  requestAnimationFrame(() => {
    const panel = document.querySelector<HTMLElement>(PANEL);
    const within = entry === 'first' ? 'input' : `[data-edit="${entry}"] input`;
    const input = panel?.querySelector<HTMLInputElement>(within);
    if (input?.type === 'text') input.select();
    (input ?? panel)?.focus({ preventScroll: true });
  });
}

/** Puts the keyboard back on the drawing. */
export const focusSpread = (): void =>
  document.querySelector<HTMLElement>('[data-spread]')?.focus({ preventScroll: true });
