import { floorPlanDocumentSchema } from '@/lib/room';
import { floorPlanResourceSchema, roomParams, savedSchema } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { getFloorPlan } from '@/lib/server/floor-plans/get-floor-plan';
import { saveFloorPlan } from '@/lib/server/floor-plans/save-floor-plan';
import { route } from '@/lib/server/route';

export const GET = route({
  permission: 'rooms:read',
  params: roomParams,
  answer: floorPlanResourceSchema,
  run: async ({ actor, params }) => {
    const value = await getFloorPlan((await database()).db, actor, params.roomId);
    return { value, version: value.version };
  },
});

export const PUT = route({
  permission: 'floor-plans:write',
  params: roomParams,
  body: floorPlanDocumentSchema,
  limit: 2_000_000,
  answer: savedSchema,
  run: async ({ actor, params, body, expected }) => {
    const version = await saveFloorPlan(await database(), actor, params.roomId, body, expected());
    return { value: { version }, version };
  },
});
