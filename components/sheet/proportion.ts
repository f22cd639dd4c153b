import type { CSSProperties } from 'react';
import { boundsOf } from '@/lib/drawing/viewport';
import type { PlanPoint } from '@/lib/room';

/** Height ÷ width of what is drawn, for `.sheet-frame`: on a phone the sheet is as tall as its room needs. */
export function sheetProportion(points: readonly PlanPoint[]): CSSProperties {
  if (points.length < 2) return {};
  const { minX, minY, maxX, maxY } = boundsOf(points);
  return { '--sheet-proportion': (maxY - minY) / Math.max(maxX - minX, 0.1) } as CSSProperties;
}
