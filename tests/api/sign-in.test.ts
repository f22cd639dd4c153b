import { and, eq } from 'drizzle-orm';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { memberships } from '@/db/schema';
import { marrowby } from '@/db/seed/demo';
import { permissionsOf } from '@/lib/access/permissions';
import { type Role, roles } from '@/lib/access/roles';
import { type House, openHouse, requestOf, routeModule, sessionOf } from '../support/api';
import { inFramework } from '../support/framework';
import { emailOf, TEST_PASSWORD } from '../support/people';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

type Cookies = Record<string, string>;

/** One step of signing in or out: a form to the sign-in routes with the cookies so far, which it adds to. */
async function step(cookies: Cookies, action: string, form?: Record<string, string>): Promise<Response> {
  const module = await routeModule('/api/auth/[...nextauth]');
  const method = form ? 'POST' : 'GET';
  const request = requestOf(`${method} /api/auth/${action}`, {
    text: form && new URLSearchParams({ json: 'true', ...form }).toString(),
    headers: {
      ...(form ? { 'content-type': 'application/x-www-form-urlencoded' } : {}),
      cookie: Object.entries(cookies)
        .map(([name, value]) => `${name}=${value}`)
        .join('; '),
    },
  });
  const handler = module[method] as (request: Request, context: object) => Promise<Response>;
  const response = await inFramework(request, (seen) =>
    handler(seen, { params: Promise.resolve({ nextauth: action.split('/') }) }),
  );
  for (const line of response.headers.getSetCookie()) {
    const [name, value] = line.split(';')[0].split(/=(.*)/s);
    cookies[name] = value;
  }
  return response;
}

const SESSION = 'next-auth.session-token';

async function signIn(email: string, password: string): Promise<{ cookies: Cookies; status: number }> {
  const cookies: Cookies = {};
  const { csrfToken } = await (await step(cookies, 'csrf')).json();
  const { status } = await step(cookies, 'callback/credentials', { csrfToken, email, password });
  return { cookies, status };
}

const me = (session: string | undefined) => house.callWith(session, 'GET /api/me');

test.each(roles)(
  'the demo’s %s signs in by password and is told who they are and what they may',
  async (role) => {
    const { cookies } = await signIn(emailOf(role).toUpperCase(), TEST_PASSWORD);
    const answer = await me(cookies[SESSION]);
    expect(answer.status).toBe(200);
    expect(answer.body).toMatchObject({
      email: emailOf(role),
      role,
      organisation: marrowby.name,
      may: permissionsOf(role),
    });
    expect(answer.text).not.toMatch(/argon2|password/i);
  },
);

test.each([
  ['a wrong password', emailOf('planner'), 'not the password'],
  ['an address nobody has', 'nobody@example.test', TEST_PASSWORD],
  ['no password', emailOf('planner'), ''],
  ['a password as long as a book', emailOf('planner'), 'x'.repeat(100_000)],
])('%s is refused and gives no session', async (_, email, password) => {
  const { cookies, status } = await signIn(email, password);
  expect(status).toBe(401);
  expect(cookies[SESSION]).toBeUndefined();
});

test('signing out takes the session from the browser', async () => {
  const { cookies } = await signIn(emailOf('planner'), TEST_PASSWORD);
  const { csrfToken } = await (await step(cookies, 'csrf')).json();
  await step(cookies, 'signout', { csrfToken });
  expect(cookies[SESSION]).toBe('');
  expect((await me(cookies[SESSION])).status).toBe(401);
});

const membership = (userId: string) =>
  and(eq(memberships.organisationId, marrowby.id), eq(memberships.userId, userId));

test('a session ends with the request after its role has changed', async () => {
  const session = await sessionOf(marrowby, 'crew');
  expect((await me(session)).status).toBe(200);
  await house.database.db
    .update(memberships)
    .set({ role: 'planner', sessionVersion: 2 })
    .where(membership('benno'));
  expect((await me(session)).status).toBe(401);
  const { cookies } = await signIn(emailOf('crew'), TEST_PASSWORD);
  expect((await me(cookies[SESSION])).body.role).toBe('planner');
});

test('a session ends with the request after its member has been removed, and they cannot sign in again', async () => {
  const session = await sessionOf(marrowby, 'reviewer');
  expect((await me(session)).status).toBe(200);
  await house.database.db.delete(memberships).where(membership('ifeoma'));
  expect((await me(session)).status).toBe(401);
  expect((await signIn(emailOf('reviewer'), TEST_PASSWORD)).status).toBe(401);
});

test.each<[string, () => Promise<string> | string]>([
  ['that has run out', () => sessionOf(marrowby, 'planner', { maxAge: -60 })],
  [
    'made with another secret',
    () => sessionOf(marrowby, 'planner', { secret: 'another secret altogether, 32+' }),
  ],
  ['of a later version', () => sessionOf(marrowby, 'planner', { sessionVersion: 2 })],
  ['for an organisation one is not in', () => sessionOf({ ...marrowby, id: 'fernside' }, 'planner')],
  ['of somebody unknown', () => sessionOf({ ...marrowby, people: [] }, 'planner' as Role)],
  ['that is no token', () => 'abc.def'],
  ['that is empty', () => ''],
])('a session %s is nobody’s', async (_, session) => {
  expect((await me(await session())).status).toBe(401);
});
