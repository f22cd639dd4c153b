'use client';

import { useState } from 'react';
import type { SheetPointer } from '@/components/sheet/sheet-stage';
import { type Guide, type Snapped, snapPoint, straighten } from '@/lib/editor/snapping';
import type { FloorPlanDocument, PlanPoint } from '@/lib/room';
import { wallRuns } from '@/lib/room/wall-geometry';
import { snapOf } from './use-select-hand';

/** What is being drawn and not there yet. */
export interface Draft {
  readonly kind: 'rectangle' | 'corners' | 'wall';
  readonly points: readonly PlanPoint[];
  /** Where the hand is now. */
  readonly end: PlanPoint;
  readonly guides: readonly Guide[];
}

const CLOSE_PX = 14;
const DRAG_PX = 8;

const rectangle = ([ax, ay]: PlanPoint, [bx, by]: PlanPoint): PlanPoint[] => [
  [ax, ay],
  [bx, ay],
  [bx, by],
  [ax, by],
];

/** The hand that draws the room's outline (a dragged rectangle, or corner by corner) and inner walls. */
export function useDrawHand({
  document,
  tool,
  onOutline,
  onWall,
}: {
  document: FloorPlanDocument | null;
  tool: 'room' | 'wall' | null;
  onOutline: (corners: readonly PlanPoint[]) => void;
  onWall: (a: PlanPoint, b: PlanPoint) => void;
}) {
  const [draft, setDraft] = useState<Draft | null>(null);
  const [pressed, setPressed] = useState(false);

  /** Where a point goes now: with Shift in line with the last one, else by snapping. */
  const place = (pointer: SheetPointer, last: PlanPoint | null, corners: readonly PlanPoint[]): Snapped => {
    const aim = pointer.event.shiftKey && last ? straighten(last, pointer.at) : pointer.at;
    const walls = tool === 'wall' && document ? wallRuns(document.floorPlan) : [];
    return snapPoint(aim, corners, walls, snapOf(pointer));
  };
  const outline = tool === 'wall' ? (document?.floorPlan.outline ?? []) : [];
  const cancel = () => {
    setDraft(null);
    setPressed(false);
  };
  const finish = (corners: readonly PlanPoint[]) => {
    cancel();
    if (corners.length > 2) onOutline(corners);
  };

  return {
    draft,
    cancel,
    /** Ends an outline that is drawn corner by corner. True when there was one. */
    close: (): boolean => {
      if (draft?.kind !== 'corners') return false;
      finish(draft.points);
      return true;
    },
    /** Takes the last corner back. True when there was one. */
    takeBack: (): boolean => {
      if (draft?.kind !== 'corners') return false;
      if (draft.points.length === 1) cancel();
      else setDraft({ ...draft, points: draft.points.slice(0, -1) });
      return true;
    },
    down: (pointer: SheetPointer) => {
      setPressed(true);
      if (draft?.kind === 'corners') {
        const first = draft.points[0];
        const near =
          Math.hypot(first[0] - pointer.at[0], first[1] - pointer.at[1]) * pointer.scale < CLOSE_PX;
        if (near && draft.points.length > 2) {
          finish(draft.points);
          return;
        }
        const { at } = place(pointer, draft.points.at(-1) ?? null, draft.points);
        setDraft({ ...draft, points: [...draft.points, at], end: at, guides: [] });
        return;
      }
      const { at } = place(pointer, null, outline);
      setDraft({ kind: tool === 'wall' ? 'wall' : 'rectangle', points: [at], end: at, guides: [] });
    },
    move: (pointer: SheetPointer) => {
      if (!draft || (draft.kind !== 'corners' && !pressed)) return;
      const last = draft.points.at(-1) ?? null;
      const corners = draft.kind === 'corners' ? draft.points : outline;
      const { at, guides } = place(pointer, draft.kind === 'rectangle' ? null : last, corners);
      setDraft({ ...draft, end: at, guides });
    },
    up: (pointer: SheetPointer) => {
      setPressed(false);
      if (!draft || draft.kind === 'corners') return;
      const [from] = draft.points;
      const far = Math.hypot(draft.end[0] - from[0], draft.end[1] - from[1]) * pointer.scale > DRAG_PX;
      if (draft.kind === 'wall') {
        cancel();
        if (far) onWall(from, draft.end);
      } else if (far) finish(rectangle(from, draft.end));
      else setDraft({ ...draft, kind: 'corners' });
    },
  };
}
