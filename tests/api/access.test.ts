import { desc } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { auditEntries } from '@/db/schema';
import { demoPeople } from '@/db/seed/people';
import { demoRooms } from '@/db/seed/rooms';
import {
  type Ask,
  type Deed,
  everyone,
  type House,
  methods,
  openHouse,
  routeFiles,
  routeModule,
} from '../support/api';
import { aStopSet } from '../support/stop-sets';

/** What each may: the status that owner, planner, reviewer, crew, another organisation's owner and nobody get. */
interface Row {
  readonly may: readonly [number, number, number, number, number, number];
  readonly ask?: (house: House) => Ask | Promise<Ask>;
}

const room = { roomId: 'two-bed-bay' };
const site = 'marrowby-marrowby-infirmary';
let made = 0;

/** A fresh draft of the demo organisation's, to be changed or deleted. */
async function draft({ call }: House) {
  const set = aStopSet(`draft-${made++}`);
  const { etag } = await call('planner', 'POST /api/rooms/[roomId]/stop-sets', { params: room, body: set });
  return { params: { stopSetId: set.id }, etag, set };
}
const draftParams = async (house: House) => ({ params: (await draft(house)).params });

const floorPlan = 'GET /api/rooms/[roomId]/floor-plan';
const readable = [200, 200, 200, 200, 404, 401] as const;
/** A list is everybody's own: the stranger's holds nothing of ours, which the test looks for. */
const ownList = [200, 200, 200, 200, 200, 401] as const;

const table: Readonly<Record<Deed, Row>> = {
  'GET /api/health': { may: [200, 200, 200, 200, 200, 200] },
  'GET /api/me': { may: ownList },
  'GET /api/emitters': { may: ownList },
  'GET /api/sites': { may: ownList },
  'POST /api/sites': {
    may: [201, 403, 403, 403, 201, 401],
    ask: () => ({ body: { name: `Site ${made++}` } }),
  },
  'GET /api/rooms': { may: ownList },
  'POST /api/rooms': {
    may: [201, 201, 403, 403, 404, 401],
    ask: () => ({ body: { siteId: site, name: 'A new room' } }),
  },
  'POST /api/rooms/import': {
    may: [201, 201, 403, 403, 201, 401],
    ask: () => ({ body: demoRooms['treatment-room'] }),
  },
  'GET /api/rooms/[roomId]': { may: readable, ask: () => ({ params: room }) },
  'PATCH /api/rooms/[roomId]': {
    may: [200, 200, 403, 403, 404, 401],
    ask: () => ({ params: room, body: { area: 'Ward 3' } }),
  },
  'GET /api/rooms/[roomId]/file': { may: readable, ask: () => ({ params: room }) },
  'GET /api/rooms/[roomId]/floor-plan': { may: readable, ask: () => ({ params: room }) },
  'PUT /api/rooms/[roomId]/floor-plan': {
    may: [200, 200, 403, 403, 404, 401],
    ask: async ({ call }) => {
      const { body, etag } = await call('planner', floorPlan, { params: room });
      return { params: room, etag, body: { ...body.document, ceiling: 2.6 + ++made / 100 } };
    },
  },
  'GET /api/rooms/[roomId]/revisions': { may: readable, ask: () => ({ params: room }) },
  'POST /api/rooms/[roomId]/revisions': {
    may: [201, 201, 403, 403, 404, 401],
    ask: () => ({ params: room, body: { note: 'Bed moved' } }),
  },
  'GET /api/rooms/[roomId]/revisions/[number]': {
    may: readable,
    ask: () => ({ params: { ...room, number: '1' } }),
  },
  'GET /api/rooms/[roomId]/stop-sets': { may: readable, ask: () => ({ params: room }) },
  'POST /api/rooms/[roomId]/stop-sets': {
    may: [201, 201, 403, 403, 404, 401],
    ask: () => ({ params: room, body: aStopSet(`new-${made++}`) }),
  },
  'GET /api/stop-sets/[stopSetId]': { may: readable, ask: draftParams },
  'PUT /api/stop-sets/[stopSetId]': {
    may: [200, 200, 403, 403, 404, 401],
    ask: async (house) => {
      const { set, ...at } = await draft(house);
      return { ...at, body: { ...set, name: 'Renamed' } };
    },
  },
  'DELETE /api/stop-sets/[stopSetId]': {
    may: [204, 204, 403, 403, 404, 401],
    ask: async (house) => {
      const { params, etag } = await draft(house);
      return { params, etag };
    },
  },
  'GET /api/stop-sets/[stopSetId]/csv': { may: readable, ask: draftParams },
};

/** Sign-in is everybody's; what it does for whom is in sign-in.test.ts. */
const signIn: readonly string[] = ['GET /api/auth/[...nextauth]', 'POST /api/auth/[...nextauth]'];

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

const newestEntry = async () =>
  (await house.database.db.select().from(auditEntries).orderBy(desc(auditEntries.id)).limit(1))[0];

test('every method of every route has its row, and every row its route', async () => {
  const deeds: string[] = [];
  for (const route of routeFiles()) {
    const exported = await routeModule(route);
    deeds.push(...methods.filter((method) => method in exported).map((method) => `${method} ${route}`));
  }
  expect([...Object.keys(table), ...signIn].sort()).toEqual(deeds.sort());
});

describe.each(Object.entries(table) as [Deed, Row][])('%s', (deed, { may, ask }) => {
  const changes = !deed.startsWith('GET');

  test.each(everyone.map((who, i) => ({ who, status: may[i] })))(
    '$who gets $status',
    async ({ who, status }) => {
      const asked = (await ask?.(house)) ?? {};
      const before = await newestEntry();
      const answer = await house.call(who, deed, asked);
      expect(answer.status, answer.text).toBe(status);
      expect(answer.headers.get('cache-control')).toBe('no-store');

      const after = await newestEntry();
      if (changes && status < 400) {
        const member = who === 'stranger' ? 'odile' : demoPeople.find(({ role }) => role === who)?.id;
        expect(after.id).toBeGreaterThan(before?.id ?? 0);
        expect(after.userId).toBe(member);
      } else expect(after?.id).toBe(before?.id);

      if (status >= 400) {
        expect(answer.headers.get('content-type')).toBe('application/problem+json');
        expect(answer.body).toMatchObject({ status, title: expect.any(String), detail: expect.any(String) });
      }
      if (who === 'stranger')
        expect(answer.text).not.toMatch(/Marrowby|Tollgate|two-bed-bay|marrowby-|Priya|Tomas|Maud/);
    },
  );
});
