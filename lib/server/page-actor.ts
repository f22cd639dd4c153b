import 'server-only';
import { cookies } from 'next/headers';
import { redirect } from 'next/navigation';
import { type Actor, actorOf, sessionCookie } from './actor';

/** Who is looking at a page; `null` when nobody is signed in. */
export const pageActor = async (): Promise<Actor | null> =>
  actorOf((await cookies()).get(sessionCookie())?.value);

/** Who is looking at a page; strangers are sent to sign in. */
export async function requirePageActor(): Promise<Actor> {
  return (await pageActor()) ?? redirect('/sign-in');
}
