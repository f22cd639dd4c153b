'use client';

import { Segmented } from '@/components/ui/segmented';
import type { SurfaceChoice } from '@/workers/protocol';

const FLOOR = 0;
const planes = [
  { value: 'floor', label: 'Floor', z: FLOOR },
  { value: '0.75', label: '0.75 m plane', z: 0.75 },
  { value: '0.9', label: '0.90 m', z: 0.9 },
  { value: '1.2', label: '1.20 m', z: 1.2 },
] as const;

export const surfaceName = (choice: SurfaceChoice): string =>
  choice.kind === 'tops'
    ? 'tops and floor'
    : choice.kind === 'sides'
      ? 'all upright faces'
      : choice.z === FLOOR
        ? 'the floor'
        : `${choice.z.toFixed(2)} m plane`;

const OWN = 'own';

/** What the dose map is shown on: the floor, a plane at a height, the top of whatever stands there, or upright faces. */
export function SurfacePicker({
  value,
  onChange,
}: {
  value: SurfaceChoice;
  onChange: (choice: SurfaceChoice) => void;
}) {
  const known = planes.find((plane) => value.kind === 'plane' && plane.z === value.z);
  const current = value.kind === 'plane' ? (known?.value ?? OWN) : value.kind;
  return (
    <div className="flex min-w-0 flex-wrap items-center gap-3">
      <span className="text-sm text-ink-2">Surface</span>
      <Segmented
        label="Surface"
        value={current}
        options={[...planes, { value: 'tops', label: 'Tops' }, { value: 'sides', label: 'Sides' }]}
        onChange={(chosen) => {
          if (chosen === 'tops' || chosen === 'sides') onChange({ kind: chosen });
          else onChange({ kind: 'plane', z: planes.find((plane) => plane.value === chosen)?.z ?? FLOOR });
        }}
      />
      <label className="flex items-center gap-1.5 text-sm text-ink-2">
        Height
        <input
          type="number"
          min={0}
          max={5}
          step={0.05}
          value={value.kind === 'plane' ? value.z : ''}
          placeholder="–"
          aria-label="Height of the plane in metres"
          className="mono h-8 w-20 rounded border border-ink-2/60 bg-field px-2 text-ink"
          onChange={(event) => {
            const z = event.target.valueAsNumber;
            if (Number.isFinite(z) && z >= 0 && z <= 5) onChange({ kind: 'plane', z });
          }}
        />
        m
      </label>
    </div>
  );
}
