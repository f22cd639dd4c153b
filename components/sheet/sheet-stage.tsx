'use client';

import type Konva from 'konva';
import { Maximize, Minus, Plus } from 'lucide-react';
import { type ReactNode, useRef } from 'react';
import { Group, Layer, Stage } from 'react-konva';
import { type Bounds, toPlan, type Viewport } from '@/lib/drawing/viewport';
import type { PlanPoint } from '@/lib/room';
import { Rulers } from './rulers';
import { SheetScaleProvider } from './sheet-scale';
import { TitleBlock } from './title-block';
import { usePanning } from './use-panning';
import { useSheetFonts } from './use-sheet-fonts';
import { useElementSize, useViewport } from './use-viewport';

/** A pointer on the sheet: where in the plan, and how it is held. */
export interface SheetPointer {
  readonly at: PlanPoint;
  readonly event: Pick<PointerEvent, 'altKey' | 'shiftKey' | 'pointerType'>;
  /** Pixels per metre now. */
  readonly scale: number;
}

export interface SheetStageProps {
  /** What to show when fitted, plan metres. */
  bounds: Bounds;
  /** For a screen reader: what is drawn. The parallel list beside the sheet holds the same things. */
  label: string;
  /** Drawn below the walls and furniture, in metres: the dose map. */
  underlay?: ReactNode;
  /** The room: walls, furniture; metres. */
  children?: ReactNode;
  /** Drawn above, listens to the pointer; metres. */
  overlay?: ReactNode;
  titleBlock?: readonly { label: string; value: string }[];
  cursor?: string;
  /** Answering 'pan' leaves the rest of this pointer's way to moving the sheet. */
  // biome-ignore lint/suspicious/noConfusingVoidType: most pages only act and answer nothing.
  onPointerDown?: (pointer: SheetPointer) => 'pan' | void;
  onPointerMove?: (pointer: SheetPointer) => void;
  onPointerUp?: (pointer: SheetPointer) => void;
  /** The pointer was taken away half-way: a second finger came down, or the system took it. */
  onInterrupt?: () => void;
  onDoubleClick?: (pointer: SheetPointer) => void;
  onPointerLeave?: () => void;
  /** Something from beside the sheet is dragged over it, or let go on it. */
  onDragOver?: (pointer: SheetPointer) => void;
  onDrop?: (pointer: SheetPointer) => void;
}

/**
 * The drawing sheet on the desk. Content is drawn in plan metres; the sheet sees to zoom (wheel, pinch, + and
 * −, 0 for all), pan (space-drag, middle-drag, two fingers), rulers and the title block.
 */
