import type { FloorPlanDocument } from '@/lib/room';
import {
  emittersResourceSchema,
  floorPlanResourceSchema,
  importedSchema,
  revisionListSchema,
  revisionSummarySchema,
  roomListSchema,
  roomSummarySchema,
  savedSchema,
  siteListSchema,
  siteSchema,
} from '@/lib/room/api/resources';
import { request } from './request';

const room = (roomId: string) => `/api/rooms/${encodeURIComponent(roomId)}`;

export const fetchSites = () => request('/api/sites', siteListSchema);
export const addSite = (name: string) =>
  request('/api/sites', siteSchema, { method: 'POST', body: { name } });

export const fetchRooms = () => request('/api/rooms', roomListSchema);
export const fetchRoom = (roomId: string) => request(room(roomId), roomSummarySchema);
export const addRoom = (body: { siteId: string; name: string; area?: string }) =>
  request('/api/rooms', roomSummarySchema, { method: 'POST', body });
export const changeRoom = (
  roomId: string,
  body: { name?: string; area?: string | null; archived?: boolean },
) => request(room(roomId), roomSummarySchema, { method: 'PATCH', body });
export const importRoom = (text: string) =>
  request('/api/rooms/import', importedSchema, { method: 'POST', text });

export const fetchFloorPlan = (roomId: string) =>
  request(`${room(roomId)}/floor-plan`, floorPlanResourceSchema);
export const saveFloorPlan = (roomId: string, body: FloorPlanDocument, etag: string) =>
  request(`${room(roomId)}/floor-plan`, savedSchema, { method: 'PUT', body, etag });

export const fetchRevisions = (roomId: string) => request(`${room(roomId)}/revisions`, revisionListSchema);
export const makeRevision = (roomId: string, note: string) =>
  request(`${room(roomId)}/revisions`, revisionSummarySchema, { method: 'POST', body: { note } });

export const fetchEmitters = () => request('/api/emitters', emittersResourceSchema);

/** Where the browser downloads from. */
export const roomFileAddress = (roomId: string): string => `${room(roomId)}/file`;
