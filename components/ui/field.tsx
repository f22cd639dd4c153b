import { type InputHTMLAttributes, type ReactNode, type SelectHTMLAttributes, useId } from 'react';

const control =
  'w-full rounded border border-ink-2/60 bg-field text-ink px-2.5 h-9 aria-[invalid=true]:border-danger aria-[invalid=true]:border-2 disabled:opacity-60';

interface Wrapping {
  label: string;
  /** A word of help under the control. */
  hint?: ReactNode;
  /** What is wrong and what to do; marks the control as invalid. */
  error?: string | null;
  /** Unit shown at the end of the control, such as m. */
  unit?: string;
  className?: string;
}

function Frame({
  id,
  label,
  hint,
  error,
  unit,
  className = '',
  children,
}: Wrapping & { id: string; children: ReactNode }) {
  return (
    <div className={`flex flex-col gap-1 ${className}`}>
      <label htmlFor={id} className="text-sm text-ink-2">
        {label}
        {unit ? ` (${unit})` : null}
      </label>
      {children}
      {hint && !error ? (
        <p id={`${id}-hint`} className="text-sm text-ink-2">
          {hint}
        </p>
      ) : null}
      {error ? (
        <p id={`${id}-error`} role="alert" className="text-sm font-medium text-danger">
          {error}
        </p>
      ) : null}
    </div>
  );
}

const describedBy = (id: string, { hint, error }: Wrapping) =>
  error ? `${id}-error` : hint ? `${id}-hint` : undefined;

export function TextField({
  label,
  hint,
  error,
  unit,
  className,
  ...rest
}: Wrapping & InputHTMLAttributes<HTMLInputElement>) {
  const made = useId();
  const id = rest.id ?? made;
  const wrapping = { label, hint, error, unit, className };
  return (
    <Frame id={id} {...wrapping}>
      <input
        {...rest}
        id={id}
        className={control}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, wrapping)}
      />
    </Frame>
  );
}

export function SelectField({
  label,
  hint,
  error,
  unit,
  className,
  children,
  ...rest
}: Wrapping & SelectHTMLAttributes<HTMLSelectElement>) {
  const made = useId();
  const id = rest.id ?? made;
  const wrapping = { label, hint, error, unit, className };
  return (
    <Frame id={id} {...wrapping}>
      <select
        {...rest}
        id={id}
        className={control}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy(id, wrapping)}
      >
        {children}
      </select>
    </Frame>
  );
}

/** A tick box with its words beside it. */
export function CheckField({
  label,
  checked,
  className = '',
  disabled,
  onChange,
}: {
  label: string;
  checked: boolean;
  className?: string;
  disabled?: boolean;
  onChange: (checked: boolean) => void;
}) {
  return (
    <label className={`flex items-center gap-2 ${className}`}>
      <input
        type="checkbox"
        className="size-4.5 accent-link"
        checked={checked}
        disabled={disabled}
        onChange={(event) => onChange(event.target.checked)}
      />
      {label}
    </label>
  );
}
