import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { DoseSession, type DoseView } from '@/components/hooks/dose-session';
import { moveStop, renameStop, setDwell } from '@/lib/editor/stop-set-actions';
import { irradianceMap, planeSurface, prepareScene } from '@/lib/engine';
import type { RoomFile } from '@/lib/room';
import type { DosePool } from '@/workers/pool';
import type { GapsReport, LampField, LampJob, MapSurface, RoomJob } from '@/workers/protocol';

const file: RoomFile = JSON.parse(readFileSync('db/seed/rooms/treatment-room.json', 'utf8'));
const [set] = file.stopSets;
const base = {
  document: { ceiling: file.room.ceiling, floorPlan: file.floorPlan },
  set,
  emitters: file.emitters,
  surface: { kind: 'plane', z: 0.75 } as const,
  step: 0.25,
};

const noGaps: GapsReport = { gaps: [], specksArea: 0, labels: new Int32Array() };

/** A pool that works at once, or holds each map back until the test lets it go. */
function pool({ held = false } = {}) {
  const waiting: { job: LampJob; go: () => void }[] = [];
  let asked = 0;
  const surfaceOf = ({ scene, outline, voids, step }: RoomJob): Extract<MapSurface, { kind: 'grid' }> => {
    const grid = planeSurface({ outline, voids, solids: scene.solids, step, z: 0.75 });
    return { kind: 'grid', grid, mask: grid.mask };
  };
  const answer = (room: RoomJob, job: LampJob): LampField => ({
    map:
      job.kind === 'stop'
        ? irradianceMap(prepareScene(room.scene), job.placement, surfaceOf(room).grid)
        : new Float32Array(),
    spots: new Float64Array(room.spots.length),
  });
  const fake = {
    surface: async (room: RoomJob) => surfaceOf(room),
    light: (_: string, room: RoomJob, job: LampJob) => {
      asked++;
      const field = answer(room, job);
      if (!held) return Promise.resolve(field);
      return new Promise<LampField>((resolve) => waiting.push({ job, go: () => resolve(field) }));
    },
    gaps: async () => noGaps,
    close: () => {},
  } as unknown as DosePool;
  return { fake, waiting, asked: () => asked };
}

/** Lets everything that is ready happen. */
const settle = () => new Promise((resolve) => setTimeout(resolve, 5));

async function open(options?: { held: boolean }) {
  const made = pool(options);
  const session = new DoseSession(made.fake);
  const views: DoseView[] = [];
  session.subscribe(() => views.push(session.getView()));
  session.show(base);
  await settle();
  return { session, views, ...made };
}

describe('the dose session', () => {
  test('asks one map a stop, and none for another dwell', async () => {
    const { session, asked } = await open();
    expect(asked()).toBe(set.stops.length);
    const before = session.getView().picture?.coverage.share ?? 0;
    session.show({ ...base, set: setDwell(set, set.stops[0].id, 3600) });
    await settle();
    expect(asked()).toBe(set.stops.length);
    expect(session.getView().picture?.coverage.share).toBeGreaterThan(before);
  });

  test('asks only for the stop that moved, and settles for the set that is shown', async () => {
    const { session, asked } = await open();
    const moved = moveStop(set, set.stops[1].id, [1.2, 1.2]);
    session.show({ ...base, set: moved });
    expect(session.getView().settledFor).toBeNull();
    await settle();
    expect(asked()).toBe(set.stops.length + 1);
    expect(session.getView().settledFor).toBe(moved);
  });

  test('adds nothing up anew while a map is on its way, nor for a new name', async () => {
    const { session, waiting } = await open({ held: true });
    for (const { go } of waiting.splice(0)) go();
    await settle();
    const { picture } = session.getView();
    session.show({ ...base, set: moveStop(set, set.stops[0].id, [2, 2]) });
    session.show({ ...base, set: moveStop(set, set.stops[0].id, [2.1, 2]) });
    await settle();
    expect(session.getView().picture).toBe(picture);
    expect(session.getView().pending).toBe(1);
    const renamed = renameStop(set, set.stops[0].id, 'Door');
    session.show({ ...base, set: renamed });
    await settle();
    expect(session.getView().picture).toBe(picture);
    expect(session.getView().settledFor).toBe(renamed);
  });

  test('a stop put back before its map came keeps its own map', async () => {
    const { session, waiting } = await open({ held: true });
    for (const { go } of waiting.splice(0)) go();
    await settle();
    const dose = [...(session.getView().picture?.dose ?? [])];
    session.show({ ...base, set: moveStop(set, set.stops[0].id, [2, 2]) });
    session.show(base);
    for (const { go } of waiting.splice(0)) go();
    await settle();
    expect([...(session.getView().picture?.dose ?? [])]).toEqual(dose);
    expect(session.getView().settledFor).toBe(set);
  });

  test('shows no half-filled picture of a room that has just been opened', async () => {
    const { session, waiting } = await open({ held: true });
    waiting.shift()?.go();
    await settle();
    expect(session.getView().picture).toBeNull();
    for (const { go } of waiting.splice(0)) go();
    await settle();
    expect(session.getView().picture).not.toBeNull();
  });

  test('a worker that fails reaches the person as words, once', async () => {
    const failing = {
      ...pool().fake,
      surface: () => Promise.reject(new Error('The worker is gone.')),
    } as unknown as DosePool;
    const session = new DoseSession(failing);
    session.show(base);
    await settle();
    expect(session.getView().failure).toBe('The worker is gone.');
  });
});
