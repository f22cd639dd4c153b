'use client';

import type { DosePicture } from '@/components/hooks/dose-session';
import { formatRatio } from '@/lib/drawing/dose-scale';
import type { GridSurface } from '@/lib/engine';
import type { PlanPoint } from '@/lib/room';
import { toMillijoulesPerCm2 } from '@/lib/units';

/** The cell under a plan point, or -1 where the surface does not count there. */
function cellAt(grid: GridSurface, [x, y]: PlanPoint): number {
  const i = Math.floor((x - grid.originX) / grid.step);
  const j = Math.floor((y - grid.originY) / grid.step);
  if (i < 0 || j < 0 || i >= grid.columns || j >= grid.rows) return -1;
  const cell = j * grid.columns + i;
  return grid.mask[cell] === 1 ? cell : -1;
}

/** Dose, ratio and the share of each stop and pass at the spot under the pointer, kept off the drawing. */
export function ReadOut({ picture, at }: { picture: DosePicture | null; at: PlanPoint | null }) {
  if (picture?.surface.kind === 'sides')
    return (
      <p className="text-sm text-ink-2">
        Edges show the worst spot from floor to top. Click a face, or a gap in the ledger, to unroll it.
      </p>
    );
  const grid = picture?.surface.grid;
  const cell = grid && at ? cellAt(grid, at) : -1;
  if (!picture || !grid || !at || cell < 0)
    return <p className="text-sm text-ink-2">Point at the sheet to read the dose of a spot.</p>;
  const { dose, ratio, shares } = picture;
  const height = typeof grid.z === 'number' ? grid.z : grid.z[cell];
  const parts = shares
    .map(({ lamp, map }) => ({ lamp, share: (map[cell] * lamp.weight) / (dose[cell] || 1) }))
    .filter(({ share }) => share >= 0.005)
    .sort((one, two) => two.share - one.share);
  return (
    <div className="flex flex-wrap items-baseline gap-x-4 gap-y-0.5 text-sm" data-testid="read-out">
      <span className="mono">
        {at[0].toFixed(2)}, {at[1].toFixed(2)} · {height.toFixed(2)} m high
      </span>
      <span className="font-semibold">
        {toMillijoulesPerCm2(dose[cell]).toPrecision(3)} mJ/cm² · {formatRatio(ratio[cell])}
      </span>
      <span className="text-ink-2">
        {parts.length === 0
          ? 'No stop and no pass reaches this spot'
          : parts
              .slice(0, 4)
              .map(({ lamp, share }) => `${lamp.kind} ${lamp.name} ${Math.round(share * 100)}%`)
              .join(' · ')}
      </span>
    </div>
  );
}
