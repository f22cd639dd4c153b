import { describe, expect, test } from 'vitest';
import {
  type Emitter,
  irradianceAt,
  prepareScene,
  type ReadingMode,
  type Scene,
  type Solid,
  UndefinedReadingError,
  type Vector3,
} from '@/lib/engine';

/** Row by row what lib/geometry/degenerate.ts decides. */

const tube: Emitter = { tubes: [{ a: [0, 0, 0.5], b: [0, 0, 1.5], watts: 60, backed: null }] };
const box = (base = 0, top = 1): Solid => ({
  polygon: [
    [1, -0.5],
    [2, -0.5],
    [2, 0.5],
    [1, 0.5],
  ],
  base,
  top,
});
const read = (
  scene: Partial<Scene>,
  p: Vector3,
  { n = [0, 0, 1] as Vector3, mode = 'normal' as ReadingMode, emitter = tube } = {},
) =>
  irradianceAt(
    prepareScene({ solids: [], walls: [], ...scene }),
    { emitter, x: 0, y: 0, headingDeg: 0 },
    { p, mode, n },
  );
const open = (p: Vector3, n?: Vector3) => read({}, p, { n });

describe('faces, edges and seams', () => {
  test('a point on a face looks outward and is not hidden by that face', () => {
    expect(read({ solids: [box()] }, [1, 0, 0.5], { n: [-1, 0, 0] })).toBeCloseTo(
      open([1, 0, 0.5], [-1, 0, 0]),
      12,
    );
    expect(read({ solids: [box()] }, [1.5, 0, 1])).toBeCloseTo(open([1.5, 0, 1]), 12);
    expect(read({ solids: [box()] }, [2, 0, 0.2], { n: [1, 0, 0] })).toBe(0);
  });

  test('a ray that slides along a face or touches a corner is free', () => {
    const beside: Solid = {
      polygon: [
        [1, 0],
        [2, 0],
        [2, 1],
        [1, 1],
      ],
      base: 0,
      top: 3,
    };
    expect(read({ solids: [beside] }, [3, 0, 0.2])).toBeCloseTo(open([3, 0, 0.2]), 12);
    const corner: Solid = { ...beside, polygon: beside.polygon.map(([x, y]) => [x, y + 0] as const) };
    expect(read({ solids: [corner] }, [-3, 0, 0.2])).toBeCloseTo(open([-3, 0, 0.2]), 12);
  });

  test('no light leaks along the seams of a footprint that is not convex', () => {
    const plus: Solid = {
      polygon: [
        [1.4, -1.5],
        [1.6, -1.5],
        [1.6, -0.1],
        [2, -0.1],
        [2, 0.1],
        [1.6, 0.1],
        [1.6, 1.5],
        [1.4, 1.5],
        [1.4, 0.1],
        [1, 0.1],
        [1, -0.1],
        [1.4, -0.1],
      ],
      base: 0,
      top: 4,
    };
    for (let i = 0; i <= 400; i++) {
      const y = -1.4 + (2.8 * i) / 400;
      // Straight behind the bar of the plus, along every line that could be a seam.
      expect(read({ solids: [plus] }, [2.4, y, 0.3])).toBe(0);
    }
  });

  test('parts side by side and on top of each other are opaque across the joint', () => {
    const left: Solid = {
      ...box(0, 4),
      polygon: [
        [1, -2],
        [1.2, -2],
        [1.2, 0],
        [1, 0],
      ],
    };
    const right: Solid = {
      ...box(0, 4),
      polygon: [
        [1, 0],
        [1.2, 0],
        [1.2, 2],
        [1, 2],
      ],
    };
    // Every ray that crosses the joint, however flat it lies to it.
    for (const y of [1e-6, 0.01, 0.3]) expect(read({ solids: [left, right] }, [2, y, 0.2])).toBe(0);
    const wide = (base: number, top: number): Solid => ({
      ...box(base, top),
      polygon: [
        [1, -2],
        [1.2, -2],
        [1.2, 2],
        [1, 2],
      ],
    });
    expect(read({ solids: [wide(0, 0.9), wide(0.9, 4)] }, [2, 0.1, 0.2])).toBe(0);
  });

  test('the gap under a slab and the stretch above it are both seen', () => {
    const slab: Solid = {
      ...box(0.55, 0.7),
      polygon: [
        [1, -2],
        [1.1, -2],
        [1.1, 2],
        [1, 2],
      ],
    };
    const partly = read({ solids: [slab] }, [2, 0, 0.5]);
    expect(partly).toBeGreaterThan(0);
    expect(partly).toBeLessThan(open([2, 0, 0.5]));
  });
});

