'use client';

import type Konva from 'konva';
import { type RefObject, useCallback, useEffect, useRef, useState } from 'react';
import type { Bounds, Size, Viewport } from '@/lib/drawing/viewport';
import { fitTo, panBy, zoomAt } from '@/lib/drawing/viewport';
import type { PlanPoint } from '@/lib/room';
import { RULER_PX } from './rulers';

const WALL_PX = 26;
const margin = {
  top: RULER_PX + WALL_PX,
  right: WALL_PX + 12,
  bottom: WALL_PX + 46,
  left: RULER_PX + WALL_PX,
};
const narrowMargin = { top: RULER_PX + 14, right: 14, bottom: 16, left: RULER_PX + 14 };

/** Size of an element in pixels, kept up to date. */
export function useElementSize(element: RefObject<HTMLElement | null>): Size {
  const [size, setSize] = useState<Size>({ width: 0, height: 0 });
  useEffect(() => {
    if (!element.current) return;
    const observer = new ResizeObserver(([entry]) => {
      const { width, height } = entry.contentRect;
      setSize({ width: Math.floor(width), height: Math.floor(height) });
    });
    observer.observe(element.current);
    return () => observer.disconnect();
  }, [element]);
  return size;
}

export interface ViewportControl {
  readonly viewport: Viewport;
  readonly zoomBy: (factor: number, at?: PlanPoint) => void;
  readonly pan: (dx: number, dy: number) => void;
  readonly fitAll: () => void;
  readonly onWheel: (event: Konva.KonvaEventObject<WheelEvent>) => void;
}

/** Zoom and pan of one sheet. It fits the whole room until the hand has moved it. */
export function useViewport(bounds: Bounds, size: Size): ViewportControl {
  const [own, setOwn] = useState<Viewport | null>(null);
  const fitted = fitTo(bounds, size, size.width < 600 ? narrowMargin : margin);
  const viewport = own ?? fitted;
  const now = useRef(viewport);
  now.current = viewport;
  const middle = useRef<PlanPoint>([0, 0]);
  middle.current = [size.width / 2, size.height / 2];

  const zoomBy = useCallback((factor: number, at?: PlanPoint) => {
    now.current = zoomAt(now.current, at ?? middle.current, factor);
    setOwn(now.current);
  }, []);
  const pan = useCallback((dx: number, dy: number) => {
    now.current = panBy(now.current, dx, dy);
    setOwn(now.current);
  }, []);
  const fitAll = useCallback(() => setOwn(null), []);

  const onWheel = useCallback(
    (event: Konva.KonvaEventObject<WheelEvent>) => {
      event.evt.preventDefault();
      const at = event.target.getStage()?.getPointerPosition();
      // A trackpad's two-finger slide pans; its pinch and a mouse wheel zoom.
      const slide = Math.abs(event.evt.deltaX) > 0 && !event.evt.ctrlKey;
      if (slide || event.evt.shiftKey) pan(-event.evt.deltaX, -event.evt.deltaY);
      else
        zoomBy(
          Math.exp(-event.evt.deltaY * (event.evt.ctrlKey ? 0.01 : 0.0016)),
          at ? [at.x, at.y] : undefined,
        );
    },
    [pan, zoomBy],
  );

  return { viewport, zoomBy, pan, fitAll, onWheel };
}
