import { expect, test } from 'vitest';
import { demoRooms } from '@/db/seed/rooms';
import { fileReferenceFaults, planReferenceFaults, setReferenceFaults } from '@/lib/room/check-references';
import { barePlan, doorway, middleWall } from '../../support/floor-plans';
import { aStopSet } from '../../support/stop-sets';

test.each(Object.entries(demoRooms))('%s holds together', (_, file) => {
  expect(fileReferenceFaults(file)).toEqual([]);
});

const spot = (id: string) => ({
  id,
  name: id,
  at: [1, 1] as [number, number],
  height: 1,
  facing: 0,
  tilt: 0,
});
const piece = (id: string, touch: string) => ({
  id,
  name: id,
  kind: 'box',
  at: [1, 1] as [number, number],
  turn: 0,
  parts: [],
  touchPoints: [spot(touch)],
});

test.each<[string, Parameters<typeof barePlan>[0], string, string]>([
  [
    'an opening in a side that is not there',
    { openings: [doorway({ wall: 'outline:4' })] },
    'openings[0].wall',
    'There is no wall "outline:4"',
  ],
  [
    'an opening in an inner wall that is not there',
    { openings: [doorway()] },
    'openings[0].wall',
    'There is no wall "mid"',
  ],
  [
    'an opening past the end of its wall',
    { innerWalls: [middleWall], openings: [doorway({ to: 4.001 })] },
    'openings[0].to',
    'The wall ends at 4.000 m',
  ],
  [
    'a piece by the name of a wall',
    { innerWalls: [middleWall], furniture: [piece('mid', 't')] },
    'furniture[0].id',
    'The id "mid" is used twice',
  ],
  [
    'a touch point by the name of another piece’s',
    { furniture: [piece('a', 't'), piece('b', 't')] },
    'furniture[1].touchPoints[0].id',
    'The id "t" is used twice',
  ],
  [
    'a watch point by the name of a touch point',
    { touchPoints: [spot('x')], watchPoints: [{ id: 'x', name: 'x', at: [1, 1], height: 1 }] },
    'watchPoints[0].id',
    'The id "x" is used twice',
  ],
])('%s is named where it is', (_, change, path, message) => {
  expect(planReferenceFaults(barePlan(change))).toEqual([{ path, message }]);
  expect(planReferenceFaults(barePlan(change), 'floorPlan.')).toEqual([
    { path: `floorPlan.${path}`, message },
  ]);
});

test('an opening to the very end of its wall, as far as a tape can tell, is on it', () => {
  expect(
    planReferenceFaults(barePlan({ innerWalls: [middleWall], openings: [doorway({ to: 4 + 1e-9 })] })),
  ).toEqual([]);
});

test('a stop set names only emitters there are, and no id twice', () => {
  const { emitters } = demoRooms['two-bed-bay'];
  const set = aStopSet('s');
  expect(setReferenceFaults(set, emitters)).toEqual([]);
  const broken = {
    ...set,
    emitter: 'gone',
    stops: [...set.stops, { ...set.stops[0], emitter: 'toString' }],
    passes: [{ ...set.passes[0], id: 'a' }],
  };
  expect(setReferenceFaults(broken, emitters, 'stopSets[2].')).toEqual([
    { path: 'stopSets[2].stops[1].id', message: 'The id "a" is used twice' },
    { path: 'stopSets[2].passes[0].id', message: 'The id "a" is used twice' },
    { path: 'stopSets[2].emitter', message: 'There is no emitter "gone"' },
    { path: 'stopSets[2].stops[1].emitter', message: 'There is no emitter "toString"' },
  ]);
});
