'use client';

import { useState } from 'react';
import { createStore, useStore } from 'zustand';
import {
  cancelGesture,
  canRedo,
  canUndo,
  endGesture,
  type History,
  openHistory,
  record,
  redo,
  undo,
} from '@/lib/editor/history';

export interface Editing<T> {
  readonly value: T;
  readonly canUndo: boolean;
  readonly canRedo: boolean;
  /** Applies a pure action. Edits of one `gesture` are one undo step until `endGesture`. */
  readonly edit: (action: (value: T) => T, gesture?: string) => void;
  readonly endGesture: () => void;
  readonly cancelGesture: () => void;
  readonly undo: () => void;
  readonly redo: () => void;
  /** Starts over from another value, with nothing to undo. */
  readonly reset: (value: T) => void;
}

/** State of one thing being edited, with its history. */
export function useEditing<T>(initial: T): Editing<T> {
  const [editor] = useState(() => {
    const store = createStore<History<T>>(() => openHistory(initial));
    const apply = (change: (history: History<T>) => History<T>) => store.setState(change, true);
    return {
      store,
      edit: (action: (value: T) => T, gesture?: string) =>
        apply((history) => record(history, action(history.present), gesture ?? null)),
      endGesture: () => apply(endGesture),
      cancelGesture: () => apply(cancelGesture),
      undo: () => apply(undo),
      redo: () => apply(redo),
      reset: (value: T) => store.setState(openHistory(value), true),
    };
  });
  const { store, ...actions } = editor;
  const history = useStore(store);
  return { value: history.present, canUndo: canUndo(history), canRedo: canRedo(history), ...actions };
}
