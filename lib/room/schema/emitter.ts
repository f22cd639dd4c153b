import { z } from 'zod';
import { id, name, vector3 } from './primitives';

const length3 = (v: readonly number[]) => Math.hypot(v[0], v[1], v[2]);

export const tubeSchema = z
  .strictObject({
    a: vector3,
    b: vector3,
    /** Rated UV-C output at 254 nm, not the electrical power. */
    watts: z.number().positive('A tube needs an output above 0 W').max(2000),
    backed: vector3.nullable(),
  })
  .refine((tube) => length3(tube.a.map((value, axis) => tube.b[axis] - value)) > 0.01, {
    path: ['b'],
    message: 'A tube must be longer than 1 cm',
  })
  .refine((tube) => tube.backed === null || Math.abs(length3(tube.backed) - 1) < 1e-6, {
    path: ['backed'],
    message: 'The backing direction must be a unit vector',
  })
  .refine(
    (tube) => {
      if (tube.backed === null) return true;
      const axis = tube.a.map((value, i) => tube.b[i] - value);
      const along = axis[0] * tube.backed[0] + axis[1] * tube.backed[1] + axis[2] * tube.backed[2];
      return Math.abs(along) <= 1e-6 * length3(axis);
    },
    { path: ['backed'], message: 'The backing direction must be perpendicular to the tube' },
  );

export const emitterSchema = z.strictObject({
  name,
  tubes: z.array(tubeSchema).min(1, 'An emitter needs at least one tube').max(24),
  /** Factor on the rated output for ageing and soiling. */
  maintenance: z.number().positive().max(1),
  /** Seconds from switch-on until output counts. */
  warmUp: z.number().min(0).max(1800),
  /** Free floor needed around the mark, metres. */
  clearance: z.number().min(0).max(5),
});

export const emitterKey = id;

export type Tube = z.infer<typeof tubeSchema>;
export type Emitter = z.infer<typeof emitterSchema>;
/** Emitters by key: a stop names one, the stop set holds the default one. */
export type Emitters = Record<string, Emitter>;
