import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { convexHull } from '@/lib/geometry/convex-hull';
import { convexPieces } from '@/lib/geometry/convex-pieces';
import type { Point } from '@/lib/geometry/point';
import { distanceToSegment, selfCrossing, sideOf, signedArea, tidyRing } from '@/lib/geometry/polygon';
import { forEachRun } from '@/lib/geometry/raster';
import { seed } from '../../support/scenes';

const square: Point[] = [
  [0, 0],
  [2, 0],
  [2, 2],
  [0, 2],
];
/** A comb with three teeth: not convex in many corners. */
const comb: Point[] = [
  [0, 0],
  [5, 0],
  [5, 3],
  [4, 3],
  [4, 1],
  [3, 1],
  [3, 3],
  [2, 3],
  [2, 1],
  [1, 1],
  [1, 3],
  [0, 3],
];

describe('areas', () => {
  test('turning the other way changes the sign, and where the ring lies changes nothing', () => {
    expect(signedArea(square)).toBe(4);
    expect(signedArea([...square].reverse())).toBe(-4);
    expect(signedArea(square.map(([x, y]) => [x + 1e6, y - 1e6] as Point))).toBeCloseTo(4, 6);
  });

  test('repeated corners and corners on a straight line do not count', () => {
    expect(
      tidyRing([
        [0, 0],
        [1, 0],
        [2, 0],
        [2, 0],
        [2, 2],
        [0, 2],
      ]),
    ).toHaveLength(4);
  });
});

describe('sides', () => {
  test.each<[string, Point, ReturnType<typeof sideOf>]>([
    ['inside', [1, 1], 'inside'],
    ['on a side', [2, 1], 'edge'],
    ['on a corner', [0, 0], 'edge'],
    ['outside in line with a side', [3, 0], 'outside'],
    ['outside at the height of a corner', [-1, 2], 'outside'],
  ])('%s', (_, [x, y], expected) => {
    expect(sideOf(x, y, square)).toBe(expected);
    expect(sideOf(x, y, [...square].reverse())).toBe(expected);
  });

  test('between the teeth of a comb is outside', () => {
    expect(sideOf(1.5, 2, comb)).toBe('outside');
    expect(sideOf(2.5, 2, comb)).toBe('inside');
  });

  test('the distance to a segment is the same from both ends, and to a point when it has no length', () => {
    fc.assert(
      fc.property(
        fc.tuple(fc.integer(), fc.integer()),
        fc.tuple(fc.integer(), fc.integer()),
        ([ax, ay], [bx, by]) => {
          const [a, b] = [[ax / 1e6, ay / 1e6] as Point, [bx / 1e6, by / 1e6] as Point];
          expect(distanceToSegment(1, 2, a, b)).toBeCloseTo(distanceToSegment(1, 2, b, a), 6);
        },
      ),
      { seed },
    );
    expect(distanceToSegment(3, 4, [0, 0], [0, 0])).toBe(5);
  });
});

describe('crossings', () => {
  test.each<[string, Point[], boolean]>([
    ['a square', square, false],
    ['a comb', comb, false],
    [
      'a bow tie',
      [
        [0, 0],
        [2, 2],
        [2, 0],
        [0, 2],
      ],
      true,
    ],
    [
      'a side through a corner',
      [
        [0, 0],
        [4, 0],
        [4, 4],
        [2, 0],
        [0, 4],
      ],
      true,
    ],
    [
      'two sides that share a stretch',
      [
        [0, 0],
        [4, 0],
        [4, 2],
        [3, 0],
        [1, 0],
        [0, 2],
      ],
      true,
    ],
  ])('%s', (_, ring, crosses) => {
    expect(selfCrossing(ring) !== null).toBe(crosses);
    expect(selfCrossing([...ring].reverse()) !== null).toBe(crosses);
  });
});

test('convex pieces cover a footprint exactly, either way round', () => {
  for (const ring of [comb, [...comb].reverse()]) {
    const pieces = convexPieces(ring);
    expect(pieces.length).toBeGreaterThan(1);
    expect(pieces.reduce((sum, piece) => sum + signedArea(piece.ring), 0)).toBeCloseTo(11, 9);
    expect(pieces.some((piece) => piece.seams.includes(true))).toBe(true);
  }
  expect(convexPieces(square)).toEqual([{ ring: square, seams: [false, false, false, false] }]);
});

test('a convex hull holds every point and no corner bends back', () => {
  const point = fc.tuple(fc.integer({ min: -50, max: 50 }), fc.integer({ min: -50, max: 50 }));
  fc.assert(
    fc.property(fc.array(point, { minLength: 3, maxLength: 30 }), (points) => {
      const hull = convexHull(points);
      if (hull.length < 3) return;
      expect(signedArea(hull)).toBeGreaterThan(0);
      for (const [x, y] of points) expect(sideOf(x, y, hull)).not.toBe('outside');
    }),
    { seed },
  );
});

test('rows of cells in a ring are the cells whose centres are in it', () => {
  const lattice = { originX: -0.3, originY: -0.2, step: 0.17, columns: 40, rows: 25 };
  const covered = new Uint8Array(lattice.columns * lattice.rows);
  forEachRun(comb, lattice, 'strict', (from, to, row) => {
    for (let i = from; i < to; i++) covered[row * lattice.columns + i] = 1;
  });
  covered.forEach((value, cell) => {
    const x = lattice.originX + ((cell % lattice.columns) + 0.5) * lattice.step;
    const y = lattice.originY + (Math.floor(cell / lattice.columns) + 0.5) * lattice.step;
    expect(value === 1).toBe(sideOf(x, y, comb) === 'inside');
  });
});
