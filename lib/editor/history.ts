/**
 * Undo and redo without limit in a sitting. A gesture (a drag, a typed run of arrow keys) is one entry:
 * its steps carry the same `gesture` mark and replace each other; cancelling goes back to where it began.
 */
export interface History<T> {
  readonly past: readonly T[];
  readonly present: T;
  readonly future: readonly T[];
  /** The gesture that the present state is part of; `null` when the last edit is closed. */
  readonly gesture: string | null;
}

export const openHistory = <T>(present: T): History<T> => ({ past: [], present, future: [], gesture: null });

/** Takes `next` as the state. Edits of one `gesture` in a row are one undo step. */
export function record<T>(history: History<T>, next: T, gesture: string | null = null): History<T> {
  if (next === history.present) return history;
  const goesOn = gesture !== null && gesture === history.gesture;
  return {
    past: goesOn ? history.past : [...history.past, history.present],
    present: next,
    future: [],
    gesture,
  };
}

/** Ends the gesture: the next edit is an undo step of its own. */
export const endGesture = <T>(history: History<T>): History<T> =>
  history.gesture === null ? history : { ...history, gesture: null };

/** Gives the gesture up: back to where it began, with nothing to redo. */
export const cancelGesture = <T>(history: History<T>): History<T> =>
  history.gesture === null ? history : { ...undo(history), future: history.future };

export const canUndo = (history: History<unknown>): boolean => history.past.length > 0;
export const canRedo = (history: History<unknown>): boolean => history.future.length > 0;

export function undo<T>(history: History<T>): History<T> {
  if (history.past.length === 0) return history;
  return {
    past: history.past.slice(0, -1),
    present: history.past[history.past.length - 1],
    future: [history.present, ...history.future],
    gesture: null,
  };
}

export function redo<T>(history: History<T>): History<T> {
  if (history.future.length === 0) return history;
  return {
    past: [...history.past, history.present],
    present: history.future[0],
    future: history.future.slice(1),
    gesture: null,
  };
}
