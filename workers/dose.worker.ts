import * as Comlink from 'comlink';
import {
  findGaps,
  type GridSurface,
  gapCauses,
  irradianceAt,
  irradianceMap,
  irradianceStrip,
  legDoses,
  type PreparedScene,
  passDoseMap,
  passDoseStrip,
  passLegs,
  planeSurface,
  prepareScene,
  type SideStrip,
  sideGaps,
  sideStrips,
  stripField,
  stripStarts,
  topsSurface,
  UndefinedReadingError,
} from '@/lib/engine';
import type { DoseWorker, GapsReport, LampJob, LitPlan, MapSurface, RoomJob } from './protocol';

interface Loaded {
  readonly job: RoomJob;
  readonly prepared: PreparedScene;
  readonly surface: MapSurface;
}

// The room being looked at and the one before it: a job in flight may still refer to the older.
let rooms: readonly Loaded[] = [];

function roomOf(key: string): Loaded {
  const room = rooms.find(({ job }) => job.key === key);
  if (!room) throw new Error('The worker was asked about a room it does not hold. Reload the page.');
  return room;
}

function surfaceOf({ scene, outline, voids, ceiling, surface, step }: RoomJob): MapSurface {
  const area = { outline, voids, solids: scene.solids, step };
  if (surface.kind !== 'sides') {
    const grid = surface.kind === 'plane' ? planeSurface({ ...area, z: surface.z }) : topsSurface(area);
    return { kind: 'grid', grid, mask: grid.mask };
  }
  const strips = sideStrips({ ...area, walls: scene.walls, ceiling });
  const starts = stripStarts(strips);
  const mask = new Uint8Array(starts[strips.length]);
  strips.forEach((strip, k) => {
    mask.set(strip.mask, starts[k]);
  });
  return { kind: 'sides', strips, mask };
}

function mapOf({ prepared, surface }: Loaded, lamp: LampJob): Float32Array {
  if (surface.kind === 'grid')
    return lamp.kind === 'stop'
      ? irradianceMap(prepared, lamp.placement, surface.grid)
      : passDoseMap(prepared, lamp.pass, surface.grid);
  return stripField(surface.strips, (strip) =>
    lamp.kind === 'stop'
      ? irradianceStrip(prepared, lamp.placement, strip)
      : passDoseStrip(prepared, lamp.pass, strip),
  );
}

function spotsOf({ prepared, job: { spots } }: Loaded, lamp: LampJob): Float64Array {
  if (lamp.kind === 'stop')
    return Float64Array.from(spots, ({ p, n }) => {
      try {
        return irradianceAt(prepared, lamp.placement, { p, mode: 'normal', n });
      } catch (error) {
        // A touch point inside the lamp: it has no reading, so it counts no dose from it.
        if (error instanceof UndefinedReadingError) return 0;
        throw error;
      }
    });
  const sum = new Float64Array(spots.length);
  for (const leg of passLegs(lamp.pass)) {
    // One by one: touch points lie all over the room, and share nothing.
    spots.forEach((spot, i) => {
      sum[i] += legDoses(prepared, leg, [spot])[0];
    });
  }
  return sum;
}

function gridGaps(
  { scene }: RoomJob,
  surface: GridSurface,
  lit: LitPlan,
  dose: Float32Array,
  target: number,
): GapsReport {
  const ratio = dose.map((value) => value / target);
  const { gaps, labels, specksArea } = findGaps(surface, ratio);
  const causes = gapCauses({ scene, ...lit, surface, dose, target, gaps, labels }).gapCauses;
  return {
    labels,
    specksArea,
    gaps: gaps.map(({ number, area, lowestRatio, x, y }, i) => ({
      number,
      area,
      lowestRatio,
      cause: causes[i],
      at: [x, y],
      strip: null,
    })),
  };
}

function stripGaps(
  { scene }: RoomJob,
  strips: readonly SideStrip[],
  lit: LitPlan,
  dose: Float32Array,
  target: number,
): GapsReport {
  const { gaps, ...found } = sideGaps({ scene, strips, ...lit, dose, target });
  return { ...found, gaps: gaps.map(({ x, y, ...gap }) => ({ ...gap, at: [x, y] })) };
}

const worker: DoseWorker = {
  load(job) {
    const found = rooms.find((loaded) => loaded.job.key === job.key);
    if (found) return found.surface;
    const surface = surfaceOf(job);
    rooms = [{ job, prepared: prepareScene(job.scene), surface }, ...rooms].slice(0, 2);
    return surface;
  },

  light(roomKey, lamp) {
    const room = roomOf(roomKey);
    const field = { map: mapOf(room, lamp), spots: spotsOf(room, lamp) };
    return Comlink.transfer(field, [field.map.buffer, field.spots.buffer]);
  },

  gaps(roomKey, lit, dose, target) {
    const { job, surface } = roomOf(roomKey);
    const report =
      surface.kind === 'grid'
        ? gridGaps(job, surface.grid, lit, dose, target)
        : stripGaps(job, surface.strips, lit, dose, target);
    return Comlink.transfer(report, [report.labels.buffer]);
  },
};

Comlink.expose(worker);
