import type { ReactNode } from 'react';

/** Nothing here yet: says what to do first, with the button for it. */
export function Empty({
  title,
  children,
  action,
}: {
  title: string;
  children?: ReactNode;
  action?: ReactNode;
}) {
  return (
    <div className="flex flex-col items-start gap-3 rounded border border-dashed border-ink-2/50 p-6">
      <p className="font-condensed text-xl font-semibold">{title}</p>
      {children ? <div className="max-w-prose text-ink-2">{children}</div> : null}
      {action}
    </div>
  );
}

/** The shape of the real thing while it loads. */
export function Skeleton({ className = '' }: { className?: string }) {
  return <div aria-hidden className={`animate-pulse rounded bg-wash ${className}`} />;
}
