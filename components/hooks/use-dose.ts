'use client';

import { useEffect, useState, useSyncExternalStore } from 'react';
import { DosePool, startDoseThread } from '@/workers/pool';
import { type DoseInput, DoseSession, type DoseView, nothingYet } from './dose-session';

const noSubscription = () => () => {};

/** The dose picture of `input`, kept up to date by workers that live as long as the component. */
export function useDose(input: DoseInput): DoseView {
  const [session, setSession] = useState<DoseSession | null>(null);

  useEffect(() => {
    const opened = new DoseSession(new DosePool(startDoseThread));
    setSession(opened);
    return () => opened.close();
  }, []);

  const { document, set, emitters, surface, step } = input;
  useEffect(() => {
    session?.show({ document, set, emitters, surface, step });
  }, [session, document, set, emitters, surface, step]);

  return useSyncExternalStore(
    session?.subscribe ?? noSubscription,
    session?.getView ?? (() => nothingYet),
    () => nothingYet,
  );
}
