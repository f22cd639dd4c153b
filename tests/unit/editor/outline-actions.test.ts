import { describe, expect, test } from 'vitest';
import { addOpening } from '@/lib/editor/opening-actions';
import {
  addCorner,
  drawOutline,
  drawRectangle,
  moveCorner,
  moveSide,
  removeCorner,
  setSideLength,
} from '@/lib/editor/outline-actions';
import { signedArea } from '@/lib/geometry/polygon';
import { floorPlanDocumentSchema, type PlanPoint } from '@/lib/room';
import { wallRuns } from '@/lib/room/wall-geometry';
import { done, refusalOf, sixByFour } from '../../support/plans';

const area = (document: ReturnType<typeof sixByFour>) => Math.abs(signedArea(document.floorPlan.outline));
const ell: PlanPoint[] = [
  [0, 0],
  [6, 0],
  [6, 3],
  [4, 3],
  [4, 5],
  [0, 5],
];

describe('drawing the outline', () => {
  test('a rectangle has four named walls and passes the schema it is saved by', () => {
    const room = sixByFour();
    expect(wallRuns(room.floorPlan).map(({ name, length }) => [name, length])).toEqual([
      ['top wall', 6],
      ['right wall', 4],
      ['bottom wall', 6],
      ['left wall', 4],
    ]);
    expect(floorPlanDocumentSchema.safeParse(room).success).toBe(true);
  });

  test('corners drawn the other way round make the same room', () => {
    const one = done(drawOutline(null, ell));
    const other = done(drawOutline(null, [...ell].reverse()));
    expect(area(other)).toBe(area(one));
    expect(signedArea(other.floorPlan.outline)).toBeGreaterThan(0);
  });

  test('walls on the same side of the sheet are told apart by number', () => {
    const names = done(drawOutline(null, ell)).floorPlan.outlineWalls.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
    expect(names).toContain('right wall 2');
  });

  test.each<[string, PlanPoint[]]>([
    [
      'cross',
      [
        [0, 0],
        [4, 4],
        [4, 0],
        [0, 4],
      ],
    ],
    [
      '3 corners',
      [
        [0, 0],
        [4, 4],
      ],
    ],
    [
      'no length',
      [
        [0, 0],
        [4, 0],
        [4, 0],
        [0, 4],
      ],
    ],
    [
      'folds back',
      [
        [0, 0],
        [4, 0],
        [2, 0],
        [2, 3],
      ],
    ],
    [
      'next to no floor',
      [
        [0, 0],
        [0.2, 0],
        [0.2, 0.2],
        [0, 0.2],
      ],
    ],
    [
      'no place that can be read',
      [
        [0, 0],
        [Number.NaN, 0],
        [4, 4],
      ],
    ],
  ])('is refused in words when it cannot be a room: %s', (words, corners) => {
    expect(refusalOf(drawOutline(null, corners))).toContain(words);
  });

  test('what stands in the room stays when its outline is drawn anew, doors of the old walls go', () => {
    const before = done(addOpening(sixByFour(), 'd', 'door', 'outline:0', 3));
    const after = done(drawRectangle(before, 5, 5));
    expect(after.floorPlan.openings).toEqual([]);
    expect(after.ceiling).toBe(before.ceiling);
  });
});

describe('changing the outline', () => {
  test('a typed length moves the next wall and keeps its direction', () => {
    const longer = done(setSideLength(sixByFour(), 0, 7.25));
    expect(longer.floorPlan.outline).toEqual([
      [0, 0],
      [7.25, 0],
      [7.25, 4],
      [0, 4],
    ]);
  });

  test('a side moved out and back is where it was', () => {
    const there = done(moveSide(sixByFour(), 1, 0.5));
    expect(area(there)).toBeCloseTo(26, 9);
    expect(done(moveSide(there, 1, -0.5)).floorPlan.outline).toEqual(sixByFour().floorPlan.outline);
  });

  test('a corner that would make walls cross is refused and nothing changes', () => {
    const room = sixByFour();
    expect(refusalOf(moveCorner(room, 0, [7, 2]))).toContain('The walls are as they were');
  });

  test('a door keeps its distance from the corner that stayed', () => {
    const room = done(addOpening(sixByFour(), 'd', 'door', 'outline:1', 1));
    const door = room.floorPlan.openings[0];
    // The top wall moves up: the first corner of the right wall moves, its last one stays.
    const taller = done(moveSide(room, 0, 1));
    const moved = taller.floorPlan.openings[0];
    expect(moved.from).toBeCloseTo(door.from + 1, 9);
    expect(moved.to - moved.from).toBeCloseTo(door.to - door.from, 9);
  });

  test('a door is pushed back onto a wall that became too short for its place', () => {
    const room = done(addOpening(sixByFour(), 'd', 'door', 'outline:0', 5.5));
    const shorter = done(setSideLength(room, 0, 3));
    const [door] = shorter.floorPlan.openings;
    expect(door.to).toBeLessThanOrEqual(3);
    expect(door.to - door.from).toBeCloseTo(0.9, 9);
  });

  test('a corner put in and taken out again leaves the same room with the same door', () => {
    const room = done(addOpening(sixByFour(), 'd', 'door', 'outline:0', 5));
    const more = done(addCorner(room, 0, 2));
    expect(more.floorPlan.outline).toHaveLength(5);
    expect(more.floorPlan.openings[0].wall).toBe('outline:1');
    const back = done(removeCorner(more, 1));
    expect(back.floorPlan).toEqual(room.floorPlan);
  });

  test('doors after the new corner are renumbered, and a corner in a door is refused', () => {
    let room = done(addOpening(sixByFour(), 'd', 'door', 'outline:2', 3));
    room = done(addCorner(room, 0, 2));
    expect(room.floorPlan.openings[0].wall).toBe('outline:3');
    expect(refusalOf(addCorner(room, 3, 3))).toContain('door or a window');
  });

  test('three corners are the least', () => {
    const triangle = done(
      drawOutline(null, [
        [0, 0],
        [4, 0],
        [0, 3],
      ]),
    );
    expect(refusalOf(removeCorner(triangle, 1))).toContain('at least 3');
  });
});
