import type { ButtonHTMLAttributes, ReactNode } from 'react';

/** A square button of one icon; `label` is its name for everyone who does not see the icon. */
export function IconButton({
  label,
  icon,
  ...rest
}: { label: string; icon: ReactNode } & ButtonHTMLAttributes<HTMLButtonElement>) {
  return (
    <button
      type="button"
      aria-label={label}
      title={label}
      className="grid size-9 shrink-0 place-items-center rounded border border-ink-2/60 text-ink hover:bg-wash disabled:opacity-40"
      {...rest}
    >
      {icon}
    </button>
  );
}
