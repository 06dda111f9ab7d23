import { useId, type ReactNode } from 'react';

interface CheckboxProps {
  readonly label: ReactNode;
  readonly checked: boolean;
  readonly onChecked: (checked: boolean) => void;
  readonly hint?: string;
  readonly disabled?: boolean;
}

export function Checkbox({ label, checked, onChecked, hint, disabled }: CheckboxProps) {
  const id = useId();
  return (
    <div className="mb-1">
      <label className="flex min-h-6 items-baseline gap-2">
        <input
          type="checkbox"
          checked={checked}
          disabled={disabled}
          aria-describedby={hint === undefined ? undefined : id}
          onChange={(event) => onChecked(event.target.checked)}
          className="size-4 shrink-0 translate-y-0.5 accent-ink"
        />
        <span>{label}</span>
      </label>
      {hint !== undefined && (
        <p id={id} className="ml-6 text-11 text-pencil">
          {hint}
        </p>
      )}
    </div>
  );
}
