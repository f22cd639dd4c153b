'use client';

import { NameField } from '@/components/ui/name-field';
import { NumberField } from '@/components/ui/number-field';
import { changeInnerWall, placeInnerWall, setInnerWallLength } from '@/lib/editor/inner-wall-actions';
import type { InnerWall } from '@/lib/room';
import type { DetailsProps } from './details-props';

export function InnerWallDetails({ wall, editable, onAct }: DetailsProps & { wall: InnerWall }) {
  const disabled = !editable;
  return (
    <>
      <NameField
        className="col-span-2"
        value={wall.name}
        disabled={disabled}
        onChange={(name) => onAct((value) => changeInnerWall(value, wall.id, { name }))}
      />
      <NumberField
        label="Length"
        unit="m"
        value={Math.hypot(wall.b[0] - wall.a[0], wall.b[1] - wall.a[1])}
        min={0.05}
        max={200}
        disabled={disabled}
        onChange={(length) => onAct((value) => setInnerWallLength(value, wall.id, length))}
      />
      <NumberField
        label="Thickness"
        unit="m"
        value={wall.thickness}
        min={0.01}
        max={2}
        disabled={disabled}
        onChange={(thickness) => onAct((value) => changeInnerWall(value, wall.id, { thickness }))}
      />
      {(['a', 'b'] as const).map((end) =>
        (['x', 'y'] as const).map((axis, i) => (
          <NumberField
            key={`${end}${axis}`}
            label={`${end === 'a' ? 'First' : 'Last'} end ${axis}`}
            unit="m"
            value={wall[end][i]}
            disabled={disabled}
            onChange={(metres) =>
              onAct((value) =>
                placeInnerWall(value, wall.id, {
                  [end]: axis === 'x' ? [metres, wall[end][1]] : [wall[end][0], metres],
                }),
              )
            }
          />
        )),
      )}
    </>
  );
}
