import 'server-only';
import { eq } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { rooms } from '@/db/schema';
import type { Actor } from '../actor';
import { audit } from '../audit';
import { getRoom, type RoomSummary } from './list-rooms';
import { ownRoom } from './own-room';

/** Renames, moves within the site, archives or brings back a room. */
export function changeRoom(
  { write }: Database,
  actor: Actor,
  roomId: string,
  { archived, ...named }: { name?: string; area?: string | null; archived?: boolean },
): Promise<RoomSummary> {
  return write(async (tx) => {
    await ownRoom(tx, actor, roomId);
    await tx
      .update(rooms)
      .set({ ...named, ...(archived === undefined ? {} : { archivedAt: archived ? new Date() : null }) })
      .where(eq(rooms.id, roomId));
    const deed = archived === undefined ? 'change' : archived ? 'archive' : 'restore';
    await audit(tx, actor, `${deed} room`, 'room', roomId, named);
    return getRoom(tx, actor, roomId);
  });
}
