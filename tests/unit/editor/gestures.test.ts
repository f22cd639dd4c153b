import { describe, expect, test } from 'vitest';
import { addPiece } from '@/lib/editor/furniture-actions';
import type { Gesture, Pull } from '@/lib/editor/gestures/gesture';
import { moveThing } from '@/lib/editor/gestures/move-thing';
import { pullHandle } from '@/lib/editor/gestures/pull-handle';
import { handlesOf, thingAt, touchPointAt } from '@/lib/editor/hit-test';
import { addInnerWall } from '@/lib/editor/inner-wall-actions';
import { addOpening } from '@/lib/editor/opening-actions';
import { placedFromShelf } from '@/lib/editor/place-piece';
import { snapPoint, straighten } from '@/lib/editor/snapping';
import type { FloorPlanDocument, PlanPoint } from '@/lib/room';
import { shelfPieces } from '@/lib/room/furniture-shelf/pieces';
import { pieceCorners, pieceSize } from '@/lib/room/piece-size';
import type { PlanRef } from '@/lib/room/plan-ref';
import { wallRuns } from '@/lib/room/wall-geometry';
import { box, done, sixByFour } from '../../support/plans';

const pull = (at: PlanPoint, keys: Partial<Pull> = {}): Pull => ({
  at,
  reach: 0.1,
  free: false,
  shift: false,
  ...keys,
});
const take = (gesture: Gesture | null): Gesture => {
  if (!gesture) throw new Error('There is nothing to take hold of');
  return gesture;
};
const move = (plan: FloorPlanDocument, ref: PlanRef, from: PlanPoint, to: Pull) =>
  done(take(moveThing(plan, ref, from)).pull(to).outcome);
const piece = (plan: FloorPlanDocument, id: string) => {
  const found = plan.floorPlan.furniture.find((one) => one.id === id);
  if (!found) throw new Error(`No piece ${id}`);
  return found;
};
const ref: PlanRef = { kind: 'furniture', id: 'f' };
const withBox = (at: PlanPoint, turn = 0) => addPiece(sixByFour(), box('f', at, turn));

describe('moving furniture', () => {
  test('goes by the 5 cm grid, and freely with Alt', () => {
    const plan = withBox([2, 2]);
    expect(piece(move(plan, ref, [2, 2], pull([2.512, 2.338])), 'f').at).toEqual([2.5, 2.35]);
    expect(piece(move(plan, ref, [2, 2], pull([2.512, 2.338], { free: true })), 'f').at).toEqual([
      2.512, 2.338,
    ]);
  });

  test('is flush with one wall, and with two in a corner, and shows both', () => {
    const plan = withBox([2, 2]);
    expect(piece(move(plan, ref, [2, 2], pull([0.56, 2])), 'f').at[0]).toBeCloseTo(0.5, 9);
    const { outcome, guides } = take(moveThing(plan, ref, [2, 2])).pull(pull([5.46, 3.71]));
    expect(piece(done(outcome), 'f').at).toEqual([5.5, 3.75]);
    expect(guides).toHaveLength(2);
  });

  test('stops at a wall it is pulled through, until the hand is beyond it', () => {
    const plan = withBox([2, 2]);
    expect(piece(move(plan, ref, [2, 2], pull([5.9, 2])), 'f').at[0]).toBeCloseTo(5.5, 9);
    expect(piece(move(plan, ref, [2, 2], pull([6.4, 2])), 'f').at[0]).toBeCloseTo(6.4, 9);
  });

  test('is flush with either face of an inner wall and with slanted walls', () => {
    const plan = done(addInnerWall(withBox([2, 2]), 'w', 'wall', [3, 0], [3, 4]));
    expect(piece(move(plan, ref, [2, 2], pull([2.4, 2])), 'f').at[0]).toBeCloseTo(2.45, 9);
    expect(piece(move(plan, ref, [2, 2], pull([3.6, 2])), 'f').at[0]).toBeCloseTo(3.55, 9);
    const slanted = addPiece(
      {
        ...plan,
        floorPlan: {
          ...plan.floorPlan,
          innerWalls: [{ ...plan.floorPlan.innerWalls[0], b: [6, 3], a: [3, 0] }],
        },
      },
      box('g', [3, 2], 45),
    );
    const at = piece(move(slanted, { kind: 'furniture', id: 'g' }, [3, 2], pull([4, 1.5])), 'g');
    const gaps = pieceCorners(at).map(([x, y]) => (y - x + 3) / Math.SQRT2 - 0.05);
    expect(Math.min(...gaps)).toBeCloseTo(0, 3);
  });

  test('answers from where it began: nothing adds up on the way', () => {
    const gesture = take(moveThing(withBox([2, 2]), ref, [2.1, 2.05]));
    for (let i = 0; i < 50; i++) gesture.pull(pull([2.1 + Math.sin(i), 2.05 + Math.cos(i)]));
    expect(piece(done(gesture.pull(pull([2.1, 2.05])).outcome), 'f').at).toEqual([2, 2]);
  });
});

