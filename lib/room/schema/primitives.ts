import { z } from 'zod';
import './plain-words';

/** Lengths beyond this are a slip of the keyboard, not a room. */
export const MAX_METRES = 500;

const finite = (what: string) =>
  z.number({ error: ({ code }) => (code === 'invalid_type' ? `${what} must be a number` : undefined) });

/** A plan coordinate in metres. */
export const coordinate = finite('A coordinate').min(-MAX_METRES).max(MAX_METRES);
/** A length in metres, more than nothing. */
export const length = finite('A length').positive('A length must be more than 0').max(MAX_METRES);
/** A height above finished floor in metres. */
export const height = finite('A height').min(0, 'A height cannot be below the floor').max(50);
export const degrees = finite('An angle').min(-3600).max(3600);

export const point = z.tuple([coordinate, coordinate]);
export const vector3 = z.tuple([coordinate, coordinate, coordinate]);

/** Ids are made by whoever makes the thing, in the browser too, so that a save can be repeated safely. */
export const id = z
  .string()
  .regex(/^[A-Za-z0-9_-]{1,40}$/, 'An id is 1 to 40 letters, digits, hyphens or underscores');

/** One line a person can read. A control character would end it in a database or a file, half a character in neither be itself. */
export const name = z
  .string()
  .trim()
  .min(1, 'Give it a name')
  .max(80, 'Keep the name to 80 characters')
  .regex(/^[^\p{Cc}\p{Cs}]*$/u, 'A name cannot hold control characters or half characters');

/** Words of several lines, or none. */
export const words = (most: number) =>
  z
    .string()
    .trim()
    .max(most, `Keep it to ${most} characters`)
    .regex(/^(?:[^\p{Cc}\p{Cs}]|[\n\r\t])*$/u, 'Text cannot hold control characters or half characters');

export type PlanPoint = z.infer<typeof point>;
