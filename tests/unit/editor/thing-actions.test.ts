import { describe, expect, test } from 'vitest';
import { addPiece, resizePiece, setPieceTop } from '@/lib/editor/furniture-actions';
import { addInnerWall, placeInnerWall } from '@/lib/editor/inner-wall-actions';
import { addOpening, changeOpening, slideOpening } from '@/lib/editor/opening-actions';
import {
  addTouchPoint,
  addTouchPointTo,
  addWatchPoint,
  moveTouchPoint,
  turnTouchPoint,
} from '@/lib/editor/spot-actions';
import {
  duplicateThing,
  exists,
  nameOf,
  nudgeThing,
  removeThing,
  turnThing,
} from '@/lib/editor/thing-actions';
import { type FloorPlanDocument, floorPlanDocumentSchema } from '@/lib/room';
import { pieceSize } from '@/lib/room/piece-size';
import type { PlanRef } from '@/lib/room/plan-ref';
import { placedTouchPoints } from '@/lib/room/touch-points';
import { box, done, refusalOf, sixByFour } from '../../support/plans';

/** One of each thing. */
function furnished(): FloorPlanDocument {
  let plan = sixByFour();
  plan = done(addInnerWall(plan, 'w', 'inner wall', [4, 0], [4, 2]));
  plan = done(addOpening(plan, 'd', 'door', 'outline:2', 3));
  plan = addPiece(plan, box('f', [2, 2], 90));
  plan = addTouchPoint(plan, 't', 'light switch', [3.6, 3.99], -90);
  return addWatchPoint(plan, 'p', 'corridor', [3, 5]);
}

const things: PlanRef[] = [
  { kind: 'inner-wall', id: 'w' },
  { kind: 'opening', id: 'd' },
  { kind: 'furniture', id: 'f' },
  { kind: 'touch-point', id: 't' },
  { kind: 'touch-point', id: 'f-t' },
  { kind: 'watch-point', id: 'p' },
];

test.each(things)('a $kind ($id) is found, named, moved and brought back, copied and deleted', (ref) => {
  const plan = furnished();
  expect(exists(plan, ref)).toBe(true);
  expect(nameOf(plan, ref).length).toBeGreaterThan(2);

  const moved = done(nudgeThing(plan, ref, [0.25, 0.1]));
  expect(moved).not.toEqual(plan);
  expect(done(nudgeThing(moved, ref, [-0.25, -0.1]))).toEqual(plan);

  let made = 0;
  const { outcome, copy } = duplicateThing(plan, ref, () => `new-${made++}`);
  const doubled = done(outcome);
  expect(copy && exists(doubled, copy)).toBe(true);
  expect(floorPlanDocumentSchema.safeParse(doubled).success).toBe(true);

  const gone = done(removeThing(plan, ref));
  expect(exists(gone, ref)).toBe(false);
  for (const other of things)
    if (other.id !== ref.id && !(ref.id === 'f' && other.id === 'f-t'))
      expect(exists(gone, other)).toBe(true);
});

test('an outer wall cannot be deleted, and says what to do instead', () => {
  expect(refusalOf(removeThing(furnished(), { kind: 'outline-wall', id: 'outline:1' }))).toContain('corners');
});

test('a copy of furniture shares no id with its original, touch points included', () => {
  let made = 0;
  const { outcome } = duplicateThing(furnished(), { kind: 'furniture', id: 'f' }, () => `new-${made++}`);
  const ids = done(outcome).floorPlan.furniture.flatMap((piece) => [
    piece.id,
    ...piece.touchPoints.map(({ id }) => id),
  ]);
  expect(new Set(ids).size).toBe(ids.length);
});

describe('openings', () => {
  test('stay on their wall wherever they are slid', () => {
    const plan = furnished();
    for (const s of [-10, 0, 2.2, 5.9, 100]) {
      const [door] = done(slideOpening(plan, 'd', 'outline:2', s)).floorPlan.openings;
      expect(door.from).toBeGreaterThanOrEqual(0);
      expect(door.to).toBeLessThanOrEqual(6);
      expect(door.to - door.from).toBeCloseTo(0.9, 9);
    }
  });

  test.each([
    [{ from: 3, to: 3.05 }, '10 cm wide'],
    [{ sill: 2.2 }, 'above its sill'],
    [{ from: 0, to: 9 }, '6.00 m long'],
  ])('%o is refused in words', (change, words) => {
    expect(refusalOf(changeOpening(furnished(), 'd', change))).toContain(words);
  });

  test('go with their inner wall, and keep their place from the end that stayed', () => {
    const plan = done(addOpening(furnished(), 'w-d', 'door', 'w', 1.5));
    const longer = done(placeInnerWall(plan, 'w', { a: [4, -0.5] }));
    const door = longer.floorPlan.openings.find(({ id }) => id === 'w-d');
    expect(door?.from).toBeCloseTo(1.05 + 0.5, 9);
    const gone = done(removeThing(plan, { kind: 'inner-wall', id: 'w' }));
    expect(gone.floorPlan.openings.map(({ id }) => id)).toEqual(['d']);
  });
});

describe('furniture', () => {
  test('stretches with its parts and touch points, one side staying where it is', () => {
    const piece = box('f', [2, 2]);
    const wide = resizePiece(piece, 2, 0.5, [-0.5, 0]);
    expect(pieceSize(wide)).toMatchObject({ width: 2, depth: 0.5 });
    // Its left side was at x = 1.5 and is there still.
    expect(wide.at[0] + pieceSize(wide).minX).toBeCloseTo(1.5, 9);
    expect(wide.touchPoints[0].at[0]).toBeCloseTo(1, 9);
  });

  test('keeps the gap under it in proportion when it is made higher', () => {
    const high = setPieceTop(box('f', [2, 2]), 2);
    expect(high.parts[0]).toMatchObject({ base: 0.4, top: 2 });
  });

  test('turns a whole turn back to where it was', () => {
    let plan = furnished();
    for (let i = 0; i < 24; i++) plan = done(turnThing(plan, { kind: 'furniture', id: 'f' }, 15));
    expect(plan).toEqual(furnished());
  });
});

describe('touch points', () => {
  test('of a turned piece are moved and turned in plan, whatever the piece does', () => {
    const moved = moveTouchPoint(furnished(), 'f-t', [2.3, 2.4]);
    const spot = placedTouchPoints(moved.floorPlan).find(({ point }) => point.id === 'f-t');
    expect(spot?.at[0]).toBeCloseTo(2.3, 4);
    expect(spot?.at[1]).toBeCloseTo(2.4, 4);
    const turned = turnTouchPoint(moved, 'f-t', 200);
    expect(placedTouchPoints(turned.floorPlan).find(({ point }) => point.id === 'f-t')?.facing).toBeCloseTo(
      200,
      6,
    );
  });

  test('a new one on a piece stands on its top and looks up', () => {
    const plan = addTouchPointTo(furnished(), 'f', 'new');
    const spot = placedTouchPoints(plan.floorPlan).find(({ point }) => point.id === 'new');
    expect(spot?.at).toEqual([2, 2]);
    expect(spot?.point).toMatchObject({ height: 1, tilt: 90 });
  });
});