describe('handles', () => {
  const handle = (plan: FloorPlanDocument, of: PlanRef, at: PlanPoint) => {
    const found = handlesOf(plan, of, 0.005).find(
      (one) => Math.hypot(one.at[0] - at[0], one.at[1] - at[1]) < 0.01,
    );
    if (!found) throw new Error('There is no handle');
    return found;
  };

  test.each([0, 90, 200])(
    'a corner pulled out makes the piece larger and the opposite one stays (turn %i)',
    (turn) => {
      const plan = withBox([3, 2], turn);
      const [first, , third] = pieceCorners(piece(plan, 'f'));
      const out: PlanPoint = [third[0] + (third[0] - first[0]), third[1] + (third[1] - first[1])];
      const pulled = done(pullHandle(plan, handle(plan, ref, third)).pull(pull(out)).outcome);
      expect(pieceSize(piece(pulled, 'f')).width).toBeCloseTo(2, 2);
      expect(pieceSize(piece(pulled, 'f')).depth).toBeCloseTo(1, 2);
      const [stays] = pieceCorners(piece(pulled, 'f'));
      expect(Math.hypot(stays[0] - first[0], stays[1] - first[1])).toBeLessThan(0.001);
    },
  );

  test('the turning handle turns in steps of 15°, of 1° with Shift', () => {
    const plan = withBox([3, 2]);
    const turning = handlesOf(plan, ref, 0.005).find(({ kind }) => kind === 'turn');
    if (!turning) throw new Error('There is no turning handle');
    const to: PlanPoint = [3 + Math.cos(0.3), 2 + Math.sin(0.3)];
    expect(piece(done(pullHandle(plan, turning).pull(pull(to)).outcome), 'f').turn).toBe(105);
    expect(piece(done(pullHandle(plan, turning).pull(pull(to, { shift: true })).outcome), 'f').turn).toBe(
      107,
    );
  });

  test('a wall end snaps to the corner of the room, and an opening keeps its least width', () => {
    let plan = done(addInnerWall(sixByFour(), 'w', 'wall', [3, 1], [3, 3]));
    plan = done(addOpening(plan, 'd', 'door', 'outline:0', 3));
    const end = handle(plan, { kind: 'inner-wall', id: 'w' }, [3, 3]);
    expect(done(pullHandle(plan, end).pull(pull([5.95, 3.96])).outcome).floorPlan.innerWalls[0].b).toEqual([
      6, 4,
    ]);
    const door: PlanRef = { kind: 'opening', id: 'd' };
    const jamb = handlesOf(plan, door, 0.005)[0];
    const narrow = done(pullHandle(plan, jamb).pull(pull([5, 0])).outcome).floorPlan.openings[0];
    expect(narrow.to - narrow.from).toBeCloseTo(0.1, 9);
  });

  test('a door is pulled from wall to wall', () => {
    const plan = done(addOpening(sixByFour(), 'd', 'door', 'outline:0', 3));
    const moved = move(plan, { kind: 'opening', id: 'd' }, [3, 0], pull([6, 2]));
    expect(moved.floorPlan.openings[0]).toMatchObject({ wall: 'outline:1', from: 1.55, to: 2.45 });
  });
});

