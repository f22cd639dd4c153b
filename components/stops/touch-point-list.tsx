'use client';

import type { TouchDose } from '@/components/hooks/dose-session';
import { formatRatio } from '@/lib/drawing/dose-scale';

/** Touch points met or not: those under target first, since they are what has to be wiped by hand. */
export function TouchPointList({
  touchPoints,
  chosen,
  onChoose,
}: {
  touchPoints: readonly TouchDose[];
  chosen: string | null;
  onChoose: (id: string | null) => void;
}) {
  const met = touchPoints.filter(({ ratio }) => ratio >= 1).length;
  return (
    <section aria-labelledby="touch-heading">
      <div className="flex items-baseline justify-between">
        <h2 id="touch-heading" className="label">
          Touch points
        </h2>
        {touchPoints.length > 0 ? (
          <span className="font-condensed text-[15px] font-semibold text-link" data-figure="touch-points">
            {met} of {touchPoints.length} met
          </span>
        ) : null}
      </div>
      {touchPoints.length === 0 ? (
        <p className="mt-1 text-ink-2">None on the floor plan yet: put them there where hands go.</p>
      ) : (
        <ul className="mt-1">
          {[...touchPoints]
            .sort((one, two) => Number(one.ratio >= 1) - Number(two.ratio >= 1) || one.ratio - two.ratio)
            .map(({ id, name, ratio }) => (
              <li key={id} className="border-b">
                <button
                  type="button"
                  aria-pressed={id === chosen}
                  onClick={() => onChoose(id === chosen ? null : id)}
                  className={`flex w-full items-baseline justify-between gap-3 py-1 text-left hover:bg-wash ${
                    ratio < 1 ? 'text-umber' : ''
                  } ${id === chosen ? 'bg-wash font-semibold' : ''}`}
                >
                  <span className="min-w-0 truncate">{name}</span>
                  <span className="mono shrink-0">
                    {formatRatio(ratio)}
                    {ratio < 1 ? <span className="ml-2 font-semibold">hand-clean</span> : null}
                  </span>
                </button>
              </li>
            ))}
        </ul>
      )}
    </section>
  );
}
