import { afterAll, beforeAll, expect, test } from 'vitest';
import { demoRooms } from '@/db/seed/rooms';
import type { StopSet } from '@/lib/room';
import { type House, openHouse } from '../support/api';
import { readCsv } from '../support/csv';
import { aStopSet } from '../support/stop-sets';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

const COLUMNS =
  'order,name,kind,from_wall_1,distance_1_m,from_wall_2,distance_2_m,heading_deg,dwell_s,speed_m_s,emitter';

const csvOf = (stopSetId: string) =>
  house.call('crew', 'GET /api/stop-sets/[stopSetId]/csv', { params: { stopSetId } });

type Row = Record<string, string>;

function rowsOf(text: string): Row[] {
  const [head, ...rows] = readCsv(text);
  expect(head.join()).toBe(COLUMNS);
  return rows.map((row) => {
    expect(row).toHaveLength(head.length);
    return Object.fromEntries(row.map((cell, i) => [head[i], cell]));
  });
}

const sets: [string, StopSet][] = Object.entries(demoRooms).flatMap(([room, { stopSets }]) =>
  stopSets.map((set): [string, StopSet] => [room, set]),
);

test.each(sets)(
  '%s: the crew’s list reads back to the same stops, tapes to the centimetre from two walls that cross',
  async (room, set) => {
    const { floorPlan, emitters } = demoRooms[room];
    const answer = await csvOf(set.id);
    expect(answer.status).toBe(200);
    expect(answer.headers.get('content-type')).toBe('text/csv; charset=utf-8');
    expect(answer.headers.get('content-disposition')).toMatch(/^attachment; filename="[a-z0-9.-]+\.csv"$/);
    const rows = rowsOf(answer.text);
    expect(rows).toHaveLength(set.stops.length + set.passes.length);

    const lines = floorPlan.outline.map((a, i) => ({
      name: floorPlan.outlineWalls[i].name,
      a,
      b: floorPlan.outline[(i + 1) % floorPlan.outline.length],
    }));
    const walls = [...lines, ...floorPlan.innerWalls.map(({ name, a, b }) => ({ name, a, b }))];
    const thickness = new Map(floorPlan.innerWalls.map((wall) => [wall.name, wall.thickness]));
    /** Square distance to the face of a wall of that name that is nearest to what the tape says. */
    const misses = (name: string, tape: number, [x, y]: readonly [number, number]) =>
      Math.min(
        ...walls
          .filter((wall) => wall.name === name)
          .map(({ a, b }) => {
            const square =
              Math.abs((x - a[0]) * (b[1] - a[1]) - (y - a[1]) * (b[0] - a[0])) /
              Math.hypot(b[0] - a[0], b[1] - a[1]);
            return Math.abs(square - (thickness.get(name) ?? 0) / 2 - tape);
          }),
      );
    const directions = (name: string) =>
      walls.filter((wall) => wall.name === name).map(({ a, b }) => Math.atan2(b[1] - a[1], b[0] - a[0]));

    const items = [
      ...set.stops.map((stop) => ({ ...stop, kind: 'stop', mark: stop.at, speed: null })),
      ...set.passes.map((pass) => ({ ...pass, kind: 'pass', mark: pass.path[0], dwell: null })),
    ];
    for (const [i, item] of items.entries()) {
      const row = rows[i];
      expect(row).toMatchObject({ order: String(i + 1), name: item.name, kind: item.kind });
      expect(row.heading_deg).toBe(item.heading === null ? '' : String(item.heading));
      expect(row.dwell_s).toBe(item.dwell === null ? '' : String(item.dwell));
      expect(row.speed_m_s).toBe(item.speed === null ? '' : String(item.speed));
      expect(row.emitter).toBe(emitters[item.emitter ?? set.emitter].name);
      for (const n of [1, 2]) {
        expect(row[`distance_${n}_m`]).toMatch(/^\d+\.\d\d$/);
        expect(misses(row[`from_wall_${n}`], Number(row[`distance_${n}_m`]), item.mark)).toBeLessThanOrEqual(
          0.0051,
        );
      }
      const across = directions(row.from_wall_1).flatMap((one) =>
        directions(row.from_wall_2).map((two) => Math.abs(Math.sin(one - two))),
      );
      expect(Math.max(...across)).toBeGreaterThan(Math.sin((20 * Math.PI) / 180));
    }
  },
);

test('names of whatever kind come out as they went in, and none is taken for a formula', async () => {
  const names = ['by the "window"', 'bed, left', '=SUM(A1)', '+1', '-1', '@home', 'Ärger 🛏'];
  const set = aStopSet('odd-names', {
    stops: names.map((name, i) => ({ id: `s${i}`, name, at: [2, 2], heading: 0, dwell: 60, emitter: null })),
    passes: [],
  });
  const added = await house.call('planner', 'POST /api/rooms/[roomId]/stop-sets', {
    params: { roomId: 'two-bed-bay' },
    body: set,
  });
  expect(added.status).toBe(201);
  const { text } = await csvOf(set.id);
  const rows = rowsOf(text);
  expect(rows.map(({ name }) => name.replace(/^'/, ''))).toEqual(names);
  for (const row of rows) expect(row.name).not.toMatch(/^[=+\-@]/);
  expect(text.endsWith('\r\n')).toBe(true);
});
