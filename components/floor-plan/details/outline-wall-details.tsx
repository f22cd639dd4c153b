'use client';

import { Button } from '@/components/ui/button';
import { NameField } from '@/components/ui/name-field';
import { NumberField } from '@/components/ui/number-field';
import { addCorner, changeSide, removeCorner, setSideLength } from '@/lib/editor/outline-actions';
import type { PlanRef } from '@/lib/room/plan-ref';
import { outlineWallId, wallRuns } from '@/lib/room/wall-geometry';
import type { DetailsProps } from './details-props';

export function OutlineWallDetails({
  document,
  edge,
  editable,
  onAct,
  onSelect,
}: DetailsProps & { edge: number; onSelect: (ref: PlanRef | null) => void }) {
  const run = wallRuns(document.floorPlan).find(({ id }) => id === outlineWallId(edge));
  const wall = document.floorPlan.outlineWalls[edge];
  if (!run || !wall) return null;
  return (
    <>
      <NameField
        className="col-span-2"
        value={wall.name}
        disabled={!editable}
        onChange={(name) => onAct((value) => changeSide(value, edge, { name }))}
      />
      <NumberField
        label="Length"
        unit="m"
        value={run.length}
        min={0.05}
        max={200}
        disabled={!editable}
        onChange={(length) => onAct((value) => setSideLength(value, edge, length))}
      />
      <NumberField
        label="Thickness"
        unit="m"
        value={wall.thickness}
        min={0}
        max={2}
        disabled={!editable}
        onChange={(thickness) => onAct((value) => changeSide(value, edge, { thickness }))}
      />
      {editable ? (
        <div className="col-span-2 flex flex-wrap gap-2">
          <Button size="small" onClick={() => onAct((value) => addCorner(value, edge, run.length / 2))}>
            Add a corner in the middle
          </Button>
          <Button
            size="small"
            onClick={() => {
              if (onAct((value) => removeCorner(value, edge))) onSelect(null);
            }}
          >
            Take out its first corner
          </Button>
        </div>
      ) : null}
    </>
  );
}
