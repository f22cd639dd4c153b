'use client';

import { useState } from 'react';
import type { PlanPoint } from '@/lib/room';

/** A path that is being drawn point by point. */
export interface PathDraft {
  readonly points: readonly PlanPoint[];
  /** The points and where the hand is; `null` when nothing is being drawn. */
  readonly shown: readonly PlanPoint[] | null;
  readonly add: (at: PlanPoint) => void;
  readonly follow: (at: PlanPoint) => void;
  /** Ends the path. True when there was one. */
  readonly finish: () => boolean;
  readonly takeBack: () => boolean;
  readonly cancel: () => void;
}

const same = (one: PlanPoint, two: PlanPoint) => one[0] === two[0] && one[1] === two[1];

export function usePathDraft(onPath: (path: readonly PlanPoint[]) => void): PathDraft {
  const [points, setPoints] = useState<readonly PlanPoint[]>([]);
  const [hand, setHand] = useState<PlanPoint | null>(null);
  const cancel = () => {
    setPoints([]);
    setHand(null);
  };
  return {
    points,
    shown: points.length > 0 ? [...points, hand ?? points[points.length - 1]] : null,
    // The second press of a double click adds nothing.
    add: (at) =>
      setPoints((held) => (held.length > 0 && same(held[held.length - 1], at) ? held : [...held, at])),
    follow: (at) => {
      if (points.length > 0) setHand(at);
    },
    finish: () => {
      if (points.length === 0) return false;
      cancel();
      if (points.length > 1) onPath(points);
      return true;
    },
    takeBack: () => {
      if (points.length === 0) return false;
      setPoints(points.slice(0, -1));
      return true;
    },
    cancel,
  };
}
