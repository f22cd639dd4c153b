import { afterEach, expect, test, vi } from 'vitest';
import { AppError, type ErrorCode, errorTable } from '@/lib/errors';
import { fileName } from '@/lib/server/file-name';
import { problem } from '@/lib/server/problem';

afterEach(() => vi.restoreAllMocks());

test.each(Object.keys(errorTable) as ErrorCode[])(
  'a refusal as %s carries its status, words and places',
  async (code) => {
    const refusal = new AppError(code, 'What went wrong', [{ path: 'a.b', message: 'Why' }], {
      etag: '"v3"',
      status: 200,
      code: 'other',
    });
    const answer = problem(refusal);
    expect(answer.status).toBe(errorTable[code].status);
    expect(answer.headers.get('content-type')).toBe('application/problem+json');
    expect(answer.headers.get('cache-control')).toBe('no-store');
    expect(await answer.json()).toEqual({
      type: `urn:leeside:problem:${code}`,
      title: errorTable[code].title,
      status: errorTable[code].status,
      code,
      detail: 'What went wrong',
      faults: [{ path: 'a.b', message: 'Why' }],
      etag: '"v3"',
    });
  },
);

test.each([
  new Error('SQLITE_BUSY at /srv/leeside/data.db', { cause: new Error('secret') }),
  new TypeError('x is not a function'),
  'a thrown word',
  null,
])('a fault of our own is a 500 whose cause is in the log and not in the answer', async (fault) => {
  const log = vi.spyOn(console, 'error').mockImplementation(() => {});
  const answer = problem(fault);
  expect(answer.status).toBe(500);
  expect(log).toHaveBeenCalledWith(fault);
  expect(await answer.text()).not.toMatch(/SQLITE|secret|data\.db|function|thrown|stack/);
});

test.each([
  ['Two-bed bay 3.14', 'two-bed-bay-3.14.csv'],
  ['Ärztezimmer / Öst', 'arztezimmer-ost.csv'],
  ['../../etc/passwd', 'etc-passwd.csv'],
  ['"; filename=evil', 'filename-evil.csv'],
  ['床', 'room.csv'],
  ['...', 'room.csv'],
])('a download of “%s” is called %s', (name, file) => {
  expect(fileName(name, 'csv')).toBe(file);
});
