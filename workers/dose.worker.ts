import * as Comlink from 'comlink';
import {
  findGaps,
  gapCauses,
  irradianceMap,
  type PreparedScene,
  planeSurface,
  prepareScene,
  topsSurface,
} from '@/lib/engine';
import type { GridSurface, Scene } from '@/lib/engine/types';
import type { DoseWorker } from './protocol';

interface Loaded {
  readonly key: string;
  readonly scene: Scene;
  readonly prepared: PreparedScene;
  readonly surface: GridSurface;
}

// The room being looked at and the one before it: a job in flight may still refer to the older.
let rooms: readonly Loaded[] = [];

function roomOf(key: string): Loaded {
  const room = rooms.find((loaded) => loaded.key === key);
  if (!room) throw new Error('The worker was asked about a room it does not hold. Reload the page.');
  return room;
}

const worker: DoseWorker = {
  load({ key, scene, outline, voids, surface: choice, step }) {
    const found = rooms.find((loaded) => loaded.key === key);
    if (found) return found.surface;
    const around = { outline, voids, solids: scene.solids, step };
    const surface = choice.kind === 'plane' ? planeSurface({ ...around, z: choice.z }) : topsSurface(around);
    rooms = [{ key, scene, prepared: prepareScene(scene), surface }, ...rooms].slice(0, 2);
    return surface;
  },

  irradiance(roomKey, placement) {
    const { prepared, surface } = roomOf(roomKey);
    const map = irradianceMap(prepared, placement, surface);
    return Comlink.transfer(map, [map.buffer]);
  },

  gaps(roomKey, stops, dose, target) {
    const { scene, surface } = roomOf(roomKey);
    const ratio = dose.map((value) => value / target);
    const found = findGaps(surface, ratio);
    const { gapCauses: causes } = gapCauses({ scene, stops, surface, dose, target, ...found });
    const report = {
      gaps: found.gaps.map((gap, i) => ({
        number: gap.number,
        area: gap.area,
        lowestRatio: gap.lowestRatio,
        cause: causes[i],
        at: [gap.x, gap.y] as const,
      })),
      specksArea: found.specksArea,
      labels: found.labels,
    };
    return Comlink.transfer(report, [found.labels.buffer]);
  },
};

Comlink.expose(worker);
