import 'server-only';
import { eq } from 'drizzle-orm';
import type { NextAuthOptions } from 'next-auth';
import Credentials from 'next-auth/providers/credentials';
import { passwordMatches } from '@/db/password';
import { memberships, users } from '@/db/schema';
import { sessionCookie } from './actor';
import { database } from './database';
import { env } from './env';

declare module 'next-auth' {
  interface User {
    organisationId: string;
    sessionVersion: number;
  }
}

declare module 'next-auth/jwt' {
  interface JWT {
    organisationId?: string;
    sessionVersion?: number;
  }
}

/** A hash of nothing anyone uses: checked for unknown addresses, so that both refusals take as long. */
const NOBODY =
  '$argon2id$v=19$m=19456,t=2,p=1$AAAAAAAAAAAAAAAAAAAAAA$AAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAA';

const WORKING_DAY_SECONDS = 12 * 3600;

async function signIn(email: string, password: string) {
  const { db } = await database();
  const [found] = await db
    .select({
      id: users.id,
      name: users.name,
      email: users.email,
      passwordHash: users.passwordHash,
      organisationId: memberships.organisationId,
      sessionVersion: memberships.sessionVersion,
    })
    .from(users)
    .innerJoin(memberships, eq(memberships.userId, users.id))
    .where(eq(users.email, email.trim().toLowerCase()));
  const matches = await passwordMatches(found?.passwordHash ?? NOBODY, password).catch(() => false);
  if (!found || !matches) return null;
  const { passwordHash: _, ...user } = found;
  return user;
}

/** Sign-in by password; the session is a signed token that each request checks against the membership. */
export const authOptions = (): NextAuthOptions => ({
  secret: env().NEXTAUTH_SECRET,
  session: { strategy: 'jwt', maxAge: WORKING_DAY_SECONDS },
  pages: { signIn: '/sign-in' },
  cookies: {
    sessionToken: {
      name: sessionCookie(),
      options: {
        httpOnly: true,
        sameSite: 'lax',
        path: '/',
        secure: sessionCookie().startsWith('__Secure-'),
      },
    },
  },
  providers: [
    Credentials({
      credentials: { email: {}, password: {} },
      authorize: (given) =>
        given?.email && given.password && given.password.length <= 200
          ? signIn(given.email, given.password)
          : Promise.resolve(null),
    }),
  ],
  callbacks: {
    jwt({ token, user }) {
      return user
        ? { ...token, sub: user.id, organisationId: user.organisationId, sessionVersion: user.sessionVersion }
        : token;
    },
  },
});