describe('walls and openings', () => {
  const wall = (openings: Scene['walls'][number]['openings'] = []): Scene['walls'] => [
    { a: [1, -2], b: [1, 2], openings },
  ];
  const door = { from: 1.5, to: 2.5, sill: 0, head: 2.1, transmittance: 1 };

  test('a wall hides at every height, its ends included, and two walls at their corner', () => {
    expect(read({ walls: wall() }, [2, 0, 0.2])).toBe(0);
    expect(read({ walls: [{ a: [1, 0], b: [1, 2], openings: [] }] }, [2, 0, 0.2])).toBe(0);
  });

  test('light passes an open door, dims through glazing, is stopped by a shut one', () => {
    expect(read({ walls: wall([door]) }, [2, 0, 0.2])).toBeCloseTo(open([2, 0, 0.2]), 12);
    expect(read({ walls: wall([{ ...door, transmittance: 0.4 }]) }, [2, 0, 0.2])).toBeCloseTo(
      0.4 * open([2, 0, 0.2]),
      12,
    );
    expect(read({ walls: wall([{ ...door, transmittance: 0 }]) }, [2, 0, 0.2])).toBe(0);
    // Beside the door, and over its head.
    expect(read({ walls: wall([door]) }, [2, 1.5, 0.2])).toBe(0);
    expect(read({ walls: wall([{ ...door, head: 0.3 }]) }, [2, 0, 0.2])).toBe(0);
  });

  test('a wall seen edge on has no thickness to hide behind, and its own line is not hidden by it', () => {
    expect(read({ walls: [{ a: [1, 0], b: [3, 0], openings: [] }] }, [4, 0, 0.2])).toBeCloseTo(
      open([4, 0, 0.2]),
      12,
    );
    expect(read({ walls: wall() }, [1, 0.3, 0.2])).toBeCloseTo(open([1, 0.3, 0.2]), 12);
  });
});

describe('readings without a value', () => {
  test('on the axis beyond the ends it is exactly 0, in every mode', () => {
    expect(open([0, 0, 0.2])).toBe(0);
    expect(read({}, [0, 0, 1.9], { mode: 'spherical' })).toBe(0);
  });

  test('on the tube it is refused with the place', () => {
    expect(() => open([0, 0, 1])).toThrow(UndefinedReadingError);
    expect(() => open([0, 0, 1])).toThrow('0.000, 0.000, 1.000');
  });

  test('facing straight under a stop is refused and says so', () => {
    expect(() => read({}, [0, 0, 0.1], { mode: 'facing' })).toThrow('straight under or over the stop');
  });

  test('a backed tube gives nothing in its own plane and behind, twice in front', () => {
    const backed: Emitter = { tubes: [{ ...tube.tubes[0], backed: [1, 0, 0] }] };
    expect(read({}, [0, 2, 0.2], { emitter: backed })).toBe(0);
    expect(read({}, [-2, 0, 0.2], { emitter: backed })).toBe(0);
    expect(read({}, [2, 0, 0.2], { emitter: backed })).toBeCloseTo(2 * open([2, 0, 0.2]), 12);
  });

  test('very near and very far there is a number', () => {
    for (const d of [1e-8, 1e-6, 1e-3, 1e3, 1e6])
      for (const p of [
        [d, 0, 1],
        [d, 0, 0.5],
        [d, 0, 0],
        [0, d, 1.5],
      ] as Vector3[]) {
        const value = read({}, p, { n: [-1, 0, 0] });
        expect(Number.isFinite(value) && value >= 0).toBe(true);
      }
  });
});

describe('what cannot be traced is refused with its number and value', () => {
  test.each<[string, Partial<Scene>]>([
    [
      'Solid 2',
      {
        solids: [
          box(),
          {
            ...box(),
            polygon: [
              [0, 0],
              [1, 0],
            ],
          },
        ],
      },
    ],
    [
      'sides',
      {
        solids: [
          {
            ...box(),
            polygon: [
              [0, 0],
              [1, 1],
              [1, 0],
              [0, 1],
            ],
          },
        ],
      },
    ],
    ['top 0', { solids: [box(0, 0)] }],
    [
      'NaN',
      {
        solids: [
          {
            ...box(),
            polygon: [
              [Number.NaN, 0],
              [1, 0],
              [1, 1],
            ],
          },
        ],
      },
    ],
    ['Wall 1', { walls: [{ a: [1, 1], b: [1, 1], openings: [] }] }],
    [
      'transmittance 2',
      {
        walls: [{ a: [0, 0], b: [1, 0], openings: [{ from: 0, to: 1, sill: 0, head: 1, transmittance: 2 }] }],
      },
    ],
  ])('%s', (words, scene) => {
    expect(() => read(scene, [3, 3, 0])).toThrow(words);
  });
});
