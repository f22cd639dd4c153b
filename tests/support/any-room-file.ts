import fc from 'fast-check';
import type { RoomFile } from '@/lib/room';

const finite = (least: number, most: number) => fc.double({ min: least, max: most, noNaN: true });
const at = fc.tuple(finite(-500, 500), finite(-500, 500));
const words = fc
  .string({ unit: 'grapheme', minLength: 1, maxLength: 20 })
  .filter((text) => /^[^\p{Cc}\p{Cs}]+$/u.test(text) && text.trim() === text);
const ids = fc.uuid();

/** Any room file that holds together. */
export const anyRoomFile: fc.Arbitrary<RoomFile> = fc.record({
  format: fc.constant('leeside-room' as const),
  version: fc.constant(1 as const),
  room: fc.record(
    { name: words, site: words, area: words, ceiling: finite(1.5, 20) },
    { requiredKeys: ['name', 'site', 'ceiling'] },
  ),
  floorPlan: fc.record({
    outline: fc.tuple(at, at, at),
    outlineWalls: fc.array(fc.record({ name: words, thickness: finite(0, 2) }), {
      minLength: 3,
      maxLength: 3,
    }),
    innerWalls: fc.array(fc.record({ id: ids, name: words, a: at, b: at, thickness: finite(0.01, 2) }), {
      maxLength: 2,
    }),
    openings: fc.constant([]),
    furniture: fc.array(
      fc.record({
        id: ids,
        name: words,
        kind: words,
        at,
        turn: finite(-3600, 3600),
        parts: fc.array(
          fc.record({
            name: words,
            footprint: fc.array(at, { minLength: 3, maxLength: 5 }),
            base: finite(0, 20),
            top: finite(21, 50),
          }),
          { minLength: 1, maxLength: 2 },
        ),
        touchPoints: fc.array(
          fc.record({
            id: ids,
            name: words,
            at,
            height: finite(0, 50),
            facing: finite(-360, 360),
            tilt: finite(-90, 90),
          }),
          { maxLength: 2 },
        ),
      }),
      { maxLength: 3 },
    ),
    touchPoints: fc.constant([]),
    watchPoints: fc.array(fc.record({ id: ids, name: words, at, height: finite(0, 50) }), { maxLength: 2 }),
  }),
  emitters: fc.constant({
    'the-lamp': {
      name: 'The lamp',
      tubes: [{ a: [-0, 0, 0.25], b: [0, 0, 1.85], watts: 110, backed: null }],
      maintenance: 0.8,
      warmUp: 60,
      clearance: 0.4,
    },
  }) as fc.Arbitrary<RoomFile['emitters']>,
  stopSets: fc.array(
    fc.record({
      id: ids,
      name: words,
      emitter: fc.constant('the-lamp'),
      target: fc.record({ name: words, dose: finite(0.001, 1_000_000), source: words }),
      margin: finite(1, 20),
      stops: fc.array(
        fc.record({
          id: ids,
          name: words,
          at,
          heading: finite(-360, 360),
          dwell: finite(0, 14_400),
          emitter: fc.constantFrom(null, 'the-lamp'),
        }),
        { maxLength: 3 },
      ),
      passes: fc.array(
        fc.record({
          id: ids,
          name: words,
          path: fc.array(at, { minLength: 2, maxLength: 4 }),
          speed: finite(0.005, 2),
          heading: fc.option(finite(-360, 360)),
          emitter: fc.constant(null),
        }),
        { maxLength: 2 },
      ),
    }),
    { maxLength: 2 },
  ),
});
