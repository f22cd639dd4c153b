'use client';

import { Copy, Download, Plus, Settings2 } from 'lucide-react';
import { type ReactNode, useMemo, useState } from 'react';
import type { DoseView } from '@/components/hooks/dose-session';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/field';
import { IconButton } from '@/components/ui/icon-button';
import { Notice } from '@/components/ui/notice';
import { stopSetCsvAddress } from '@/lib/client/stop-sets';
import { moveStop, renameStop, setStopEmitter, turnStop } from '@/lib/editor/stop-set-actions';
import { type StopSet, timesOf } from '@/lib/room';
import { stopProblems } from '@/lib/room/check-stops';
import type { SurfaceChoice } from '@/workers/protocol';
import { Caution, ModelLimits } from './caution';
import { GapList } from './gap-list';
import type { SetEditorProps } from './set-editor-props';
import { SetSettings } from './set-settings';
import { StopDetails } from './stop-details';
import { StopTable } from './stop-table';
import { surfaceName } from './surface-choice';
import { Verdict } from './verdict';

/** Every number of the stop set, beside the sheet. */
export function Ledger({
  document,
  emitters,
  sets,
  editable,
  mayWrite,
  set,
  dose,
  surface,
  selectedStopId,
  chosenGap,
  notice,
  onOpen,
  onAdd,
  onSelectStop,
  onChooseGap,
  onEdit,
  onNudge,
  onTurnBy,
  onDwell,
  onReorder,
  onRemove,
  onSaveNow,
}: SetEditorProps & {
  set: StopSet;
  dose: DoseView;
  surface: SurfaceChoice;
  selectedStopId: string | null;
  chosenGap: number | null;
  notice: ReactNode;
  onSelectStop: (id: string | null) => void;
  onChooseGap: (gap: number | null) => void;
  onEdit: (action: (set: StopSet) => StopSet, gesture?: string) => void;
  onNudge: (id: string, dx: number, dy: number) => void;
  onTurnBy: (id: string, by: number) => void;
  onDwell: (id: string, seconds: number) => void;
  onReorder: (id: string, by: number) => void;
  onRemove: (id: string) => void;
  onSaveNow: () => Promise<boolean>;
}) {
  const [settingsOpen, setSettingsOpen] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const plan = document.floorPlan;
  const times = useMemo(() => timesOf(set, emitters), [set, emitters]);
  const problems = useMemo(() => stopProblems(set, plan, emitters), [set, plan, emitters]);
  const stop = set.stops.find((it) => it.id === selectedStopId);
  const settled = dose.settledFor === set;

  /** What is on the desk is saved first: another set, a copy or a file must not leave the newest edit behind. */
  const saved = (work: () => Promise<unknown>) => async () => {
    setFailure(null);
    try {
      if (editable && !(await onSaveNow())) return;
      await work();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : String(error));
    }
  };

  return (
    <aside
      aria-label="Ledger"
      aria-busy={!settled}
      data-dose={settled ? 'settled' : 'pending'}
      className="flex w-[376px] shrink-0 flex-col gap-5 overflow-y-auto border-l bg-panel px-5 py-4 max-lg:w-full max-lg:border-t max-lg:border-l-0"
    >
      {notice}
      {failure ? (
        <Notice tone="danger" role="alert">
          {failure}
        </Notice>
      ) : null}
      <Verdict
        picture={dose.picture}
        times={times}
        stops={set.stops.length}
        surfaceName={surfaceName(surface)}
      />
      <div className="flex items-end gap-2">
        <SelectField
          label="Stop set"
          className="min-w-0 flex-1"
          value={set.id}
          onChange={(event) => {
            const id = event.target.value;
            void saved(() => onOpen(id))();
          }}
        >
          {sets.map((it) => (
            <option key={it.id} value={it.id}>
              {it.id === set.id ? set.name : it.name} · {it.status}
            </option>
          ))}
        </SelectField>
        {editable ? (
          <IconButton
            label="Name, target, margin, emitter"
            icon={<Settings2 size={17} aria-hidden />}
            onClick={() => setSettingsOpen(true)}
          />
        ) : null}
        {mayWrite ? (
          <>
            <IconButton
              label="Copy this stop set"
              icon={<Copy size={16} aria-hidden />}
              onClick={saved(() => onAdd(set))}
            />
            <IconButton
              label="New stop set"
              icon={<Plus size={18} aria-hidden />}
              onClick={saved(() => onAdd())}
            />
          </>
        ) : null}
      </div>

      <section aria-labelledby="stops-heading">
        <h2 id="stops-heading" className="label">
          Stops
        </h2>
        {set.stops.length === 0 ? (
          <p className="mt-2 text-ink-2">None yet.</p>
        ) : (
          <StopTable
            set={set}
            plan={plan}
            selectedId={selectedStopId}
            editable={editable}
            onSelect={onSelectStop}
            onReorder={onReorder}
            onNudge={onNudge}
            onTurn={onTurnBy}
            onRemove={onRemove}
          />
        )}
        {problems.length > 0 ? (
          <ul className="mt-2 flex flex-col gap-1 text-sm">
            {problems.map((problem) => (
              <li
                key={problem.stopId}
                className={problem.kind === 'wrong' ? 'font-medium text-danger' : 'text-ink-2'}
              >
                {problem.kind === 'wrong' ? '▲ ' : ''}
                {problem.message}.
              </li>
            ))}
          </ul>
        ) : null}
        {stop ? (
          <StopDetails
            key={stop.id}
            stop={stop}
            set={set}
            emitters={emitters}
            editable={editable}
            onRename={(name) => onEdit((value) => renameStop(value, stop.id, name))}
            onMove={(at) => onEdit((value) => moveStop(value, stop.id, at))}
            onTurn={(heading) => onEdit((value) => turnStop(value, stop.id, heading))}
            onDwell={(seconds) => onDwell(stop.id, seconds)}
            onEmitter={(key) => onEdit((value) => setStopEmitter(value, stop.id, key))}
            onRemove={() => onRemove(stop.id)}
          />
        ) : null}
      </section>

      <section aria-labelledby="gaps-heading">
        <h2 id="gaps-heading" className="label">
          Shadow gaps
        </h2>
        {set.stops.length === 0 ? (
          <p className="mt-2 text-ink-2">Place a stop to see them.</p>
        ) : (
          <GapList report={dose.gaps} chosen={chosenGap} onChoose={onChooseGap} />
        )}
      </section>

      <Caution />
      <ModelLimits />
      <div className="flex flex-wrap gap-2">
        <Button
          variant="primary"
          icon={<Download size={16} aria-hidden />}
          disabled={set.stops.length === 0}
          onClick={saved(async () => window.location.assign(stopSetCsvAddress(set.id)))}
        >
          Stop sequence (CSV)
        </Button>
      </div>
      {settingsOpen ? (
        <SetSettings
          set={set}
          emitters={emitters}
          open
          onOpenChange={setSettingsOpen}
          onSave={(next) => onEdit(() => next)}
        />
      ) : null}
    </aside>
  );
}
