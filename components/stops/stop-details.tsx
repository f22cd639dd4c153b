'use client';

import { Trash2 } from 'lucide-react';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/field';
import { NameField } from '@/components/ui/name-field';
import { NumberField } from '@/components/ui/number-field';
import type { Emitters, Stop, StopSet } from '@/lib/room';
import { DurationField } from './duration-field';

/** Exact values of the chosen stop. */
export function StopDetails({
  stop,
  set,
  emitters,
  editable,
  onRename,
  onMove,
  onTurn,
  onDwell,
  onEmitter,
  onRemove,
}: {
  stop: Stop;
  set: StopSet;
  emitters: Emitters;
  editable: boolean;
  onRename: (name: string) => void;
  onMove: (at: [number, number]) => void;
  onTurn: (heading: number) => void;
  onDwell: (seconds: number) => void;
  onEmitter: (key: string | null) => void;
  onRemove: () => void;
}) {
  return (
    <section
      aria-label={`Stop ${stop.name}`}
      className="mt-3 grid grid-cols-2 gap-3 rounded border border-rule bg-desk/60 p-3"
    >
      <NameField value={stop.name} disabled={!editable} onChange={onRename} />
      <DurationField label="Dwell" seconds={stop.dwell} onChange={onDwell} disabled={!editable} />
      <NumberField
        label="x"
        unit="m"
        value={stop.at[0]}
        disabled={!editable}
        onChange={(x) => onMove([x, stop.at[1]])}
      />
      <NumberField
        label="y"
        unit="m"
        value={stop.at[1]}
        disabled={!editable}
        onChange={(y) => onMove([stop.at[0], y])}
      />
      <NumberField
        label="Heading"
        unit="°"
        digits={1}
        min={-360}
        max={720}
        value={stop.heading}
        disabled={!editable}
        onChange={onTurn}
      />
      <SelectField
        label="Emitter"
        value={stop.emitter ?? ''}
        disabled={!editable}
        onChange={(event) => onEmitter(event.target.value || null)}
      >
        <option value="">As the set: {emitters[set.emitter]?.name ?? set.emitter}</option>
        {Object.entries(emitters).map(([key, emitter]) => (
          <option key={key} value={key}>
            {emitter.name}
          </option>
        ))}
      </SelectField>
      {editable ? (
        <div className="col-span-2">
          <Button variant="danger" size="small" icon={<Trash2 size={15} aria-hidden />} onClick={onRemove}>
            Delete stop {stop.name}
          </Button>
        </div>
      ) : null}
    </section>
  );
}
