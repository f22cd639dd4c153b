import { MousePointer2, Route, Ruler, Zap } from 'lucide-react';
import type { RailTool } from '@/components/ui/rail';

export type StopsTool = 'select' | 'stop' | 'pass' | 'tape';

/** What the hand can do on the stops page; `editing` ones are for who may change the set. */
export const tools: readonly (RailTool<StopsTool> & { editing: boolean })[] = [
  {
    value: 'select',
    label: 'Select',
    shortcut: 'V',
    icon: <MousePointer2 size={18} aria-hidden />,
    editing: false,
  },
  { value: 'stop', label: 'Stop', shortcut: 'S', icon: <Zap size={18} aria-hidden />, editing: true },
  { value: 'pass', label: 'Pass', shortcut: 'P', icon: <Route size={18} aria-hidden />, editing: true },
  { value: 'tape', label: 'Tape', shortcut: 'T', icon: <Ruler size={18} aria-hidden />, editing: false },
];
