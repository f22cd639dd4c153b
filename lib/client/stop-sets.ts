import { z } from 'zod';
import type { StopSet } from '@/lib/room';
import { savedSchema, stopSetListSchema, stopSetResourceSchema } from '@/lib/room/api/resources';
import { request } from './request';

const stopSet = (id: string) => `/api/stop-sets/${encodeURIComponent(id)}`;

export const fetchStopSets = (roomId: string) =>
  request(`/api/rooms/${encodeURIComponent(roomId)}/stop-sets`, stopSetListSchema);
export const fetchStopSet = (id: string) => request(stopSet(id), stopSetResourceSchema);
export const addStopSet = (roomId: string, set: StopSet) =>
  request(`/api/rooms/${encodeURIComponent(roomId)}/stop-sets`, savedSchema, { method: 'POST', body: set });
export const saveStopSet = (set: StopSet, etag: string) =>
  request(stopSet(set.id), savedSchema, { method: 'PUT', body: set, etag });
export const deleteStopSet = (id: string, etag: string) =>
  request(stopSet(id), z.object({}), { method: 'DELETE', etag });

/** Where the browser downloads the crew's CSV from. */
export const stopSetCsvAddress = (id: string): string => `${stopSet(id)}/csv`;
