'use client';

import { useMemo, useState } from 'react';
import { useEditing } from '@/components/hooks/edit-store';
import { useAutosave } from '@/components/hooks/use-autosave';
import { useDose } from '@/components/hooks/use-dose';
import { useEditKeys } from '@/components/hooks/use-edit-keys';
import { sheetProportion } from '@/components/sheet/proportion';
import { EditorFrame } from '@/components/shell/editor-frame';
import { ConflictNotice } from '@/components/ui/conflict-notice';
import { SaveStatus } from '@/components/ui/save-status';
import { newId } from '@/lib/client/new-id';
import { fetchStopSet, saveStopSet } from '@/lib/client/stop-sets';
import { addPass, removePass } from '@/lib/editor/pass-actions';
import { moveStop, removeStop, reorderStop, setDwell, turnStop } from '@/lib/editor/stop-set-actions';
import type { PlanPoint } from '@/lib/room';
import type { SurfaceChoice } from '@/workers/protocol';
import type { Chosen } from './chosen';
import { DoseSheet } from './dose-sheet';
import { KeysHelp } from './keys-help';
import { Ledger } from './ledger';
import { Legend } from './legend';
import { usePathDraft } from './path-draft';
import { ReadOut } from './read-out';
import type { SetEditorProps } from './set-editor-props';
import { type StopsTool, tools } from './stops-tools';
import { SurfacePicker } from './surface-choice';
import { TargetLine } from './target-line';

/** Centimetres matter on the sheet, not below: the grid the dose is reckoned on. */
const GRID_STEP = 0.05;
/** Upright faces add up to several times the floor. */
const SIDES_STEP = 0.1;

/** One stop set on the desk: the sheet in the middle, the ledger on the right, the rail on the left. */
export function SetEditor(props: SetEditorProps) {
  const { room, document, revision, planVersion, resource, emitters, editable } = props;
  const plan = document.floorPlan;
  const editing = useEditing(resource.stopSet);
  const set = editing.value;
  const [tool, setTool] = useState<StopsTool>(editable && set.stops.length === 0 ? 'stop' : 'select');
  const [chosen, setChosen] = useState<Chosen | null>(null);
  const [gap, setGap] = useState<number | null>(null);
  const [surface, setSurface] = useState<SurfaceChoice>({ kind: 'plane', z: 0.75 });
  const [pointer, setPointer] = useState<PlanPoint | null>(null);
  const [helpOpen, setHelpOpen] = useState(false);
  const dose = useDose(
    useMemo(
      () => ({
        document,
        set,
        emitters,
        surface,
        step: surface.kind === 'sides' ? SIDES_STEP : GRID_STEP,
      }),
      [document, set, emitters, surface],
    ),
  );
  const saving = useAutosave({
    value: set,
    etag: `"v${resource.version}"`,
    save: (value, etag) => saveStopSet(value, etag),
  });

  const remove = ({ kind, id }: Chosen) => {
    if (kind === 'stop') editing.edit((value) => removeStop(value, id));
    else if (kind === 'pass') editing.edit((value) => removePass(value, id));
    else return;
    setChosen(null);
  };
  const path = usePathDraft((points) => {
    const id = newId();
    editing.edit((value) => addPass(value, id, points));
    setChosen({ kind: 'pass', id });
    setTool('select');
  });
  const pickTool = (next: StopsTool) => {
    path.cancel();
    setTool(next);
  };
  /** A gap on an upright face is looked at with the face unrolled. */
  const chooseGap = (number: number | null) => {
    setGap(number);
    const strip = dose.gaps?.gaps.find((one) => one.number === number)?.strip ?? null;
    if (strip !== null) setChosen({ kind: 'face', id: String(strip) });
  };

  useEditKeys(editing, (event) => {
    const picked = tools.find(({ shortcut }) => shortcut.toLowerCase() === event.key.toLowerCase());
    if (event.ctrlKey || event.metaKey) return false;
    if (picked && (editable || !picked.editing)) pickTool(picked.value);
    else if (event.key === '?') setHelpOpen(true);
    else if (event.key === 'Escape') {
      editing.cancelGesture();
      if (path.points.length > 0) path.cancel();
      else {
        setChosen(null);
        setGap(null);
        setTool('select');
      }
    } else if (event.key === 'Enter') return path.finish();
    else if (event.key === 'Backspace' && path.takeBack()) return true;
    else if (editable && chosen && (event.key === 'Delete' || event.key === 'Backspace')) remove(chosen);
    else return false;
    return true;
  });

  return (
    <>
      <EditorFrame
        room={room}
        status={<SaveStatus {...saving} />}
        tools={tools.filter((it) => editable || !it.editing)}
        tool={tool}
        editable={editable}
        editing={editing}
        onTool={pickTool}
        ledger={
          <Ledger
            {...props}
            set={set}
            dose={dose}
            surface={surface}
            chosen={chosen}
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
            onChoose={setChosen}
            onChooseGap={chooseGap}
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
        }
      >
        <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
          <SurfacePicker
            value={surface}
            onChange={(next) => {
              // Gaps and faces belong to the surface they were found on.
              setGap(null);
              if (chosen?.kind === 'face') setChosen(null);
              setSurface(next);
            }}
          />
          <TargetLine set={set} />
        </div>
        <div className="sheet-frame min-h-0 flex-1 max-lg:flex-none" style={sheetProportion(plan.outline)}>
          <DoseSheet
            plan={plan}
            set={set}
            dose={dose}
            surface={surface}
            tool={tool}
            editable={editable}
            chosen={chosen}
            chosenGap={gap}
            path={path}
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
            onChoose={setChosen}
            onChooseGap={chooseGap}
            onEdit={editing.edit}
            onGestureEnd={editing.endGesture}
            onPointer={setPointer}
          />
        </div>
        <div className="flex min-h-[22px] flex-col gap-1.5">
          <ReadOut picture={dose.picture} at={pointer} />
          <Legend />
        </div>
      </EditorFrame>
      <KeysHelp open={helpOpen} onOpenChange={setHelpOpen} />
    </>
  );
}
