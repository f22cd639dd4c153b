'use client';

import type { DoseView } from '@/components/hooks/dose-session';

/** Progress, failure, and what to do first: over the sheet's upper edge, never in the way of the hand. */
export function SheetNotes({
  dose,
  empty,
  editable,
  drawingPath,
}: {
  dose: DoseView;
  empty: boolean;
  editable: boolean;
  drawingPath: boolean;
}) {
  const words = dose.failure
    ? `The dose map stopped: ${dose.failure} The stops are safe. Move one, or reload the page.`
    : drawingPath
      ? 'Click the next point of the path. Enter or a double click ends it, Backspace takes a point back.'
      : empty
        ? editable
          ? 'Click the sheet where the emitter should stand: that is the first stop.'
          : 'This stop set has no stops yet.'
        : !dose.picture || dose.pending > 1
          ? `Reckoning the dose map: ${Math.max(0, dose.asked - dose.pending)} of ${dose.asked}`
          : null;
  if (!words) return null;
  return (
    <p
      role={dose.failure ? 'alert' : 'status'}
      className={`on-sheet pointer-events-none absolute top-11 left-1/2 w-max max-w-[85%] -translate-x-1/2 rounded border bg-[#fcfbf7] px-3 py-1.5 text-[#1e2326] ${
        dose.failure ? 'border-[#c8452d]' : 'border-[#b9b3a5]'
      }`}
    >
      {words}
    </p>
  );
}
