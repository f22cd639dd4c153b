import { describe, expect, test } from 'vitest';
import {
  addDose,
  irradianceStrip,
  prepareScene,
  type Scene,
  sideGaps,
  sideStrips,
  stripField,
  stripStarts,
} from '@/lib/engine';
import { room, towers } from '../../support/scenes';

const scene: Scene = {
  solids: [
    {
      polygon: [
        [3, 2],
        [4, 2],
        [4, 3],
        [3, 3],
      ],
      base: 0,
      top: 1.5,
    },
  ],
  walls: [{ a: [0, 0], b: [8, 0], openings: [] }],
};
const strips = sideStrips({
  outline: room,
  solids: scene.solids,
  walls: scene.walls,
  step: 0.1,
  ceiling: 2.5,
});
const placement = { emitter: towers[0], x: 1.5, y: 2.5, headingDeg: 0 };
const dwell = 600;
const dose = new Float32Array(stripStarts(strips)[strips.length]);
addDose(
  dose,
  stripField(strips, (strip) => irradianceStrip(prepareScene(scene), placement, strip)),
  dwell,
);
const report = sideGaps({ scene, strips, stops: [{ placement, dwell }], passes: [], dose, target: 100 });

describe('gaps of upright faces', () => {
  test('are numbered by area over all faces, and lie on the faces they name', () => {
    expect(report.gaps.map(({ number }) => number)).toEqual(report.gaps.map((_, i) => i + 1));
    const areas = report.gaps.map(({ area }) => area);
    expect([...areas].sort((a, b) => b - a)).toEqual(areas);
    const starts = stripStarts(strips);
    for (const { number, strip } of report.gaps) {
      const cells = [...report.labels.keys()].filter((cell) => report.labels[cell] === number);
      expect(cells.every((cell) => cell >= starts[strip] && cell < starts[strip + 1])).toBe(true);
    }
  });

  test('the side that looks away from the lamp faces away, all of it', () => {
    const away = strips.findIndex(({ kind, normal }) => kind === 'solid' && normal[0] > 0.9);
    const gap = report.gaps.find(({ strip }) => strip === away);
    expect(gap).toMatchObject({ cause: 'facing away', lowestRatio: 0 });
    expect(gap?.area).toBeCloseTo(1.5, 6);
  });

  test('the wall behind the furniture is hidden or partly hidden by it', () => {
    const wall = strips.findIndex(({ kind }) => kind === 'wall');
    const shade = { ...placement, x: 3.5, y: 5 };
    const behind = new Float32Array(dose.length);
    addDose(
      behind,
      stripField(strips, (strip) => irradianceStrip(prepareScene(scene), shade, strip)),
      3000,
    );
    const { gaps } = sideGaps({
      scene,
      strips,
      stops: [{ placement: shade, dwell: 3000 }],
      passes: [],
      dose: behind,
      target: 100,
    });
    expect(gaps.filter(({ strip }) => strip === wall).map(({ cause }) => cause)).toEqual(
      expect.arrayContaining([expect.stringMatching(/hidden/)]),
    );
  });
});
