import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { auditEntries, emitters, rooms, sites, stopSets } from '@/db/schema';
import { demoRooms } from '@/db/seed/rooms';
import type { RoomFile, StopSet } from '@/lib/room';
import { anyRoomFile } from '../support/any-room-file';
import { type House, openHouse, type Who } from '../support/api';
import { seeded } from '../support/properties';
import { aStopSet } from '../support/stop-sets';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

const importing = (who: Who, body: unknown) => house.call(who, 'POST /api/rooms/import', { body });
const exported = (who: Who, roomId: string) =>
  house.call(who, 'GET /api/rooms/[roomId]/file', { params: { roomId } });

const usedBy = (sets: readonly StopSet[]) =>
  new Set(sets.flatMap((set) => [set, ...set.stops, ...set.passes].map(({ emitter }) => emitter)));

/** What a file holds, but for what must differ on the way in where something of that id or name is there already. */
function content(file: RoomFile): string {
  const used = usedBy(file.stopSets);
  return JSON.stringify({
    ...file,
    room: { ...file.room, name: file.room.name.replace(/ \(\d+\)$/, '') },
    emitters: Object.fromEntries(
      Object.entries(file.emitters)
        .filter(([key]) => used.has(key))
        .sort(([one], [two]) => (one < two ? -1 : 1)),
    ),
    stopSets: file.stopSets.map((set, i) => ({ ...set, id: i })),
  });
}

const counts = async () => {
  const { db } = house.database;
  return Promise.all([sites, rooms, emitters, stopSets, auditEntries].map((table) => db.$count(table)));
};

test.each(Object.entries(demoRooms))('%s goes in and comes out the same, and again', async (_, file) => {
  const { body: made, status } = await importing('stranger', file);
  expect(status).toBe(201);
  const out = await exported('stranger', made.roomId);
  expect(out.headers.get('content-disposition')).toMatch(
    /^attachment; filename="[a-z0-9.-]+\.leeside\.json"$/,
  );
  expect(content(out.body)).toBe(content(file));
  const { body: again } = await importing('stranger', out.body);
  expect(content((await exported('stranger', again.roomId)).body)).toBe(content(file));
});

test('any room that holds together goes in and comes out the same, and its lamp is added once', async () => {
  await fc.assert(
    fc.asyncProperty(anyRoomFile, async (file) => {
      const { body: made, status, text } = await importing('stranger', file);
      expect(status, text).toBe(201);
      expect(content((await exported('stranger', made.roomId)).body)).toBe(content(file));
    }),
    seeded(40),
  );
  const { body } = await house.call('stranger', 'GET /api/emitters');
  expect(Object.keys(body.emitters).filter((key) => key.startsWith('the-lamp'))).toEqual(['the-lamp']);
});

test('a lamp of the same key that is another lamp comes in beside ours, and the stops go with it', async () => {
  const file = structuredClone(demoRooms['side-room']);
  file.emitters.tower.tubes[0].watts = 55;
  const { body: made } = await importing('planner', file);
  const out: RoomFile = (await exported('planner', made.roomId)).body;
  const key = out.stopSets[0].emitter;
  expect(key).toBe('tower-2');
  expect(out.emitters[key]).toEqual(file.emitters.tower);
  const ours = await house.call('planner', 'GET /api/emitters');
  expect(ours.body.emitters.tower.tubes[0].watts).toBe(110);
});

test('a room of the same name comes in under the next free name, however long and of whatever letters', async () => {
  for (const name of ['Bay', '🛏'.repeat(40), `${'x'.repeat(75)} yyyy`]) {
    const file = { ...demoRooms.studio, room: { ...demoRooms.studio.room, name } };
    const names: string[] = [];
    for (let i = 0; i < 3; i++) {
      const { body, status, text } = await importing('planner', file);
      expect(status, text).toBe(201);
      names.push(body.name);
    }
    expect(new Set(names).size).toBe(3);
    expect(names[0]).toBe(name);
    expect(names[2]).toMatch(/ \(3\)$/);
  }
  expect((await house.call('planner', 'GET /api/rooms')).status).toBe(200);
});

