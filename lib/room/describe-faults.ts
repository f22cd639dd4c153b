import type { z } from 'zod';
import type { Fault } from '@/lib/errors';

/** `['floorPlan', 'furniture', 3, 'top']` → `floorPlan.furniture[3].top`; the whole thing is `(whole)`. */
export const describePath = (path: readonly PropertyKey[]): string =>
  path.reduce<string>(
    (text, key) =>
      typeof key === 'number'
        ? `${text}[${key}]`
        : text
          ? `${text}.${clipped(String(key))}`
          : clipped(String(key)),
    '',
  ) || '(whole)';

const MOST_FAULTS = 20;

/** A key as far as it helps to find it: it may be as long as the file. */
const clipped = (key: string): string => (key.length > 60 ? `${key.slice(0, 60)}…` : key);

/** What a schema refused, as places and words; at most twenty, the rest would help nobody. */
export const describeFaults = (error: z.ZodError): Fault[] =>
  error.issues.slice(0, MOST_FAULTS).map((issue) => ({
    path: describePath(issue.path),
    message:
      issue.code === 'unrecognized_keys'
        ? `Unknown ${issue.keys.length === 1 ? 'key' : 'keys'}: ${issue.keys.slice(0, 5).map(clipped).join(', ')}`
        : issue.message,
  }));
