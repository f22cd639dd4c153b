'use client';

import { NameField } from '@/components/ui/name-field';
import { NumberField } from '@/components/ui/number-field';
import {
  changeTouchPoint,
  changeWatchPoint,
  moveTouchPoint,
  turnTouchPoint,
} from '@/lib/editor/spot-actions';
import type { WatchPoint } from '@/lib/room';
import type { PlacedTouchPoint } from '@/lib/room/touch-points';
import type { DetailsProps } from './details-props';

export function TouchPointDetails({
  spot: { point, at, facing, pieceName },
  document,
  editable,
  onAct,
}: DetailsProps & { spot: PlacedTouchPoint }) {
  const disabled = !editable;
  const { id } = point;
  return (
    <>
      <NameField
        className="col-span-2"
        label={pieceName ? `Touch point of ${pieceName}` : 'Touch point'}
        value={point.name}
        disabled={disabled}
        onChange={(name) => onAct((value) => changeTouchPoint(value, id, { name }))}
      />
      <NumberField
        label="x"
        unit="m"
        value={at[0]}
        disabled={disabled}
        onChange={(x) => onAct((value) => moveTouchPoint(value, id, [x, at[1]]))}
      />
      <NumberField
        label="y"
        unit="m"
        value={at[1]}
        disabled={disabled}
        onChange={(y) => onAct((value) => moveTouchPoint(value, id, [at[0], y]))}
      />
      <NumberField
        label="Height"
        unit="m"
        value={point.height}
        min={0}
        max={document.ceiling}
        disabled={disabled}
        onChange={(height) => onAct((value) => changeTouchPoint(value, id, { height }))}
      />
      <NumberField
        label="Faces"
        unit="°"
        digits={1}
        value={facing}
        min={-360}
        max={720}
        hint="0 right, 90 down the sheet"
        disabled={disabled}
        onChange={(degrees) => onAct((value) => turnTouchPoint(value, id, degrees))}
      />
      <NumberField
        label="Tilt"
        unit="°"
        digits={1}
        value={point.tilt}
        min={-90}
        max={90}
        hint="0 level, 90 looks up"
        disabled={disabled}
        onChange={(tilt) => onAct((value) => changeTouchPoint(value, id, { tilt }))}
      />
    </>
  );
}

export function WatchPointDetails({ point, editable, onAct }: DetailsProps & { point: WatchPoint }) {
  const disabled = !editable;
  const change = (part: Partial<Omit<WatchPoint, 'id'>>) =>
    onAct((value) => changeWatchPoint(value, point.id, part));
  return (
    <>
      <NameField
        className="col-span-2"
        label="Watch point"
        value={point.name}
        disabled={disabled}
        onChange={(name) => change({ name })}
      />
      <NumberField
        label="x"
        unit="m"
        value={point.at[0]}
        disabled={disabled}
        onChange={(x) => change({ at: [x, point.at[1]] })}
      />
      <NumberField
        label="y"
        unit="m"
        value={point.at[1]}
        disabled={disabled}
        onChange={(y) => change({ at: [point.at[0], y] })}
      />
      <NumberField
        label="Eye height"
        unit="m"
        value={point.height}
        min={0}
        max={5}
        disabled={disabled}
        onChange={(height) => change({ height })}
      />
    </>
  );
}
