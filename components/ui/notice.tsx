import type { ReactNode } from 'react';

/** A ruled note beside the text. `danger` is kept for harm to people and for failures. */
export function Notice({
  tone = 'plain',
  title,
  children,
  role,
}: {
  tone?: 'plain' | 'danger';
  title?: string;
  children: ReactNode;
  role?: 'alert' | 'status' | 'note';
}) {
  const look = tone === 'danger' ? 'border-vermilion bg-danger-wash' : 'border-link bg-wash/60';
  return (
    <div role={role} className={`border-l-4 px-3 py-2.5 text-[14.5px] ${look}`}>
      {title ? <p className="font-semibold">{title}</p> : null}
      {children}
    </div>
  );
}
