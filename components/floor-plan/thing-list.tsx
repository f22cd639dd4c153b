'use client';

import { arrowStep } from '@/components/hooks/arrow-step';
import type { PlanAction } from '@/lib/editor/outcome';
import { nudgeThing, removeThing, turnThing } from '@/lib/editor/thing-actions';
import type { FloorPlanDocument } from '@/lib/room';
import { pieceSize } from '@/lib/room/piece-size';
import { type PlanRef, sameRef, type ThingKind } from '@/lib/room/plan-ref';
import { placedTouchPoints } from '@/lib/room/touch-points';
import { wallRuns } from '@/lib/room/wall-geometry';
import { formatMetres } from '@/lib/units';

interface Row {
  readonly ref: PlanRef;
  readonly name: string;
  readonly figure: string;
}

interface Section {
  readonly title: string;
  readonly rows: readonly Row[];
}

function sectionsOf({ floorPlan }: FloorPlanDocument): Section[] {
  const runs = wallRuns(floorPlan);
  const row = (kind: ThingKind, id: string, name: string, figure: string): Row => ({
    ref: { kind, id },
    name,
    figure,
  });
  return [
    {
      title: 'Walls',
      rows: runs.map((run) =>
        row(
          run.id.startsWith('outline:') ? 'outline-wall' : 'inner-wall',
          run.id,
          run.name,
          formatMetres(run.length),
        ),
      ),
    },
    {
      title: 'Doors and windows',
      rows: floorPlan.openings.map((opening) => {
        const wall = runs.find(({ id }) => id === opening.wall)?.name ?? 'missing wall';
        const state = opening.open ? ', open' : '';
        return row(
          'opening',
          opening.id,
          `${opening.kind === 'door' ? 'Door' : 'Window'}, ${wall}${state}`,
          formatMetres(opening.to - opening.from),
        );
      }),
    },
    {
      title: 'Furniture',
      rows: floorPlan.furniture.map((piece) => {
        const { width, depth, top } = pieceSize(piece);
        return row(
          'furniture',
          piece.id,
          piece.name,
          `${width.toFixed(2)} × ${depth.toFixed(2)} × ${top.toFixed(2)}`,
        );
      }),
    },
    {
      title: 'Touch points',
      rows: placedTouchPoints(floorPlan).map(({ point, pieceName }) =>
        row(
          'touch-point',
          point.id,
          pieceName ? `${pieceName}: ${point.name}` : point.name,
          formatMetres(point.height),
        ),
      ),
    },
    {
      title: 'Watch points',
      rows: floorPlan.watchPoints.map((point) =>
        row('watch-point', point.id, point.name, formatMetres(point.height)),
      ),
    },
  ].filter(({ rows }) => rows.length > 0);
}

/** The parallel list of all that is on the sheet; on a row, arrows move the thing, [ and ] turn it, Delete removes it. */
export function ThingList({
  document,
  selected,
  editable,
  onSelect,
  onAct,
}: {
  document: FloorPlanDocument;
  selected: PlanRef | null;
  editable: boolean;
  onSelect: (ref: PlanRef | null) => void;
  onAct: (action: PlanAction, mark?: string) => boolean;
}) {
  const onKey = (event: React.KeyboardEvent, ref: PlanRef) => {
    if (event.key === 'Escape') onSelect(null);
    if (!editable || event.ctrlKey || event.metaKey) return;
    const step = arrowStep(event);
    if (step) onAct((value) => nudgeThing(value, ref, step), `nudge ${ref.id}`);
    else if (event.key === '[' || event.key === ']')
      onAct(
        (value) => turnThing(value, ref, (event.key === '[' ? -1 : 1) * (event.shiftKey ? 1 : 15)),
        `turn ${ref.id}`,
      );
    else if (event.key === 'Delete') onAct((value) => removeThing(value, ref));
    else return;
    event.preventDefault();
  };
  return (
    <section aria-labelledby="things-heading" className="flex flex-col gap-3">
      <h2 id="things-heading" className="label">
        On this plan
      </h2>
      {sectionsOf(document).map(({ title, rows }) => (
        <div key={title}>
          <h3 className="text-sm text-ink-2">
            {title} <span className="tabular-nums">({rows.length})</span>
          </h3>
          <ul className="mt-0.5">
            {rows.map(({ ref, name, figure }) => {
              const on = sameRef(ref, selected);
              return (
                <li key={ref.id} className="border-b border-rule/60">
                  <button
                    type="button"
                    aria-pressed={on}
                    onClick={() => onSelect(on ? null : ref)}
                    onKeyDown={(event) => onKey(event, ref)}
                    className={`flex w-full items-baseline justify-between gap-3 rounded px-1 py-1 text-left ${
                      on ? 'bg-wash font-semibold' : 'hover:bg-wash'
                    }`}
                  >
                    <span className="min-w-0 truncate">{name}</span>
                    <span className="mono shrink-0 text-ink-2">{figure}</span>
                  </button>
                </li>
              );
            })}
          </ul>
        </div>
      ))}
    </section>
  );
}
