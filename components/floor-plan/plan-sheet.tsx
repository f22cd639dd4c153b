'use client';

import { useMemo, useState } from 'react';
import { DraftLine, Guides, Handles, ProblemMarks } from '@/components/sheet/edit-overlay';
import { FurnitureLayer } from '@/components/sheet/furniture-layer';
import { useSheetScale } from '@/components/sheet/sheet-scale';
import { type SheetPointer, SheetStage } from '@/components/sheet/sheet-stage';
import { SpotsLayer } from '@/components/sheet/spots-layer';
import { TapeOverlay } from '@/components/sheet/tape-overlay';
import { WallsLayer } from '@/components/sheet/walls-layer';
import type { Bounds } from '@/lib/drawing/viewport';
import { handlesOf, wallAt } from '@/lib/editor/hit-test';
import { newOpening } from '@/lib/editor/opening-actions';
import type { Outcome } from '@/lib/editor/outcome';
import { placedFromShelf } from '@/lib/editor/place-piece';
import { nearestFace, onGrid } from '@/lib/editor/snapping';
import type { FloorPlan, FloorPlanDocument, Furniture, PlanPoint } from '@/lib/room';
import type { PlanProblem } from '@/lib/room/check-floor-plan';
import type { ShelfPiece } from '@/lib/room/furniture-shelf/shelf-piece';
import type { PlanRef } from '@/lib/room/plan-ref';
import { placedTouchPoints } from '@/lib/room/touch-points';
import { againstWall, wallRuns } from '@/lib/room/wall-geometry';
import { toDegrees } from '@/lib/units';
import type { PlanTool } from './plan-tools';
import type { useDrawHand } from './use-draw-hand';
import { snapOf, useSelectHand } from './use-select-hand';

const nothing: FloorPlan = {
  outline: [],
  outlineWalls: [],
  innerWalls: [],
  openings: [],
  furniture: [],
  touchPoints: [],
  watchPoints: [],
};

/** Walls are found from this far when a door, a window or a touch point is put on them, pixels. */
const WALL_REACH_PX = 40;

