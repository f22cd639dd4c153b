import { describe, expect, test } from 'vitest';
import { doseStepOf, doseSteps, formatRatio } from '@/lib/drawing/dose-scale';
import { hatchLines } from '@/lib/drawing/hatch';
import { sideEdges } from '@/lib/drawing/side-edges';
import { fitTo, rulerStep, toPlan, toScreen, zoomAt } from '@/lib/drawing/viewport';
import { openingShape, outerFace } from '@/lib/drawing/wall-shapes';
import { addOpening } from '@/lib/editor/opening-actions';
import { wallRuns } from '@/lib/room/wall-geometry';
import { done, sixByFour } from '../../support/plans';

describe('the dose scale', () => {
  test('never shows a miss as a hit', () => {
    expect(doseStepOf(0.999999).under).toBe(true);
    expect(doseStepOf(1).under).toBe(false);
    expect(formatRatio(0.9999)).toBe('0.99×');
    expect(formatRatio(0)).toBe('none');
    expect(formatRatio(1e-6)).toBe('< 0.01×');
  });

  test('has six steps of different colours, the first three under target', () => {
    expect(new Set(doseSteps.map(({ colour }) => colour)).size).toBe(6);
    expect(doseSteps.map(({ under }) => under)).toEqual([true, true, true, false, false, false]);
  });
});

describe('the viewport', () => {
  const size = { width: 900, height: 600 };
  const margin = { top: 20, right: 20, bottom: 20, left: 20 };

  test('shows all that it fits, and back and forth is where it was', () => {
    const viewport = fitTo({ minX: -1, minY: 0, maxX: 19, maxY: 14 }, size, margin);
    for (const at of [
      [-1, 0],
      [19, 14],
    ] as const) {
      const [x, y] = toScreen(viewport, [...at]);
      expect(x >= 20 && x <= 880 && y >= 20 && y <= 580).toBe(true);
      const back = toPlan(viewport, [x, y]);
      expect(back[0]).toBeCloseTo(at[0], 9);
      expect(back[1]).toBeCloseTo(at[1], 9);
    }
  });

  test('zooming keeps the spot under the pointer', () => {
    const viewport = fitTo({ minX: 0, minY: 0, maxX: 8, maxY: 6 }, size, margin);
    const before = toPlan(viewport, [200, 300]);
    const after = toPlan(zoomAt(viewport, [200, 300], 3.7), [200, 300]);
    expect(after[0]).toBeCloseTo(before[0], 9);
    expect(after[1]).toBeCloseTo(before[1], 9);
  });

  test('ruler marks are at least 60 pixels apart, in steps one counts in', () => {
    for (const scale of [5, 17, 40, 93, 210, 900]) {
      const step = rulerStep(scale);
      expect(step * scale).toBeGreaterThanOrEqual(60 - 1e-9);
      expect([1, 2, 5]).toContain(Number((step / 10 ** Math.floor(Math.log10(step) + 1e-9)).toFixed(6)));
    }
  });
});

describe('walls', () => {
  test('thickness is drawn outward and corners meet', () => {
    expect(outerFace(sixByFour().floorPlan)).toEqual([
      [-0.12, -0.12],
      [6.12, -0.12],
      [6.12, 4.12],
      [-0.12, 4.12],
    ]);
  });

  test('an open door swings square into the room, a shut one lies in its wall', () => {
    const { floorPlan } = done(addOpening(sixByFour(), 'd', 'door', 'outline:2', 3));
    const [door] = floorPlan.openings;
    const runs = wallRuns(floorPlan);
    const shut = openingShape(door, runs);
    const open = openingShape({ ...door, open: true }, runs);
    expect(shut?.leafEnd[1]).toBeCloseTo(4, 9);
    expect(open?.leafEnd[1]).toBeCloseTo(4 - 0.9, 9);
  });
});

test('hatching stays in the cells it is asked for', () => {
  const surface = {
    originX: 0,
    originY: 0,
    step: 0.1,
    columns: 20,
    rows: 10,
    mask: new Uint8Array(200).fill(1),
  };
  const inside = (cell: number) => cell % 20 < 8;
  const lines = hatchLines(surface, inside, 0.15);
  expect(lines.length).toBeGreaterThan(8);
  for (let i = 0; i < lines.length; i += 2) {
    expect(lines[i]).toBeGreaterThanOrEqual(-1e-9);
    expect(lines[i]).toBeLessThanOrEqual(0.8 + 0.05 + 1e-9);
  }
});

test('an upright face takes the colour of its worst spot, column by column', () => {
  const strip = {
    a: [0, 0] as const,
    b: [3, 0] as const,
    normal: [0, 1, 0] as const,
    columns: 3,
    rows: 2,
    mask: new Uint8Array([1, 1, 1, 1, 1, 0]),
  };
  const ratio = new Float32Array([5, 0.1, 5, 5, 5, 0]);
  const edges = sideEdges([strip], [0], ratio, 0);
  expect(edges[0]).toEqual([1, 0, 2, 0]);
  expect(edges[5]).toEqual([0, 0, 1, 0, 2, 0, 3, 0]);
});
