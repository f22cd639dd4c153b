'use client';

import { useRef, useState } from 'react';
import type { SheetPointer } from '@/components/sheet/sheet-stage';
import type { Gesture } from '@/lib/editor/gestures/gesture';
import { moveThing } from '@/lib/editor/gestures/move-thing';
import { pullHandle } from '@/lib/editor/gestures/pull-handle';
import { handleAt, handlesOf, thingAt, touchPointAt } from '@/lib/editor/hit-test';
import type { Outcome } from '@/lib/editor/outcome';
import type { Guide, SnapReach } from '@/lib/editor/snapping';
import type { FloorPlanDocument, PlanPoint } from '@/lib/room';
import { type PlanRef, sameRef } from '@/lib/room/plan-ref';

/** Pixels: how near the hand must be, and how far it must go before a press is a drag. */
export const REACH_PX = 10;
const FINGER_REACH_PX = 20;
const DRAG_PX = 4;

/** The pointer as the editor's snapping wants it. */
export const snapOf = ({ event, scale }: SheetPointer): SnapReach => ({
  reach: REACH_PX / scale,
  free: event.altKey,
});

const reachOf = ({ event, scale }: SheetPointer): number =>
  (event.pointerType === 'touch' ? FINGER_REACH_PX : REACH_PX) / scale;

/**
 * The hand that chooses and moves: a press chooses what is under it, a drag moves it or pulls its handle. An
 * outer wall moves only once it is chosen, so that a slip does not rebuild the room.
 */
export function useSelectHand({
  document,
  selected,
  editable,
  onSelect,
  onPull,
  onEnd,
}: {
  document: FloorPlanDocument;
  selected: PlanRef | null;
  editable: boolean;
  onSelect: (ref: PlanRef | null) => void;
  onPull: (outcome: Outcome, mark: string) => void;
  onEnd: () => void;
}) {
  const pressed = useRef<{
    at: PlanPoint;
    gesture: Gesture | null;
    dragging: boolean;
    /** What the press chooses if it turns out to be a click. */
    click: PlanRef | null;
  } | null>(null);
  const [guides, setGuides] = useState<readonly Guide[]>([]);
  const [active, setActive] = useState(false);

  const stop = () => {
    if (pressed.current?.dragging) onEnd();
    else if (pressed.current?.click) onSelect(pressed.current.click);
    pressed.current = null;
    setGuides([]);
    setActive(false);
  };

  return {
    guides,
    /** A drag is under way. */
    active,
    /** Answers 'pan' on bare paper. */
    // biome-ignore lint/suspicious/noConfusingVoidType: only bare paper has an answer.
    down: (pointer: SheetPointer): 'pan' | void => {
      const reach = reachOf(pointer);
      const handle =
        editable && selected
          ? handleAt(handlesOf(document, selected, 1 / pointer.scale), pointer.at, reach)
          : null;
      if (handle) {
        pressed.current = {
          at: pointer.at,
          gesture: pullHandle(document, handle),
          dragging: false,
          click: null,
        };
        return;
      }
      // A touch point that is chosen already is taken itself; a click on one of a chosen piece chooses it.
      const own = touchPointAt(document, pointer.at, reach, () => true);
      const ref = own && sameRef(own, selected) ? own : thingAt(document, pointer.at, reach);
      const again = ref !== null && sameRef(ref, selected);
      onSelect(ref);
      if (!ref) return 'pan';
      const mayMove = editable && (ref.kind !== 'outline-wall' || sameRef(ref, selected));
      pressed.current = {
        at: pointer.at,
        gesture: mayMove ? moveThing(document, ref, pointer.at) : null,
        dragging: false,
        click: again && ref.kind === 'furniture' ? own : null,
      };
    },
    move: (pointer: SheetPointer) => {
      const held = pressed.current;
      if (!held?.gesture) return;
      const far = Math.hypot(pointer.at[0] - held.at[0], pointer.at[1] - held.at[1]) * pointer.scale;
      if (!held.dragging && far < DRAG_PX) return;
      if (!held.dragging) setActive(true);
      held.dragging = true;
      const pulled = held.gesture.pull({ at: pointer.at, shift: pointer.event.shiftKey, ...snapOf(pointer) });
      onPull(pulled.outcome, held.gesture.mark);
      setGuides(pulled.guides);
    },
    up: stop,
    stop,
  };
}
