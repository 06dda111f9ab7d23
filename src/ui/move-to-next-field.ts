import type { KeyboardEvent } from 'react';

const FIELDS =
  'input:not([type=hidden], [type=radio], :disabled), input[type=radio]:checked:not(:disabled), select:not(:disabled), textarea:not(:disabled)';

/**
 * Moves focus from a field to the next one on the page, in the nearest ancestor marked `data-fields`, else form, else main.
 * Answers false at the last one, where focus stays.
 */
export function moveToNextField(from: HTMLElement): boolean {
  const within = from.closest('[data-fields]') ?? from.closest('form') ?? from.closest('main') ?? document.body;
  const fields = [...within.querySelectorAll<HTMLElement>(FIELDS)];
  const next = fields[fields.indexOf(from) + 1];
  if (next === undefined) return false;
  next.focus();
  if (next instanceof HTMLInputElement && next.type !== 'radio' && next.type !== 'checkbox') next.select();
  return true;
}

/** Key handler for fields where Enter goes to the next one and sends nothing. */
export function enterMovesOn(event: KeyboardEvent<HTMLElement>): void {
  if (event.key !== 'Enter' || event.nativeEvent.isComposing) return;
  event.preventDefault();
  moveToNextField(event.currentTarget);
}
