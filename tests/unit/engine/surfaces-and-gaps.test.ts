import { describe, expect, test } from 'vitest';
import {
  coverage,
  findGaps,
  gapCauses,
  irradianceAt,
  irradianceMap,
  irradianceStrip,
  type Point,
  passDoseAt,
  passDoseMap,
  planeSurface,
  prepareScene,
  type Scene,
  type Solid,
  sideStrips,
  stripPoint,
  sumDose,
  topsSurface,
  type Vector3,
} from '@/lib/engine';
import { banks, room, towers } from '../../support/scenes';

const rectangle = (x0: number, y0: number, x1: number, y1: number): Point[] => [
  [x0, y0],
  [x1, y0],
  [x1, y1],
  [x0, y1],
];
const table: Solid = { polygon: rectangle(3, 2, 4, 3), base: 0.7, top: 0.75 };
const cupboard: Solid = { polygon: rectangle(5, 1, 6, 2), base: 0, top: 1.8 };

describe('surfaces', () => {
  test('cells are those strictly inside the outline, their centres half a step in', () => {
    const surface = planeSurface({ outline: rectangle(1, 1, 2, 1.5), solids: [], step: 0.25, z: 0 });
    expect([surface.columns, surface.rows]).toEqual([4, 2]);
    expect(surface.mask.every((counts) => counts === 1)).toBe(true);
    const triangle = planeSurface({
      outline: [
        [0, 0],
        [1, 0],
        [0, 1],
      ],
      solids: [],
      step: 0.25,
      z: 0,
    });
    // Centres on the slanted side do not count: 3 + 2 + 1.
    expect(triangle.mask.reduce((sum, counts) => sum + counts, 0)).toBe(6);
  });

  test('a plane leaves out a part from its underside to just under its top', () => {
    const at = (z: number) =>
      planeSurface({ outline: room, solids: [table], step: 0.5, z }).mask.reduce(
        (sum, counts) => sum + counts,
        0,
      );
    const all = at(0);
    expect(at(0.69)).toBe(all);
    expect(at(0.7)).toBe(all - 4);
    expect(at(0.75)).toBe(all);
  });

  test('tops are the tallest part over a cell, or the floor', () => {
    const surface = topsSurface({
      outline: room,
      solids: [table, cupboard, { ...table, top: 0.9, base: 0.8 }],
      step: 0.5,
    });
    const heights = surface.z as Float32Array;
    expect(heights[Math.floor(2.25 / 0.5) * surface.columns + Math.floor(3.25 / 0.5)]).toBeCloseTo(0.9, 6);
    expect(heights[Math.floor(1.25 / 0.5) * surface.columns + Math.floor(5.25 / 0.5)]).toBeCloseTo(1.8, 6);
    expect(heights[0]).toBe(0);
  });

  test('sides are strips that face out, and read what a point with that direction reads', () => {
    const scene: Scene = { solids: [cupboard], walls: [{ a: [0, 0], b: [8, 0], openings: [] }] };
    const strips = sideStrips({
      outline: room,
      solids: scene.solids,
      walls: scene.walls,
      step: 0.25,
      ceiling: 2.6,
    });
    const area = (kind: string) =>
      strips
        .filter((strip) => strip.kind === kind)
        .reduce(
          (sum, s) => sum + s.mask.reduce((n, counts) => n + counts, 0) * s.cellWidth * s.cellHeight,
          0,
        );
    // Four faces of 1 × 1.8 m; one wall of 8 × 2.6 m, seen from inside only.
    expect(area('solid')).toBeCloseTo(7.2, 6);
    expect(area('wall')).toBeCloseTo(20.8, 6);
    const prepared = prepareScene(scene);
    const placement = { emitter: banks[0], x: 3, y: 3, headingDeg: -40 };
    for (const strip of strips) {
      const map = irradianceStrip(prepared, placement, strip);
      for (const [i, j] of [
        [0, 0],
        [strip.columns - 1, strip.rows - 1],
        [1, 2],
      ]) {
        const exact = irradianceAt(prepared, placement, {
          p: stripPoint(strip, i, j),
          mode: 'normal',
          n: strip.normal,
        });
        expect(map[j * strip.columns + i]).toBeCloseTo(Math.fround(exact), 5);
      }
    }
  });

  test('where furniture stands against a wall the wall is not a surface', () => {
    const against: Solid = { polygon: rectangle(1, 0, 2, 0.5), base: 0, top: 1 };
    const [wall] = sideStrips({
      outline: room,
      solids: [against],
      walls: [{ a: [0, 0], b: [8, 0], openings: [] }],
      step: 0.5,
      ceiling: 2,
    }).filter(({ kind }) => kind === 'wall');
    const covered =
      wall.mask.reduce((sum, counts) => sum + (counts ? 0 : 1), 0) * wall.cellWidth * wall.cellHeight;
    expect(covered).toBeCloseTo(1, 6);
  });
});

