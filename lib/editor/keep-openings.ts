import type { Opening } from '@/lib/room';
import { tidy } from './outcome';

/** Metres. An opening narrower than this is no door and no window. */
export const LEAST_OPENING = 0.1;

const round = (opening: Opening, from: number, to: number): Opening => ({
  ...opening,
  from: tidy(from),
  to: tidy(to),
});

/** The opening pushed back onto a wall of `length` metres: first moved, then made narrower. */
export function fitOpening(opening: Opening, length: number): Opening {
  if (opening.from >= 0 && opening.to <= length) return opening;
  const width = Math.min(opening.to - opening.from, length);
  const from = Math.max(0, Math.min(opening.from, length - width));
  return round(opening, from, from + width);
}

/**
 * The opening after its wall changed its length: it keeps its distance from the end that stayed, and always
 * stays on the wall. Openings are measured from the wall's first end.
 */
export function keepOnWall(
  opening: Opening,
  change: { before: number; after: number; firstEndMoved: boolean; lastEndMoved: boolean },
): Opening {
  const { before, after, firstEndMoved, lastEndMoved } = change;
  const shift = firstEndMoved ? (lastEndMoved ? (after - before) / 2 : after - before) : 0;
  const moved = shift === 0 ? opening : { ...opening, from: opening.from + shift, to: opening.to + shift };
  const fitted = fitOpening(moved, after);
  return fitted === opening ? opening : round(fitted, fitted.from, fitted.to);
}
