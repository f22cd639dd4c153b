import fc from 'fast-check';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { auditEntries } from '@/db/schema';
import { demoRooms } from '@/db/seed/rooms';
import { type Answer, type Ask, type Deed, type House, openHouse } from '../support/api';
import { seeded } from '../support/properties';
import { aStopSet } from '../support/stop-sets';

let house: House;
let etag: string;
beforeAll(async () => {
  house = await openHouse();
  const added = await call('POST /api/rooms/[roomId]/stop-sets', { body: aStopSet('target') });
  expect(added.status).toBe(201);
  etag = added.etag;
});
afterAll(() => house.close());

/** As the owner, who may do everything: what is refused is refused for the body. */
const call = (deed: Deed, ask: Ask) =>
  house.call('owner', deed, {
    params: { roomId: 'studio', stopSetId: 'target' },
    etag: etag ?? '"v1"',
    ...ask,
  });

const file = demoRooms['treatment-room'];

/** Every deed that takes a body, with one that it takes. */
const bodies: readonly [Deed, unknown][] = [
  ['POST /api/sites', { name: 'A site' }],
  ['POST /api/rooms', { siteId: 'marrowby-tollgate-gym', name: 'A room', area: 'Upstairs' }],
  ['POST /api/rooms/import', file],
  ['PATCH /api/rooms/[roomId]', { name: 'Studio', area: null, archived: false }],
  ['PUT /api/rooms/[roomId]/floor-plan', { ceiling: 3, floorPlan: file.floorPlan }],
  ['POST /api/rooms/[roomId]/revisions', { note: 'A note' }],
  ['POST /api/rooms/[roomId]/stop-sets', aStopSet('another')],
  ['PUT /api/stop-sets/[stopSetId]', aStopSet('target')],
];

const entries = async () => (await house.database.db.select().from(auditEntries)).length;

/** A refusal a person can act on: what is wrong, where, and nothing about our insides. */
function expectClearRefusal(answer: Answer) {
  expect([400, 413, 415, 422], answer.text.slice(0, 500)).toContain(answer.status);
  expect(answer.headers.get('content-type')).toBe('application/problem+json');
  expect(answer.body.detail.length).toBeGreaterThan(10);
  if (answer.status === 422) {
    expect(answer.body.faults.length).toBeGreaterThan(0);
    for (const { path, message } of answer.body.faults) {
      expect(path).not.toBe('');
      expect(message.length).toBeGreaterThan(3);
    }
  }
  expect(answer.text).not.toMatch(/\bat .+:\d+:\d+|node_modules|\.ts\b|SQLITE|Drizzle|Zod|select |insert /);
  expect(answer.text.length).toBeLessThan(20_000);
}

async function expectRefusedOrTaken(deed: Deed, ask: Ask) {
  const before = await entries();
  const answer = await call(deed, ask);
  // A body that happens to be right may be taken, or meet a state it does not fit.
  if (answer.status < 300 || [404, 409, 412].includes(answer.status)) return;
  expectClearRefusal(answer);
  expect(await entries()).toBe(before);
}

const deep = (open: string, close: string, levels = 100_000) => open.repeat(levels) + close.repeat(levels);
const bytes = (...values: number[]) => new Uint8Array(values);

/** Bodies that are not what they should be, and what the answer must say of them. */
const texts: readonly [string, string | Uint8Array<ArrayBuffer>, number, RegExp][] = [
  ['nothing', '', 400, /line 1, column 1/],
  ['a lone word', 'hello', 400, /line 1, column 1/],
  ['a broken line', '{\n  "name": "A",,\n}', 400, /line 2, column 15/],
  ['a comment', '{ "name": "A" /* so */ }', 400, /line 1, column 15/],
  ['a list that does not end', '[1, 2', 400, /line 1, column 6/],
  ['a number that is none', '{"name": NaN}', 400, /line 1, column 10/],
  ['an infinite number that is none', '{"name": -Infinity}', 400, /line 1/],
  ['text that is not UTF-8', bytes(0x7b, 0x22, 0xff, 0x22, 0x3a, 0x31, 0x7d), 400, /UTF-8/],
  ['text in UTF-16', bytes(0xff, 0xfe, 0x7b, 0x00, 0x7d, 0x00), 400, /UTF-8/],
  ['lists in lists without end', deep('[', ']'), 422, /cannot be used/],
  ['things in things without end', `${deep('{"a":', '}', 50_000).replace('}', '1}')}`, 422, /cannot be used/],
  ['lists in lists that do not close', '['.repeat(100_000), 400, /nested too deeply|line 1/],
  ['more than it takes', `"${'x'.repeat(2_000_001)}"`, 413, /kB/],
  ['a null', 'null', 422, /cannot be used/],
  ['a long list', `[${'0,'.repeat(200_000)}0]`, 422, /cannot be used/],
  ['many keys', `{${Array.from({ length: 40_000 }, (_, i) => `"k${i}":1`).join()}}`, 422, /cannot be used/],
  ['one very long key', `{"${'k'.repeat(400_000)}":1}`, 422, /cannot be used/],
];

