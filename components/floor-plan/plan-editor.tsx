'use client';

import { useMemo, useState } from 'react';
import { arrowStep } from '@/components/hooks/arrow-step';
import { useEditing } from '@/components/hooks/edit-store';
import { useAutosave } from '@/components/hooks/use-autosave';
import { useEditKeys } from '@/components/hooks/use-edit-keys';
import { sheetProportion } from '@/components/sheet/proportion';
import { EditorFrame } from '@/components/shell/editor-frame';
import { ConflictNotice } from '@/components/ui/conflict-notice';
import { SaveStatus } from '@/components/ui/save-status';
import { newId } from '@/lib/client/new-id';
import { fetchFloorPlan, importRoom, saveFloorPlan } from '@/lib/client/rooms';
import { boundsOf } from '@/lib/drawing/viewport';
import { freeName } from '@/lib/editor/free-name';
import { addPiece } from '@/lib/editor/furniture-actions';
import { addInnerWall } from '@/lib/editor/inner-wall-actions';
import { addOpening } from '@/lib/editor/opening-actions';
import { isRefused, type Outcome, type PlanAction } from '@/lib/editor/outcome';
import { drawOutline } from '@/lib/editor/outline-actions';
import { placedFromShelf } from '@/lib/editor/place-piece';
import { addTouchPoint, addWatchPoint } from '@/lib/editor/spot-actions';
import { duplicateThing, exists, nudgeThing, removeThing, turnThing } from '@/lib/editor/thing-actions';
import type { FloorPlanDocument, PlanPoint, RoomFile } from '@/lib/room';
import { etagOf } from '@/lib/room/api/etag';
import type { FloorPlanResource, RoomSummary } from '@/lib/room/api/resources';
import { planProblems } from '@/lib/room/check-floor-plan';
import type { ShelfPiece } from '@/lib/room/furniture-shelf/shelf-piece';
import type { PlanRef } from '@/lib/room/plan-ref';
import { PlanKeysHelp } from './plan-keys-help';
import { PlanLedger } from './plan-ledger';
import { PlanSheet } from './plan-sheet';
import { type PlanTool, planTools } from './plan-tools';
import { useDrawHand } from './use-draw-hand';

const FIRST_VIEW: PlanPoint[] = [
  [0, 0],
  [8, 6],
];

/** What the sheet shows when it shows all: the room and the watch points outside it. */
const extentOf = (document: FloorPlanDocument | null): readonly PlanPoint[] =>
  document
    ? [...document.floorPlan.outline, ...document.floorPlan.watchPoints.map((point) => point.at)]
    : FIRST_VIEW;

const asRoomFile = (room: RoomSummary, { ceiling, floorPlan }: FloorPlanDocument): RoomFile => ({
  format: 'leeside-room',
  version: 1,
  room: { name: room.name, site: room.site.name, ceiling },
  floorPlan,
  emitters: {},
  stopSets: [],
});

