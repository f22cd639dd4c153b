'use client';

import { KeysDialog } from '@/components/ui/keys-dialog';

const keys = [
  ['V R W D N P O T', 'Select, room, wall, door, window, touch point, watch point, tape'],
  ['Arrows', 'Move the chosen thing by 5 cm, with Shift by 1 cm'],
  ['[  ]', 'Turn it by 15°, with Shift by 1°; swing a door open or shut'],
  ['Ctrl D', 'Duplicate it'],
  ['Delete', 'Delete it'],
  ['R', 'While a piece from the shelf is in hand: turn it'],
  ['Enter, Backspace', 'While drawing corner by corner: close the room, take a corner back'],
  ['Alt while dragging', 'No snapping'],
  ['Ctrl Z, Ctrl Y', 'Undo, redo'],
  ['+  −  0', 'Zoom in, out, whole room'],
  ['Space and drag', 'Move the sheet'],
  ['Esc', 'Let go'],
] as const;

export function PlanKeysHelp(props: { open: boolean; onOpenChange: (open: boolean) => void }) {
  return <KeysDialog keys={keys} {...props} />;
}
