// The route handlers as functions, on a migrated database file of their own.
import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { encode } from 'next-auth/jwt';
import type { Database } from '@/db/client';
import { marrowby } from '@/db/seed/demo';
import { type Organisation, seedOrganisation } from '@/db/seed/seed-organisation';
import { type Role, roles } from '@/lib/access/roles';
import { database } from '@/lib/server/database';
import { fernside } from './organisations';
import { TEST_PASSWORD } from './people';

export const methods = ['GET', 'HEAD', 'POST', 'PUT', 'PATCH', 'DELETE', 'OPTIONS'] as const;
export type Method = (typeof methods)[number];

/** A method and a route as its folders are called: `PUT /api/rooms/[roomId]/floor-plan`. */
export type Deed = `${Method} /api/${string}`;

/** Members of the demo organisation by role, the owner of another organisation, somebody not signed in. */
export const everyone = [...roles, 'stranger', 'nobody'] as const;
export type Who = Role | 'stranger' | 'nobody';

export interface Ask {
  readonly params?: Readonly<Record<string, string>>;
  readonly body?: unknown;
  /** A body that is sent as it is, in place of `body`. */
  readonly text?: string | Uint8Array<ArrayBuffer>;
  readonly etag?: string;
  /** `null` takes a header away that our own page sends. */
  readonly headers?: Readonly<Record<string, string | null>>;
}

export interface Answer {
  readonly status: number;
  readonly headers: Headers;
  readonly text: string;
  /** The JSON of the answer; `undefined` when it has none. Tests look into it where they expect something. */
  // biome-ignore lint/suspicious/noExplicitAny: a test asserts what it reads
  readonly body: any;
  readonly etag: string;
}

const ORIGIN = 'http://127.0.0.1:3999';
const SECRET = 'a secret that lives as long as this test';
const API = path.join(process.cwd(), 'app', 'api');

/** Every route file under app/api, as its address. */
export const routeFiles = (): string[] =>
  readdirSync(API, { recursive: true, encoding: 'utf8' })
    .filter((file) => path.basename(file) === 'route.ts')
    .map((file) => `/api/${path.dirname(file).split(path.sep).join('/')}`)
    .sort();

type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;

/** What a route file exports. */
export const routeModule = (route: string): Promise<Record<string, unknown>> =>
  import(path.join(process.cwd(), 'app', route, 'route.ts'));

/** A session as signing in makes it. */
export const sessionOf = (
  organisation: Organisation,
  role: Role,
  { sessionVersion = 1, secret = SECRET, maxAge = 3600 } = {},
): Promise<string> => {
  const person = organisation.people.find((it) => it.role === role);
  return encode({
    token: { sub: person?.id, organisationId: organisation.id, sessionVersion },
    secret,
    maxAge,
  });
};

const addressOf = (route: string, params: Readonly<Record<string, string>>): string =>
  route.replace(/\[(?:\.\.\.)?(\w+)\]/g, (_, name: string) => encodeURIComponent(params[name] ?? ''));

/** A request as our own page sends it. */
export function requestOf(
  deed: Deed,
  { params = {}, body, text, etag, headers = {} }: Ask = {},
  session?: string,
): Request {
  const [method, route] = deed.split(' ');
  const content = text ?? (body === undefined ? undefined : JSON.stringify(body));
  const sent: Record<string, string | null> = {
    ...(method === 'GET' ? {} : { origin: ORIGIN, 'sec-fetch-site': 'same-origin' }),
    ...(content === undefined ? {} : { 'content-type': 'application/json' }),
    ...(etag === undefined ? {} : { 'if-match': etag }),
    ...(session === undefined ? {} : { cookie: `theme=dark; next-auth.session-token=${session}` }),
    ...headers,
  };
  return new Request(`${ORIGIN}${addressOf(route, params)}`, {
    method,
    body: content,
    headers: Object.entries(sent).filter((header): header is [string, string] => header[1] !== null),
  });
}

const jsonOf = (text: string): unknown => {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
};

export interface House {
  readonly database: Database;
  /** Does a deed as somebody, by calling the route's own handler. */
  readonly call: (who: Who, deed: Deed, ask?: Ask) => Promise<Answer>;
  /** The same with a session of one's own making. */
  readonly callWith: (session: string | undefined, deed: Deed, ask?: Ask) => Promise<Answer>;
  readonly close: () => void;
}

/** The demo organisation and a stranger to it in a fresh database, and a way to do deeds there. */
export async function openHouse(): Promise<House> {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'leeside-api-'));
  process.env.DATABASE_URL = `file:${path.join(folder, 'test.db')}`;
  process.env.NEXTAUTH_SECRET = SECRET;
  process.env.NEXTAUTH_URL = ORIGIN;
  const opened = await database();
  await seedOrganisation(opened, marrowby, TEST_PASSWORD);
  await seedOrganisation(opened, fernside, TEST_PASSWORD);
  const sessions = new Map<Who, string>([['stranger', await sessionOf(fernside, 'owner')]]);
  for (const role of roles) sessions.set(role, await sessionOf(marrowby, role));

  const callWith: House['callWith'] = async (session, deed, ask = {}) => {
    const [method, route] = deed.split(' ');
    const handler = (await routeModule(route))[method];
    if (typeof handler !== 'function') throw new Error(`${route} has no ${method}`);
    const response = await (handler as Handler)(requestOf(deed, ask, session), {
      params: Promise.resolve({ ...ask.params }),
    });
    const text = await response.text();
    const { status, headers } = response;
    return { status, headers, text, body: jsonOf(text), etag: headers.get('etag') ?? '' };
  };
  return {
    database: opened,
    call: (who, deed, ask) => callWith(sessions.get(who), deed, ask),
    callWith,
    close: () => {
      opened.close();
      rmSync(folder, { recursive: true, force: true });
    },
  };
}
