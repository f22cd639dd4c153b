import { describe, expect, test } from 'vitest';
import {
  type Emitter,
  emitterFromMeasurement,
  irradianceAt,
  passDoseAt,
  prepareScene,
  requiredSpeed,
  type Vector3,
} from '@/lib/engine';
import { toMicrowattsPerCm2 } from '@/lib/units';

/** Published figures for a bare line source, and for one that moves. The source stands beside each. */

const nothing = prepareScene({ solids: [], walls: [] });

/** An upright tube of L metres whose middle is 1 m up, or another height where the check needs one. */
const upright = (watts: number, length: number, middle = 1): Emitter => ({
  tubes: [{ a: [0, 0, middle - length / 2], b: [0, 0, middle + length / 2], watts, backed: null }],
});

/** µW/cm² on a surface at `p` that faces the lamp's axis at the origin. */
const facing = (emitter: Emitter, p: Vector3): number =>
  toMicrowattsPerCm2(irradianceAt(nothing, { emitter, x: 0, y: 0, headingDeg: 0 }, { p, mode: 'facing' }));

describe('a line source', () => {
  // Keitz 1971, formula as given in the IOA World Congress proceedings 2007, p. 1396; values computed from it.
  test.each([
    [10, 1, 0.5, 260.48],
    [10, 1, 1, 87.506],
    [10, 1, 2, 24.331],
    [100, 1.5, 2, 232.21],
    [100, 1.5, 3, 108.14],
    [11.2, 0.82, 1, 102.42],
  ])('%d W over %d m gives at %d m the Keitz value %d µW/cm²', (watts, length, distance, expected) => {
    const value = facing(upright(watts, length), [distance, 0, 1]);
    expect(Math.abs(value / expected - 1)).toBeLessThan(1e-4);
  });

  test('the Keitz formula itself, over a range of lengths and distances', () => {
    for (const length of [0.1, 0.6, 1.5])
      for (const distance of [0.05, 0.4, 1, 7]) {
        const alpha = Math.atan(length / 2 / distance);
        const keitz = (40 * (2 * alpha + Math.sin(2 * alpha))) / (2 * Math.PI ** 2 * length * distance);
        expect(facing(upright(40, length), [0, distance, 1]) / 100 / keitz).toBeCloseTo(1, 10);
      }
  });

  // Computed from the same formula off its mid-plane.
  test.each([
    [0.75, 189.72],
    [1.5, 110.3],
  ])('%d m above the mid-plane of 100 W over 1.5 m at 2 m', (up, expected) => {
    expect(Math.abs(facing(upright(100, 1.5), [2, 0, 1 + up]) / expected - 1)).toBeLessThan(1e-4);
  });

  // Line against point of equal intensity, computed; the rule that five lengths are far enough: IES, from memory.
  test.each([
    [0.5, 0.643],
    [1, 0.864],
    [2, 0.961],
    [3, 0.982],
    [4, 0.99],
    [5, 0.9934],
    [10, 0.998],
  ])('at %d lengths it gives %d of a point', (lengths, expected) => {
    const value = facing(upright(10, 1), [lengths, 0, 1]) / 100;
    expect(Math.abs(value / (10 / Math.PI ** 2 / lengths ** 2) - expected)).toBeLessThan(1e-3);
  });

  // Inverse square: Health Physics Society, Ask the Experts Q11543.
  test('far away it falls with the square of the distance', () => {
    const at = (distance: number) => facing(upright(10, 0.01), [distance, 0, 1]);
    expect(at(2) / at(1)).toBeCloseTo(0.25, 4);
    expect(at(4) / at(1)).toBeCloseTo(0.0625, 4);
  });

  test('a horizontal receiver and an upright tube: Φ/(2π²L) · D · (1/r₀² − 1/r₁²), the arctangent gone', () => {
    // From the closed form with A = 0: strength · B D/2 · (1/r² at the near end − at the far one).
    const [watts, length, D, below] = [60, 1.2, 1.4, 0.3];
    const expected =
      (watts / (2 * Math.PI ** 2 * length)) *
      D *
      (1 / (D ** 2 + below ** 2) - 1 / (D ** 2 + (below + length) ** 2));
    const value = irradianceAt(
      nothing,
      { emitter: upright(watts, length, below + length / 2), x: 0, y: 0, headingDeg: 0 },
      { p: [D, 0, 0], mode: 'normal', n: [0, 0, 1] },
    );
    expect(value / expected).toBeCloseTo(1, 12);
  });

  // Generic tubes at 1 m: from memory; 11.2 W over 0.82 m by Keitz 102.4 µW/cm².
  test.each([
    [4.9, 0.36, 48],
    [11.2, 0.82, 100],
    [18, 0.82, 160],
    [26, 1.12, 220],
  ])('a generic tube of %d W over %d m gives about %d µW/cm² at 1 m', (watts, length, expected) => {
    expect(Math.abs(facing(upright(watts, length), [1, 0, 1]) / expected - 1)).toBeLessThan(0.05);
  });

  test('an emitter known by a reading gives that reading back', () => {
    const emitter = emitterFromMeasurement(upright(1, 1.5), { irradiance: 2.4, distance: 1, height: 1 });
    expect(facing(emitter, [1, 0, 1])).toBeCloseTo(240, 9);
  });
});

describe('a moving source', () => {
  const tube = upright(100, 1.5);
  const pass = (halfPath: number, speed: number) => ({
    emitter: tube,
    path: [
      [-halfPath, 0],
      [halfPath, 0],
    ] as [number, number][],
    speed,
    headingDeg: 0,
  });
  const wallDose = (standOff: number, halfPath: number, speed = 0.1) =>
    passDoseAt(nothing, pass(halfPath, speed), { p: [0, standOff, 1], mode: 'normal', n: [0, -1, 0] });

  // Computed by integrating the closed form; the receiver faces the track at the tube's mid-height, path ± 100 m.
  test.each([
    [1, 166.12],
    [1.5, 122.32],
    [2, 95.54],
  ])('100 W over 1.5 m at 0.1 m/s and %d m off gives %d J/m²', (standOff, expected) => {
    expect(Math.abs(wallDose(standOff, 100) / expected - 1)).toBeLessThan(1e-3);
  });

  // Conservation of energy: an endless upright line gives (Φ/L)/(2v) to a wall at any stand-off.
  test('a very tall line gives the same dose at any stand-off', () => {
    const tall = { ...pass(4000, 0.1), emitter: upright(66.67 * 4000, 4000, 0) };
    for (const standOff of [1, 2, 5]) {
      const dose = passDoseAt(nothing, tall, { p: [0, standOff, 0], mode: 'normal', n: [0, -1, 0] });
      expect(Math.abs(dose / 333.3 - 1)).toBeLessThan(0.005);
    }
  });

  test('dose × speed is constant', () => {
    expect(wallDose(1.5, 20, 0.05) / wallDose(1.5, 20, 0.2)).toBeCloseTo(4, 6);
  });

  // The further off, the slower the pass: common practice. The speed gives just the dose it was asked for.
  test('the speed for a target falls with the stand-off and gives that target', () => {
    const speeds = requiredSpeed(tube, [0.3, 0.5, 1, 1.5, 2], 120);
    expect([...speeds].sort((a, b) => b - a)).toEqual([...speeds]);
    expect(speeds[2]).toBeCloseTo((166.135 * 0.1) / 120, 4);
  });
});
