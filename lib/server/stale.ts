import 'server-only';
import { eq } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { users } from '@/db/schema';
import { AppError } from '@/lib/errors';
import { etagOf } from '@/lib/room/api/etag';
import type { Actor } from './actor';
import { sameJson } from './same-json';

interface Held {
  readonly version: number;
  readonly document: unknown;
  readonly updatedBy: string;
}

/** Is this the save that is held already? Its answer was lost on the way and the browser sends it again. */
export const isRepeated = (
  held: Held | undefined,
  actor: Actor,
  document: unknown,
  expected: number,
): boolean =>
  held !== undefined &&
  held.version === expected + 1 &&
  held.updatedBy === actor.userId &&
  sameJson(held.document, document);

/** The refusal of a save over a version that is no longer the newest; says who was first. */
export async function staleSave(
  tx: Tx,
  what: string,
  held: { version: number; updatedBy: string; updatedAt: Date } | undefined,
): Promise<AppError> {
  const [user] = held
    ? await tx.select({ name: users.name }).from(users).where(eq(users.id, held.updatedBy))
    : [];
  return new AppError(
    'stale',
    user
      ? `${user.name} saved this ${what} while you were working on it. Your changes are still here and not saved.`
      : `This ${what} has changed while you were working on it. Your changes are still here and not saved.`,
    [],
    {
      etag: etagOf(held?.version ?? 0),
      savedBy: user?.name ?? null,
      savedAt: held?.updatedAt.toISOString() ?? null,
    },
  );
}
