import { describe, expect, test } from 'vitest';
import { irradianceAt, prepareScene, type Vector3 } from '@/lib/engine';
import {
  type Emitter,
  type FloorPlan,
  placedTouchPoints,
  toEngineEmitter,
  toPlacement,
  toScene,
  toSpot,
} from '@/lib/room';
import { barePlan, doorway, middleWall } from '../../support/floor-plans';

const tower: Emitter = {
  name: 'Tower',
  tubes: [{ a: [0, 0, 0.25], b: [0, 0, 1.85], watts: 100, backed: null }],
  maintenance: 0.8,
  warmUp: 60,
  clearance: 0.4,
};

/** Fluence rate at a spot from a tower at another, in a plan. */
const lightAt = (plan: FloorPlan, stop: [number, number], p: Vector3): number =>
  irradianceAt(prepareScene(toScene(plan).scene), toPlacement({ at: stop, heading: 0 }, tower), {
    p,
    mode: 'spherical',
  });

test('an emitter gives its rated output times its maintenance factor', () => {
  expect(toEngineEmitter(tower).tubes[0].watts).toBe(80);
});

describe('a piece turned a quarter clockwise', () => {
  const plan = barePlan({
    furniture: [
      {
        id: 'f',
        name: 'Bench',
        kind: 'bench',
        at: [2, 1],
        turn: 90,
        parts: [
          {
            name: 'seat',
            footprint: [
              [-1, -0.25],
              [1, -0.25],
              [1, 0.25],
              [-1, 0.25],
            ],
            base: 0.4,
            top: 0.5,
          },
          {
            name: 'foot',
            footprint: [
              [0.8, -0.1],
              [1, -0.1],
              [1, 0.1],
            ],
            base: 0,
            top: 0.4,
          },
        ],
        touchPoints: [{ id: 't', name: 'end', at: [1, 0], height: 0.45, facing: 0, tilt: 0 }],
      },
    ],
  });

  test('has its corners where a person would measure them, y down', () => {
    const [seat, foot] = toScene(plan).scene.solids;
    const corners = [
      [2.25, 0],
      [2.25, 2],
      [1.75, 2],
      [1.75, 0],
    ];
    for (const [i, corner] of corners.entries())
      for (const axis of [0, 1]) expect(seat.polygon[i][axis]).toBeCloseTo(corner[axis], 12);
    expect(foot).toMatchObject({ base: 0, top: 0.4 });
  });

  test('takes its touch points with it, the way they face too', () => {
    const [placed] = placedTouchPoints(plan);
    expect(placed.at[0]).toBeCloseTo(2, 12);
    expect(placed.at[1]).toBeCloseTo(2, 12);
    expect(placed).toMatchObject({ facing: 90, pieceId: 'f', pieceName: 'Bench' });
    const { p, n } = toSpot(placed);
    expect(p[2]).toBe(0.45);
    for (const [axis, value] of [0, 1, 0].entries()) expect(n[axis]).toBeCloseTo(value, 12);
  });

  test('is known by its name for every part that shades', () => {
    expect(
      toScene(plan).origins.map(({ furnitureName, partName }) => `${furnitureName} ${partName}`),
    ).toEqual(['Bench seat', 'Bench foot']);
  });
});

test('a touch point that looks up faces up, whichever way it is turned', () => {
  const [placed] = placedTouchPoints(
    barePlan({ touchPoints: [{ id: 't', name: 'top', at: [1, 1], height: 0.9, facing: 213, tilt: 90 }] }),
  );
  const { n } = toSpot(placed);
  for (const [axis, value] of [0, 0, 1].entries()) expect(n[axis]).toBeCloseTo(value, 12);
});

describe('an inner wall', () => {
  const walled = (...openings: FloorPlan['openings']) => barePlan({ innerWalls: [middleWall], openings });
  const lamp: [number, number] = [1.5, 2];
  const behind: Vector3 = [4.5, 2, 1];
  const free = lightAt(barePlan(), lamp, behind);

  test('lets nothing through, at any height', () => {
    for (const z of [0, 1, 2.6, 10]) expect(lightAt(walled(), lamp, [4.5, 2, z])).toBe(0);
  });

  test('stands as its slab, in which no floor counts', () => {
    expect(toScene(walled()).voids).toEqual([
      [
        [3.1, 0],
        [3.1, 4],
        [2.9, 4],
        [2.9, 0],
      ],
    ]);
  });

  test('lets through what goes through its open door, all of it and no more', () => {
    const plan = walled(doorway());
    expect(lightAt(plan, lamp, behind)).toBeCloseTo(free, 12);
    expect(lightAt(plan, lamp, [4.5, 3.9, 1])).toBe(0);
  });

  test('lets nothing through a closed door', () => {
    expect(lightAt(walled(doorway({ open: false })), lamp, behind)).toBe(0);
  });

  test('lets nothing under the sill or over the head of a window', () => {
    const plan = walled(doorway({ kind: 'window', sill: 1, head: 1.2 }));
    const through = lightAt(plan, lamp, [4.5, 2, 1.1]);
    expect(through).toBeGreaterThan(0);
    expect(through).toBeLessThan(lightAt(barePlan(), lamp, [4.5, 2, 1.1]));
    expect(lightAt(plan, lamp, [3.2, 2, 0])).toBe(0);
  });

  test('takes the share its glazing takes, once, though the slab has two faces', () => {
    const glazed = walled(doorway({ kind: 'window', open: false, transmittance: 0.25 }));
    expect(lightAt(glazed, lamp, behind)).toBeCloseTo(0.25 * free, 12);
    expect(lightAt(glazed, [4.5, 2], [1.5, 2, 1])).toBeCloseTo(0.25 * free, 12);
  });

  test('lets nothing pass from one door through the pier into the next', () => {
    const pair = walled(doorway({ id: 'd1', from: 1, to: 1.9 }), doorway({ id: 'd2', from: 2.1, to: 3 }));
    // Grazing along the wall: into the first door's reveal and out of the second's, through the pier between.
    expect(lightAt(pair, [2.6, 1.2], [3.4, 2.8, 1])).toBe(0);
    expect(lightAt(pair, lamp, [4.5, 1.5, 1])).toBeGreaterThan(0);
  });
});

describe('the outline', () => {
  test('keeps the light in, but for what goes through an opening to a watch point outside', () => {
    const outside: Vector3 = [7, 2, 1.7];
    const window = doorway({ wall: 'outline:1', kind: 'window', open: false, sill: 0.5 });
    expect(lightAt(barePlan(), [3, 2], outside)).toBe(0);
    expect(lightAt(barePlan({ openings: [window] }), [3, 2], outside)).toBe(0);
    const through = lightAt(barePlan({ openings: [{ ...window, open: true }] }), [3, 2], outside);
    expect(through).toBeGreaterThan(0);
    expect(lightAt(barePlan({ openings: [{ ...window, transmittance: 0.1 }] }), [3, 2], outside)).toBeCloseTo(
      0.1 * through,
      12,
    );
  });
});
