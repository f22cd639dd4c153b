import { z } from 'zod';

/** Lengths beyond this are a slip of the keyboard, not a room. */
export const MAX_METRES = 500;

const finite = (what: string) => z.number({ error: `${what} must be a number` });

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

export const name = z.string().trim().min(1, 'Give it a name').max(80, 'Keep the name under 80 characters');

export type PlanPoint = z.infer<typeof point>;
