import { z } from 'zod';
import { emitterKey, emitterSchema } from './emitter';
import { ceilingSchema, floorPlanSchema } from './floor-plan';
import { name } from './primitives';
import { stopSetSchema } from './stop-set';

/** More would be no choice but a heap; a room of the database holds as many as its file. */
export const MOST_STOP_SETS = 40;

/** The open room file, version 1: metres, degrees, seconds, J/m². Unknown keys are refused with their place. */
export const roomFileSchema = z.strictObject({
  format: z.literal('leeside-room', {
    error: 'This is not a Leeside room file: "format" must be "leeside-room"',
  }),
  version: z.literal(1, { error: 'Only version 1 of the room file can be read' }),
  room: z.strictObject({
    name,
    site: name,
    /** A part of the site, such as a ward. */
    area: name.optional(),
    ceiling: ceilingSchema,
  }),
  floorPlan: floorPlanSchema,
  emitters: z.record(emitterKey, emitterSchema),
  stopSets: z.array(stopSetSchema).max(MOST_STOP_SETS),
});

export type RoomFile = z.infer<typeof roomFileSchema>;
