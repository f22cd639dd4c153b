import type { PlanPoint } from '@/lib/room/schema/primitives';

/** Which part of the plan the sheet shows: screen = plan · scale + offset, in pixels. */
export interface Viewport {
  /** Pixels per metre. */
  readonly scale: number;
  readonly x: number;
  readonly y: number;
}

export interface Size {
  readonly width: number;
  readonly height: number;
}

export interface Bounds {
  readonly minX: number;
  readonly minY: number;
  readonly maxX: number;
  readonly maxY: number;
}

const LEAST_SCALE = 4;
const MOST_SCALE = 2000;

export function boundsOf(points: readonly PlanPoint[]): Bounds {
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  return { minX: Math.min(...xs), minY: Math.min(...ys), maxX: Math.max(...xs), maxY: Math.max(...ys) };
}

/** The whole of `bounds` in the middle of the sheet, with `margin` pixels left free on each side. */
export function fitTo(
  bounds: Bounds,
  size: Size,
  margin: { top: number; right: number; bottom: number; left: number },
): Viewport {
  const width = Math.max(bounds.maxX - bounds.minX, 0.5);
  const height = Math.max(bounds.maxY - bounds.minY, 0.5);
  const free = {
    width: Math.max(size.width - margin.left - margin.right, 40),
    height: Math.max(size.height - margin.top - margin.bottom, 40),
  };
  const scale = clampScale(Math.min(free.width / width, free.height / height));
  return {
    scale,
    x: margin.left + (free.width - width * scale) / 2 - bounds.minX * scale,
    y: margin.top + (free.height - height * scale) / 2 - bounds.minY * scale,
  };
}

const clampScale = (scale: number): number => Math.max(LEAST_SCALE, Math.min(MOST_SCALE, scale));

/** Zooms by `factor` and keeps the plan point under the screen point where it is. */
export function zoomAt(viewport: Viewport, [px, py]: PlanPoint, factor: number): Viewport {
  const scale = clampScale(viewport.scale * factor);
  const ratio = scale / viewport.scale;
  return { scale, x: px - (px - viewport.x) * ratio, y: py - (py - viewport.y) * ratio };
}

export const panBy = (viewport: Viewport, dx: number, dy: number): Viewport => ({
  ...viewport,
  x: viewport.x + dx,
  y: viewport.y + dy,
});

export const toPlan = ({ scale, x, y }: Viewport, [px, py]: PlanPoint): PlanPoint => [
  (px - x) / scale,
  (py - y) / scale,
];
export const toScreen = ({ scale, x, y }: Viewport, [mx, my]: PlanPoint): PlanPoint => [
  mx * scale + x,
  my * scale + y,
];

/** Step between labelled ruler marks so that they stand at least 60 px apart: 0.1, 0.2, 0.5, 1, 2, 5 … m. */
export function rulerStep(scale: number): number {
  const least = 60 / scale;
  const power = 10 ** Math.floor(Math.log10(least));
  return [1, 2, 5, 10].map((factor) => factor * power).find((step) => step >= least - 1e-12) ?? 10 * power;
}
