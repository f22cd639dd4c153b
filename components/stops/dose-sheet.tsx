'use client';

import { useMemo, useState } from 'react';
import type { DoseView } from '@/components/hooks/dose-session';
import { useCalm } from '@/components/hooks/use-calm';
import { DoseLayer, GapMarks } from '@/components/sheet/dose-layer';
import { FurnitureLayer } from '@/components/sheet/furniture-layer';
import { PassesLayer } from '@/components/sheet/passes-layer';
import { SheetStage } from '@/components/sheet/sheet-stage';
import { SidesLayer } from '@/components/sheet/sides-layer';
import { StopsLayer } from '@/components/sheet/stops-layer';
import { TapeOverlay } from '@/components/sheet/tape-overlay';
import { TouchDoseLayer } from '@/components/sheet/touch-dose-layer';
import { WallsLayer } from '@/components/sheet/walls-layer';
import { newId } from '@/lib/client/new-id';
import { boundsOf } from '@/lib/drawing/viewport';
import { movePassPoint } from '@/lib/editor/pass-actions';
import { onGrid, straighten } from '@/lib/editor/snapping';
import { addStop, moveStop, turnStop } from '@/lib/editor/stop-set-actions';
import { distanceToSegment } from '@/lib/geometry/polygon';
import { type FloorPlan, type PlanPoint, placedTouchPoints, type StopSet } from '@/lib/room';
import type { SurfaceChoice } from '@/workers/protocol';
import type { Chosen } from './chosen';
import type { PathDraft } from './path-draft';
import { SheetNotes } from './sheet-notes';
import type { StopsTool } from './stops-tools';

/** Stops and paths snap to what a crew can read off a tape. */
const snap = ([x, y]: PlanPoint): PlanPoint => [Number(onGrid(x).toFixed(3)), Number(onGrid(y).toFixed(3))];

/** A map that has stood still for so long is drawn with its lines and edges. */
const CALM_MS = 180;

/** Pixels from an edge within which a click means that face. */
const FACE_REACH_PX = 12;

/** The sheet of the stops page: dose map, room, stops, passes and gaps, and what the hand does on them. */
export function DoseSheet({
  plan,
  set,
  dose,
  surface,
  tool,
  editable,
  chosen,
  chosenGap,
  path,
  titleBlock,
  onChoose,
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
  chosen: Chosen | null;
  chosenGap: number | null;
  path: PathDraft;
  titleBlock: readonly { label: string; value: string }[];
  onChoose: (chosen: Chosen | null) => void;
  onChooseGap: (gap: number | null) => void;
  onEdit: (action: (set: StopSet) => StopSet, gesture?: string) => void;
  onGestureEnd: () => void;
  onPointer: (at: PlanPoint | null) => void;
}) {
  const bounds = useMemo(() => boundsOf(plan.outline), [plan]);
  const spots = useMemo(() => placedTouchPoints(plan), [plan]);
  const [tape, setTape] = useState<{ from: PlanPoint; to: PlanPoint; held: boolean } | null>(null);
  const lit = set.stops.length + set.passes.length > 0;
  const { picture } = dose;
  const calm = useCalm(picture, CALM_MS);
  const grid = picture?.surface.kind === 'grid' ? picture.surface.grid : null;
  const strips = picture?.surface.kind === 'sides' ? picture.surface.strips : null;
  const ratioOf = useMemo(
    () => new Map(lit ? picture?.touchPoints.map(({ id, ratio }) => [id, ratio]) : []),
    [picture, lit],
  );
  const chosenId = (kind: Chosen['kind']) => (chosen?.kind === kind ? chosen.id : null);
  const choose = (kind: 'stop' | 'pass', id: string) => {
    if (tool !== 'tape') onChoose({ kind, id });
  };

  /** The face whose edge is under the pointer. */
  const faceAt = ([x, y]: PlanPoint, reach: number): number | null => {
    let best: { strip: number; off: number } | null = null;
    strips?.forEach((strip, k) => {
      // A click in front of a face means it, not the one behind it.
      const off = distanceToSegment(x - strip.normal[0] * 0.01, y - strip.normal[1] * 0.01, strip.a, strip.b);
      const front = (x - strip.a[0]) * strip.normal[0] + (y - strip.a[1]) * strip.normal[1] > -0.001;
      if (front && off < (best?.off ?? reach)) best = { strip: k, off };
    });
    return (best as { strip: number } | null)?.strip ?? null;
  };

  return (
    <div className="relative h-full">
      <SheetStage
        bounds={bounds}
        label={`Dose map of the room with ${set.stops.length} stops and ${set.passes.length} passes. The ledger lists them, the gaps and the touch points.`}
        titleBlock={titleBlock}
        cursor={tool === 'select' ? 'default' : 'crosshair'}
        underlay={
          grid && picture && lit ? <DoseLayer grid={grid} ratio={picture.ratio} moving={!calm} /> : null
        }
        overlay={
          <>
            {strips && picture && lit ? (
              <SidesLayer
                strips={strips}
                ratio={picture.ratio}
                chosen={chosen?.kind === 'face' ? Number(chosen.id) : null}
              />
            ) : null}
            {picture && dose.gaps && lit ? (
              <GapMarks grid={grid} report={dose.gaps} chosen={chosenGap} onChoose={onChooseGap} />
            ) : null}
            <TouchDoseLayer spots={spots} ratioOf={ratioOf} chosen={chosenId('touch-point')} />
            <PassesLayer
              passes={set.passes}
              selectedId={chosenId('pass')}
              editable={editable && tool !== 'tape'}
              draft={path.shown}
              onSelect={(id) => choose('pass', id)}
              onMovePoint={(id, index, at, free) =>
                onEdit(
                  (value) => movePassPoint(value, id, index, free ? at : snap(at)),
                  `path ${id} ${index}`,
                )
              }
              onMoveEnd={onGestureEnd}
            />
            <StopsLayer
              stops={set.stops}
              selectedId={chosenId('stop')}
              editable={editable && tool !== 'tape'}
              onSelect={(id) => choose('stop', id)}
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
        onPointerDown={({ at, event, scale }) => {
          if (tool === 'tape') setTape({ from: at, to: at, held: true });
          else if (tool === 'pass') {
            const last = path.points.at(-1);
            path.add(snap(event.shiftKey && last ? straighten(last, at) : at));
          } else if (tool === 'stop') {
            const id = newId();
            onEdit((value) => addStop(value, id, snap(at)));
            onChoose({ kind: 'stop', id });
          } else {
            const face = faceAt(at, FACE_REACH_PX / scale);
            onChoose(face === null ? null : { kind: 'face', id: String(face) });
            onChooseGap(null);
          }
        }}
        onDoubleClick={() => path.finish()}
        onPointerMove={({ at }) => {
          onPointer(at);
          path.follow(at);
          if (tape?.held) setTape({ ...tape, to: at });
        }}
        onPointerUp={() => setTape((held) => held && { ...held, held: false })}
        onPointerLeave={() => onPointer(null)}
      >
        <FurnitureLayer
          furniture={plan.furniture}
          plane={!lit || surface.kind === 'sides' ? null : surface.kind === 'tops' ? 'tops' : surface.z}
        />
        <WallsLayer plan={plan} />
      </SheetStage>
      <SheetNotes dose={dose} empty={!lit} editable={editable} drawingPath={path.points.length > 0} />
    </div>
  );
}
