'use client';

import { useEffect, useState, useSyncExternalStore } from 'react';
import { Autosaver, type Save, type SaveStanding } from '@/lib/client/autosave';

export interface Autosave<T> extends SaveStanding {
  readonly saveNow: (over?: { etag: string }) => Promise<boolean>;
  readonly accept: (value: T, etag: string) => void;
}

/**
 * Keeps `value` saved while the page is open. `etag` and `save` are those of the first render: give the
 * component a `key` when it comes to show another thing.
 */
export function useAutosave<T>({
  value,
  etag,
  save,
}: {
  value: T;
  etag: string;
  save: Save<T>;
}): Autosave<T> {
  const [saver] = useState(() => new Autosaver(value, etag, save));
  const standing = useSyncExternalStore(saver.subscribe, saver.getStanding, saver.getStanding);

  useEffect(() => saver.set(value), [saver, value]);

  useEffect(() => {
    // Closing the tab with unsaved work asks first; walking to another page saves on the way out.
    const ask = (event: BeforeUnloadEvent) => {
      if (saver.hasUnsaved) event.preventDefault();
    };
    window.addEventListener('beforeunload', ask);
    return () => {
      window.removeEventListener('beforeunload', ask);
      if (saver.hasUnsaved && saver.getStanding().state !== 'conflict') void saver.saveNow();
    };
  }, [saver]);

  return {
    ...standing,
    saveNow: (over) => saver.saveNow(over),
    accept: (accepted, acceptedEtag) => saver.accept(accepted, acceptedEtag),
  };
}
