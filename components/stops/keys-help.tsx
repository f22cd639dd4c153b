'use client';

import { KeysDialog } from '@/components/ui/keys-dialog';

const keys = [
  ['V  S  P  T', 'Select, place a stop, draw a pass, tape'],
  ['Enter, Backspace', 'While drawing a pass: end it, take a point back'],
  ['Arrows', 'On a stop or pass in the ledger: move it by 5 cm, with Shift by 1 cm'],
  ['[  ]', 'On a stop in the ledger: turn it by 5°'],
  ['Delete', 'Delete the chosen stop or pass'],
  ['Ctrl Z, Ctrl Y', 'Undo, redo'],
  ['+  −  0', 'Zoom in, out, whole room'],
  ['Space and drag', 'Move the sheet'],
  ['Alt while dragging', 'No snapping to the 5 cm grid'],
  ['Esc', 'Let go of what is chosen'],
] as const;

export function KeysHelp(props: { open: boolean; onOpenChange: (open: boolean) => void }) {
  return <KeysDialog keys={keys} {...props} />;
}
