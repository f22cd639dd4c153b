'use client';

import { formatRatio } from '@/lib/drawing/dose-scale';
import type { GapsReport } from '@/workers/protocol';

const shown = 12;

/** The shadow gaps, largest first, named as on the sheet. Choosing one shows it there. */
export function GapList({
  report,
  chosen,
  placeOf,
  onChoose,
}: {
  report: GapsReport | null;
  chosen: number | null;
  /** Name of the upright face a gap lies on. */
  placeOf: (strip: number) => string | undefined;
  onChoose: (gap: number | null) => void;
}) {
  if (!report) return <p className="mt-2 text-ink-2">Appears once the dose map is there.</p>;
  if (report.gaps.length === 0 && report.specksArea === 0)
    return <p className="mt-2">None: every spot of this surface meets the target.</p>;
  return (
    <>
      <table className="mt-1 w-full">
        <thead className="sr-only">
          <tr>
            <th>Gap</th>
            <th>Area</th>
            <th>Cause</th>
            <th>Lowest dose ÷ target</th>
          </tr>
        </thead>
        <tbody>
          {report.gaps.slice(0, shown).map((gap) => (
            <tr key={gap.number} className={`border-b ${gap.number === chosen ? 'bg-wash' : ''}`}>
              <td className="py-1.5">
                <button
                  type="button"
                  aria-pressed={gap.number === chosen}
                  onClick={() => onChoose(gap.number === chosen ? null : gap.number)}
                  className={`rounded border-[1.5px] border-umber px-1.5 font-condensed text-sm font-semibold ${
                    gap.number === chosen ? 'bg-umber text-panel' : 'bg-panel text-umber'
                  }`}
                >
                  G{gap.number}
                </button>
              </td>
              <td className="mono py-1.5 pr-3 text-right">{gap.area.toFixed(2)} m²</td>
              <td className="py-1.5">
                <span className="block first-letter:uppercase">{gap.cause}</span>
                {gap.strip === null ? null : (
                  <span className="block text-[13px] leading-tight text-ink-2">{placeOf(gap.strip)}</span>
                )}
              </td>
              <td className="mono py-1.5 text-right">{formatRatio(gap.lowestRatio)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      {report.gaps.length > shown ? (
        <p className="mt-1.5 text-sm text-ink-2">and {report.gaps.length - shown} smaller ones</p>
      ) : null}
      {report.specksArea > 0 ? (
        <p className="mt-1.5 text-sm text-ink-2">
          Specks under 0.01 m²: {report.specksArea < 0.005 ? '< 0.01' : report.specksArea.toFixed(2)} m² in
          all
        </p>
      ) : null}
    </>
  );
}
