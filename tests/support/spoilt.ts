import { expect, test } from 'vitest';
import type { z } from 'zod';
import { describeFaults } from '@/lib/room/describe-faults';

/** What is wrong, where, with what in its place (`undefined`: nothing), and what the refusal says; where it says it, if elsewhere. */
export type Spoilt = readonly [what: string, place: string, value: unknown, words: RegExp, said?: string];

/** A copy with a value put at a place such as `stops[0].at`. */
export function withAt(good: unknown, place: string, value: unknown): unknown {
  const copy = structuredClone(good);
  const keys = place.split(/[.[\]]+/).filter(Boolean);
  const last = keys.pop() ?? '';
  // biome-ignore lint/suspicious/noExplicitAny: what is spoilt is no longer of its type
  const held = keys.reduce<any>((it, key) => it[key], copy);
  if (value === undefined) delete held[last];
  else held[last] = value;
  return copy;
}

/** Takes the good one as it is, and refuses each spoilt one with its place and words. */
export function refusesWhatIsSpoilt(schema: z.ZodType, good: unknown, rows: readonly Spoilt[]) {
  test('a good one is taken as it is', () => {
    expect(schema.parse(structuredClone(good))).toEqual(good);
  });
  const named = rows.map(([what, place, value, words, said]) => ({ what, place, value, words, said }));
  test.each(named)('$what is refused with its place', ({ place, value, words, said = place }) => {
    const { error } = schema.safeParse(withAt(good, place, value));
    expect(error && describeFaults(error)).toContainEqual({
      path: said,
      message: expect.stringMatching(words),
    });
  });
}

/** What JSON and forms can put where a number belongs. */
export const noNumbers = [Number.NaN, Number.POSITIVE_INFINITY, '1', null, true, [1], {}].map(
  (value) => [`${JSON.stringify(value)} (${String(value)})`, value] as const,
);
