'use client';

import { useQuery } from '@tanstack/react-query';
import { savesAnswered } from '@/lib/client/autosave';
import { queryKeys } from '@/lib/client/query-keys';
import { fetchEmitters, fetchFloorPlan, fetchRoom, fetchRooms, fetchSites } from '@/lib/client/rooms';
import { fetchStopSets } from '@/lib/client/stop-sets';

export const useSites = () => useQuery({ queryKey: queryKeys.sites, queryFn: fetchSites });
export const useRooms = () => useQuery({ queryKey: queryKeys.rooms, queryFn: fetchRooms });
export const useRoom = (roomId: string) =>
  useQuery({ queryKey: queryKeys.room(roomId), queryFn: () => fetchRoom(roomId) });
export const useEmitters = () => useQuery({ queryKey: queryKeys.emitters, queryFn: fetchEmitters });

// What is edited is loaded afresh on each visit, after the page before has saved: an editor must start from what is saved now.
export const useFloorPlan = (roomId: string) =>
  useQuery({
    queryKey: queryKeys.floorPlan(roomId),
    queryFn: () => savesAnswered().then(() => fetchFloorPlan(roomId)),
    gcTime: 0,
    staleTime: Number.POSITIVE_INFINITY,
  });
export const useStopSets = (roomId: string) =>
  useQuery({
    queryKey: queryKeys.stopSets(roomId),
    queryFn: () => savesAnswered().then(() => fetchStopSets(roomId)),
    gcTime: 0,
    staleTime: Number.POSITIVE_INFINITY,
  });