describe('a file that does not hold together brings in nothing at all', () => {
  const file = demoRooms['weights-floor'];
  const last = file.stopSets.length - 1;
  const lamp = Object.keys(file.emitters)[0];

  test.each<[string, (file: RoomFile) => void, string, RegExp]>([
    ['is of another version', (it) => Object.assign(it, { version: 2 }), 'version', /version 1/],
    ['is no room file', (it) => Object.assign(it, { format: 'something' }), 'format', /leeside-room/],
    [
      'names a lamp that is not in it',
      (it) => {
        it.stopSets[last].emitter = 'gone';
      },
      `stopSets[${last}].emitter`,
      /no emitter "gone"/,
    ],
    [
      'has a door in a wall that is not there',
      (it) => {
        it.floorPlan.openings[0].wall = 'outline:99';
      },
      'floorPlan.openings[0].wall',
      /no wall "outline:99"/,
    ],
    [
      'has a door beyond its wall’s end',
      (it) => {
        it.floorPlan.openings[0].to = 499;
      },
      'floorPlan.openings[0].to',
      /wall ends at/,
    ],
    [
      'has two pieces of one id',
      (it) => {
        it.floorPlan.furniture[1].id = it.floorPlan.furniture[0].id;
      },
      'floorPlan.furniture[1].id',
      /used twice/,
    ],
    [
      'has two stop sets of one id',
      (it) => {
        it.stopSets.push(it.stopSets[0]);
      },
      `stopSets[${last + 1}].id`,
      /used twice/,
    ],
    [
      'has a part upside down',
      (it) => {
        it.floorPlan.furniture[2].parts[0].top = 0;
      },
      'floorPlan.furniture[2].parts[0].top',
      /higher/,
    ],
    [
      'has fewer walls than sides',
      (it) => {
        it.floorPlan.outlineWalls.pop();
      },
      'floorPlan.outlineWalls',
      /one wall for each side/,
    ],
    [
      'has a lamp of no output',
      (it) => {
        it.emitters[lamp].tubes[0].watts = 0;
      },
      `emitters.${lamp}.tubes[0].watts`,
      /above 0 W/,
    ],
  ])('%s', async (_, spoil, path, words) => {
    const spoilt = structuredClone(file);
    spoilt.room.site = 'A site that would be new';
    spoil(spoilt);
    const before = await counts();
    const answer = await importing('planner', spoilt);
    expect(answer.status).toBe(422);
    expect(answer.body.faults).toContainEqual({ path, message: expect.stringMatching(words) });
    expect(await counts()).toEqual(before);
  });
});

test('an import is in the audit trail with everything it added', async () => {
  const site = 'A new site';
  const file = { ...demoRooms.studio, room: { ...demoRooms.studio.room, site } };
  await importing('planner', file);
  const trail = await house.database.db.select().from(auditEntries);
  expect(trail.slice(-2).map(({ action, userId }) => [action, userId])).toEqual([
    ['add site', 'tomas'],
    ['import room', 'tomas'],
  ]);
});

test('a room with nothing drawn in it says so instead of a file', async () => {
  const { body: room } = await house.call('planner', 'POST /api/rooms', {
    body: { siteId: 'marrowby-tollgate-gym', name: 'Bare' },
  });
  const answer = await exported('planner', room.id);
  expect(answer.status).toBe(422);
  expect(answer.body.detail).toContain('Draw the room first');
  await house.call('planner', 'POST /api/rooms/[roomId]/stop-sets', {
    params: { roomId: room.id },
    body: aStopSet('early'),
  });
  const csv = await house.call('planner', 'GET /api/stop-sets/[stopSetId]/csv', {
    params: { stopSetId: 'early' },
  });
  expect(csv.status).toBe(422);
});