/** A room's working plan on the desk: the sheet in the middle, its ledger on the right, the rail on the left. */
export function PlanEditor({
  room,
  resource,
  editable,
}: {
  room: RoomSummary;
  resource: FloorPlanResource;
  editable: boolean;
}) {
  const editing = useEditing<FloorPlanDocument | null>(resource.document);
  const document = editing.value;
  const [tool, setTool] = useState<PlanTool>(editable && !document ? 'room' : 'select');
  const [chosen, setChosen] = useState<PlanRef | null>(null);
  const [placing, setPlacing] = useState<{ piece: ShelfPiece; turn: number | null } | null>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const [dragging, setDragging] = useState(false);
  const [helpOpen, setHelpOpen] = useState(false);
  const selected = document && chosen && exists(document, chosen) ? chosen : null;
  const problems = useMemo(() => (document ? planProblems(document) : []), [document]);
  const saving = useAutosave({
    value: document,
    etag: etagOf(resource.version),
    // Nothing is saved before there is a room: an editor that holds none has not been changed.
    save: (value, etag) => (value ? saveFloorPlan(room.id, value, etag) : Promise.resolve({ etag })),
  });

  // While the hand pulls, the sheet keeps still: what it fits to is the plan before the pull.
  const [settled, setSettled] = useState(document);
  if (!dragging && settled !== document) setSettled(document);
  const extent = useMemo(() => extentOf(settled), [settled]);

  const take = (outcome: Outcome, mark?: string): boolean => {
    if (isRefused(outcome)) {
      setRefusal(outcome.refused);
      return false;
    }
    setRefusal(null);
    // The first outline is where the history begins: before it there was no room to go back to.
    if (!document) editing.reset(outcome);
    else editing.edit(() => outcome, mark);
    return true;
  };
  const act = (action: PlanAction, mark?: string): boolean =>
    editable && document ? take(action(document), mark) : false;
  const added = (ref: PlanRef, outcome: Outcome) => {
    if (!take(outcome)) return;
    setChosen(ref);
    setTool('select');
  };

  const draw = useDrawHand({
    document,
    tool: tool === 'room' || tool === 'wall' ? tool : null,
    onOutline: (corners) => {
      if (take(drawOutline(document, corners))) setTool('select');
    },
    onWall: (a, b) => {
      if (!document) return;
      const id = newId();
      const name = freeName(
        'inner wall',
        document.floorPlan.innerWalls.map((wall) => wall.name),
      );
      added({ kind: 'inner-wall', id }, addInnerWall(document, id, name, a, b));
    },
  });

  /** Before there is a room there is nothing but the room to draw. */
  const usable = (value: PlanTool): boolean => {
    const editing = planTools.find((it) => it.value === value)?.editing;
    return editing ? editable && (document !== null || value === 'room') : true;
  };
  const pickTool = (next: PlanTool) => {
    draw.cancel();
    setPlacing(null);
    setRefusal(null);
    setTool(next);
  };
  const putPiece = (piece: ShelfPiece) => {
    if (!document) return;
    const { minX, minY, maxX, maxY } = boundsOf(document.floorPlan.outline);
    const middle: PlanPoint = [(minX + maxX) / 2, (minY + maxY) / 2];
    const placed = placedFromShelf(document, piece, middle, 0, { reach: 0.1, free: false }, newId).piece;
    added({ kind: 'furniture', id: placed.id }, addPiece(document, placed));
  };
  const duplicate = (ref: PlanRef) => {
    if (!document) return;
    const { outcome, copy } = duplicateThing(document, ref, newId);
    if (take(outcome) && copy) setChosen(copy);
  };

  useEditKeys(editing, (event) => {
    const { key, shiftKey } = event;
    const step = arrowStep(event);
    const low = key.toLowerCase();
    if (event.ctrlKey || event.metaKey) {
      if (low !== 'd' || !selected || !editable) return false;
      duplicate(selected);
      return true;
    }
    if (key === 'Escape') {
      editing.cancelGesture();
      draw.cancel();
      setRefusal(null);
      if (placing) setPlacing(null);
      else if (tool !== 'select') setTool('select');
      else setChosen(null);
      return true;
    }
    if (key === '?') setHelpOpen(true);
    else if (key === 'Enter') return draw.close();
    else if (key === 'Backspace' && draw.takeBack()) return true;
    else if (placing && low === 'r') setPlacing({ ...placing, turn: ((placing.turn ?? 0) + 90) % 360 });
    else if (selected && editable && (key === 'Delete' || key === 'Backspace'))
      act((value) => removeThing(value, selected));
    else if (selected && editable && (key === '[' || key === ']'))
      act(
        (value) => turnThing(value, selected, (key === '[' ? -1 : 1) * (shiftKey ? 1 : 15)),
        `turn ${selected.id}`,
      );
    else if (selected && editable && step)
      act((value) => nudgeThing(value, selected, step), `nudge ${selected.id}`);
    else {
      const next = planTools.find((it) => it.shortcut.toLowerCase() === low && usable(it.value));
      if (!next) return false;
      pickTool(next.value);
    }
    return true;
  });

  const hint = placing
    ? `Click where the ${placing.piece.label.toLowerCase()} stands. R turns it, Esc lets it go.`
    : planTools.find((it) => it.value === tool)?.hint;
  const revision = resource.revision;
  return (
    <>
      <EditorFrame
        room={room}
        status={<SaveStatus {...saving} />}
        tools={planTools.filter((it) => usable(it.value))}
        tool={placing ? null : tool}
        editable={editable}
        editing={editing}
        onTool={pickTool}
        ledger={
          <PlanLedger
            room={room}
            document={document}
            selected={selected}
            problems={problems}
            editable={editable}
            placing={placing?.piece ?? null}
            notice={
              <ConflictNotice
                saving={saving}
                what="floor plan"
                onTakeTheirs={async () => {
                  const theirs = await fetchFloorPlan(room.id);
                  editing.reset(theirs.document);
                  saving.accept(theirs.document, theirs.etag);
                }}
                onKeepAsCopy={
                  document
                    ? async () => {
                        const copy = await importRoom(JSON.stringify(asRoomFile(room, document)));
                        const theirs = await fetchFloorPlan(room.id);
                        editing.reset(theirs.document);
                        saving.accept(theirs.document, theirs.etag);
                        window.location.assign(`/rooms/${copy.roomId}/floor-plan`);
                      }
                    : undefined
                }
              />
            }
            onSelect={setChosen}
            onAct={act}
            onDraw={(outcome) => {
              if (take(outcome)) setTool('select');
            }}
            onPlace={(piece) => {
              draw.cancel();
              setTool('select');
              setPlacing(piece && { piece, turn: null });
            }}
            onPut={putPiece}
            onDuplicate={duplicate}
            onSaveNow={() => saving.saveNow()}
          />
        }
      >
        <div className="sheet-frame relative min-h-0 flex-1 max-lg:flex-none" style={sheetProportion(extent)}>
          <PlanSheet
            document={document}
            tool={tool}
            placing={placing?.piece ?? null}
            placingTurn={placing?.turn ?? null}
            selected={selected}
            editable={editable}
            problems={problems}
            bounds={boundsOf(extent)}
            titleBlock={[
              { label: 'Room', value: room.name },
              {
                label: 'Floor plan',
                value: revision
                  ? `Rev ${revision.number} · ${revision.createdAt.slice(0, 10)}`
                  : 'No revision yet',
              },
              { label: 'Ceiling', value: document ? `${document.ceiling.toFixed(2)} m` : '–' },
            ]}
            draw={draw}
            newId={newId}
            onSelect={setChosen}
            onPull={(outcome, mark) => {
              setDragging(true);
              take(outcome, mark);
            }}
            onGestureEnd={() => {
              setDragging(false);
              editing.endGesture();
            }}
            onOpening={(kind, wall, s) => {
              if (!document) return;
              const id = newId();
              added({ kind: 'opening', id }, addOpening(document, id, kind, wall, s));
            }}
            onTouchPoint={(at, facing) => {
              if (!document) return;
              const id = newId();
              const names = document.floorPlan.touchPoints.map((point) => point.name);
              added(
                { kind: 'touch-point', id },
                addTouchPoint(document, id, freeName('touch point', names), at, facing),
              );
            }}
            onWatchPoint={(at) => {
              if (!document) return;
              const id = newId();
              const names = document.floorPlan.watchPoints.map((point) => point.name);
              added(
                { kind: 'watch-point', id },
                addWatchPoint(document, id, freeName('watch point', names), at),
              );
            }}
            onPiece={(piece) => {
              setPlacing(null);
              if (document) added({ kind: 'furniture', id: piece.id }, addPiece(document, piece));
            }}
          />
          {refusal ? (
            <p
              role="alert"
              className="on-sheet pointer-events-none absolute top-10 left-1/2 w-max max-w-[85%] -translate-x-1/2 rounded border border-[#c8452d] bg-[#fcfbf7] px-3 py-1.5 text-[#1e2326]"
            >
              {refusal}
            </p>
          ) : null}
        </div>
        <p className="min-h-[22px] text-ink-2 max-lg:text-sm">{editable ? hint : null}</p>
      </EditorFrame>
      <PlanKeysHelp open={helpOpen} onOpenChange={setHelpOpen} />
    </>
  );
}
