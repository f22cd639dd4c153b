'use client';

import { Gauge, Trash2 } from 'lucide-react';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { CheckField, SelectField } from '@/components/ui/field';
import { NameField } from '@/components/ui/name-field';
import { NumberField } from '@/components/ui/number-field';
import { type Emitters, emitterOf, type Pass, type StopSet } from '@/lib/room';
import { SpeedTable } from './speed-table';

/** Exact values of the chosen pass. */
export function PassDetails({
  pass,
  set,
  emitters,
  editable,
  onChange,
  onRemove,
}: {
  pass: Pass;
  set: StopSet;
  emitters: Emitters;
  editable: boolean;
  onChange: (change: Partial<Omit<Pass, 'id'>>) => void;
  onRemove: () => void;
}) {
  const [speedsOpen, setSpeedsOpen] = useState(false);
  const emitter = emitterOf(set, pass, emitters);
  return (
    <section
      aria-label={`Pass ${pass.name}`}
      className="mt-3 grid grid-cols-2 gap-3 rounded border border-rule bg-desk/60 p-3"
    >
      <NameField value={pass.name} disabled={!editable} onChange={(name) => onChange({ name })} />
      <NumberField
        label="Speed"
        unit="m/s"
        digits={4}
        min={0.005}
        max={2}
        value={pass.speed}
        disabled={!editable}
        onChange={(speed) => onChange({ speed })}
      />
      <CheckField
        className="col-span-2"
        label="The emitter looks along the path"
        checked={pass.heading === null}
        disabled={!editable}
        onChange={(along) => onChange({ heading: along ? null : 0 })}
      />
      {pass.heading === null ? null : (
        <NumberField
          label="Heading"
          unit="°"
          digits={1}
          min={-360}
          max={720}
          value={pass.heading}
          disabled={!editable}
          onChange={(heading) => onChange({ heading })}
        />
      )}
      <SelectField
        label="Emitter"
        className={pass.heading === null ? 'col-span-2' : ''}
        value={pass.emitter ?? ''}
        disabled={!editable}
        onChange={(event) => onChange({ emitter: event.target.value || null })}
      >
        <option value="">As the set: {emitters[set.emitter]?.name ?? set.emitter}</option>
        {Object.entries(emitters).map(([key, one]) => (
          <option key={key} value={key}>
            {one.name}
          </option>
        ))}
      </SelectField>
      <div className="col-span-2 flex flex-wrap gap-2">
        <Button
          size="small"
          icon={<Gauge size={15} aria-hidden />}
          disabled={!emitter}
          onClick={() => setSpeedsOpen(true)}
        >
          Push speeds
        </Button>
        {editable ? (
          <Button variant="danger" size="small" icon={<Trash2 size={15} aria-hidden />} onClick={onRemove}>
            Delete pass {pass.name}
          </Button>
        ) : null}
      </div>
      {speedsOpen && emitter ? (
        <SpeedTable emitter={emitter} set={set} onClose={() => setSpeedsOpen(false)} />
      ) : null}
    </section>
  );
}
