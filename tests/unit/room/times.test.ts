import { expect, test } from 'vitest';
import { type Emitter, emitterOf, passSeconds, pathLength, timesOf } from '@/lib/room';
import { aStopSet } from '../../support/stop-sets';

const emitter = (warmUp: number): Emitter => ({
  name: 'Lamp',
  tubes: [{ a: [0, 0, 0.3], b: [0, 0, 1.8], watts: 100, backed: null }],
  maintenance: 1,
  warmUp,
  clearance: 0,
});
const emitters = { tower: emitter(60), bank: emitter(120) };
const stop = (id: string, at: [number, number], dwell: number, own: string | null = null) => ({
  id,
  name: id,
  at,
  heading: 0,
  dwell,
  emitter: own,
});

test.each([
  [
    [
      [0, 0],
      [3, 4],
    ],
    5,
  ],
  [
    [
      [0, 0],
      [3, 4],
      [3, 0],
    ],
    9,
  ],
  [
    [
      [1, 1],
      [1, 1],
    ],
    0,
  ],
] as [[number, number][], number][])('a path %j is %d m long', (path, metres) => {
  expect(pathLength(path)).toBe(metres);
});

test('a pass of 9 m at 0.05 m/s takes three minutes', () => {
  expect(
    passSeconds({
      path: [
        [0, 0],
        [3, 4],
        [3, 0],
      ],
      speed: 0.05,
    }),
  ).toBeCloseTo(180, 9);
});

test('two stops and a pass, worked by hand', () => {
  const set = aStopSet('s', {
    stops: [stop('a', [0, 0], 600), stop('b', [3, 4], 300, 'bank')],
    passes: [
      {
        id: 'p',
        name: 'P',
        path: [
          [3, 0],
          [7, 0],
        ],
        speed: 0.1,
        heading: null,
        emitter: null,
      },
    ],
  });
  const times = timesOf(set, emitters);
  // Lit: 600 + 300 + 4 m ÷ 0.1 m/s; warm-up: 60 + 120 + 60.
  expect(times.lampOn).toBeCloseTo(940 + 240, 9);
  // Pushed dark: 5 m + 4 m at 0.5 m/s; set down twice at 40 s.
  expect(times.moving).toBeCloseTo(18 + 80, 9);
  expect(times.total).toBe(times.lampOn + times.moving);
});

test('a set of nothing takes no time', () => {
  expect(timesOf(aStopSet('s', { stops: [], passes: [] }), emitters)).toEqual({
    lampOn: 0,
    moving: 0,
    total: 0,
  });
});

test('a stop’s emitter is its own, else the set’s; an unknown one is none', () => {
  expect(emitterOf({ emitter: 'tower' }, { emitter: null }, emitters)).toBe(emitters.tower);
  expect(emitterOf({ emitter: 'tower' }, { emitter: 'bank' }, emitters)).toBe(emitters.bank);
  for (const key of ['gone', 'constructor', '__proto__'])
    expect(emitterOf({ emitter: key }, { emitter: null }, emitters)).toBeUndefined();
});
