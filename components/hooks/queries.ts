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

/**
 * What is edited is loaded afresh on each visit, after the page before has saved, and is not there until then:
 * an editor must start from what is saved now, not from what another page last saw.
 */
function useFresh<T>(queryKey: readonly string[], load: () => Promise<T>) {
  const query = useQuery({
    queryKey,
    queryFn: () => savesAnswered().then(load),
    gcTime: 0,
    staleTime: Number.POSITIVE_INFINITY,
    refetchOnMount: 'always',
  });
  return { ...query, data: query.isFetchedAfterMount ? query.data : undefined };
}

export const useFloorPlan = (roomId: string) =>
  useFresh(queryKeys.floorPlan(roomId), () => fetchFloorPlan(roomId));
export const useStopSets = (roomId: string) =>
  useFresh(queryKeys.stopSets(roomId), () => fetchStopSets(roomId));
