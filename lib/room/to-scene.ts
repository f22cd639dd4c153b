import type {
  Emitter as EngineEmitter,
  Pass as EnginePass,
  Placement,
  Point,
  Scene,
  Solid,
  Wall,
  WallOpening,
} from '@/lib/engine/types';
import { toRadians } from '@/lib/units';
import type { Emitter } from './schema/emitter';
import type { FloorPlan, Furniture, InnerWall, Opening, Part } from './schema/floor-plan';
import type { PlanPoint } from './schema/primitives';

/** A point in a piece's own axes, turned clockwise by `turn` about `at`, in plan. */
export function inPlan(piece: Pick<Furniture, 'at' | 'turn'>, [x, y]: PlanPoint): PlanPoint {
  const cos = Math.cos(toRadians(piece.turn));
  const sin = Math.sin(toRadians(piece.turn));
  return [piece.at[0] + x * cos - y * sin, piece.at[1] + x * sin + y * cos];
}

export const footprintInPlan = (
  piece: Pick<Furniture, 'at' | 'turn'>,
  part: Pick<Part, 'footprint'>,
): PlanPoint[] => part.footprint.map((corner) => inPlan(piece, corner));

/** The four corners of an inner wall's slab; a→b along the first side. `null` for a wall of no length. */
export function slabOf({ a, b, thickness }: Pick<InnerWall, 'a' | 'b' | 'thickness'>): PlanPoint[] | null {
  const span = Math.hypot(b[0] - a[0], b[1] - a[1]);
  if (span === 0) return null;
  const nx = (-(b[1] - a[1]) / span) * (thickness / 2);
  const ny = ((b[0] - a[0]) / span) * (thickness / 2);
  return [
    [a[0] - nx, a[1] - ny],
    [b[0] - nx, b[1] - ny],
    [b[0] + nx, b[1] + ny],
    [a[0] + nx, a[1] + ny],
  ];
}

const toWallOpening = (opening: Opening): WallOpening => ({
  from: opening.from,
  to: opening.to,
  sill: opening.sill,
  head: opening.head,
  transmittance: opening.open ? 1 : opening.transmittance,
});

/**
 * The engine's walls have no thickness. The outline is its room-side face. An inner wall's slab becomes its
 * four sides with the openings in both faces: a slab is convex, so a ray through both faces' openings stays
 * inside the reveal, and any other ray meets a side. Where a wall has several openings their jambs stand in the
 * slab too, or a ray could go in by one and out by the next through the pier between. The pane's transmittance
 * is counted once, on the first face.
 */
function wallsOf(plan: FloorPlan): Wall[] {
  const openingsOn = (wall: string) =>
    plan.openings.filter((opening) => opening.wall === wall).map(toWallOpening);
  const outline = plan.outline.map((a, i) => ({
    a,
    b: plan.outline[(i + 1) % plan.outline.length],
    openings: openingsOn(`outline:${i}`),
  }));
  const inner = plan.innerWalls.flatMap((wall) => {
    const slab = slabOf(wall);
    if (!slab) return [];
    const openings = openingsOn(wall.id);
    const farFace = openings.map((opening) => ({
      ...opening,
      transmittance: opening.transmittance > 0 ? 1 : 0,
    }));
    const [a1, b1, b2, a2] = slab;
    const span = Math.hypot(wall.b[0] - wall.a[0], wall.b[1] - wall.a[1]);
    const across = (metres: number): Wall => {
      const on = (p: PlanPoint, q: PlanPoint): PlanPoint => [
        p[0] + ((q[0] - p[0]) * metres) / span,
        p[1] + ((q[1] - p[1]) * metres) / span,
      ];
      return { a: on(a1, b1), b: on(a2, b2), openings: [] };
    };
    const jambs = openings.length > 1 ? openings.flatMap(({ from, to }) => [across(from), across(to)]) : [];
    return [
      ...jambs,
      { a: a1, b: b1, openings },
      { a: a2, b: b2, openings: farFace },
      { a: a1, b: a2, openings: [] },
      { a: b1, b: b2, openings: [] },
    ];
  });
  return [...outline, ...inner];
}

/** Which piece and part a solid of the scene came from, in the order of `scene.solids`. */
export interface SolidOrigin {
  readonly furnitureId: string;
  readonly furnitureName: string;
  readonly partName: string;
}

export interface RoomScene {
  readonly scene: Scene;
  readonly origins: readonly SolidOrigin[];
  /** Room-side face of the outline. */
  readonly outline: readonly Point[];
  /** Inner walls' slabs: no cell in them counts. */
  readonly voids: readonly (readonly Point[])[];
}

/** What the engine needs of a floor plan. */
export function toScene(plan: FloorPlan): RoomScene {
  const solids: Solid[] = [];
  const origins: SolidOrigin[] = [];
  for (const piece of plan.furniture) {
    for (const part of piece.parts) {
      solids.push({ polygon: footprintInPlan(piece, part), base: part.base, top: part.top });
      origins.push({ furnitureId: piece.id, furnitureName: piece.name, partName: part.name });
    }
  }
  return {
    scene: { solids, walls: wallsOf(plan) },
    origins,
    outline: plan.outline,
    voids: plan.innerWalls.map(slabOf).filter((slab) => slab !== null),
  };
}

/** Rated output × maintenance factor: what the tubes give today. */
export const toEngineEmitter = (emitter: Emitter): EngineEmitter => ({
  tubes: emitter.tubes.map((tube) => ({ ...tube, watts: tube.watts * emitter.maintenance })),
});

export const toEnginePass = (
  pass: { readonly path: readonly PlanPoint[]; readonly speed: number; readonly heading: number | null },
  emitter: Emitter,
): EnginePass => ({
  emitter: toEngineEmitter(emitter),
  path: pass.path,
  speed: pass.speed,
  headingDeg: pass.heading,
});

export const toPlacement = (
  stop: { readonly at: PlanPoint; readonly heading: number },
  emitter: Emitter,
): Placement => ({
  emitter: toEngineEmitter(emitter),
  x: stop.at[0],
  y: stop.at[1],
  headingDeg: stop.heading,
});
