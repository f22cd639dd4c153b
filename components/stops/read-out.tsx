'use client';

import type { DosePicture } from '@/components/hooks/dose-session';
import { formatRatio } from '@/lib/drawing/dose-scale';
import type { PlanPoint, StopSet } from '@/lib/room';
import { toMillijoulesPerCm2 } from '@/lib/units';

/** The cell under a plan point, or -1 where the surface does not count there. */
export function cellAt({ surface }: DosePicture, [x, y]: PlanPoint): number {
  const i = Math.floor((x - surface.originX) / surface.step);
  const j = Math.floor((y - surface.originY) / surface.step);
  if (i < 0 || j < 0 || i >= surface.columns || j >= surface.rows) return -1;
  const cell = j * surface.columns + i;
  return surface.mask[cell] === 1 ? cell : -1;
}

/** Dose, ratio and each stop's share at the spot under the pointer, kept off the drawing. */
export function ReadOut({
  picture,
  set,
  at,
}: {
  picture: DosePicture | null;
  set: StopSet;
  at: PlanPoint | null;
}) {
  const cell = picture && at ? cellAt(picture, at) : -1;
  if (!picture || !at || cell < 0)
    return <p className="text-sm text-ink-2">Point at the sheet to read the dose of a spot.</p>;
  const { surface, dose, ratio, maps } = picture;
  const height = typeof surface.z === 'number' ? surface.z : surface.z[cell];
  const shares = set.stops
    .map((stop) => ({
      name: stop.name,
      share: ((maps.get(stop.id)?.[cell] ?? 0) * stop.dwell) / (dose[cell] || 1),
    }))
    .filter((stop) => stop.share >= 0.005)
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
        {shares.length === 0
          ? 'No stop reaches this spot'
          : shares
              .slice(0, 4)
              .map(({ name, share }) => `stop ${name} ${Math.round(share * 100)}%`)
              .join(' · ')}
      </span>
    </div>
  );
}
