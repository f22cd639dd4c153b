import fc from 'fast-check';
import { expect, test } from 'vitest';
import { demoRooms } from '@/db/seed/rooms';
import { stopSequenceCsv } from '@/lib/room';
import { readCsv } from '../../support/csv';
import { barePlan } from '../../support/floor-plans';
import { seeded } from '../../support/properties';
import { aStopSet } from '../../support/stop-sets';

const { emitters } = demoRooms['two-bed-bay'];
const name = emitters.tower.name;

test('a stop and a pass, written out by hand', () => {
  const set = aStopSet('s', {
    stops: [{ id: 'a', name: 'By the bed', at: [1.2, 0.7], heading: 12.34, dwell: 600, emitter: null }],
    passes: [
      {
        id: 'b',
        name: 'P1',
        path: [
          [5.5, 3.75],
          [1, 3.75],
        ],
        speed: 0.05,
        heading: null,
        emitter: null,
      },
    ],
  });
  expect(stopSequenceCsv(set, barePlan(), emitters)).toBe(
    [
      'order,name,kind,from_wall_1,distance_1_m,from_wall_2,distance_2_m,heading_deg,dwell_s,speed_m_s,emitter',
      `1,By the bed,stop,north,0.70,west,1.20,12.3,600,,${name}`,
      `2,P1,pass,south,0.25,east,0.50,,,0.05,${name}`,
      '',
    ].join('\r\n'),
  );
});

test('a mark that two walls do not fix leaves the second tape blank rather than guessed', () => {
  const corridor = barePlan({
    outline: [
      [0, 0],
      [10, 0],
      [12, 1],
      [10, 2],
      [0, 2],
      [-2, 1],
    ],
    outlineWalls: ['a', 'b', 'c', 'd', 'e', 'f'].map((wall) => ({ name: wall, thickness: 0.1 })),
  });
  const set = aStopSet('s', { stops: [{ ...aStopSet('s').stops[0], at: [5, 0.9] }], passes: [] });
  expect(readCsv(stopSequenceCsv(set, corridor, emitters))[1].slice(3, 7)).toEqual(['a', '0.90', '', '']);
});

test('whatever things are called, each cell comes back as it was and none starts a formula', () => {
  const text = fc.string({ unit: 'grapheme', minLength: 1, maxLength: 30 });
  fc.assert(
    fc.property(text, text, (stop, wall) => {
      const plan = barePlan({
        outlineWalls: Array.from({ length: 4 }, () => ({ name: wall, thickness: 0.1 })),
      });
      const set = aStopSet('s', { stops: [{ ...aStopSet('s').stops[0], name: stop }], passes: [] });
      const [, row] = readCsv(stopSequenceCsv(set, plan, emitters));
      expect(row).toHaveLength(11);
      for (const [cell, given] of [
        [row[1], stop],
        [row[3], wall],
        [row[5], wall],
      ]) {
        expect(cell).toBe(/^[=+\-@\t\r]/.test(given) ? `'${given}` : given);
        expect(cell).not.toMatch(/^[=+\-@]/);
      }
    }),
    seeded(300),
  );
});
