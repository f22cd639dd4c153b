'use client';

import { Dialog } from '@/components/ui/dialog';

const keys: readonly (readonly [string, string])[] = [
  ['V  S  T', 'Select, place a stop, tape'],
  ['Arrows', 'On a stop in the ledger: move it by 5 cm, with Shift by 1 cm'],
  ['[  ]', 'On a stop in the ledger: turn it by 5°'],
  ['Delete', 'Delete the chosen stop'],
  ['Ctrl Z, Ctrl Y', 'Undo, redo'],
  ['+  −  0', 'Zoom in, out, whole room'],
  ['Space and drag', 'Move the sheet'],
  ['Alt while dragging', 'No snapping to the 5 cm grid'],
  ['Esc', 'Let go of what is chosen'],
];

export function KeysHelp({ open, onOpenChange }: { open: boolean; onOpenChange: (open: boolean) => void }) {
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
