import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { auditEntries, stopSets } from '@/db/schema';
import { type Ask, type House, openHouse, type Who } from '../support/api';
import { aStopSet } from '../support/stop-sets';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

describe('a stop set', () => {
  const rooms = { params: { roomId: 'studio' } };
  const add = (who: Who, body: unknown) =>
    house.call(who, 'POST /api/rooms/[roomId]/stop-sets', { ...rooms, body });
  const at = (stopSetId: string, etag?: string): Ask => ({ params: { stopSetId }, etag });

  test('added twice by a repeated request is there once', async () => {
    const set = aStopSet('repeated');
    expect((await add('planner', set)).status).toBe(201);
    const again = await add('planner', set);
    expect(again.status).toBe(200);
    expect(again.etag).toBe('"v1"');
    const { body } = await house.call('planner', 'GET /api/rooms/[roomId]/stop-sets', rooms);
    expect(body.stopSets.filter((it: { stopSet: { id: string } }) => it.stopSet.id === set.id)).toHaveLength(
      1,
    );
  });

  test('added under the id of another one is refused rather than dropped', async () => {
    await add('planner', aStopSet('one-of-two'));
    const answer = await add('planner', aStopSet('one-of-two', { name: 'Other work' }));
    expect(answer.status).toBe(409);
    expect(answer.body.faults).toEqual([{ path: 'id', message: expect.any(String) }]);
    const elsewhere = await house.call('planner', 'POST /api/rooms/[roomId]/stop-sets', {
      params: { roomId: 'side-room' },
      body: aStopSet('one-of-two'),
    });
    expect(elsewhere.status).toBe(409);
  });

  test('is deleted at the version that was seen, and only then', async () => {
    const { etag } = await add('planner', aStopSet('to-delete'));
    const deleted = (asked: Ask) => house.call('planner', 'DELETE /api/stop-sets/[stopSetId]', asked);
    expect((await deleted(at('to-delete'))).status).toBe(428);
    await house.call('owner', 'PUT /api/stop-sets/[stopSetId]', {
      ...at('to-delete', etag),
      body: aStopSet('to-delete', { name: 'Renamed' }),
    });
    const stale = await deleted(at('to-delete', etag));
    expect(stale.status).toBe(412);
    expect(stale.body.savedBy).toBe('Maud Ellery');
    expect((await deleted(at('to-delete', stale.body.etag))).status).toBe(204);
    expect((await house.call('planner', 'GET /api/stop-sets/[stopSetId]', at('to-delete'))).status).toBe(404);
    expect((await deleted(at('to-delete', stale.body.etag))).status).toBe(404);
    const trail = await house.database.db
      .select({ action: auditEntries.action, by: auditEntries.userId })
      .from(auditEntries)
      .where(eq(auditEntries.thingId, 'to-delete'));
    expect(trail).toEqual([
      { action: 'add stop set', by: 'tomas' },
      { action: 'save stop set', by: 'maud' },
      { action: 'delete stop set', by: 'tomas' },
    ]);
  });

  test('beyond what a room file holds is refused, so that the room can still be exported', async () => {
    const params = { roomId: 'weights-floor' };
    const statuses: number[] = [];
    for (let i = 0; i < 41; i++) {
      const { status } = await house.call('planner', 'POST /api/rooms/[roomId]/stop-sets', {
        params,
        body: aStopSet(`many-${i}`),
      });
      statuses.push(status);
    }
    expect(new Set(statuses)).toEqual(new Set([201, 409]));
    const file = await house.call('crew', 'GET /api/rooms/[roomId]/file', { params });
    expect(file.status).toBe(200);
    expect(file.body.stopSets).toHaveLength(40);
  });

  test('saved under another’s address is refused', async () => {
    const { etag } = await add('planner', aStopSet('here'));
    const answer = await house.call('planner', 'PUT /api/stop-sets/[stopSetId]', {
      ...at('here', etag),
      body: aStopSet('there'),
    });
    expect(answer.status).toBe(422);
    expect(answer.body.faults[0].path).toBe('id');
  });

  test('past draft neither changes nor goes', async () => {
    const { etag } = await add('planner', aStopSet('signed'));
    await house.database.db.update(stopSets).set({ status: 'approved' }).where(eq(stopSets.id, 'signed'));
    for (const deed of ['PUT', 'DELETE'] as const) {
      const answer = await house.call('planner', `${deed} /api/stop-sets/[stopSetId]`, {
        ...at('signed', etag),
        ...(deed === 'PUT' ? { body: aStopSet('signed') } : {}),
      });
      expect(answer.status).toBe(409);
      expect(answer.body.detail).toContain('approved');
    }
  });
});
