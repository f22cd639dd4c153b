import { describe, expect, test } from 'vitest';
import { type Emitter, irradianceAt, prepareScene, type Scene, type Vector3 } from '@/lib/engine';

/** Conservation of energy: what leaves the tubes arrives on the surfaces of a closed room, furniture or not. */

const [W, D, H] = [4, 5, 2.7];

/** Midpoints of an n × n lattice over each face of a box, with its area and the normal that looks in (or out). */
function faces(min: Vector3, max: Vector3, n: number, inward: boolean) {
  const spots: { p: Vector3; normal: Vector3; area: number }[] = [];
  for (const axis of [0, 1, 2] as const)
    for (const side of [0, 1]) {
      const [u, v] = [(axis + 1) % 3, (axis + 2) % 3];
      const area = ((max[u] - min[u]) * (max[v] - min[v])) / (n * n);
      const normal: [number, number, number] = [0, 0, 0];
      normal[axis] = (side === 0 ? 1 : -1) * (inward ? 1 : -1);
      for (let i = 0; i < n; i++)
        for (let j = 0; j < n; j++) {
          const p: [number, number, number] = [0, 0, 0];
          p[axis] = side === 0 ? min[axis] : max[axis];
          p[u] = min[u] + ((i + 0.5) / n) * (max[u] - min[u]);
          p[v] = min[v] + ((j + 0.5) / n) * (max[v] - min[v]);
          spots.push({ p, normal, area });
        }
    }
  return spots;
}

const flux = (
  scene: Scene,
  emitter: Emitter,
  at: readonly [number, number],
  boxes: ReturnType<typeof faces>,
) => {
  const prepared = prepareScene(scene);
  const placement = { emitter, x: at[0], y: at[1], headingDeg: 25 };
  return boxes.reduce(
    (sum, { p, normal, area }) =>
      sum + area * irradianceAt(prepared, placement, { p, mode: 'normal', n: normal }),
    0,
  );
};

const emitters: [string, Emitter, number][] = [
  ['an upright tube', { tubes: [{ a: [0, 0, 0.4], b: [0, 0, 1.9], watts: 100, backed: null }] }, 100],
  ['a leaning tube', { tubes: [{ a: [-0.3, 0.1, 0.5], b: [0.4, -0.2, 1.8], watts: 40, backed: null }] }, 40],
  [
    'two tubes, one of them backed',
    {
      tubes: [
        { a: [0.1, 0, 0.5], b: [0.1, 0, 1.5], watts: 30, backed: [1, 0, 0] },
        { a: [0, 0.4, 0.5], b: [0, -0.4, 1.2], watts: 20, backed: null },
      ],
    },
    50,
  ],
];

describe('flux', () => {
  test.each(emitters)('of %s through a closed box is its output', (_, emitter, watts) => {
    const total = flux({ solids: [], walls: [] }, emitter, [1.9, 2.6], faces([0, 0, 0], [W, D, H], 60, true));
    expect(Math.abs(total / watts - 1)).toBeLessThan(0.005);
  });

  // Mean direct irradiance of an empty closed room, Φ/A: 4 × 5 × 2.7 m and 100 W give 1.1287 W/m² (conservation of energy).
  test('the mean over all surfaces of an empty room is Φ/A', () => {
    const box = faces([0, 0, 0], [W, D, H], 60, true);
    const area = box.reduce((sum, spot) => sum + spot.area, 0);
    const mean = flux({ solids: [], walls: [] }, emitters[0][1], [2, 2.5], box) / area;
    expect(Math.abs(mean / 1.1287 - 1)).toBeLessThan(0.005);
  });

  test('is shared between furniture and room, none lost and none made', () => {
    const base = 0.3;
    const top = 0.9;
    const scene: Scene = {
      solids: [
        {
          polygon: [
            [2.5, 1],
            [3.4, 1],
            [3.4, 2],
            [2.5, 2],
          ],
          base,
          top,
        },
      ],
      walls: [],
    };
    const room = flux(scene, emitters[0][1], [1.2, 2.6], faces([0, 0, 0], [W, D, H], 90, true));
    const piece = flux(scene, emitters[0][1], [1.2, 2.6], faces([2.5, 1, base], [3.4, 2, top], 40, false));
    expect(piece).toBeGreaterThan(1);
    expect(Math.abs((room + piece) / 100 - 1)).toBeLessThan(0.006);
  });
});
