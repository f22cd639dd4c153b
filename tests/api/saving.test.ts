import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { auditEntries } from '@/db/schema';
import { type Answer, type Ask, type Deed, type House, openHouse, type Who } from '../support/api';
import { aStopSet } from '../support/stop-sets';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

// biome-ignore lint/suspicious/noExplicitAny: a document as the API answers it
type Document = any;

/** What two people can be working on at once: how it is loaded and saved, and a change that tells who made it. */
interface Kind {
  readonly what: string;
  readonly load: Deed;
  readonly save: Deed;
  /** Makes one that nobody has touched, and answers where it is. */
  readonly make: () => Promise<Record<string, string>>;
  readonly document: (answer: Answer) => Document;
  readonly marked: (document: Document, mark: string) => unknown;
  readonly marks: (answer: Answer) => string[];
}

let made = 0;

const kinds: readonly Kind[] = [
  {
    what: 'floor plan',
    load: 'GET /api/rooms/[roomId]/floor-plan',
    save: 'PUT /api/rooms/[roomId]/floor-plan',
    make: async () => {
      const { body } = await house.call('planner', 'POST /api/rooms/import', {
        body: (await house.call('planner', 'GET /api/rooms/[roomId]/file', { params: { roomId: 'studio' } }))
          .body,
      });
      return { roomId: body.roomId };
    },
    document: ({ body }) => body.document,
    marked: (document, mark) => ({
      ...document,
      floorPlan: {
        ...document.floorPlan,
        watchPoints: [...document.floorPlan.watchPoints, { id: mark, name: mark, at: [1, 1], height: 1.7 }],
      },
    }),
    marks: ({ body }) => body.document.floorPlan.watchPoints.map(({ id }: { id: string }) => id),
  },
  {
    what: 'stop set',
    load: 'GET /api/stop-sets/[stopSetId]',
    save: 'PUT /api/stop-sets/[stopSetId]',
    make: async () => {
      const set = aStopSet(`shared-${made++}`, { stops: [] });
      await house.call('planner', 'POST /api/rooms/[roomId]/stop-sets', {
        params: { roomId: 'studio' },
        body: set,
      });
      return { stopSetId: set.id };
    },
    document: ({ body }) => body.stopSet,
    marked: (set, mark) => ({
      ...set,
      stops: [...set.stops, { id: mark, name: mark, at: [2, 2], heading: 0, dwell: 60, emitter: null }],
    }),
    marks: ({ body }) => body.stopSet.stops.map(({ id }: { id: string }) => id),
  },
];

describe.each(kinds)('a $what', ({ what, load, save, make, document, marked, marks }) => {
  let params: Record<string, string>;
  beforeEach(async () => {
    params = await make();
  });
  const loaded = () => house.call('planner', load, { params });
  const saved = (who: Who, ask: Ask) => house.call(who, save, { params, ...ask });

  test('without If-Match is not saved, and the answer says what to send', async () => {
    const before = await loaded();
    const answer = await saved('planner', { body: marked(document(before), 'x') });
    expect(answer.status).toBe(428);
    expect(answer.body.detail).toContain('If-Match');
    expect((await loaded()).body).toEqual(before.body);
  });

  test.each(['*', 'v1', '"1"', '"v-1"', '"v1", "v2"', '""', '"v99999999999999999999"'])(
    'with an If-Match of %s, which was never given out, is not saved',
    async (etag) => {
      const before = await loaded();
      const answer = await saved('planner', { body: marked(document(before), 'x'), etag });
      expect(answer.status).toBe(400);
      expect((await loaded()).body).toEqual(before.body);
    },
  );

  test('is saved under the ETag that a compressing proxy has weakened', async () => {
    const before = await loaded();
    const answer = await saved('planner', { body: marked(document(before), 'x'), etag: `W/${before.etag}` });
    expect(answer.status, answer.text).toBe(200);
  });

  test('saved over an older version is refused with who was first and when, and keeps what they saved', async () => {
    const mine = await loaded();
    const theirs = await saved('owner', { body: marked(document(mine), 'theirs'), etag: mine.etag });
    const answer = await saved('planner', { body: marked(document(mine), 'mine'), etag: mine.etag });
    const now = await loaded();
    expect(answer.status).toBe(412);
    expect(answer.body.detail).toContain(`Maud Ellery saved this ${what}`);
    expect(answer.body).toMatchObject({
      code: 'stale',
      etag: theirs.etag,
      savedBy: 'Maud Ellery',
      savedAt: now.body.updatedAt,
    });
    expect(Math.abs(Date.now() - Date.parse(answer.body.savedAt))).toBeLessThan(60_000);
    expect(marks(now)).toContain('theirs');
    expect(marks(now)).not.toContain('mine');

    const chosen = await saved('planner', { body: marked(document(now), 'mine'), etag: answer.body.etag });
    expect(chosen.status).toBe(200);
    expect(marks(await loaded())).toEqual(expect.arrayContaining(['theirs', 'mine']));
  });

  test('sent again because the first answer was lost on the way is saved once, not refused', async () => {
    const before = await loaded();
    const ask = { body: marked(document(before), 'mine'), etag: before.etag };
    const first = await saved('planner', ask);
    const audited = await entries();
    const again = await saved('planner', ask);
    expect(again.status, again.text).toBe(200);
    expect(again.etag).toBe(first.etag);
    expect(await entries()).toBe(audited);
    expect((await saved('owner', ask)).status).toBe(412);
  });

  const entries = async () => (await house.database.db.select().from(auditEntries)).length;

  test('that fifty people save at once, each loading again and trying again, keeps the work of all fifty; one wins each version', async () => {
    const wins = new Map<string, number>();
    const first = await loaded();
    const refused: Answer[] = [];
    await Promise.all(
      Array.from({ length: 50 }, async (_, i) => {
        for (let tries = 0; tries <= 50; tries++) {
          const now = await loaded();
          const answer = await saved(i % 2 ? 'owner' : 'planner', {
            body: marked(document(now), `person-${i}`),
            etag: now.etag,
          });
          if (answer.status === 200) {
            wins.set(now.etag, (wins.get(now.etag) ?? 0) + 1);
            return;
          }
          refused.push(answer);
        }
        throw new Error(`Person ${i} never got through`);
      }),
    );
    expect(new Set(refused.map(({ status }) => status))).toEqual(new Set([412]));
    expect([...wins.values()]).toEqual(Array.from({ length: 50 }, () => 1));
    const last = await loaded();
    expect(last.body.version).toBe(first.body.version + 50);
    const found = marks(last).filter((mark) => mark.startsWith('person-'));
    expect(found.sort()).toEqual(Array.from({ length: 50 }, (_, i) => `person-${i}`).sort());
  });
});
