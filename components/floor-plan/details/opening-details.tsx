'use client';

import { CheckField, SelectField } from '@/components/ui/field';
import { NumberField } from '@/components/ui/number-field';
import { changeOpening } from '@/lib/editor/opening-actions';
import type { Opening } from '@/lib/room';
import { wallRuns } from '@/lib/room/wall-geometry';
import type { DetailsProps } from './details-props';

export function OpeningDetails({ document, opening, editable, onAct }: DetailsProps & { opening: Opening }) {
  const disabled = !editable;
  const change = (part: Partial<Omit<Opening, 'id'>>) =>
    onAct((value) => changeOpening(value, opening.id, part));
  return (
    <>
      <SelectField
        label="Kind"
        value={opening.kind}
        disabled={disabled}
        onChange={(event) => change({ kind: event.target.value === 'window' ? 'window' : 'door' })}
      >
        <option value="door">Door</option>
        <option value="window">Window</option>
      </SelectField>
      <SelectField
        label="In the"
        value={opening.wall}
        disabled={disabled}
        onChange={(event) => change({ wall: event.target.value })}
      >
        {wallRuns(document.floorPlan).map((run) => (
          <option key={run.id} value={run.id}>
            {run.name}
          </option>
        ))}
      </SelectField>
      <NumberField
        label="From the wall's first corner"
        unit="m"
        value={opening.from}
        min={0}
        disabled={disabled}
        onChange={(from) => change({ from, to: from + opening.to - opening.from })}
      />
      <NumberField
        label="Width"
        unit="m"
        value={opening.to - opening.from}
        min={0.1}
        disabled={disabled}
        onChange={(width) => change({ to: opening.from + width })}
      />
      <NumberField
        label="Sill height"
        unit="m"
        value={opening.sill}
        min={0}
        disabled={disabled}
        onChange={(sill) => change({ sill })}
      />
      <NumberField
        label="Head height"
        unit="m"
        value={opening.head}
        min={0.1}
        max={document.ceiling}
        disabled={disabled}
        onChange={(head) => change({ head })}
      />
      <CheckField
        label={opening.kind === 'door' ? 'Stands open during the run' : 'Stands open (no pane in it)'}
        className="col-span-2"
        checked={opening.open}
        disabled={disabled}
        onChange={(open) => change({ open })}
      />
      {opening.kind === 'window' && !opening.open ? (
        <NumberField
          label="Pane lets through at 254 nm"
          unit="%"
          digits={1}
          value={opening.transmittance * 100}
          min={0}
          max={100}
          hint="Ordinary glass: 0. Only the maker's figure counts."
          disabled={disabled}
          onChange={(percent) => change({ transmittance: percent / 100 })}
        />
      ) : null}
    </>
  );
}
