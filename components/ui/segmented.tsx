'use client';

import type { ReactNode } from 'react';

/** A row of choices of which one holds, as a group of toggle buttons. */
export function Segmented<T extends string>({
  label,
  value,
  options,
  onChange,
}: {
  label: string;
  value: T;
  options: readonly { value: T; label: ReactNode; title?: string }[];
  onChange: (value: T) => void;
}) {
  return (
    <fieldset className="inline-flex max-w-full min-w-0 overflow-x-auto rounded border border-ink-2/50">
      <legend className="sr-only">{label}</legend>
      {options.map((option) => (
        <button
          key={option.value}
          type="button"
          title={option.title}
          aria-pressed={option.value === value}
          onClick={() => onChange(option.value)}
          className={`h-8 border-l border-ink-2/30 px-3 text-[14.5px] whitespace-nowrap first:border-l-0 ${
            option.value === value ? 'bg-action font-semibold text-on-action' : 'hover:bg-wash'
          }`}
        >
          {option.label}
        </button>
      ))}
    </fieldset>
  );
}
