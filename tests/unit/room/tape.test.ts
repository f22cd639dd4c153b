import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { tapesTo } from '@/lib/room';
import { barePlan, middleWall } from '../../support/floor-plans';
import { seeded } from '../../support/properties';

const said = (plan: Parameters<typeof tapesTo>[0], mark: [number, number]) =>
  tapesTo(plan, mark).map(({ wall, distance }) => `${wall} ${distance.toFixed(2)}`);

const walls = (names: string[]) => names.map((name) => ({ name, thickness: 0.1 }));

const triangle = barePlan({
  outline: [
    [0, 0],
    [4, 0],
    [0, 3],
  ],
  outlineWalls: walls(['top', 'slope', 'left']),
});
const lShape = barePlan({
  outline: [
    [0, 0],
    [6, 0],
    [6, 2],
    [3, 2],
    [3, 5],
    [0, 5],
  ],
  outlineWalls: walls(['top', 'right', 'step', 'inner right', 'bottom', 'left']),
});
const withWall = barePlan({ innerWalls: [middleWall] });

/** Worked by hand with a pencil. */
test.each<[string, Parameters<typeof tapesTo>[0], [number, number], string[]]>([
  ['near a corner, the two walls of the corner', barePlan(), [1.2, 0.7], ['north 0.70', 'west 1.20']],
  ['in the middle, the nearest of either direction', barePlan(), [2.5, 2.6], ['south 1.40', 'west 2.50']],
  ['beside an inner wall, its face and not its middle', withWall, [2.5, 1], ['middle 0.40', 'north 1.00']],
  ['behind an inner wall, nothing from across it', withWall, [3.6, 1], ['middle 0.50', 'north 1.00']],
  ['in the short leg of an L, the step', lShape, [4.5, 1.8], ['step 0.20', 'right 1.50']],
  ['in a corner away from a slope, the corner', triangle, [0.8, 0.9], ['left 0.80', 'top 0.90']],
  ['nearer a slope, the slope and what crosses it', triangle, [2, 1.2], ['slope 0.24', 'top 1.20']],
])('%s', (_, plan, mark, tapes) => {
  expect(said(plan, mark)).toEqual(tapes);
});

test('walls within 20° of each other do not fix a place', () => {
  const wedge = barePlan({
    outline: [
      [0, 0],
      [10, 0],
      [10, 1.5],
      [0, 4],
    ],
    outlineWalls: walls(['long', 'end', 'nearly along', 'back']),
  });
  const tapes = tapesTo(wedge, [5, 1.3]);
  expect(new Set(tapes.map(({ wall }) => wall))).not.toEqual(new Set(['long', 'nearly along']));
  expect(tapes).toHaveLength(2);
});

test('where no two walls cross square to the mark, one tape is all there is', () => {
  const corridor = barePlan({
    outline: [
      [0, 0],
      [10, 0],
      [12, 1],
      [10, 2],
      [0, 2],
      [-2, 1],
    ],
    outlineWalls: walls(['a', 'b', 'c', 'd', 'e', 'f']),
  });
  expect(tapesTo(corridor, [5, 1]).length).toBeLessThan(2);
});

describe('wherever a mark is in a room', () => {
  test('two tapes, each square to its wall and as long as it says, bring a crew back to it', () => {
    const inside = fc.record({
      plan: fc.constantFrom(barePlan(), withWall),
      x: fc.double({ min: 0.01, max: 5.99, noNaN: true }),
      y: fc.double({ min: 0.01, max: 3.99, noNaN: true }),
    });
    fc.assert(
      fc.property(inside, ({ plan, x, y }) => {
        fc.pre(plan === withWall ? Math.abs(x - 3) > 0.11 : true);
        const tapes = tapesTo(plan, [x, y]);
        expect(tapes).toHaveLength(2);
        const [[dx1, dy1], [dx2, dy2]] = tapes.map(({ foot }) => [foot[0] - x, foot[1] - y]);
        for (const [i, { distance }] of tapes.entries())
          expect(distance).toBeCloseTo(
            Math.hypot(
              ...[
                [dx1, dy1],
                [dx2, dy2],
              ][i],
            ),
            9,
          );
        expect(Math.abs(dx1 * dx2 + dy1 * dy2)).toBeLessThan(1e-9);
      }),
      seeded(300),
    );
  });
});
