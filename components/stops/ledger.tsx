'use client';

import { Copy, Download, Plus, Settings2 } from 'lucide-react';
import { type ReactNode, useMemo, useState } from 'react';
import type { DoseView } from '@/components/hooks/dose-session';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/field';
import { IconButton } from '@/components/ui/icon-button';
import { Notice } from '@/components/ui/notice';
import { stopSetCsvAddress } from '@/lib/client/stop-sets';
import { changePass, movePass } from '@/lib/editor/pass-actions';
import { moveStop, renameStop, setStopEmitter, turnStop } from '@/lib/editor/stop-set-actions';
import { type StopSet, timesOf } from '@/lib/room';
import { stopProblems } from '@/lib/room/check-stops';
import { faceNames } from '@/lib/room/face-names';
import type { SurfaceChoice } from '@/workers/protocol';
import { Caution, ModelLimits } from './caution';
import type { Chosen } from './chosen';
import { ChosenFace } from './chosen-face';
import { GapList } from './gap-list';
import { PassDetails } from './pass-details';
import { PassTable } from './pass-table';
import type { SetEditorProps } from './set-editor-props';
import { SetSettings } from './set-settings';
import { StopDetails } from './stop-details';
import { StopTable } from './stop-table';
import { surfaceName } from './surface-choice';
import { TouchPointList } from './touch-point-list';
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
  chosen,
  chosenGap,
  notice,
  onOpen,
  onAdd,
  onChoose,
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
  chosen: Chosen | null;
  chosenGap: number | null;
  notice: ReactNode;
  onChoose: (chosen: Chosen | null) => void;
  onChooseGap: (gap: number | null) => void;
  onEdit: (action: (set: StopSet) => StopSet, gesture?: string) => void;
  onNudge: (id: string, dx: number, dy: number) => void;
  onTurnBy: (id: string, by: number) => void;
  onDwell: (id: string, seconds: number) => void;
  onReorder: (id: string, by: number) => void;
  onRemove: (thing: Chosen) => void;
  onSaveNow: () => Promise<boolean>;
}) {
  const [settingsOpen, setSettingsOpen] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const plan = document.floorPlan;
  const times = useMemo(() => timesOf(set, emitters), [set, emitters]);
  const problems = useMemo(() => stopProblems(set, plan, emitters), [set, plan, emitters]);
  const stop = chosen?.kind === 'stop' ? set.stops.find((it) => it.id === chosen.id) : undefined;
  const pass = chosen?.kind === 'pass' ? set.passes.find((it) => it.id === chosen.id) : undefined;
  const lit = set.stops.length + set.passes.length > 0;
  const cells = dose.picture?.surface;
  const faces = useMemo(() => (cells?.kind === 'sides' ? faceNames(plan, cells.strips) : []), [plan, cells]);
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
        passes={set.passes.length}
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
            selectedId={stop?.id ?? null}
            editable={editable}
            onSelect={(id) => onChoose(id === null ? null : { kind: 'stop', id })}
            onReorder={onReorder}
            onNudge={onNudge}
            onTurn={onTurnBy}
            onRemove={(id) => onRemove({ kind: 'stop', id })}
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
            onRemove={() => onRemove({ kind: 'stop', id: stop.id })}
          />
        ) : null}
      </section>

      {set.passes.length > 0 ? (
        <section aria-labelledby="passes-heading">
          <h2 id="passes-heading" className="label">
            Passes
          </h2>
          <PassTable
            set={set}
            selectedId={pass?.id ?? null}
            editable={editable}
            onSelect={(id) => onChoose(id === null ? null : { kind: 'pass', id })}
            onNudge={(id, dx, dy) => onEdit((value) => movePass(value, id, [dx, dy]), `nudge ${id}`)}
            onRemove={(id) => onRemove({ kind: 'pass', id })}
          />
          {pass ? (
            <PassDetails
              key={pass.id}
              pass={pass}
              set={set}
              emitters={emitters}
              editable={editable}
              onChange={(change) => onEdit((value) => changePass(value, pass.id, change))}
              onRemove={() => onRemove({ kind: 'pass', id: pass.id })}
            />
          ) : null}
        </section>
      ) : null}

      {chosen?.kind === 'face' && dose.picture ? (
        <ChosenFace
          plan={plan}
          picture={dose.picture}
          face={Number(chosen.id)}
          onClose={() => onChoose(null)}
        />
      ) : null}

      <section aria-labelledby="gaps-heading">
        <h2 id="gaps-heading" className="label">
          Shadow gaps
        </h2>
        {!lit ? (
          <p className="mt-2 text-ink-2">Place a stop to see them.</p>
        ) : (
          <GapList
            report={dose.gaps}
            chosen={chosenGap}
            placeOf={(strip) => faces[strip]}
            onChoose={onChooseGap}
          />
        )}
      </section>

      {lit && dose.picture ? (
        <TouchPointList
          touchPoints={dose.picture.touchPoints}
          chosen={chosen?.kind === 'touch-point' ? chosen.id : null}
          onChoose={(id) => onChoose(id === null ? null : { kind: 'touch-point', id })}
        />
      ) : null}

      <Caution />
      <ModelLimits />
      <div className="flex flex-wrap gap-2">
        <Button
          variant="primary"
          icon={<Download size={16} aria-hidden />}
          disabled={!lit}
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
