import type { PlanPoint } from '@/lib/room';

const ways: Readonly<Record<string, PlanPoint>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
};

/** How far an arrow key moves what is chosen, metres: 5 cm, with Shift 1 cm; `null` for any other key. */
export function arrowStep({ key, shiftKey }: { key: string; shiftKey: boolean }): PlanPoint | null {
  const way = ways[key];
  const by = shiftKey ? 0.01 : 0.05;
  return way ? [way[0] * by, way[1] * by] : null;
}
