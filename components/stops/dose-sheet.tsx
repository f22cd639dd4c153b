'use client';

import { useMemo, useState } from 'react';
import type { DoseView } from '@/components/hooks/dose-session';
import { DoseLayer, GapMarks } from '@/components/sheet/dose-layer';
import { FurnitureLayer } from '@/components/sheet/furniture-layer';
import { SheetStage } from '@/components/sheet/sheet-stage';
import { StopsLayer } from '@/components/sheet/stops-layer';
import { TapeOverlay } from '@/components/sheet/tape-overlay';
import { WallsLayer } from '@/components/sheet/walls-layer';
import { newId } from '@/lib/client/new-id';
import { boundsOf } from '@/lib/drawing/viewport';
import { addStop, moveStop, turnStop } from '@/lib/editor/stop-set-actions';
import type { FloorPlan, PlanPoint, StopSet } from '@/lib/room';
import type { SurfaceChoice } from '@/workers/protocol';
import type { StopsTool } from './stops-tools';

/** Stops snap to this grid: what a crew can read off a tape. */
const GRID = 0.05;
const snap = ([x, y]: PlanPoint): [number, number] => [
  Number((Math.round(x / GRID) * GRID).toFixed(3)),
  Number((Math.round(y / GRID) * GRID).toFixed(3)),
];

/** The sheet of the stops page: dose map, room, stops and gaps, and what the hand does on them. */
export function DoseSheet({
  plan,
  set,
  dose,
  surface,
  tool,
  editable,
  selectedStopId,
  chosenGap,
  titleBlock,
  onSelectStop,
  onChooseGap,
  onEdit,
  onGestureEnd,
  onPointer,
}: {
  plan: FloorPlan;
  set: StopSet;
  dose: DoseView;
  surface: SurfaceChoice;
  tool: StopsTool;
  editable: boolean;
  selectedStopId: string | null;
  chosenGap: number | null;
  titleBlock: readonly { label: string; value: string }[];
  onSelectStop: (id: string | null) => void;
  onChooseGap: (gap: number | null) => void;
  onEdit: (action: (set: StopSet) => StopSet, gesture?: string) => void;
  onGestureEnd: () => void;
  onPointer: (at: PlanPoint | null) => void;
}) {
  const bounds = useMemo(() => boundsOf(plan.outline), [plan]);
  const [tape, setTape] = useState<{ from: PlanPoint; to: PlanPoint; held: boolean } | null>(null);
  return (
    <div className="relative h-full">
      <SheetStage
        bounds={bounds}
        label={`Dose map of the room with ${set.stops.length} stops. The ledger lists the stops and the gaps.`}
        titleBlock={titleBlock}
        cursor={tool === 'select' ? 'default' : 'crosshair'}
        underlay={dose.picture && set.stops.length > 0 ? <DoseLayer picture={dose.picture} /> : null}
        overlay={
          <>
            {dose.picture && dose.gaps && set.stops.length > 0 ? (
              <GapMarks picture={dose.picture} report={dose.gaps} chosen={chosenGap} onChoose={onChooseGap} />
            ) : null}
            <StopsLayer
              stops={set.stops}
              selectedId={selectedStopId}
              editable={editable && tool !== 'tape'}
              onSelect={(id) => {
                if (tool !== 'tape') onSelectStop(id);
              }}
              onMove={(id, at, free) =>
                onEdit((value) => moveStop(value, id, free ? at : snap(at)), `move ${id}`)
              }
              onMoveEnd={onGestureEnd}
              onTurn={(id, heading) => onEdit((value) => turnStop(value, id, heading), `turn ${id}`)}
              onTurnEnd={onGestureEnd}
            />
            {tape ? <TapeOverlay from={tape.from} to={tape.to} /> : null}
          </>
        }
        onPointerDown={({ at }) => {
          if (tool === 'tape') setTape({ from: at, to: at, held: true });
          else if (tool === 'stop') {
            const id = newId();
            onEdit((value) => addStop(value, id, snap(at)));
            onSelectStop(id);
          } else {
            onSelectStop(null);
            onChooseGap(null);
          }
        }}
        onPointerMove={({ at }) => {
          onPointer(at);
          if (tape?.held) setTape({ ...tape, to: at });
        }}
        onPointerUp={() => setTape((held) => held && { ...held, held: false })}
        onPointerLeave={() => onPointer(null)}
      >
        <FurnitureLayer
          furniture={plan.furniture}
          plane={set.stops.length === 0 ? null : surface.kind === 'tops' ? 'tops' : surface.z}
        />
        <WallsLayer plan={plan} />
      </SheetStage>
      <SheetNotes dose={dose} empty={set.stops.length === 0} editable={editable} />
    </div>
  );
}

/** Progress, failure, and what to do first: over the sheet's upper edge, never in the way of the hand. */
function SheetNotes({ dose, empty, editable }: { dose: DoseView; empty: boolean; editable: boolean }) {
  const words = dose.failure
    ? `The dose map stopped: ${dose.failure} The stops are safe. Move one, or reload the page.`
    : empty
      ? editable
        ? 'Click the sheet where the emitter should stand: that is the first stop.'
        : 'This stop set has no stops yet.'
      : !dose.picture
        ? `Reckoning the dose map: ${Math.max(0, dose.asked - dose.pending)} of ${dose.asked} stops`
        : null;
  if (!words) return null;
  return (
    <p
      role={dose.failure ? 'alert' : 'status'}
      className={`on-sheet pointer-events-none absolute top-10 left-1/2 w-max max-w-[85%] -translate-x-1/2 rounded border bg-[#fcfbf7] px-3 py-1.5 text-[#1e2326] ${
        dose.failure ? 'border-[#c8452d]' : 'border-[#b9b3a5]'
      }`}
    >
      {words}
    </p>
  );
}
