import { describe, expect, test } from 'vitest';
import type { Emitters, FloorPlan } from '@/lib/room';
import { stopProblems } from '@/lib/room/check-stops';
import { barePlan, middleWall } from '../../support/floor-plans';
import { box } from '../../support/plans';
import { aStopSet } from '../../support/stop-sets';

const emitters: Emitters = {
  tower: {
    name: 'Tower',
    tubes: [{ a: [0, 0, 0.25], b: [0, 0, 1.85], watts: 110, backed: null }],
    maintenance: 0.8,
    warmUp: 60,
    clearance: 0.4,
  },
};

const problemOf = (plan: FloorPlan, at: [number, number]): string => {
  const set = aStopSet('s', { stops: [{ ...aStopSet('s').stops[0], at }] });
  const [problem, ...more] = stopProblems(set, plan, emitters);
  expect(more).toEqual([]);
  return problem ? `${problem.kind}: ${problem.message}` : 'none';
};

/** A box of 1 by 0.5 m about (3, 2), and one hung from the ceiling about (1, 1). */
const furnished = barePlan({
  furniture: [
    box('low', [3, 2]),
    { ...box('high', [1, 1]), parts: [{ ...box('high', [1, 1]).parts[0], base: 2.1, top: 2.5 }] },
  ],
});

describe('a stop', () => {
  test.each<[string, FloorPlan, [number, number], string]>([
    [
      'in an inner wall',
      barePlan({ innerWalls: [middleWall] }),
      [3.05, 2],
      'wrong: Stop 1 stands in the middle',
    ],
    ['with room to spare', furnished, [1.5, 3], 'none'],
    ['outside the room', furnished, [7, 2], 'wrong: Stop 1 is outside the room'],
    ['on the wall itself', furnished, [6, 2], 'wrong: Stop 1 is outside the room'],
    ['on a piece', furnished, [3, 2], 'wrong: Stop 1 stands on the Box low'],
    ['on the edge of a piece', furnished, [3.5, 2], 'wrong: Stop 1 stands on the Box low'],
    [
      'close to a piece',
      furnished,
      [3.75, 2],
      'tight: Stop 1 is 0.25 m from the Box low; the emitter wants 0.4 m',
    ],
    ['under something hung high', furnished, [1, 1], 'none'],
    [
      'close to a wall',
      furnished,
      [5.7, 3],
      'tight: Stop 1 is closer to the east than the 0.4 m its emitter wants',
    ],
    [
      'close to an inner wall',
      barePlan({ innerWalls: [middleWall] }),
      [2.6, 2],
      'tight: Stop 1 is closer to the middle than the 0.4 m its emitter wants',
    ],
  ])('%s', (_, plan, at, problem) => {
    expect(problemOf(plan, at)).toBe(problem);
  });

  test('turned with a piece, is judged by where the piece then stands', () => {
    const turned = barePlan({ furniture: [box('t', [3, 2], 90)] });
    expect(problemOf(turned, [3, 2.45])).toContain('stands on');
    expect(problemOf(turned, [3.45, 2])).toContain('0.20 m from');
  });
});
