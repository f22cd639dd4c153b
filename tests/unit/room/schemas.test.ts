import { describe, expect, test } from 'vitest';
import { demoRooms } from '@/db/seed/rooms';
import { emitterSchema, roomFileSchema, stopSetSchema } from '@/lib/room';
import { etagOf, versionOf } from '@/lib/room/api/etag';
import { newRevisionSchema, roomChangeSchema } from '@/lib/room/api/resources';
import { describeFaults } from '@/lib/room/describe-faults';
import { noNumbers, refusesWhatIsSpoilt } from '../../support/spoilt';
import { aStopSet } from '../../support/stop-sets';

describe('a stop set', () => {
  refusesWhatIsSpoilt(stopSetSchema, aStopSet('s'), [
    ['a missing name', 'name', undefined, /^Is missing$/],
    ['a dwell below nothing', 'stops[0].dwell', -1, /cannot be negative/],
    ['a dwell of five hours', 'stops[0].dwell', 18_000, /at most 4 hours/],
    ['a margin under one', 'margin', 0.99, /1 or more/],
    ['a margin as text', 'margin', '1.5', /^Must be a number, not text$/],
    ['a target of nothing', 'target.dose', 0, /more than 0/],
    ['a list for a target', 'target', [], /^Must be an object, not a list$/],
    ['a pass of one point', 'passes[0].path', [[0, 0]], /at least two/],
    ['a pass that stands', 'passes[0].speed', 0, /0.005/],
    ['more stops than anyone sets out', 'stops', Array(61).fill(0), /60 entries or fewer/],
    ['an emitter that is not said', 'stops[0].emitter', undefined, /Is missing/],
    ['a status, which is not the planner’s to say', 'status', 'approved', /^Unknown key: status$/, '(whole)'],
    ...noNumbers.map(
      ([what, value]) => [`a heading of ${what}`, 'stops[0].heading', value, /must be a number/] as const,
    ),
  ]);
});

describe('an emitter', () => {
  const bank = {
    name: 'One-sided bank',
    tubes: [{ a: [0, -0.5, 1], b: [0, 0.5, 1], watts: 90, backed: [1, 0, 0] }],
    maintenance: 0.8,
    warmUp: 90,
    clearance: 0.5,
  };
  refusesWhatIsSpoilt(emitterSchema, bank, [
    ['no tubes', 'tubes', [], /at least one tube/],
    ['a tube of no length', 'tubes[0].b', [0, -0.5, 1], /longer than 1 cm/],
    ['a tube of no output', 'tubes[0].watts', 0, /above 0 W/],
    ['a backing that is no direction', 'tubes[0].backed', [2, 0, 0], /unit vector/],
    ['a backing along the tube', 'tubes[0].backed', [0, 1, 0], /perpendicular/],
    ['more output than rated', 'maintenance', 1.01, /1 or less/],
    ['no output at all', 'maintenance', 0, /more than 0/],
    ['a warm-up that is not said', 'warmUp', null, /not null/],
  ]);
});

describe('a room file', () => {
  const file = demoRooms['two-bed-bay'];
  refusesWhatIsSpoilt(roomFileSchema, file, [
    ['another format', 'format', 'drawing', /not a Leeside room file/],
    ['a later version', 'version', 2, /Only version 1/],
    ['a version as text', 'version', '1', /Only version 1/],
    ['an emitter key with a blank', 'emitters.a b', file.emitters.tower, /Cannot be called that/],
    ['an empty site', 'room.site', '', /Give it a name/],
  ]);
});

test('a refusal lists twenty places at most, and of a key only as much as helps to find it', () => {
  const many = stopSetSchema.safeParse({ ...aStopSet('s'), stops: Array(60).fill({ at: 0 }) });
  expect(many.error && describeFaults(many.error)).toHaveLength(20);
  const long = stopSetSchema.safeParse({ ...aStopSet('s'), ['k'.repeat(1000)]: 1 });
  expect(long.error && describeFaults(long.error)[0].message.length).toBeLessThan(100);
});

test.each([
  [{}, false],
  [{ name: 'New' }, true],
  [{ area: null }, true],
  [{ archived: true, name: 'New' }, true],
  [{ siteId: 'other' }, false],
  [{ name: '' }, false],
])('a change of a room by %j: %s', (change, fits) => {
  expect(roomChangeSchema.safeParse(change).success).toBe(fits);
});

test.each([
  [{}, ''],
  [{ note: ' Bed moved\nto the window ' }, 'Bed moved\nto the window'],
  [{ note: 'x'.repeat(201) }, null],
  [{ note: 'a\u0007b' }, null],
])('a revision’s note of %j', (given, note) => {
  expect(newRevisionSchema.safeParse(given).data?.note ?? null).toBe(note);
});

test('a version goes out as an ETag and comes back, and nothing else is one', () => {
  for (const version of [0, 1, 42, 999_999_999_999_999]) expect(versionOf(etagOf(version))).toBe(version);
  expect(versionOf('W/"v3"')).toBe(3);
  for (const text of ['', '*', 'v1', '"1"', '"v"', '"v-1"', '"v1.5"', '"v1", "v2"', `"v${'9'.repeat(16)}"`])
    expect(versionOf(text)).toBeNull();
});