describe.each(bodies)('%s', (deed, valid) => {
  test.each(texts)('given %s, says so', async (_, text, status, words) => {
    const before = await entries();
    const started = performance.now();
    const answer = await call(deed, { text });
    expect(answer.status, answer.text.slice(0, 300)).toBe(status);
    expect(answer.body.detail).toMatch(words);
    expectClearRefusal(answer);
    expect(performance.now() - started).toBeLessThan(5000);
    expect(await entries()).toBe(before);
  });

  test.each([null, 'text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data'])(
    'given the content type %s, says what to send',
    async (type) => {
      const answer = await call(deed, { body: valid, headers: { 'content-type': type } });
      expect(answer.status).toBe(415);
      expect(answer.body.detail).toContain('application/json');
    },
  );

  test('given more than it says it is, stops reading', async () => {
    const answer = await call(deed, {
      text: `"${'x'.repeat(2_000_001)}"`,
      headers: { 'content-length': '5' },
    });
    expect(answer.status).toBe(413);
  });

  test('given any JSON at all, takes it or says what is wrong', async () => {
    await fc.assert(
      fc.asyncProperty(fc.jsonValue(), (body) => expectRefusedOrTaken(deed, { body })),
      seeded(40),
    );
  });

  test('given what it takes with one thing in it put wrong, names the place', async () => {
    const places = placesIn(valid);
    await fc.assert(
      fc.asyncProperty(
        fc.constantFrom(...places),
        fc.constantFrom(
          'null',
          '"\\u0000"',
          '-1e308',
          '1e999',
          '1e-320',
          'true',
          '[]',
          '{}',
          '[[[]]]',
          '""',
          '9007199254740993',
        ),
        async (place, wrong) => {
          const text = withAt(valid, place, wrong);
          const before = await entries();
          const answer = await call(deed, { text });
          if (answer.status < 300 || [404, 409, 412].includes(answer.status)) return;
          expectClearRefusal(answer);
          expect(await entries()).toBe(before);
          const parent = place.slice(0, -1);
          const near = answer.body.faults.some(({ path }: { path: string }) =>
            path.startsWith(pathText(parent)),
          );
          expect(near, `${pathText(place)} = ${wrong}: ${answer.text.slice(0, 400)}`).toBe(true);
        },
      ),
      seeded(60),
    );
  });

  test.each(['__proto__', 'constructor', 'toString', 'hasOwnProperty', 'extra'])(
    'given an unknown key called %s, names it and where it is',
    async (key) => {
      const objects = placesIn(
        valid,
        (value) => typeof value === 'object' && value !== null && !Array.isArray(value),
      );
      for (const place of [[], ...objects]) {
        if (place.at(-1) === 'emitters') continue;
        const answer = await call(deed, { text: withAt(valid, [...place, key], '{"polluted": 1}') });
        expect(answer.status, answer.text).toBe(422);
        expect(answer.body.faults).toContainEqual({
          path: pathText(place) || '(whole)',
          message: `Unknown key: ${key}`,
        });
      }
      expect(({} as Record<string, unknown>).polluted).toBeUndefined();
    },
  );
});

test.each(['__proto__', 'constructor', 'toString'])('an emitter called %s is no emitter', async (key) => {
  const set = aStopSet('odd', { emitter: key });
  const named = await call('POST /api/rooms/[roomId]/stop-sets', { body: set });
  expect(named.status).toBe(422);
  expect(named.body.faults[0]).toEqual({ path: 'emitter', message: `There is no emitter "${key}"` });
  const text = withAt(file, ['emitters', key], JSON.stringify({ name: 'No lamp' }));
  const imported = await call('POST /api/rooms/import', { text });
  // The first of these is no key a thing can have, so nobody can name it; the others are refused as lamps that are none.
  if (key === '__proto__') expect(imported.status).toBe(201);
  else expect(imported.body.faults[0].path).toBe(`emitters.${key}.tubes`);
  const held = await call('GET /api/emitters', {});
  expect(Object.keys(held.body.emitters)).not.toContain(key);
});

test.each(['..', '%00', 'a b', "' or 1=1 --", 'ä', 'x'.repeat(41), '', '__proto__', 'constructor'])(
  'the address “%s” is an address of nothing',
  async (text) => {
    for (const [deed, params] of [
      ['GET /api/rooms/[roomId]', { roomId: text }],
      ['GET /api/rooms/[roomId]/revisions/[number]', { roomId: 'studio', number: text }],
      ['GET /api/stop-sets/[stopSetId]', { stopSetId: text }],
      ['GET /api/stop-sets/[stopSetId]/csv', { stopSetId: text }],
    ] as [Deed, Record<string, string>][]) {
      const answer = await house.call('owner', deed, { params });
      expect(answer.status, answer.text).toBe(404);
      expect(answer.body.code).toBe('not_found');
    }
  },
);

type Place = readonly (string | number)[];

/** Every place in a JSON value that passes. */
function placesIn(value: unknown, passes: (value: unknown) => boolean = () => true, at: Place = []): Place[] {
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => {
    const place = [...at, Array.isArray(value) ? Number(key) : key];
    return [...(passes(inner) ? [place] : []), ...placesIn(inner, passes, place)];
  });
}

const pathText = (place: Place): string =>
  place.reduce<string>(
    (text, key) => (typeof key === 'number' ? `${text}[${key}]` : text ? `${text}.${key}` : key),
    '',
  );

/** The JSON of `value` with `json` written at a place, as it stands: a key such as __proto__ too. */
function withAt(value: unknown, [key, ...rest]: Place, json: string): string {
  const inner = (held: unknown) => (rest.length > 0 ? withAt(held, rest, json) : json);
  if (Array.isArray(value))
    return `[${value.map((it, i) => (i === key ? inner(it) : JSON.stringify(it))).join()}]`;
  const held = Object.entries(value as object).filter(([, it]) => it !== undefined);
  const kept = held
    .filter(([name]) => name !== key)
    .map(([name, it]) => `${JSON.stringify(name)}:${JSON.stringify(it)}`);
  const own = Object.hasOwn(value as object, key) ? (value as Record<string, unknown>)[key] : undefined;
  return `{${[...kept, `${JSON.stringify(key)}:${inner(own)}`].join()}}`;
}
