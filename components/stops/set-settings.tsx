'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { SelectField, TextField } from '@/components/ui/field';
import { type Emitters, type StopSet, stopSetSchema } from '@/lib/room';
import { fromMillijoulesPerCm2, toMillijoulesPerCm2 } from '@/lib/units';

type Draft = Record<'name' | 'targetName' | 'dose' | 'source' | 'margin' | 'emitter', string>;

const toDraft = (set: StopSet): Draft => ({
  name: set.name,
  targetName: set.target.name,
  dose: String(toMillijoulesPerCm2(set.target.dose)),
  source: set.target.source,
  margin: String(set.margin),
  emitter: set.emitter,
});

/** What the draft says as a stop set, unchecked: the schema is the judge. */
const toCandidate = (set: StopSet, draft: Draft) => ({
  ...set,
  name: draft.name,
  emitter: draft.emitter,
  margin: Number(draft.margin.replace(',', '.')),
  target: {
    name: draft.targetName,
    dose: fromMillijoulesPerCm2(Number(draft.dose.replace(',', '.'))),
    source: draft.source,
  },
});

/** Name, dose target, margin and default emitter of a stop set. */
export function SetSettings({
  set,
  emitters,
  open,
  onOpenChange,
  onSave,
}: {
  set: StopSet;
  emitters: Emitters;
  open: boolean;
  onOpenChange: (open: boolean) => void;
  onSave: (set: StopSet) => void;
}) {
  const [draft, setDraft] = useState(() => toDraft(set));
  const [errors, setErrors] = useState<Record<string, string>>({});
  const edit = (key: keyof Draft) => ({
    value: draft[key],
    onChange: (event: { target: { value: string } }) => setDraft({ ...draft, [key]: event.target.value }),
  });
  const required = Number(draft.dose.replace(',', '.')) * Number(draft.margin.replace(',', '.'));
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title="Stop set">
      <form
        className="grid grid-cols-2 gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          const parsed = stopSetSchema.safeParse(toCandidate(set, draft));
          if (parsed.success) {
            onSave(parsed.data);
            onOpenChange(false);
          } else {
            setErrors(
              Object.fromEntries(parsed.error.issues.map((issue) => [issue.path.join('.'), issue.message])),
            );
          }
        }}
      >
        <TextField label="Name" className="col-span-2" {...edit('name')} error={errors.name} />
        <TextField
          label="Dose target"
          className="col-span-2"
          hint="What it is for, such as: 3-log, surface"
          {...edit('targetName')}
          error={errors['target.name']}
        />
        <TextField
          label="Dose"
          unit="mJ/cm²"
          inputMode="decimal"
          {...edit('dose')}
          error={errors['target.dose']}
        />
        <TextField label="Margin" unit="×" inputMode="decimal" {...edit('margin')} error={errors.margin} />
        <TextField
          label="Source with year"
          className="col-span-2"
          hint={draft.source.trim() ? undefined : 'Without a source the target is shown as unsourced'}
          {...edit('source')}
          error={errors['target.source']}
        />
        <SelectField
          label="Emitter of the set"
          className="col-span-2"
          {...edit('emitter')}
          error={errors.emitter}
        >
          {Object.entries(emitters).map(([key, emitter]) => (
            <option key={key} value={key}>
              {emitter.name}
            </option>
          ))}
        </SelectField>
        <p className="col-span-2">
          Every spot must get{' '}
          <strong>{Number.isFinite(required) ? `${Number(required.toPrecision(4))} mJ/cm²` : '–'}</strong>{' '}
          (dose × margin).
        </p>
        <div className="col-span-2 flex justify-end gap-2">
          <Button onClick={() => onOpenChange(false)}>Cancel</Button>
          <Button variant="primary" type="submit">
            Use these
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
