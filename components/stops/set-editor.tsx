'use client';

import { Redo2, Undo2 } from 'lucide-react';
import { useMemo, useState } from 'react';
import { useEditing } from '@/components/hooks/edit-store';
import { useAutosave } from '@/components/hooks/use-autosave';
import { useDose } from '@/components/hooks/use-dose';
import { useEditKeys } from '@/components/hooks/use-edit-keys';
import { sheetProportion } from '@/components/sheet/proportion';
import { DeskHeader, roomCrumbs, roomTabs } from '@/components/shell/desk-header';
import { ConflictNotice } from '@/components/ui/conflict-notice';
import { Rail, RailAction } from '@/components/ui/rail';
import { SaveStatus } from '@/components/ui/save-status';
import { fetchStopSet, saveStopSet } from '@/lib/client/stop-sets';
import { moveStop, removeStop, reorderStop, setDwell, turnStop } from '@/lib/editor/stop-set-actions';
import type { PlanPoint } from '@/lib/room';
import type { SurfaceChoice } from '@/workers/protocol';
import { DoseSheet } from './dose-sheet';
import { KeysHelp } from './keys-help';
import { Ledger } from './ledger';
import { Legend } from './legend';
import { ReadOut } from './read-out';
import type { SetEditorProps } from './set-editor-props';
import { type StopsTool, tools } from './stops-tools';
import { SurfacePicker } from './surface-choice';
import { TargetLine } from './target-line';

/** Centimetres matter on the sheet, not below: the grid the dose is reckoned on. */
const GRID_STEP = 0.05;

/** One stop set on the desk: the sheet in the middle, the ledger on the right, the rail on the left. */
export function SetEditor(props: SetEditorProps) {
  const { room, document, revision, planVersion, resource, emitters, editable } = props;
  const plan = document.floorPlan;
  const editing = useEditing(resource.stopSet);
  const set = editing.value;
  const [tool, setTool] = useState<StopsTool>(editable && set.stops.length === 0 ? 'stop' : 'select');
  const [stopId, setStopId] = useState<string | null>(null);
  const [gap, setGap] = useState<number | null>(null);
  const [surface, setSurface] = useState<SurfaceChoice>({ kind: 'plane', z: 0.75 });
  const [pointer, setPointer] = useState<PlanPoint | null>(null);
  const [helpOpen, setHelpOpen] = useState(false);
  const dose = useDose(
    useMemo(() => ({ plan, set, emitters, surface, step: GRID_STEP }), [plan, set, emitters, surface]),
  );
  const saving = useAutosave({
    value: set,
    etag: `"v${resource.version}"`,
    save: (value, etag) => saveStopSet(value, etag),
  });

  useEditKeys(editing, (event) => {
    const picked = tools.find(({ shortcut }) => shortcut.toLowerCase() === event.key.toLowerCase());
    if (event.ctrlKey || event.metaKey) return false;
    if (picked && (editable || !picked.editing)) setTool(picked.value);
    else if (event.key === '?') setHelpOpen(true);
    else if (event.key === 'Escape') {
      editing.cancelGesture();
      setStopId(null);
      setGap(null);
      setTool('select');
    } else if (editable && stopId && (event.key === 'Delete' || event.key === 'Backspace')) {
      editing.edit((value) => removeStop(value, stopId));
      setStopId(null);
    } else return false;
    return true;
  });

  const remove = (id: string) => {
    editing.edit((value) => removeStop(value, id));
    setStopId(null);
  };

  return (
    <div className="flex h-dvh flex-col max-lg:h-auto max-lg:min-h-dvh">
      <DeskHeader
        crumbs={roomCrumbs(room)}
        tabs={roomTabs(room.id)}
        status={editable ? <SaveStatus {...saving} /> : <span>Read only</span>}
      />
      <div className="flex min-h-0 flex-1 max-lg:flex-col">
        <Rail tools={tools.filter((it) => editable || !it.editing)} value={tool} onChange={setTool}>
          {editable ? (
            <>
              <RailAction
                label="Undo"
                icon={<Undo2 size={18} aria-hidden />}
                disabled={!editing.canUndo}
                onClick={editing.undo}
              />
              <RailAction
                label="Redo"
                icon={<Redo2 size={18} aria-hidden />}
                disabled={!editing.canRedo}
                onClick={editing.redo}
              />
            </>
          ) : null}
        </Rail>
        <main className="flex min-w-0 flex-1 flex-col gap-2.5 p-3 sm:px-5">
          <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
            <SurfacePicker value={surface} onChange={setSurface} />
            <TargetLine set={set} />
          </div>
          <div className="sheet-frame min-h-0 flex-1" style={sheetProportion(plan.outline)}>
            <DoseSheet
              plan={plan}
              set={set}
              dose={dose}
              surface={surface}
              tool={tool}
              editable={editable}
              selectedStopId={stopId}
              chosenGap={gap}
              titleBlock={[
                { label: 'Room', value: room.name },
                {
                  label: 'Floor plan',
                  value: revision
                    ? `Rev ${revision.number}${revision.planVersion === planVersion ? '' : ' + changes'} · ${revision.createdAt.slice(0, 10)}`
                    : 'No revision yet',
                },
                { label: 'Emitter', value: emitters[set.emitter]?.name ?? set.emitter },
              ]}
              onSelectStop={setStopId}
              onChooseGap={setGap}
              onEdit={editing.edit}
              onGestureEnd={editing.endGesture}
              onPointer={setPointer}
            />
          </div>
          <div className="flex min-h-[22px] flex-col gap-1.5">
            <ReadOut picture={dose.picture} set={set} at={pointer} />
            <Legend />
          </div>
        </main>
        <Ledger
          {...props}
          set={set}
          dose={dose}
          surface={surface}
          selectedStopId={stopId}
          chosenGap={gap}
          notice={
            <ConflictNotice
              saving={saving}
              what="stop set"
              onTakeTheirs={async () => {
                const theirs = await fetchStopSet(set.id);
                editing.reset(theirs.stopSet);
                saving.accept(theirs.stopSet, theirs.etag);
              }}
              onKeepAsCopy={async () => {
                await props.onAdd(set);
              }}
            />
          }
          onSelectStop={setStopId}
          onChooseGap={setGap}
          onEdit={editing.edit}
          onNudge={(id, dx, dy) =>
            editing.edit((value) => {
              const stop = value.stops.find((it) => it.id === id);
              return stop ? moveStop(value, id, [stop.at[0] + dx, stop.at[1] + dy]) : value;
            }, `nudge ${id}`)
          }
          onTurnBy={(id, by) =>
            editing.edit((value) => {
              const stop = value.stops.find((it) => it.id === id);
              return stop ? turnStop(value, id, stop.heading + by) : value;
            }, `turn ${id}`)
          }
          onDwell={(id, seconds) => editing.edit((value) => setDwell(value, id, seconds), `dwell ${id}`)}
          onReorder={(id, by) => editing.edit((value) => reorderStop(value, id, by))}
          onRemove={remove}
          onSaveNow={() => saving.saveNow()}
        />
      </div>
      <KeysHelp open={helpOpen} onOpenChange={setHelpOpen} />
    </div>
  );
}
