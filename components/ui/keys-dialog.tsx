'use client';

import { Dialog } from './dialog';

/** What the keys do on a page. */
export function KeysDialog({
  keys,
  open,
  onOpenChange,
}: {
  keys: readonly (readonly [string, string])[];
  open: boolean;
  onOpenChange: (open: boolean) => void;
}) {
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title="Keys">
      <dl className="grid grid-cols-[auto_1fr] gap-x-5 gap-y-2">
        {keys.map(([key, does]) => (
          <div key={key} className="contents">
            <dt className="mono whitespace-nowrap">{key}</dt>
            <dd>{does}</dd>
          </div>
        ))}
      </dl>
    </Dialog>
  );
}
