/** Names of what the query cache holds, from the general to the particular: forgetting one forgets what is under it. */
export const queryKeys = {
  sites: ['sites'],
  rooms: ['rooms'],
  room: (roomId: string) => ['rooms', roomId],
  floorPlan: (roomId: string) => ['rooms', roomId, 'floor-plan'],
  revisions: (roomId: string) => ['rooms', roomId, 'revisions'],
  stopSets: (roomId: string) => ['rooms', roomId, 'stop-sets'],
  emitters: ['emitters'],
} as const;
