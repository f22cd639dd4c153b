'use client';

import { arrowStep } from '@/components/hooks/arrow-step';
import type { StopSet } from '@/lib/room';
import { passSeconds, pathLength } from '@/lib/room';
import { formatDuration, formatMetres } from '@/lib/units';

/** The passes in order: the parallel list of the paths on the sheet. Arrow keys on a row move the pass, Delete removes it. */
export function PassTable({
  set,
  selectedId,
  editable,
  onSelect,
  onNudge,
  onRemove,
}: {
  set: StopSet;
  selectedId: string | null;
  editable: boolean;
  onSelect: (id: string | null) => void;
  onNudge: (id: string, dx: number, dy: number) => void;
  onRemove: (id: string) => void;
}) {
  const onKey = (event: React.KeyboardEvent, id: string) => {
    const step = arrowStep(event);
    if (event.key === 'Escape') onSelect(null);
    else if (!editable) return;
    else if (step) onNudge(id, ...step);
    else if (event.key === 'Delete') onRemove(id);
    else return;
    event.preventDefault();
  };
  return (
    <table className="mt-1 w-full">
      <thead>
        <tr className="border-b text-left font-condensed text-sm text-ink-2">
          <th className="py-1.5 font-medium">Pass</th>
          <th className="py-1.5 text-right font-medium">Length</th>
          <th className="py-1.5 text-right font-medium">Speed</th>
          <th className="py-1.5 text-right font-medium">Time</th>
        </tr>
      </thead>
      <tbody>
        {set.passes.map((pass) => (
          <tr key={pass.id} className={`border-b ${pass.id === selectedId ? 'bg-wash' : ''}`}>
            <td className="py-1.5">
              <button
                type="button"
                aria-pressed={pass.id === selectedId}
                aria-label={`Pass ${pass.name}`}
                onClick={() => onSelect(pass.id === selectedId ? null : pass.id)}
                onKeyDown={(event) => onKey(event, pass.id)}
                className="rounded-[3px] bg-[#12323f] px-1.5 py-0.5 font-condensed text-sm font-semibold text-[#f4efe4] ring-1 ring-ink-2/50"
              >
                {pass.name}
              </button>
            </td>
            <td className="mono py-1.5 text-right">{formatMetres(pathLength(pass.path))}</td>
            <td className="mono py-1.5 text-right">{pass.speed.toFixed(3)} m/s</td>
            <td className="mono py-1.5 text-right">{formatDuration(passSeconds(pass))}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
