'use client';

import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { NumberField } from '@/components/ui/number-field';
import type { Outcome, PlanAction } from '@/lib/editor/outcome';
import { setCeiling } from '@/lib/editor/outline-actions';
import { removeThing } from '@/lib/editor/thing-actions';
import { signedArea } from '@/lib/geometry/polygon';
import type { FloorPlanDocument } from '@/lib/room';
import type { RoomSummary } from '@/lib/room/api/resources';
import type { PlanProblem } from '@/lib/room/check-floor-plan';
import type { ShelfPiece } from '@/lib/room/furniture-shelf/shelf-piece';
import type { PlanRef } from '@/lib/room/plan-ref';
import { FurnitureShelf } from './furniture-shelf';
import { Revisions } from './revisions';
import { StartRoom } from './start-room';
import { ThingDetails } from './thing-details';
import { ThingList } from './thing-list';

/** Everything on the plan in numbers and words, beside the sheet; all of it can be worked by keyboard. */
export function PlanLedger({
  room,
  document,
  selected,
  problems,
  editable,
  placing,
  notice,
  onSelect,
  onAct,
  onDraw,
  onPlace,
  onPut,
  onDuplicate,
  onSaveNow,
}: {
  room: RoomSummary;
  document: FloorPlanDocument | null;
  selected: PlanRef | null;
  problems: readonly PlanProblem[];
  editable: boolean;
  placing: ShelfPiece | null;
  notice: ReactNode;
  onSelect: (ref: PlanRef | null) => void;
  /** Applies an edit; edits of one `mark` in a row are one undo step. */
  onAct: (action: PlanAction, mark?: string) => boolean;
  onDraw: (outcome: Outcome) => void;
  onPlace: (piece: ShelfPiece | null) => void;
  onPut: (piece: ShelfPiece) => void;
  onDuplicate: (ref: PlanRef) => void;
  onSaveNow: () => Promise<boolean>;
}) {
  return (
    <aside
      aria-label="Ledger"
      className="flex w-[376px] shrink-0 flex-col gap-5 overflow-y-auto border-l bg-panel px-5 py-4 max-lg:w-full max-lg:border-t max-lg:border-l-0"
    >
      {notice}
      {document ? (
        <>
          <div className="grid grid-cols-2 gap-x-6 border-b pb-4">
            <div>
              <p className="label">Floor area</p>
              <p className="figure" data-figure="floor-area">
                {Math.abs(signedArea(document.floorPlan.outline)).toFixed(1)}
                <span className="ml-1 text-2xl">m²</span>
              </p>
            </div>
            <NumberField
              label="Ceiling"
              unit="m"
              value={document.ceiling}
              min={1.5}
              max={20}
              disabled={!editable}
              onChange={(ceiling) => onAct((value) => setCeiling(value, ceiling))}
            />
          </div>
          {problems.length > 0 ? <Problems problems={problems} onSelect={onSelect} /> : null}
          {selected ? (
            <ThingDetails
              key={selected.id}
              document={document}
              thing={selected}
              editable={editable}
              onAct={onAct}
              onSelect={onSelect}
              onDuplicate={() => onDuplicate(selected)}
              onRemove={() => onAct((value) => removeThing(value, selected))}
            />
          ) : null}
          {editable ? <FurnitureShelf placing={placing} onPlace={onPlace} onPut={onPut} /> : null}
          <ThingList
            document={document}
            selected={selected}
            editable={editable}
            onSelect={onSelect}
            onAct={onAct}
          />
          <Revisions
            roomId={room.id}
            mayWrite={editable}
            problems={problems.filter(({ severity }) => severity === 'wrong').length}
            onSaveNow={onSaveNow}
          />
        </>
      ) : editable ? (
        <StartRoom onDraw={onDraw} />
      ) : (
        <p className="text-ink-2">This room is not drawn yet. A planner can draw it.</p>
      )}
    </aside>
  );
}

function Problems({
  problems,
  onSelect,
}: {
  problems: readonly PlanProblem[];
  onSelect: (ref: PlanRef | null) => void;
}) {
  return (
    <section aria-labelledby="problems-heading">
      <h2 id="problems-heading" className="label">
        To put right
      </h2>
      <ul className="mt-1.5 flex flex-col gap-1">
        {problems.map(({ message, severity, thing }) => (
          <li key={`${thing?.id} ${message}`} className="flex items-baseline gap-2">
            <span aria-hidden className={severity === 'wrong' ? 'text-danger' : 'text-ink-2'}>
              ▲
            </span>
            {thing ? (
              <Button
                variant="quiet"
                size="small"
                className="h-auto! px-0! py-0.5 text-left whitespace-normal!"
                onClick={() => onSelect(thing)}
              >
                {message}
              </Button>
            ) : (
              <span>{message}</span>
            )}
          </li>
        ))}
      </ul>
    </section>
  );
}