/** The sheet of the floor plan, and what the hand does on it. */
export function PlanSheet({
  document,
  tool,
  placing,
  placingTurn,
  selected,
  editable,
  problems,
  bounds,
  titleBlock,
  draw,
  newId,
  onSelect,
  onPull,
  onGestureEnd,
  onOpening,
  onTouchPoint,
  onWatchPoint,
  onPiece,
}: {
  document: FloorPlanDocument | null;
  tool: PlanTool;
  placing: ShelfPiece | null;
  placingTurn: number | null;
  selected: PlanRef | null;
  editable: boolean;
  problems: readonly PlanProblem[];
  bounds: Bounds;
  titleBlock: readonly { label: string; value: string }[];
  draw: ReturnType<typeof useDrawHand>;
  newId: () => string;
  onSelect: (ref: PlanRef | null) => void;
  onPull: (outcome: Outcome, mark: string) => void;
  onGestureEnd: () => void;
  onOpening: (kind: 'door' | 'window', wall: string, s: number) => void;
  onTouchPoint: (at: PlanPoint, facing: number) => void;
  onWatchPoint: (at: PlanPoint) => void;
  onPiece: (piece: Furniture) => void;
}) {
  const plan = document?.floorPlan ?? nothing;
  const runs = useMemo(() => wallRuns(plan), [plan]);
  const spots = useMemo(() => placedTouchPoints(plan), [plan]);
  const [hover, setHover] = useState<SheetPointer | null>(null);
  const [tape, setTape] = useState<{ from: PlanPoint; to: PlanPoint; held: boolean } | null>(null);
  const hand = useSelectHand({
    document: document ?? { ceiling: 2.6, floorPlan: nothing },
    selected,
    editable,
    onSelect,
    onPull,
    onEnd: onGestureEnd,
  });

  const opening = tool === 'door' || tool === 'window' ? tool : null;
  const ghost =
    document && placing && hover
      ? placedFromShelf(document, placing, hover.at, placingTurn, snapOf(hover), () => 'ghost')
      : null;
  /** The wall under the pointer, and how far along it, for doors and windows. */
  const wallSpot = (pointer: SheetPointer) => {
    const run = wallAt(runs, pointer.at, WALL_REACH_PX / pointer.scale);
    if (!run) return null;
    const { s } = againstWall(run, pointer.at);
    return { run, s: pointer.event.altKey ? s : onGrid(s) };
  };
  const hovered = document && opening && hover ? wallSpot(hover) : null;
  const ghostOpening =
    document && opening && hovered ? newOpening(document, 'ghost', opening, hovered.run.id, hovered.s) : null;

  const putPiece = (pointer: SheetPointer) => {
    if (!document || !placing) return;
    const { piece } = placedFromShelf(document, placing, pointer.at, placingTurn, snapOf(pointer), newId);
    onPiece(piece);
    setHover(null);
  };
  const putTouchPoint = (pointer: SheetPointer) => {
    const face = nearestFace(pointer.at, runs, WALL_REACH_PX / pointer.scale);
    if (!face) return onTouchPoint(pointer.at, 90);
    // One centimetre in front of the wall: on its room side for certain.
    const { run, s, offset, facing } = face;
    const t = offset + facing * 0.01;
    onTouchPoint(
      [run.a[0] + run.along[0] * s + run.across[0] * t, run.a[1] + run.along[1] * s + run.across[1] * t],
      toDegrees(Math.atan2(run.across[1] * facing, run.across[0] * facing)),
    );
  };

  const down = (pointer: SheetPointer) => {
    if (placing) return putPiece(pointer);
    if (tool === 'select') return hand.down(pointer);
    if (tool === 'tape') return setTape({ from: pointer.at, to: pointer.at, held: true });
    if (tool === 'room' || tool === 'wall') return draw.down(pointer);
    if (tool === 'touch-point') return putTouchPoint(pointer);
    if (tool === 'watch-point') return onWatchPoint(pointer.at);
    const spot = wallSpot(pointer);
    if (spot && opening) onOpening(opening, spot.run.id, spot.s);
  };

  const drawnPlan = ghostOpening ? { ...plan, openings: [...plan.openings, ghostOpening] } : plan;
  const furniture = ghost ? [...plan.furniture, ghost.piece] : plan.furniture;
  const faulty = problems.flatMap(({ thing }) => (thing?.kind === 'furniture' ? [thing.id] : []));
  const crosshair = placing || tool !== 'select';
  return (
    <SheetStage
      bounds={bounds}
      label={`Floor plan with ${plan.furniture.length} pieces of furniture. The list beside it holds everything on the plan.`}
      titleBlock={titleBlock}
      cursor={hand.active ? 'move' : crosshair ? 'crosshair' : 'default'}
      onPointerDown={down}
      onPointerMove={(pointer) => {
        setHover(placing || opening ? pointer : null);
        if (tape?.held) setTape({ ...tape, to: pointer.at });
        else if (tool === 'room' || tool === 'wall') draw.move(pointer);
        else hand.move(pointer);
      }}
      onPointerUp={(pointer) => {
        setTape((held) => held && { ...held, held: false });
        draw.up(pointer);
        hand.up();
      }}
      onInterrupt={() => {
        hand.stop();
        if (draw.draft?.kind !== 'corners') draw.cancel();
      }}
      onPointerLeave={() => setHover(null)}
      onDragOver={(pointer) => placing && setHover(pointer)}
      onDrop={putPiece}
      overlay={
        <>
          <Guides guides={[...hand.guides, ...(ghost?.guides ?? []), ...(draw.draft?.guides ?? [])]} />
          {draw.draft ? (
            <DraftLine
              points={
                draw.draft.kind === 'rectangle'
                  ? corners(draw.draft.points[0], draw.draft.end)
                  : [...draw.draft.points, draw.draft.end]
              }
              closed={draw.draft.kind === 'rectangle'}
            />
          ) : null}
          {document && selected && editable && tool === 'select' && !placing ? (
            <ChosenHandles document={document} selected={selected} />
          ) : null}
          <ProblemMarks problems={problems} />
          {tape ? <TapeOverlay from={tape.from} to={tape.to} /> : null}
        </>
      }
    >
      {plan.outline.length > 0 ? (
        <WallsLayer plan={drawnPlan} selectedId={selected?.id ?? ghostOpening?.id} />
      ) : null}
      <FurnitureLayer
        furniture={furniture}
        plane={null}
        selectedIds={[
          ...(selected?.kind === 'furniture' ? [selected.id] : []),
          ...(ghost ? [ghost.piece.id] : []),
        ]}
        faultyIds={faulty}
      />
      <SpotsLayer touchPoints={spots} watchPoints={plan.watchPoints} selectedId={selected?.id ?? null} />
    </SheetStage>
  );
}

function ChosenHandles({ document, selected }: { document: FloorPlanDocument; selected: PlanRef }) {
  const px = 1 / useSheetScale();
  return <Handles handles={handlesOf(document, selected, px)} />;
}

const corners = ([ax, ay]: PlanPoint, [bx, by]: PlanPoint): PlanPoint[] => [
  [ax, ay],
  [bx, ay],
  [bx, by],
  [ax, by],
];
