import { afterEach, expect, test, vi } from 'vitest';
import { z } from 'zod';
import { newId } from '@/lib/client/new-id';
import { request } from '@/lib/client/request';
import { AppError } from '@/lib/errors';
import { id } from '@/lib/room';

afterEach(() => vi.unstubAllGlobals());

function answering(body: BodyInit | null, init: ResponseInit = {}) {
  const fetched = vi.fn(async (_path: string, _init: RequestInit) => new Response(body, init));
  vi.stubGlobal('fetch', fetched);
  return fetched;
}

const schema = z.object({ version: z.int() });
const failing = (): Promise<unknown> =>
  request('/api/x', schema).then(
    () => null,
    (error: unknown) => error,
  );

test('an answer comes with its ETag, and a change goes out with the one it was loaded under', async () => {
  const fetched = answering('{"version":4}', { headers: { etag: '"v4"' } });
  expect(await request('/api/x', schema, { method: 'PUT', body: { a: 1 }, etag: '"v3"' })).toEqual({
    version: 4,
    etag: '"v4"',
  });
  const [, sent] = fetched.mock.calls[0];
  expect(sent).toMatchObject({
    method: 'PUT',
    body: '{"a":1}',
    headers: { 'content-type': 'application/json', 'if-match': '"v3"' },
  });
});

test('an answer of nothing is no failure', async () => {
  answering(null, { status: 204 });
  expect(await request('/api/x', z.object({}), { method: 'DELETE' })).toEqual({ etag: '' });
});

test('a refusal keeps its code, its words, its places and what comes with it', async () => {
  const faults = [{ path: 'a', message: 'Why' }];
  answering(
    JSON.stringify({ code: 'stale', detail: 'Maud was first.', faults, etag: '"v9"', savedBy: 'Maud' }),
    { status: 412 },
  );
  const error = await failing();
  expect(error).toBeInstanceOf(AppError);
  expect(error).toMatchObject({
    code: 'stale',
    message: 'Maud was first.',
    faults,
    extra: { etag: '"v9"', savedBy: 'Maud' },
  });
});

/** What is no word of our server is the line, and is tried again. */
test.each<[string, BodyInit, ResponseInit]>([
  ['a proxy’s page instead of a refusal', '<html>Bad gateway</html>', { status: 502 }],
  ['somebody else’s JSON', '{"error":"nope"}', { status: 500 }],
  ['a code we do not know', '{"code":"constructor","detail":"x"}', { status: 400 }],
  ['a sign-in page of a network instead of an answer', '<html>Welcome to the wifi</html>', { status: 200 }],
  ['an answer of another shape', '{"version":"four"}', { status: 200 }],
])('%s is a broken line, not a refusal', async (_, body, init) => {
  answering(body, init);
  const error = await failing();
  expect(error).toBeInstanceOf(Error);
  expect(error).not.toBeInstanceOf(AppError);
});

test('ids made in the browser are ids to the server, and no two are the same', () => {
  const made = Array.from({ length: 500 }, newId);
  for (const it of made) expect(id.safeParse(it).success).toBe(true);
  expect(new Set(made).size).toBe(made.length);
});
