import { z } from 'zod';
import { emitterKey } from './emitter';
import { degrees, id, name, point, words } from './primitives';

/** Dwell is limited to four hours: longer is a slip, and a lamp that long wants a person's second thought. */
export const MAX_DWELL_SECONDS = 4 * 3600;

export const stopSchema = z.strictObject({
  id,
  name,
  at: point,
  heading: degrees,
  /** Seconds lit after warm-up. */
  dwell: z.number().min(0, 'A dwell cannot be negative').max(MAX_DWELL_SECONDS, 'A dwell is at most 4 hours'),
  /** `null`: the set's own emitter. */
  emitter: emitterKey.nullable(),
});

export const passSchema = z.strictObject({
  id,
  name,
  path: z.array(point).min(2, 'A pass needs at least two points').max(200),
  /** Metres per second, lit. */
  speed: z.number().min(0.005, 'A pass moves at 0.005 m/s or more').max(2),
  /** Degrees; `null`: along each leg. */
  heading: degrees.nullable(),
  emitter: emitterKey.nullable(),
});

export const targetSchema = z.strictObject({
  name,
  /** J/m². */
  dose: z.number().positive('A dose target must be more than 0').max(1_000_000),
  source: words(400),
});

export const stopSetSchema = z.strictObject({
  id,
  name,
  emitter: emitterKey,
  target: targetSchema,
  /** Factor on top of the target. */
  margin: z.number().min(1, 'A margin is 1 or more').max(20),
  stops: z.array(stopSchema).max(60),
  passes: z.array(passSchema).max(60),
});

export const stopSetStatuses = ['draft', 'in review', 'approved', 'withdrawn'] as const;
export const stopSetStatusSchema = z.enum(stopSetStatuses);

export type Stop = z.infer<typeof stopSchema>;
export type Pass = z.infer<typeof passSchema>;
export type Target = z.infer<typeof targetSchema>;
export type StopSet = z.infer<typeof stopSetSchema>;
export type StopSetStatus = z.infer<typeof stopSetStatusSchema>;

/** J/m² that a surface must get: the target with the set's margin on it. */
export const requiredDose = (set: Pick<StopSet, 'target' | 'margin'>): number => set.target.dose * set.margin;
