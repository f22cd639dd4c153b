import { z } from 'zod';
import { emitterKey, emitterSchema } from '../schema/emitter';
import { floorPlanDocumentSchema } from '../schema/floor-plan';
import { id, name, words } from '../schema/primitives';
import { stopSetSchema, stopSetStatusSchema } from '../schema/stop-set';

/** What the API takes and answers, beyond the things themselves. */

const moment = z.iso.datetime();

export const siteSchema = z.object({ id, name });
export const siteListSchema = z.object({ sites: z.array(siteSchema) });
export const newSiteSchema = z.strictObject({ name });

export const roomSummarySchema = z.object({
  id,
  name,
  area: name.nullable(),
  site: siteSchema,
  archived: z.boolean(),
  /** Is there a floor plan yet? */
  drawn: z.boolean(),
  /** Number of the newest revision. */
  revision: z.int().nullable(),
  stopSets: z.array(z.object({ id, name, status: stopSetStatusSchema })),
  updatedAt: moment,
  updatedBy: z.string(),
});
export const roomListSchema = z.object({ rooms: z.array(roomSummarySchema) });
export const newRoomSchema = z.strictObject({ siteId: id, name, area: name.optional() });
export const roomChangeSchema = z
  .strictObject({ name, area: name.nullable(), archived: z.boolean() })
  .partial()
  .refine((change) => Object.keys(change).length > 0, 'Say what to change: name, area or archived');

export const revisionSummarySchema = z.object({
  number: z.int(),
  note: z.string(),
  /** Version of the working plan that was frozen. */
  planVersion: z.int(),
  createdAt: moment,
  createdBy: z.string(),
});
export const revisionSchema = revisionSummarySchema.extend({ document: floorPlanDocumentSchema });
export const revisionListSchema = z.object({ revisions: z.array(revisionSummarySchema) });
export const newRevisionSchema = z.strictObject({ note: words(200).default('') });

export const floorPlanResourceSchema = z.object({
  /** `null` until the room is drawn. */
  document: floorPlanDocumentSchema.nullable(),
  version: z.int(),
  updatedAt: moment,
  updatedBy: z.string(),
  revision: revisionSummarySchema.nullable(),
});

export const stopSetResourceSchema = z.object({
  stopSet: stopSetSchema,
  roomId: id,
  status: stopSetStatusSchema,
  version: z.int(),
  updatedAt: moment,
  updatedBy: z.string(),
});
export const stopSetListSchema = z.object({ stopSets: z.array(stopSetResourceSchema) });

export const emittersResourceSchema = z.object({ emitters: z.record(emitterKey, emitterSchema) });

export const savedSchema = z.object({ version: z.int() });
export const importedSchema = z.object({ roomId: id, name: z.string() });

export const problemSchema = z.object({
  code: z.string(),
  detail: z.string(),
  faults: z.array(z.object({ path: z.string(), message: z.string() })).optional(),
});

export const roomParams = z.object({ roomId: id });
export const stopSetParams = z.object({ stopSetId: id });
export const revisionParams = z.object({ roomId: id, number: z.coerce.number().int().positive() });

export type Site = z.infer<typeof siteSchema>;
export type RoomSummary = z.infer<typeof roomSummarySchema>;
export type FloorPlanResource = z.infer<typeof floorPlanResourceSchema>;
export type StopSetResource = z.infer<typeof stopSetResourceSchema>;
export type RevisionSummary = z.infer<typeof revisionSummarySchema>;
