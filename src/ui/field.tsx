import { useId, type ReactNode } from 'react';
import { classNames } from './class-names.ts';

/** What ties a control to its label, hint and error. Spread it onto the control. */
export interface FieldWiring {
  readonly id: string;
  readonly 'aria-describedby': string | undefined;
  readonly 'aria-invalid': true | undefined;
}

export interface FieldProps {
  readonly label: string;
  /** What is wrong and what the field takes; '' when nothing is. */
  readonly error?: string;
  /** Said beforehand, small. */
  readonly hint?: ReactNode;
  /** row: label left, control right, as in a column of lengths; stack: label above. */
  readonly layout?: 'row' | 'stack';
  /** The label is for screen readers only, where a table's heads say it already. */
  readonly hideLabel?: boolean;
  /** A row of a size of its own, whatever is in it: what is typed is laid out within and nowhere else. */
  readonly steady?: boolean;
}

const ROW = 'flex items-center justify-between gap-3';

/** Label, control, hint and error of one entry. */
export function Field(props: FieldProps & { readonly children: (wiring: FieldWiring) => ReactNode }) {
  const { label, error = '', hint, layout = 'stack', hideLabel = false, steady = false, children } = props;
  const id = useId();
  const says = [error !== '' && `${id}-error`, hint !== undefined && `${id}-hint`]
    .filter((part) => part !== false)
    .join(' ');
  const row = layout === 'row' && !hideLabel;
  return (
    <div className={classNames(layout === 'stack' && !hideLabel && 'mb-3', row && says !== '' && 'mb-1.5')}>
      <div
        className={classNames(
          row && ROW,
          row && (steady ? 'h-7 [contain:layout_size_style] pointer-coarse:h-11' : 'min-h-7'),
        )}
      >
        <label htmlFor={id} className={hideLabel ? 'sr-only' : classNames('block', !row && 'mb-0.5')}>
          {label}
        </label>
        {children({ id, 'aria-describedby': says || undefined, 'aria-invalid': error === '' ? undefined : true })}
      </div>
      {error !== '' && (
        <p id={`${id}-error`} className={classNames('text-12 text-stop wrap-anywhere', row && 'text-right')}>
          {error}
        </p>
      )}
      {hint !== undefined && (
        <p id={`${id}-hint`} className={classNames('text-11 text-pencil', row && 'text-right')}>
          {hint}
        </p>
      )}
    </div>
  );
}
