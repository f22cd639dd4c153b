'use client';

import type { ReactNode } from 'react';

export interface RailTool<T extends string> {
  readonly value: T;
  readonly label: string;
  readonly icon: ReactNode;
  /** The key that picks it, shown in its title. */
  readonly shortcut: string;
}

/** The rail of what the hand does: down the left of the desk, along the bottom of a phone. */
export function Rail<T extends string>({
  tools,
  value,
  onChange,
  children,
}: {
  tools: readonly RailTool<T>[];
  /** `null` while the hand holds something that is no tool. */
  value: T | null;
  onChange: (tool: T) => void;
  children?: ReactNode;
}) {
  return (
    <section
      aria-label="Tools"
      className="flex shrink-0 gap-1 overflow-x-auto border-rule bg-desk p-1.5 max-lg:sticky max-lg:bottom-0 max-lg:z-20 max-lg:order-last max-lg:border-t lg:w-16 lg:flex-col lg:border-r"
    >
      {tools.map((tool) => (
        <button
          key={tool.value}
          type="button"
          aria-pressed={tool.value === value}
          title={`${tool.label} (${tool.shortcut})`}
          onClick={() => onChange(tool.value)}
          className={`flex min-w-13 shrink-0 flex-col items-center gap-0.5 rounded px-1 py-1.5 font-condensed text-[13px] font-semibold ${
            tool.value === value ? 'bg-action text-on-action' : 'hover:bg-wash'
          }`}
        >
          {tool.icon}
          {tool.label}
        </button>
      ))}
      {children}
    </section>
  );
}

/** A rail button that acts at once. */
export function RailAction({
  label,
  icon,
  disabled,
  onClick,
}: {
  label: string;
  icon: ReactNode;
  disabled?: boolean;
  onClick: () => void;
}) {
  return (
    <button
      type="button"
      disabled={disabled}
      onClick={onClick}
      className="flex min-w-13 shrink-0 flex-col items-center gap-0.5 rounded px-1 py-1.5 font-condensed text-[13px] font-medium hover:bg-wash disabled:opacity-40"
    >
      {icon}
      {label}
    </button>
  );
}
