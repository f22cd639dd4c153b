import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { describe, expect, test } from 'vitest';
import { evaluateStopSet } from '@/lib/commands/evaluate-stop-set';
import { irradianceAt, passDoseAt, prepareScene } from '@/lib/engine';
import {
  litPlanOf,
  placedTouchPoints,
  type RoomFile,
  requiredDose,
  timesOf,
  toScene,
  toSpot,
} from '@/lib/room';

const FILE = 'db/seed/rooms/two-bed-bay.json';
const file: RoomFile = JSON.parse(readFileSync(FILE, 'utf8'));
const withPass: RoomFile = {
  ...file,
  stopSets: [
    {
      ...file.stopSets[0],
      passes: [
        {
          id: 'p',
          name: 'P1',
          path: [
            [1, 2.6],
            [4, 2.6],
          ],
          speed: 0.05,
          heading: null,
          emitter: null,
        },
      ],
    },
  ],
};

describe('evaluating a room file', () => {
  const coarse = { plane: 0.75, grid: 0.2 };

  test('answers just the figures it promises', () => {
    expect(Object.keys(evaluateStopSet(file, coarse))).toEqual([
      'room',
      'stopSet',
      'surface',
      'grid',
      'cells',
      'targetMet',
      'lowestRatio',
      'p5Ratio',
      'lampOnSeconds',
      'movingSeconds',
      'totalSeconds',
      'gaps',
      'touchPoints',
    ]);
  });

  test('takes a pass into time, cover and touch points, each as the engine reads it alone', () => {
    const without = evaluateStopSet(file, coarse);
    const figures = evaluateStopSet(withPass, coarse);
    const [set] = withPass.stopSets;
    expect(figures.lampOnSeconds).toBe(timesOf(set, withPass.emitters).lampOn);
    expect(figures.lampOnSeconds).toBeCloseTo(without.lampOnSeconds + 60 + withPass.emitters.tower.warmUp, 9);
    expect(figures.targetMet).toBeGreaterThan(without.targetMet);

    const { scene } = toScene(withPass.floorPlan);
    const prepared = prepareScene(scene);
    const { stops, passes } = litPlanOf(set, withPass.emitters);
    placedTouchPoints(withPass.floorPlan).forEach((touch, i) => {
      const receiver = { ...toSpot(touch), mode: 'normal' as const };
      const dose =
        stops.reduce(
          (sum, { placement, dwell }) => sum + dwell * irradianceAt(prepared, placement, receiver),
          0,
        ) + passes.reduce((sum, pass) => sum + passDoseAt(prepared, pass, receiver), 0);
      expect(figures.touchPoints[i].dose).toBeCloseTo(dose, 6);
      expect(figures.touchPoints[i].ratio).toBeCloseTo(dose / requiredDose(set), 9);
    });
  });

  test('a stop set that is not there is named, with those that are', () => {
    expect(() => evaluateStopSet(file, { ...coarse, stopSet: 'nope' })).toThrow(file.stopSets[0].id);
  });
});

describe('npm run evaluate', () => {
  const run = (...args: string[]) =>
    spawnSync('node_modules/.bin/tsx', ['lib/commands/evaluate.ts', ...args], { encoding: 'utf8' });

  test('prints one line of JSON with --json', () => {
    const { stdout, status } = run(FILE, '--json', '--grid', '0.2', '--plane', '0.9');
    expect(status).toBe(0);
    expect(stdout.trim().split('\n')).toHaveLength(1);
    expect(JSON.parse(stdout)).toMatchObject({ room: 'Two-bed bay 3.14', surface: { z: 0.9 }, grid: 0.2 });
  });

  test('a file that cannot be used is refused with its places, and exits 1', () => {
    const broken = path.join(mkdtempSync(path.join(os.tmpdir(), 'leeside-evaluate-')), 'room.json');
    writeFileSync(broken, JSON.stringify({ ...file, room: { ...file.room, ceiling: 'high' } }));
    const { stderr, status } = run(broken);
    expect(status).toBe(1);
    expect(stderr).toContain('room.ceiling');
    expect(run('no-such-file.json').stderr).toContain('no-such-file.json');
    expect(run(FILE, '--grid', 'fine').stderr).toContain('--grid');
  }, 60_000);
});
