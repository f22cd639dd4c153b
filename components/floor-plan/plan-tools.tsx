import { AppWindow, DoorOpen, Eye, Hand, MousePointer2, Ruler, Square, Tally1 } from 'lucide-react';
import type { RailTool } from '@/components/ui/rail';

export type PlanTool =
  | 'select'
  | 'room'
  | 'wall'
  | 'door'
  | 'window'
  | 'touch-point'
  | 'watch-point'
  | 'tape';

/** What the hand can do on the floor plan; `editing` ones are for who may change it. */
export const planTools: readonly (RailTool<PlanTool> & { editing: boolean; hint: string })[] = [
  {
    value: 'select',
    label: 'Select',
    shortcut: 'V',
    icon: <MousePointer2 size={18} aria-hidden />,
    editing: false,
    hint: 'Click a thing to choose it, drag to move it. Alt while dragging: no snapping.',
  },
  {
    value: 'room',
    label: 'Room',
    shortcut: 'R',
    icon: <Square size={18} aria-hidden />,
    editing: true,
    hint: 'Drag a rectangle, or click corner by corner and end on the first one or with Enter. Shift keeps walls straight.',
  },
  {
    value: 'wall',
    label: 'Wall',
    shortcut: 'W',
    icon: <Tally1 size={18} aria-hidden />,
    editing: true,
    hint: 'Drag an inner wall from end to end. Shift keeps it straight.',
  },
  {
    value: 'door',
    label: 'Door',
    shortcut: 'D',
    icon: <DoorOpen size={18} aria-hidden />,
    editing: true,
    hint: 'Click a wall where the middle of the door is.',
  },
  {
    value: 'window',
    label: 'Window',
    shortcut: 'N',
    icon: <AppWindow size={18} aria-hidden />,
    editing: true,
    hint: 'Click a wall where the middle of the window is.',
  },
  {
    value: 'touch-point',
    label: 'Touch',
    shortcut: 'P',
    icon: <Hand size={18} aria-hidden />,
    editing: true,
    hint: 'Click where hands go: a light switch, a door handle. Near a wall the point faces into the room.',
  },
  {
    value: 'watch-point',
    label: 'Watch',
    shortcut: 'O',
    icon: <Eye size={18} aria-hidden />,
    editing: true,
    hint: 'Click where a person could stand: in the corridor, behind glass.',
  },
  {
    value: 'tape',
    label: 'Tape',
    shortcut: 'T',
    icon: <Ruler size={18} aria-hidden />,
    editing: false,
    hint: 'Drag to measure.',
  },
];
