'use client';

import { useCallback, useEffect, useLayoutEffect, useRef, useState } from 'react';
import { AppError } from '@/lib/errors';

export type SaveState = 'saved' | 'unsaved' | 'saving' | 'conflict' | 'offline' | 'error';

export interface Autosave<T> {
  readonly state: SaveState;
  readonly savedAt: Date | null;
  /** Words for the person when `state` is `conflict` or `error`. */
  readonly message: string | null;
  /** What the server said of the version that won, when `state` is `conflict`. */
  readonly winner: Readonly<Record<string, unknown>> | null;
  /** Saves now, on top of the newest version when `over` is given (the person chose to overwrite it). */
  readonly saveNow: (over?: { etag: string }) => Promise<boolean>;
  /** Takes `value`, at version `etag`, as what is saved: after the person chose the other version. */
  readonly accept: (etag: string, value: T) => void;
}

const PAUSE_MS = 700;
const RETRY_MS = 5000;

/**
 * Keeps `value` saved: waits for a pause in editing, saves one request at a time, and always the newest
 * value. A refused save stops and says so; a broken line is tried again until it holds. Nothing is dropped:
 * the value stays with the caller whatever the answer.
 *
 * `value` is compared by identity, so it must be replaced, not mutated, on every edit.
 */
export function useAutosave<T>({
  value,
  etag,
  save,
  enabled = true,
}: {
  value: T;
  /** Version that `value` was loaded as. */
  etag: string;
  /** Writes the value over `etag` and answers the new one. Throws AppError for a refusal, anything else for a broken line. */
  save: (value: T, etag: string) => Promise<{ etag: string }>;
  enabled?: boolean;
}): Autosave<T> {
  const [state, setState] = useState<SaveState>('saved');
  const [savedAt, setSavedAt] = useState<Date | null>(null);
  const [refusal, setRefusal] = useState<AppError | Error | null>(null);
  const latest = useRef({ value, save });
  useLayoutEffect(() => {
    latest.current = { value, save };
  });
  const saved = useRef(value);
  const version = useRef(etag);
  const running = useRef<Promise<boolean> | null>(null);
  const timer = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  const stopped = useRef(false);

  const run = useCallback(async (): Promise<boolean> => {
    while (saved.current !== latest.current.value) {
      const sending = latest.current.value;
      setState('saving');
      try {
        const answer = await latest.current.save(sending, version.current);
        version.current = answer.etag;
        saved.current = sending;
      } catch (error) {
        const refused = error instanceof AppError;
        stopped.current = refused;
        setRefusal(error instanceof Error ? error : new Error(String(error)));
        if (!refused) timer.current = setTimeout(() => void start(), RETRY_MS);
        setState(refused ? (error.code === 'stale' ? 'conflict' : 'error') : 'offline');
        return false;
      }
    }
    stopped.current = false;
    setRefusal(null);
    setSavedAt(new Date());
    setState('saved');
    return true;
  }, []);

  const start = useCallback((): Promise<boolean> => {
    clearTimeout(timer.current);
    running.current ??= run().finally(() => {
      running.current = null;
    });
    return running.current;
  }, [run]);

  useEffect(() => {
    if (!enabled || value === saved.current) return;
    // A conflict waits for the person; any other refusal may be cured by the next edit.
    if (stopped.current && state === 'conflict') return;
    setState((current) => (current === 'saving' ? current : 'unsaved'));
    clearTimeout(timer.current);
    timer.current = setTimeout(() => void start(), PAUSE_MS);
  }, [value, enabled, start, state]);

  // Leaving with unsaved work asks first.
  useEffect(() => {
    const ask = (event: BeforeUnloadEvent) => {
      if (saved.current !== latest.current.value) event.preventDefault();
    };
    window.addEventListener('beforeunload', ask);
    return () => {
      window.removeEventListener('beforeunload', ask);
      clearTimeout(timer.current);
      // Walking to another page of the product is not losing work either.
      if (saved.current !== latest.current.value && !stopped.current) void start();
    };
  }, [start]);

  const saveNow = useCallback(
    (over?: { etag: string }) => {
      if (over) version.current = over.etag;
      stopped.current = false;
      return start();
    },
    [start],
  );

  const accept = useCallback((newEtag: string, newValue: T) => {
    version.current = newEtag;
    saved.current = newValue;
    stopped.current = false;
    setRefusal(null);
    setState('saved');
  }, []);

  return {
    state,
    savedAt,
    message: refusal?.message ?? null,
    winner: refusal instanceof AppError ? refusal.extra : null,
    saveNow,
    accept,
  };
}