describe('dose and gaps', () => {
  const surface = planeSurface({ outline: rectangle(0, 0, 1, 0.5), solids: [], step: 0.1, z: 0 });
  const ratio = (under: readonly (readonly [number, number])[], value = 0.5) => {
    const field = new Float32Array(surface.mask.length).fill(2);
    for (const [i, j] of under) field[j * surface.columns + i] = value;
    return field;
  };

  test('a dose is the sum of maps held for their dwells', () => {
    const maps = [new Float32Array([1, 2]), new Float32Array([3, 0])];
    expect([...sumDose(maps, [10, 2])]).toEqual([16, 20]);
    expect(() => sumDose(maps, [1])).toThrow('2 maps but 1 dwells');
  });

  test('coverage counts the cells that count and nothing else', () => {
    const dose = new Float32Array([5, 10, 15, 0]);
    const report = coverage({ ...surface, mask: new Uint8Array([1, 1, 1, 0]) }, dose, 10);
    expect(report).toMatchObject({ cells: 3, met: 2, lowestRatio: 0.5 });
    expect(report.share).toBeCloseTo(2 / 3, 12);
  });

  test('zones that only touch at a corner are two gaps, the larger is G1', () => {
    const { gaps } = findGaps(
      surface,
      ratio([
        [1, 1],
        [2, 2],
        [3, 2],
      ]),
    );
    expect(gaps.map(({ number, cells }) => [number, cells])).toEqual([
      [1, 2],
      [2, 1],
    ]);
    expect(gaps[0].area).toBeCloseTo(0.02, 12);
  });

  test('what is smaller than 0.01 m² is a speck, and 0.01 m² is a gap', () => {
    const fine = planeSurface({ outline: rectangle(0, 0, 1, 0.5), solids: [], step: 0.05, z: 0 });
    const field = new Float32Array(fine.mask.length).fill(2);
    for (const cell of [0, 1, 20, 21]) field[cell] = 0.2;
    for (const cell of [10, 11, 12]) field[cell] = 0.2;
    const report = findGaps(fine, field);
    expect(report.gaps).toHaveLength(1);
    expect(report.specksArea).toBeCloseTo(0.0075, 12);
    expect(report.labels[10]).toBe(-1);
  });

  test('a gap is named inside itself, also when it is a ring', () => {
    const ring: [number, number][] = [];
    for (let i = 1; i < 9; i++)
      for (let j = 0; j < 5; j++) if (i < 3 || i > 6 || j < 1 || j > 3) ring.push([i, j]);
    const { gaps, labels } = findGaps(surface, ratio(ring));
    const cell = Math.floor(gaps[0].y / 0.1) * surface.columns + Math.floor(gaps[0].x / 0.1);
    expect(labels[cell]).toBe(1);
  });
});

describe('the cause of a gap', () => {
  const at = (x: number, y: number, z = 0) => {
    const step = 0.1;
    return planeSurface({ outline: rectangle(x, y, x + step, y + step), solids: [], step, z });
  };
  const cause = (scene: Scene, spot: ReturnType<typeof at>, dwell: number, emitter = towers[0]) => {
    const stops = [{ placement: { emitter, x: 1, y: 1, headingDeg: 0 }, dwell }];
    const dose = sumDose([irradianceMap(prepareScene(scene), stops[0].placement, spot)], [dwell]);
    const found = findGaps(
      spot,
      dose.map((value) => value / 100),
    );
    return gapCauses({ scene, stops, surface: spot, dose, target: 100, ...found }).gapCauses[0];
  };
  const screen: Solid = { polygon: rectangle(2, 0, 2.1, 2), base: 0, top: 3 };
  const wall: Scene['walls'] = [{ a: [2, -2], b: [2, 4], openings: [] }];

  test.each([
    // Over the top of every lamp a level surface that looks up sees none of it.
    ['facing away', { solids: [screen], walls: wall }, at(4, 1, 2.5), 300],
    ['walled off', { solids: [screen], walls: wall }, at(4, 1), 3000],
    ['hidden', { solids: [screen], walls: [] }, at(3, 1), 3000],
    ['partly hidden', { solids: [{ ...screen, top: 0.7 }], walls: [] }, at(3, 1), 150],
    ['short', { solids: [], walls: [] }, at(6, 1), 1],
  ] as const)('%s', (expected, scene, spot, dwell) => {
    expect(cause(scene, spot, dwell)).toBe(expected);
  });
});

describe('maps of passes', () => {
  const scene: Scene = {
    solids: [table, cupboard],
    walls: [{ a: [2, 0], b: [2, 2], openings: [{ from: 0.5, to: 1.2, sill: 0, head: 2, transmittance: 1 }] }],
  };
  test.each([
    ['upright', towers[0]],
    ['backed and leaning', banks[0]],
  ])('are the point doses to 0.1 %%, cell by cell (%s tubes)', (_, emitter) => {
    const surface = planeSurface({ outline: room, solids: scene.solids, step: 0.45, z: 0.3 });
    const pass = {
      emitter,
      path: [
        [1, 4],
        [4.6, 4.4],
        [6.5, 3],
      ] as Point[],
      speed: 0.1,
      headingDeg: null,
    };
    const prepared = prepareScene(scene);
    const map = passDoseMap(prepared, pass, surface);
    let lit = 0;
    for (let cell = 0; cell < map.length; cell++) {
      if (surface.mask[cell] === 0) continue;
      const p: Vector3 = [
        ((cell % surface.columns) + 0.5) * surface.step,
        (Math.floor(cell / surface.columns) + 0.5) * surface.step,
        0.3,
      ];
      const exact = passDoseAt(prepared, pass, { p, mode: 'normal', n: [0, 0, 1] });
      expect(Math.abs(map[cell] - exact)).toBeLessThanOrEqual(1e-3 * exact);
      if (exact > 0) lit++;
    }
    expect(lit).toBeGreaterThan(20);
  });

  test('a cell that the tube sweeps over has a dose all the same', () => {
    const surface = planeSurface({ outline: rectangle(0, 0, 4, 1), solids: [], step: 0.2, z: 1 });
    const map = passDoseMap(
      prepareScene({ solids: [], walls: [] }),
      {
        emitter: towers[0],
        path: [
          [0.1, 0.5],
          [3.9, 0.5],
        ],
        speed: 0.2,
        headingDeg: null,
      },
      surface,
    );
    expect(map.every((value) => Number.isFinite(value) && value > 0)).toBe(true);
  });
});
