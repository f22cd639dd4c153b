'use client';

import { useEffect, useState } from 'react';

/** True once `value` has not changed for `ms` milliseconds. */
export function useCalm(value: unknown, ms: number): boolean {
  const [calm, setCalm] = useState<unknown>(undefined);
  useEffect(() => {
    const timer = setTimeout(() => setCalm(value), ms);
    return () => clearTimeout(timer);
  }, [value, ms]);
  return calm === value;
}
