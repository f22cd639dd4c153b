import { afterAll, beforeAll, expect, test } from 'vitest';
import { type House, openHouse } from '../support/api';

let house: House;
beforeAll(async () => {
  house = await openHouse();
});
afterAll(() => house.close());

const none = { origin: null, 'sec-fetch-site': null };

/** What a browser says of where a request comes from, and whether it may change something. */
test.each<[string, Record<string, string | null>, number]>([
  ['our own page', {}, 201],
  ['our own page, in an older browser', { 'sec-fetch-site': null }, 201],
  [
    'our own page behind a proxy',
    {
      'sec-fetch-site': null,
      origin: 'https://leeside.example.test',
      'x-forwarded-host': 'leeside.example.test',
    },
    201,
  ],
  ['a program that is no browser', none, 201],
  ['another site', { 'sec-fetch-site': 'cross-site', origin: 'https://elsewhere.example.test' }, 403],
  ['another site, in an older browser', { ...none, origin: 'https://elsewhere.example.test' }, 403],
  [
    'a neighbour under the same domain',
    { 'sec-fetch-site': 'same-site', origin: 'https://other.example.test' },
    403,
  ],
  ['a neighbouring port, in an older browser', { ...none, origin: 'http://127.0.0.1:4000' }, 403],
  ['a sandboxed page', { ...none, origin: 'null' }, 403],
  ['an origin that is no address', { ...none, origin: 'http://[' }, 403],
])('a change asked for by %s', async (name, headers, status) => {
  const answer = await house.call('owner', 'POST /api/sites', { body: { name: name.slice(0, 80) }, headers });
  expect(answer.status, answer.text).toBe(status);
  if (status === 403) expect(answer.body.detail).toContain('another site');
});
