'use client';

import type Konva from 'konva';
import { useMemo } from 'react';
import { Group, Label, Shape, Tag, Text } from 'react-konva';
import { doseImage, regionEdges } from '@/lib/drawing/dose-image';
import { finerGrid } from '@/lib/drawing/finer-grid';
import { hatchLines } from '@/lib/drawing/hatch';
import type { GridSurface } from '@/lib/engine';
import type { GapsReport } from '@/workers/protocol';
import { useSheetScale } from './sheet-scale';

const UMBER = '#5a2f08';
/** Smaller gaps than these are in the ledger only: numbers must not cover the drawing. */
const MOST_MARKS = 40;
const MOST_FACE_MARKS = 12;

function toCanvas(columns: number, rows: number, pixels: Uint8ClampedArray<ArrayBuffer>): HTMLCanvasElement {
  const canvas = document.createElement('canvas');
  canvas.width = columns;
  canvas.height = rows;
  canvas.getContext('2d')?.putImageData(new ImageData(pixels, columns, rows), 0, 0);
  return canvas;
}

function strokeSegments(context: Konva.Context, segments: readonly number[]) {
  context.beginPath();
  for (let i = 0; i < segments.length; i += 4) {
    context.moveTo(segments[i], segments[i + 1]);
    context.lineTo(segments[i + 2], segments[i + 3]);
  }
}

/**
 * The dose map on the sheet: colour steps, hatching and a drawn edge round what is under target. Metres. While it follows
 * the hand it is drawn as one image; edges and lines come when the hand rests.
 */
export function DoseLayer({
  grid,
  ratio,
  moving,
}: {
  grid: GridSurface;
  ratio: Float32Array;
  moving: boolean;
}) {
  const canvas = useMemo(
    () => (moving ? toCanvas(grid.columns, grid.rows, doseImage(grid, ratio, true)) : null),
    [grid, ratio, moving],
  );
  if (!canvas) return <FineDose grid={grid} ratio={ratio} />;
  return <MapImage canvas={canvas} grid={grid} />;
}

function MapImage({ canvas, grid }: { canvas: HTMLCanvasElement; grid: GridSurface }) {
  return (
    <Shape
      listening={false}
      perfectDrawEnabled={false}
      sceneFunc={(context) => {
        context.imageSmoothingEnabled = false;
        context.drawImage(
          canvas,
          grid.originX,
          grid.originY,
          grid.columns * grid.step,
          grid.rows * grid.step,
        );
      }}
    />
  );
}

function FineDose({ grid, ratio: coarse }: { grid: GridSurface; ratio: Float32Array }) {
  const pxPerMetre = useSheetScale();
  // A drawn cell is about two pixels: no stairs where the eye would see them, no work where it would not.
  const parts = Math.max(1, Math.min(4, Math.round((grid.step * pxPerMetre) / 2)));
  const { surface, ratio } = useMemo(() => finerGrid(grid, coarse, parts), [grid, coarse, parts]);
  const canvas = useMemo(
    () => toCanvas(surface.columns, surface.rows, doseImage(surface, ratio)),
    [surface, ratio],
  );
  const edges = useMemo(() => regionEdges(surface, (cell) => ratio[cell] < 1), [surface, ratio]);
  // Lines stand about 9 px apart whatever the zoom; a power of √2 keeps them still while zooming a little.
  const spacing = 2 ** (Math.round(Math.log2(9 / pxPerMetre) * 2) / 2) * Math.SQRT2;
  const hatch = useMemo(
    () => hatchLines(surface, (cell) => ratio[cell] < 1, spacing),
    [surface, ratio, spacing],
  );
  return (
    <Group listening={false}>
      <MapImage canvas={canvas} grid={surface} />
      <Shape
        stroke={UMBER}
        opacity={0.75}
        strokeWidth={1}
        strokeScaleEnabled={false}
        perfectDrawEnabled={false}
        sceneFunc={(context, shape) => {
          strokeSegments(context, hatch);
          context.strokeShape(shape);
        }}
      />
      <Shape
        stroke={UMBER}
        strokeWidth={1.4}
        strokeScaleEnabled={false}
        perfectDrawEnabled={false}
        sceneFunc={(context, shape) => {
          strokeSegments(context, edges);
          context.strokeShape(shape);
        }}
      />
    </Group>
  );
}

/** The numbers of the gaps, and the whole of the chosen one outlined where the surface lies in plan. */
export function GapMarks({
  grid,
  report,
  chosen,
  onChoose,
}: {
  grid: GridSurface | null;
  report: GapsReport;
  chosen: number | null;
  onChoose: (gap: number) => void;
}) {
  const pxPerMetre = useSheetScale();
  const outline = useMemo(
    () => (chosen === null || !grid ? [] : regionEdges(grid, (cell) => report.labels[cell] === chosen)),
    [grid, report, chosen],
  );
  const px = 1 / pxPerMetre;
  return (
    <Group>
      {outline.length > 0 ? (
        <Shape
          listening={false}
          stroke={UMBER}
          strokeWidth={4}
          strokeScaleEnabled={false}
          sceneFunc={(context, shape) => {
            strokeSegments(context, outline);
            context.strokeShape(shape);
          }}
        />
      ) : null}
      {report.gaps
        .filter(({ number }) => number <= (grid ? MOST_MARKS : MOST_FACE_MARKS) || number === chosen)
        .map((gap) => (
          <Label
            key={gap.number}
            name={`gap G${gap.number}`}
            x={gap.at[0]}
            y={gap.at[1]}
            scaleX={px}
            scaleY={px}
            offsetX={13}
            offsetY={10}
            onClick={() => onChoose(gap.number)}
            onTap={() => onChoose(gap.number)}
          >
            <Tag
              fill={chosen === gap.number ? UMBER : '#fcfbf7'}
              stroke={UMBER}
              strokeWidth={1.5}
              cornerRadius={3}
            />
            <Text
              text={`G${gap.number}`}
              fontFamily="Barlow Condensed"
              fontStyle="600"
              fontSize={13}
              padding={4}
              fill={chosen === gap.number ? '#fcfbf7' : UMBER}
            />
          </Label>
        ))}
    </Group>
  );
}
