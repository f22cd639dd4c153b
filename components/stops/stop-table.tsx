'use client';

import { ChevronDown, ChevronUp } from 'lucide-react';
import { arrowStep } from '@/components/hooks/arrow-step';
import { type FloorPlan, type StopSet, tapesTo } from '@/lib/room';
import { formatDuration, formatMetres } from '@/lib/units';

/**
 * The stops in order with their two tape measurements: the parallel list of what is on the sheet. Choosing a
 * row chooses the stop; arrow keys on it move the stop by 5 cm (1 cm with Shift), [ and ] turn it, Delete removes it.
 */
export function StopTable({
  set,
  plan,
  selectedId,
  editable,
  onSelect,
  onReorder,
  onNudge,
  onTurn,
  onRemove,
}: {
  set: StopSet;
  plan: FloorPlan;
  selectedId: string | null;
  editable: boolean;
  onSelect: (id: string | null) => void;
  onReorder: (id: string, by: number) => void;
  onNudge: (id: string, dx: number, dy: number) => void;
  onTurn: (id: string, by: number) => void;
  onRemove: (id: string) => void;
}) {
  const onKey = (event: React.KeyboardEvent, id: string) => {
    const step = arrowStep(event);
    const { key } = event;
    if (key === 'Escape') onSelect(null);
    else if (!editable) return;
    else if (step) onNudge(id, ...step);
    else if (key === '[' || key === ']') onTurn(id, key === '[' ? -5 : 5);
    else if (key === 'Delete') onRemove(id);
    else return;
    event.preventDefault();
  };
  return (
    <table className="mt-1 w-full">
      <thead>
        <tr className="border-b text-left font-condensed text-sm text-ink-2">
          <th className="py-1.5 font-medium">Stop</th>
          <th className="py-1.5 font-medium">From walls</th>
          <th className="py-1.5 text-right font-medium">Dwell</th>
          <th className="w-14">
            <span className="sr-only">Order</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {set.stops.map((stop, index) => {
          const tapes = tapesTo(plan, stop.at);
          const selected = stop.id === selectedId;
          return (
            <tr key={stop.id} className={`border-b ${selected ? 'bg-wash' : ''}`}>
              <td className="py-1.5">
                <button
                  type="button"
                  aria-pressed={selected}
                  aria-label={`Stop ${stop.name}`}
                  onClick={() => onSelect(selected ? null : stop.id)}
                  onKeyDown={(event) => onKey(event, stop.id)}
                  className="mr-2.5 grid h-[22px] min-w-[22px] place-items-center rounded-full bg-[#12323f] px-1.5 font-condensed text-sm font-semibold text-[#f4efe4] ring-1 ring-ink-2/50"
                >
                  {stop.name}
                </button>
              </td>
              <td className="py-1.5">
                {tapes.length === 2 ? (
                  <span className="flex flex-wrap gap-x-3">
                    {tapes.map((tape) => (
                      <span key={tape.wall} title={`From the ${tape.wall}`}>
                        <span className="mono">{formatMetres(tape.distance)}</span>{' '}
                        <span className="text-[13px] text-ink-2">{tape.wall}</span>
                      </span>
                    ))}
                  </span>
                ) : (
                  <span className="text-sm text-danger">No two walls to measure from</span>
                )}
              </td>
              <td className="mono py-1.5 text-right">{formatDuration(stop.dwell)}</td>
              <td className="py-1 text-right whitespace-nowrap">
                {editable ? (
                  <>
                    <OrderButton
                      label={`Stop ${stop.name} earlier`}
                      disabled={index === 0}
                      onClick={() => onReorder(stop.id, -1)}
                      up
                    />
                    <OrderButton
                      label={`Stop ${stop.name} later`}
                      disabled={index === set.stops.length - 1}
                      onClick={() => onReorder(stop.id, 1)}
                    />
                  </>
                ) : null}
              </td>
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}

function OrderButton({
  label,
  up = false,
  disabled,
  onClick,
}: {
  label: string;
  up?: boolean;
  disabled: boolean;
  onClick: () => void;
}) {
  const Icon = up ? ChevronUp : ChevronDown;
  return (
    <button
      type="button"
      aria-label={label}
      disabled={disabled}
      onClick={onClick}
      className="rounded p-0.5 text-ink-2 hover:bg-wash disabled:opacity-25"
    >
      <Icon size={17} aria-hidden />
    </button>
  );
}
