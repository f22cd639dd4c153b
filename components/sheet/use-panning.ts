'use client';

import type Konva from 'konva';
import { useEffect, useRef, useState } from 'react';
import type { ViewportControl } from './use-viewport';

type Pointing = Konva.KonvaEventObject<PointerEvent>;

/** Is the person typing? Then keys are theirs. */
export const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  target.closest('input, textarea, select, [contenteditable], [role="dialog"]') !== null;

/**
 * Panning by space-drag, middle-drag and two fingers, zooming by pinch. `busy()` says whether the pointers
 * belong to the sheet now: then nothing else may act on them.
 */
export function usePanning({ pan, zoomBy, fitAll }: ViewportControl) {
  const [spaceHeld, setSpaceHeld] = useState(false);
  const [moving, setMoving] = useState(false);
  const pointers = useRef(new Map<number, { x: number; y: number }>());
  const dragging = useRef<number | null>(null);

  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (isTyping(event.target)) return;
      if (event.code === 'Space') {
        // A focused button would take the space for a click.
        if (event.target instanceof HTMLButtonElement) return;
        event.preventDefault();
        setSpaceHeld(event.type === 'keydown');
      }
      if (event.type !== 'keydown' || event.ctrlKey || event.metaKey) return;
      if (event.key === '+' || event.key === '=') zoomBy(1.25);
      else if (event.key === '-') zoomBy(0.8);
      else if (event.key === '0') fitAll();
    };
    window.addEventListener('keydown', onKey);
    window.addEventListener('keyup', onKey);
    return () => {
      window.removeEventListener('keydown', onKey);
      window.removeEventListener('keyup', onKey);
    };
  }, [zoomBy, fitAll]);

  const place = ({ evt }: Pointing) => ({ x: evt.clientX, y: evt.clientY });

  /** From now on this pointer moves the sheet. */
  const take = ({ evt }: Pointing): void => {
    dragging.current = evt.pointerId;
    setMoving(true);
  };

  /** True when this is a second finger: what the first had begun is over. */
  const down = (event: Pointing): boolean => {
    pointers.current.set(event.evt.pointerId, place(event));
    if (spaceHeld || event.evt.button === 1) take(event);
    return pointers.current.size > 1;
  };

  /** True when the move was a pan or a pinch. */
  const move = (event: Pointing): boolean => {
    const before = pointers.current.get(event.evt.pointerId);
    if (!before) return false;
    const after = place(event);
    pointers.current.set(event.evt.pointerId, after);
    if (pointers.current.size === 2) {
      const [other] = [...pointers.current].filter(([id]) => id !== event.evt.pointerId).map(([, at]) => at);
      const was = Math.hypot(before.x - other.x, before.y - other.y);
      const is = Math.hypot(after.x - other.x, after.y - other.y);
      const box = event.target.getStage()?.container().getBoundingClientRect();
      const middle = {
        x: (after.x + other.x) / 2 - (box?.x ?? 0),
        y: (after.y + other.y) / 2 - (box?.y ?? 0),
      };
      if (was > 0) zoomBy(is / was, [middle.x, middle.y]);
      pan((after.x - before.x) / 2, (after.y - before.y) / 2);
      return true;
    }
    if (dragging.current !== event.evt.pointerId) return false;
    pan(after.x - before.x, after.y - before.y);
    return true;
  };

  const up = (event: Pointing): void => {
    pointers.current.delete(event.evt.pointerId);
    if (dragging.current !== event.evt.pointerId) return;
    dragging.current = null;
    setMoving(false);
  };

  const busy = () => dragging.current !== null || pointers.current.size > 1;

  return { down, take, move, up, busy, spaceHeld, moving };
}
