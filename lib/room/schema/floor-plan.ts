import { z } from 'zod';
import { degrees, height, id, name, point } from './primitives';

export const touchPointSchema = z.strictObject({
  id,
  name,
  at: point,
  height,
  /** Plan direction of the normal in degrees. */
  facing: degrees,
  /** Angle of the normal above the horizontal; 90 looks up. */
  tilt: z.number().min(-90).max(90),
});

export const partSchema = z
  .strictObject({
    name,
    footprint: z.array(point).min(3, 'A footprint needs at least 3 corners').max(60),
    base: height,
    top: height,
  })
  .refine((part) => part.top > part.base, {
    path: ['top'],
    message: 'The top must be higher than the underside',
  });

export const furnitureSchema = z.strictObject({
  id,
  name,
  kind: name.max(40, 'Keep the kind to 40 characters'),
  at: point,
  turn: degrees,
  parts: z.array(partSchema).min(1, 'A piece of furniture needs at least one part').max(30),
  touchPoints: z.array(touchPointSchema).max(30),
});

export const outlineWallSchema = z.strictObject({ name, thickness: z.number().min(0).max(2) });

export const innerWallSchema = z.strictObject({
  id,
  name,
  a: point,
  b: point,
  thickness: z.number().positive('A wall needs a thickness').max(2),
});

export const openingSchema = z
  .strictObject({
    id,
    /** `outline:<edge>` or an inner wall's id. */
    wall: z.union([z.string().regex(/^outline:\d{1,3}$/), id], {
      error: 'Name the wall: outline:<edge> or the id of an inner wall',
    }),
    kind: z.enum(['door', 'window']),
    from: z.number().min(0).max(500),
    to: z.number().min(0).max(500),
    sill: height,
    head: height,
    open: z.boolean(),
    /** 254 nm transmittance of the glazing. */
    transmittance: z.number().min(0).max(1),
  })
  .refine((opening) => opening.to > opening.from, {
    path: ['to'],
    message: 'An opening must end after it starts',
  })
  .refine((opening) => opening.head > opening.sill, {
    path: ['head'],
    message: 'The head must be higher than the sill',
  });

export const watchPointSchema = z.strictObject({ id, name, at: point, height });

export const floorPlanSchema = z
  .strictObject({
    outline: z.array(point).min(3, 'A room needs at least 3 corners').max(200),
    outlineWalls: z.array(outlineWallSchema).max(200),
    innerWalls: z.array(innerWallSchema).max(200),
    openings: z.array(openingSchema).max(200),
    furniture: z.array(furnitureSchema).max(500),
    touchPoints: z.array(touchPointSchema).max(500),
    watchPoints: z.array(watchPointSchema).max(100),
  })
  .refine((plan) => plan.outlineWalls.length === plan.outline.length, {
    path: ['outlineWalls'],
    message: 'There must be one wall for each side of the outline',
  });

export const ceilingSchema = z.number().min(1.5, 'A ceiling is at least 1.5 m high').max(20);

export type TouchPoint = z.infer<typeof touchPointSchema>;
export type Part = z.infer<typeof partSchema>;
export type Furniture = z.infer<typeof furnitureSchema>;
export type OutlineWall = z.infer<typeof outlineWallSchema>;
export type InnerWall = z.infer<typeof innerWallSchema>;
export type Opening = z.infer<typeof openingSchema>;
export type WatchPoint = z.infer<typeof watchPointSchema>;
export type FloorPlan = z.infer<typeof floorPlanSchema>;

/** What the floor-plan editor loads and saves as one thing: the plan and the height it goes up to. */
export const floorPlanDocumentSchema = z.strictObject({ ceiling: ceilingSchema, floorPlan: floorPlanSchema });
export type FloorPlanDocument = z.infer<typeof floorPlanDocumentSchema>;