export function SheetStage(props: SheetStageProps) {
  const frame = useRef<HTMLDivElement>(null);
  const size = useElementSize(frame);
  const fontsReady = useSheetFonts();
  const control = useViewport(props.bounds, size);
  const panning = usePanning(control);
  const { viewport } = control;

  const pointer = (event: Konva.KonvaEventObject<PointerEvent>): SheetPointer | null => {
    const stage = event.target.getStage();
    if (!stage) return null;
    stage.setPointersPositions(event.evt);
    const at = stage.getPointerPosition();
    return (
      at && {
        at: toPlan(viewport, [at.x, at.y]),
        event: event.evt,
        scale: viewport.scale,
      }
    );
  };
  const dragged = (event: React.DragEvent<HTMLElement>): SheetPointer => {
    const { left, top } = event.currentTarget.getBoundingClientRect();
    const at = toPlan(viewport, [event.clientX - left, event.clientY - top]);
    const { altKey, shiftKey } = event;
    return { at, event: { altKey, shiftKey, pointerType: 'mouse' }, scale: viewport.scale };
  };
  const pass = <T,>(event: Konva.KonvaEventObject<PointerEvent>, to?: (pointer: SheetPointer) => T) => {
    const where = pointer(event);
    return where && !panning.busy() ? to?.(where) : undefined;
  };

  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: the drawing; the list beside it does the same by keyboard.
    <div
      ref={frame}
      // Where the plan is on the sheet: pixels per metre and the plan's origin, for whoever points at it from outside.
      data-sheet={`${viewport.scale} ${viewport.x} ${viewport.y}`}
      className="relative h-full min-h-0 w-full touch-none overflow-hidden border border-rule bg-[#fcfbf7] shadow-sm sheet-paper"
      onDragOver={(event) => {
        if (!props.onDragOver) return;
        event.preventDefault();
        props.onDragOver(dragged(event));
      }}
      onDrop={(event) => {
        event.preventDefault();
        props.onDrop?.(dragged(event));
      }}
      style={{ cursor: panning.moving ? 'grabbing' : panning.spaceHeld ? 'grab' : props.cursor }}
    >
      {size.width > 0 && fontsReady ? (
        <div role="img" aria-label={props.label}>
          <Stage
            width={size.width}
            height={size.height}
            onWheel={control.onWheel}
            onPointerDown={(event) => {
              // A drag goes on outside the sheet's edge.
              if (event.evt.target instanceof Element)
                event.evt.target.setPointerCapture(event.evt.pointerId);
              if (panning.down(event)) props.onInterrupt?.();
              if (pass(event, props.onPointerDown) === 'pan') panning.take(event);
            }}
            onPointerMove={(event) => {
              if (!panning.move(event)) pass(event, props.onPointerMove);
            }}
            onPointerUp={(event) => {
              pass(event, props.onPointerUp);
              panning.up(event);
            }}
            onPointerCancel={(event) => {
              panning.up(event);
              props.onInterrupt?.();
            }}
            onDblClick={(event: Konva.KonvaEventObject<MouseEvent>) =>
              pass(event as unknown as Konva.KonvaEventObject<PointerEvent>, props.onDoubleClick)
            }
            onPointerLeave={(event) => {
              panning.up(event);
              props.onPointerLeave?.();
            }}
          >
            <SheetScaleProvider value={viewport.scale}>
              <Layer listening={false}>
                <InPlan viewport={viewport}>{props.underlay}</InPlan>
              </Layer>
              {/* A canvas of its own: a map that follows the hand does not draw the room again. */}
              <Layer listening={false}>
                <InPlan viewport={viewport}>{props.children}</InPlan>
              </Layer>
              <Layer>
                <InPlan viewport={viewport}>{props.overlay}</InPlan>
              </Layer>
              <Layer listening={false}>
                <Rulers viewport={viewport} size={size} />
              </Layer>
            </SheetScaleProvider>
          </Stage>
        </div>
      ) : null}
      <div className="on-sheet absolute bottom-3 left-10 flex flex-col overflow-hidden rounded border border-[#b9b3a5] bg-[#fcfbf7] text-[#1e2326]">
        <ZoomButton
          label="Zoom in"
          onClick={() => control.zoomBy(1.25)}
          icon={<Plus size={16} aria-hidden />}
        />
        <ZoomButton
          label="Zoom out"
          onClick={() => control.zoomBy(0.8)}
          icon={<Minus size={16} aria-hidden />}
        />
        <ZoomButton
          label="Show the whole room"
          onClick={control.fitAll}
          icon={<Maximize size={15} aria-hidden />}
        />
      </div>
      {props.titleBlock ? <TitleBlock entries={props.titleBlock} /> : null}
    </div>
  );
}

function InPlan({ viewport, children }: { viewport: Viewport; children: ReactNode }) {
  return (
    <Group x={viewport.x} y={viewport.y} scaleX={viewport.scale} scaleY={viewport.scale}>
      {children}
    </Group>
  );
}

function ZoomButton({ label, icon, onClick }: { label: string; icon: ReactNode; onClick: () => void }) {
  return (
    <button
      type="button"
      aria-label={label}
      title={label}
      onClick={onClick}
      className="grid size-8 place-items-center hover:bg-[#e4dfd2]"
    >
      {icon}
    </button>
  );
}
