import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  addDose,
  type Emitter,
  irradianceAt,
  irradianceMap,
  type Placement,
  planeSurface,
  prepareScene,
  type Scene,
  topsSurface,
  UndefinedReadingError,
  type Vector3,
} from '@/lib/engine';
import { banks, placements, room, scenes, seed, solids, spots, towers } from '../../support/scenes';

const all = [...towers, ...banks];
const up: Vector3 = [0, 0, 1];

/** Irradiance, or `null` where physics leaves none. */
function read(scene: Scene, placement: Placement, p: Vector3, n: Vector3 = up): number | null {
  try {
    return irradianceAt(prepareScene(scene), placement, { p, mode: 'normal', n });
  } catch (error) {
    if (error instanceof UndefinedReadingError) return null;
    throw error;
  }
}

/** Equal up to rounding; differences of shadow edges that rounding may move count as equal below `slack`. */
const close = (a: number | null, b: number | null, slack = 1e-9) =>
  a === null || b === null || Math.abs(a - b) <= slack * Math.max(1e-6, Math.abs(a), Math.abs(b));

const check = (property: fc.IPropertyWithHooks<never> | fc.IProperty<never>, numRuns: number) =>
  fc.assert(property as fc.IProperty<unknown>, { seed, numRuns });

describe('the engine', () => {
  test(`never gives more light for one more solid, never less than none, never no number (seed ${seed})`, () => {
    check(
      fc.property(scenes, solids, placements(all), spots, (scene, solid, placement, p) => {
        const before = read(scene, placement, p);
        const after = read({ ...scene, solids: [...scene.solids, solid] }, placement, p);
        if (before === null || after === null) return;
        expect(Number.isFinite(before) && before >= 0).toBe(true);
        expect(after).toBeLessThanOrEqual(before * (1 + 1e-12));
      }) as never,
      400,
    );
  });

  test('gives a mirrored room a mirrored reading', () => {
    check(
      fc.property(scenes, placements(all), spots, (scene, placement, p) => {
        const mirror = <T extends readonly number[]>(v: T): T => [-v[0], ...v.slice(1)] as unknown as T;
        const mirrored: Scene = {
          solids: scene.solids.map((solid) => ({ ...solid, polygon: solid.polygon.map(mirror) })),
          walls: scene.walls.map((wall) => ({ ...wall, a: mirror(wall.a), b: mirror(wall.b) })),
        };
        const emitter: Emitter = {
          tubes: placement.emitter.tubes.map((tube) => ({
            ...tube,
            a: [tube.a[0], -tube.a[1], tube.a[2]],
            b: [tube.b[0], -tube.b[1], tube.b[2]],
            backed: tube.backed && [tube.backed[0], -tube.backed[1], tube.backed[2]],
          })),
        };
        const other = { emitter, x: -placement.x, y: placement.y, headingDeg: 180 - placement.headingDeg };
        expect(close(read(scene, placement, p), read(mirrored, other, mirror(p)), 1e-7)).toBe(true);
      }) as never,
      200,
    );
  });

  test('does not mind where the room lies or which way it is turned', () => {
    check(
      fc.property(
        scenes,
        placements(all),
        spots,
        fc.constantFrom(90, 180, 270),
        fc.integer({ min: -40, max: 40 }),
        (scene, placement, p, turn, shift) => {
          const [cos, sin] = { 90: [0, 1], 180: [-1, 0], 270: [0, -1] }[turn] as [number, number];
          const move = <T extends readonly number[]>(v: T): T =>
            [v[0] * cos - v[1] * sin + shift, v[0] * sin + v[1] * cos - shift, ...v.slice(2)] as unknown as T;
          const moved: Scene = {
            solids: scene.solids.map((solid) => ({ ...solid, polygon: solid.polygon.map(move) })),
            walls: scene.walls.map((wall) => ({ ...wall, a: move(wall.a), b: move(wall.b) })),
          };
          const [x, y] = move([placement.x, placement.y] as const);
          const there = { ...placement, x, y, headingDeg: placement.headingDeg + turn };
          expect(close(read(scene, placement, p), read(moved, there, move(p)), 1e-7)).toBe(true);
        },
      ) as never,
      200,
    );
  });

  test('maps are the point readings, cell by cell, on planes and on tops, upright and leaning tubes alike', () => {
    check(
      fc.property(
        scenes,
        placements(all),
        fc.constantFrom(0, 0.4, 0.75, 1.2, 'tops' as const),
        (scene, placement, z) => {
          const area = { outline: room, solids: scene.solids, step: 0.31 };
          const surface = z === 'tops' ? topsSurface(area) : planeSurface({ ...area, z });
          const prepared = prepareScene(scene);
          const map = irradianceMap(prepared, placement, surface);
          for (let cell = 0; cell < map.length; cell++) {
            if (surface.mask[cell] === 0) {
              expect(map[cell]).toBe(0);
              continue;
            }
            const p: Vector3 = [
              surface.originX + ((cell % surface.columns) + 0.5) * surface.step,
              surface.originY + (Math.floor(cell / surface.columns) + 0.5) * surface.step,
              typeof surface.z === 'number' ? surface.z : surface.z[cell],
            ];
            const point = read(scene, placement, p);
            expect(close(map[cell], point === null ? null : Math.fround(point), 1e-6), `cell ${cell}`).toBe(
              true,
            );
          }
        },
      ) as never,
      40,
    );
  });

  test('doses do not mind the order of the stops', () => {
    check(
      fc.property(scenes, fc.array(placements(towers), { minLength: 2, maxLength: 4 }), (scene, stops) => {
        const surface = planeSurface({ outline: room, solids: scene.solids, step: 0.5, z: 0.75 });
        const prepared = prepareScene(scene);
        const dose = (order: Placement[]) => {
          const sum = new Float64Array(surface.mask.length);
          for (const placement of order) addDose(sum, irradianceMap(prepared, placement, surface), 60);
          return sum;
        };
        const [one, other] = [dose(stops), dose([...stops].reverse())];
        one.forEach((value, cell) => {
          expect(close(value, other[cell], 1e-12)).toBe(true);
        });
      }) as never,
      20,
    );
  });

  test('glazing that lets half through gives between nothing and all', () => {
    const wall = (transmittance: number): Scene => ({
      solids: [],
      walls: [{ a: [0, 2], b: [5, 2], openings: [{ from: 0, to: 5, sill: 0, head: 3, transmittance }] }],
    });
    const placement = { emitter: towers[0], x: 2, y: 1, headingDeg: 0 };
    const at = (transmittance: number) => read(wall(transmittance), placement, [2.5, 4, 0.2]) ?? Number.NaN;
    expect(at(0)).toBe(0);
    expect(at(0.5)).toBeCloseTo(at(1) / 2, 12);
    expect(at(1)).toBeCloseTo(read({ solids: [], walls: [] }, placement, [2.5, 4, 0.2]) ?? Number.NaN, 12);
  });
});
