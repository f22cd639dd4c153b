import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { auditEntries } from '@/db/schema';
import { type House, openHouse } from '../support/api';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

test('a revision is a copy that later saves leave alone', async () => {
  const params = { roomId: 'side-room' };
  const before = await house.call('planner', 'GET /api/rooms/[roomId]/floor-plan', { params });
  const { body: made } = await house.call('planner', 'POST /api/rooms/[roomId]/revisions', {
    params,
    body: { note: ' Before the bed moved ' },
  });
  expect(made).toMatchObject({
    number: 2,
    note: 'Before the bed moved',
    createdBy: 'Tomas Quill',
    planVersion: 1,
  });
  await house.call('planner', 'PUT /api/rooms/[roomId]/floor-plan', {
    params,
    etag: before.etag,
    body: { ...before.body.document, ceiling: 3 },
  });
  const frozen = await house.call('crew', 'GET /api/rooms/[roomId]/revisions/[number]', {
    params: { ...params, number: '2' },
  });
  expect(frozen.body.document).toEqual(before.body.document);
  const list = await house.call('crew', 'GET /api/rooms/[roomId]/revisions', { params });
  expect(list.body.revisions.map(({ number }: { number: number }) => number)).toEqual([2, 1]);
});

test('a new room is bare, can be drawn from version 0 on, and only once', async () => {
  const { body: room, status } = await house.call('planner', 'POST /api/rooms', {
    body: { siteId: 'marrowby-tollgate-gym', name: ' Sauna ', area: 'Basement' },
  });
  expect(status).toBe(201);
  expect(room).toMatchObject({ name: 'Sauna', area: 'Basement', drawn: false, revision: null, stopSets: [] });
  const params = { roomId: room.id };
  const bare = await house.call('planner', 'GET /api/rooms/[roomId]/floor-plan', { params });
  expect(bare.body).toMatchObject({ document: null, version: 0, revision: null });
  const none = await house.call('planner', 'POST /api/rooms/[roomId]/revisions', { params, body: {} });
  expect(none.status).toBe(422);

  const studio = await house.call('planner', 'GET /api/rooms/[roomId]/floor-plan', {
    params: { roomId: 'studio' },
  });
  const draw = (who: 'owner' | 'planner', ceiling: number) =>
    house.call(who, 'PUT /api/rooms/[roomId]/floor-plan', {
      params,
      etag: bare.etag,
      body: { ...studio.body.document, ceiling },
    });
  expect((await draw('planner', 3)).status).toBe(200);
  const second = await draw('owner', 4);
  expect(second.status).toBe(412);
  expect(second.body.savedBy).toBe('Tomas Quill');
  const { body: drawn } = await house.call('crew', 'GET /api/rooms/[roomId]', { params });
  expect(drawn).toMatchObject({ drawn: true, updatedBy: 'Tomas Quill' });
});

test('a room is renamed, archived and brought back, each with its entry', async () => {
  const params = { roomId: 'treatment-room' };
  const change = async (body: object) =>
    (await house.call('owner', 'PATCH /api/rooms/[roomId]', { params, body })).body;
  expect(await change({ name: 'Treatment 1', area: null })).toMatchObject({
    name: 'Treatment 1',
    area: null,
  });
  expect(await change({ archived: true })).toMatchObject({ archived: true, name: 'Treatment 1' });
  const { body } = await house.call('crew', 'GET /api/rooms');
  expect(body.rooms.find(({ id }: { id: string }) => id === params.roomId).archived).toBe(true);
  expect(await change({ archived: false })).toMatchObject({ archived: false });
  const trail = await house.database.db
    .select({ action: auditEntries.action, details: auditEntries.details })
    .from(auditEntries)
    .where(eq(auditEntries.thingId, params.roomId));
  expect(trail).toEqual([
    { action: 'change room', details: { name: 'Treatment 1', area: null } },
    { action: 'archive room', details: {} },
    { action: 'restore room', details: {} },
  ]);
});

test('two sites of one organisation cannot share a name; two organisations can', async () => {
  const add = (who: 'owner' | 'stranger') =>
    house.call(who, 'POST /api/sites', { body: { name: 'North House' } });
  expect((await add('owner')).status).toBe(201);
  const again = await add('owner');
  expect(again.status).toBe(409);
  expect(again.body.faults).toEqual([{ path: 'name', message: 'Already taken' }]);
  expect((await add('stranger')).status).toBe(201);
});