describe('what is under the hand', () => {
  test('small things come before large ones, furniture before walls', () => {
    let plan = addPiece(withBox([3, 2]), {
      ...box('large', [3, 2]),
      parts: box('x', [0, 0]).parts.map((part) => ({
        ...part,
        footprint: part.footprint.map(([x, y]) => [x * 3, y * 3]),
      })),
    });
    plan = done(addOpening(plan, 'd', 'door', 'outline:0', 3));
    expect(thingAt(plan, [3, 2], 0.05)).toEqual({ kind: 'furniture', id: 'f' });
    expect(thingAt(plan, [4.2, 2.5], 0.05)).toEqual({ kind: 'furniture', id: 'large' });
    // A piece's own touch point does not keep the hand from the piece.
    expect(thingAt(plan, [3.49, 2], 0.05)).toEqual({ kind: 'furniture', id: 'f' });
    expect(touchPointAt(plan, [3.49, 2], 0.05, () => true)).toEqual({ kind: 'touch-point', id: 'f-t' });
    expect(thingAt(plan, [3, -0.05], 0.05)).toEqual({ kind: 'opening', id: 'd' });
    expect(thingAt(plan, [1, -0.05], 0.05)).toEqual({ kind: 'outline-wall', id: 'outline:0' });
    expect(thingAt(plan, [1, 3], 0.05)).toBeNull();
  });
});

describe('snapping points', () => {
  const corners: PlanPoint[] = [
    [0, 0],
    [6, 0],
  ];
  const snap = { reach: 0.2, free: false };
  test.each<[string, PlanPoint, PlanPoint]>([
    ['to a corner', [5.9, 0.1], [6, 0]],
    ['into line with a corner', [5.95, 2.03], [6, 2.05]],
    ['onto the grid', [2.512, 1.338], [2.5, 1.35]],
  ])('%s', (_, at, to) => {
    const snapped = snapPoint(at, corners, [], snap).at;
    expect(snapped[0]).toBeCloseTo(to[0], 9);
    expect(snapped[1]).toBeCloseTo(to[1], 9);
  });

  test('onto a slanted wall at a length one can measure', () => {
    const plan = done(addInnerWall(sixByFour(), 'w', 'wall', [1, 1], [4, 4]));
    const walls = wallRuns(plan.floorPlan).filter(({ id }) => id === 'w');
    const [x, y] = snapPoint([2.06, 1.96], [], walls, snap).at;
    expect(Math.abs(x - y)).toBeCloseTo(0.05 * Math.SQRT2, 3);
  });

  test('Shift keeps a wall straight', () => {
    const [x, y] = straighten([1, 1], [4, 1.2]);
    expect(y).toBeCloseTo(1, 9);
    expect(x).toBeGreaterThan(4);
  });
});

describe('from the shelf', () => {
  test.each(shelfPieces.map((one) => [one.label, one] as const))(
    '%s stands inside the room at any wall',
    (_, shelf) => {
      const plan = sixByFour();
      for (const at of [
        [0.1, 2],
        [5.9, 2],
        [3, 0.1],
        [3, 3.9],
      ] as PlanPoint[]) {
        const placed = placedFromShelf(plan, shelf, at, null, { reach: 0.1, free: false }, () => 'x').piece;
        for (const [x, y] of pieceCorners(placed)) {
          expect(x).toBeGreaterThan(-0.001);
          expect(x).toBeLessThan(6.001);
          expect(y).toBeGreaterThan(-0.001);
          expect(y).toBeLessThan(4.001);
        }
      }
    },
  );

  test('a bed stands with its head to the wall, the rest with their backs to it', () => {
    const plan = sixByFour();
    const at = (kind: string, spot: PlanPoint) => {
      const shelf = shelfPieces.find((one) => one.kind === kind);
      if (!shelf) throw new Error(`No ${kind} on the shelf`);
      return placedFromShelf(plan, shelf, spot, null, { reach: 0.1, free: false }, () => 'x').piece.turn;
    };
    expect(at('bed', [0.5, 2])).toBe(0);
    expect(at('bed', [5.5, 2])).toBe(180);
    expect(at('locker', [3, 0.3])).toBe(0);
    expect(at('locker', [3, 3.7])).toBe(180);
  });
});
