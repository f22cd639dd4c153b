import 'server-only';
import { and, eq } from 'drizzle-orm';
import { decode } from 'next-auth/jwt';
import { memberships, organisations, users } from '@/db/schema';
import type { Role } from '@/lib/access/roles';
import { database } from './database';
import { env } from './env';

/** Who acts, for which organisation, in which role: every use case takes one. */
export interface Actor {
  readonly userId: string;
  readonly name: string;
  readonly email: string;
  readonly organisationId: string;
  readonly organisation: string;
  readonly role: Role;
}

/** Browsers hold a `__Secure-` cookie to HTTPS. */
export const sessionCookie = (): string =>
  `${env().NEXTAUTH_URL.startsWith('https:') ? '__Secure-' : ''}next-auth.session-token`;

/**
 * The member behind a session token; `null` when there is none, it has run out, or the membership has
 * ended or changed since it was issued.
 */
export async function actorOf(token: string | undefined): Promise<Actor | null> {
  if (!token) return null;
  const claims = await decode({ token, secret: env().NEXTAUTH_SECRET }).catch(() => null);
  if (!claims?.sub || !claims.organisationId) return null;
  const { db } = await database();
  const [row] = await db
    .select({
      userId: users.id,
      name: users.name,
      email: users.email,
      organisationId: organisations.id,
      organisation: organisations.name,
      role: memberships.role,
      sessionVersion: memberships.sessionVersion,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .innerJoin(organisations, eq(organisations.id, memberships.organisationId))
    .where(and(eq(memberships.userId, claims.sub), eq(memberships.organisationId, claims.organisationId)));
  if (!row || row.sessionVersion !== claims.sessionVersion) return null;
  const { sessionVersion: _, ...actor } = row;
  return actor;
}
