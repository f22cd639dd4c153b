import type { Vector3 } from '@/lib/engine/types';
import { doseStepOf, doseSteps } from './dose-scale';

/** What the drawing needs of an upright strip. */
export interface DrawnStrip {
  readonly a: readonly [number, number];
  readonly b: readonly [number, number];
  readonly normal: Vector3;
  readonly columns: number;
  readonly rows: number;
  readonly mask: Uint8Array;
}

/**
 * Upright faces seen from above: each column of a strip is a stretch of its edge, in the step of its least ratio from
 * floor to top. For every dose step its stretches as flat x1,y1,x2,y2 in plan metres, drawn `inset` in front of the face.
 */
export function sideEdges(
  strips: readonly DrawnStrip[],
  starts: readonly number[],
  ratio: Float32Array,
  inset: number,
): number[][] {
  const segments: number[][] = doseSteps.map(() => []);
  strips.forEach((strip, k) => {
    const { a, b, normal, columns } = strip;
    const at = (share: number) => [
      a[0] + (b[0] - a[0]) * share + normal[0] * inset,
      a[1] + (b[1] - a[1]) * share + normal[1] * inset,
    ];
    let from = 0;
    let step = -1;
    for (let i = 0; i <= columns; i++) {
      const least = i < columns ? leastOf(strip, ratio, starts[k], i) : null;
      const next = least === null ? -1 : doseSteps.indexOf(doseStepOf(least));
      if (next === step) continue;
      if (step >= 0) segments[step].push(...at(from / columns), ...at(i / columns));
      from = i;
      step = next;
    }
  });
  return segments;
}

/** The least ratio of a column's cells that count; `null` when none does. */
function leastOf(
  { columns, rows, mask }: DrawnStrip,
  ratio: Float32Array,
  start: number,
  column: number,
): number | null {
  let least: number | null = null;
  for (let j = 0; j < rows; j++) {
    const cell = j * columns + column;
    if (mask[cell] === 1 && (least === null || ratio[start + cell] < least)) least = ratio[start + cell];
  }
  return least;
}
