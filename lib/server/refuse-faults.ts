import 'server-only';
import { AppError, type Fault } from '@/lib/errors';

/** Refuses what has faults, naming the places. */
export function refuseFaults(faults: readonly Fault[], what: string): void {
  if (faults.length > 0)
    throw new AppError(
      'invalid',
      `The ${what} does not hold together. Nothing was changed.`,
      faults.slice(0, 20),
    );
}
