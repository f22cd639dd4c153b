'use client';

import { useEffect, useRef } from 'react';
import { isTyping } from '@/components/sheet/use-panning';
import type { Editing } from './edit-store';

/** Undo, redo and the page's own keys, while nobody is typing. A key's act says true when it took it. */
export function useEditKeys(
  { undo, redo }: Pick<Editing<unknown>, 'undo' | 'redo'>,
  act: (event: KeyboardEvent) => boolean,
): void {
  const latest = useRef(act);
  useEffect(() => {
    latest.current = act;
  });
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (isTyping(event.target) || event.defaultPrevented) return;
      const key = event.key.toLowerCase();
      if (event.ctrlKey || event.metaKey) {
        if (key === 'z' && !event.shiftKey) undo();
        else if (key === 'y' || (key === 'z' && event.shiftKey)) redo();
        else if (!latest.current(event)) return;
      } else if (!latest.current(event)) return;
      event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [undo, redo]);
}
