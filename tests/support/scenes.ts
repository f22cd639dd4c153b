import fc from 'fast-check';
import type { Emitter, Placement, Point, Scene, Solid, Vector3 } from '@/lib/engine';

/** Fixed in CI; set FC_SEED to look elsewhere. */
export const seed = Number(process.env.FC_SEED ?? 20261201);

export const towers: readonly Emitter[] = [
  { tubes: [{ a: [0, 0, 0.25], b: [0, 0, 1.85], watts: 110, backed: null }] },
  {
    tubes: [
      { a: [0.2, 0.1, 0.3], b: [0.2, 0.1, 1.5], watts: 40, backed: null },
      { a: [-0.2, -0.1, 0.3], b: [-0.2, -0.1, 1.5], watts: 40, backed: [-1, 0, 0] },
    ],
  },
];

export const banks: readonly Emitter[] = [
  {
    tubes: [-0.2, 0, 0.2].map((y) => ({
      a: [0, y, 0.9] as Vector3,
      b: [0.55, y, 1.35] as Vector3,
      watts: 30,
      // Perpendicular to the tube, forward and down.
      backed: [0.6332377902572627, 0, -0.7739573] as Vector3,
    })),
  },
  { tubes: [{ a: [-0.4, 0, 0.12], b: [0.4, 0, 0.12], watts: 25, backed: null }] },
];

const metres = (min: number, max: number) =>
  fc.integer({ min: Math.round(min * 1000), max: Math.round(max * 1000) }).map((value) => value / 1000);

export const spots: fc.Arbitrary<Vector3> = fc.tuple(metres(0.1, 7.9), metres(0.1, 5.9), metres(0, 2.2));

/** Footprints: boxes turned any way, and an L that is not convex. */
const footprints: fc.Arbitrary<Point[]> = fc
  .record({
    at: fc.tuple(metres(0.5, 7.5), metres(0.5, 5.5)),
    size: fc.tuple(metres(0.1, 1.6), metres(0.1, 1.2)),
    turn: fc.integer({ min: 0, max: 359 }),
    ell: fc.boolean(),
    other: fc.boolean(),
  })
  .map(({ at, size: [w, d], turn, ell, other }) => {
    const own: Point[] = ell
      ? [
          [-w, -d],
          [w, -d],
          [w, 0],
          [0, 0],
          [0, d],
          [-w, d],
        ]
      : [
          [-w, -d],
          [w, -d],
          [w, d],
          [-w, d],
        ];
    const angle = (turn * Math.PI) / 180;
    const ring = own.map(
      ([x, y]): Point => [
        at[0] + (x * Math.cos(angle) - y * Math.sin(angle)) / 2,
        at[1] + (x * Math.sin(angle) + y * Math.cos(angle)) / 2,
      ],
    );
    return other ? ring.reverse() : ring;
  });

export const solids: fc.Arbitrary<Solid> = fc
  .record({ polygon: footprints, base: metres(0, 0.8), height: metres(0.05, 1.6) })
  .map(({ polygon, base, height }) => ({ polygon, base, top: base + height }));

export const scenes: fc.Arbitrary<Scene> = fc
  .record({
    solids: fc.array(solids, { maxLength: 7 }),
    wall: fc.option(fc.record({ y: metres(1, 5), from: metres(0.3, 2), width: metres(0.4, 2) }), {
      nil: null,
    }),
  })
  .map(({ solids: pieces, wall }) => ({
    solids: pieces,
    walls: wall
      ? [
          {
            a: [0, wall.y] as Point,
            b: [5, wall.y] as Point,
            openings: [
              { from: wall.from, to: wall.from + wall.width, sill: 0.3, head: 1.7, transmittance: 1 },
              { from: 4.2, to: 4.8, sill: 0.6, head: 2, transmittance: 0.5 },
            ],
          },
        ]
      : [],
  }));

export const placements = (emitters: readonly Emitter[]): fc.Arbitrary<Placement> =>
  fc
    .record({
      emitter: fc.constantFrom(...emitters),
      at: fc.tuple(metres(0.6, 7.4), metres(0.6, 5.4)),
      headingDeg: fc.integer({ min: 0, max: 359 }),
    })
    .map(({ emitter, at, headingDeg }) => ({ emitter, x: at[0], y: at[1], headingDeg }));

export const room: readonly Point[] = [
  [0, 0],
  [8, 0],
  [8, 6],
  [0, 6],
];
