import fc from 'fast-check';
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { Autosaver, type Save, savesAnswered } from '@/lib/client/autosave';
import { AppError } from '@/lib/errors';
import { seeded } from '../../support/properties';

const PAUSE = 700;
const RETRY = 5000;

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

interface Sent {
  readonly value: string;
  readonly etag: string;
  readonly answer: (etag: string) => void;
  readonly refuse: (error: unknown) => void;
}

/** A saver whose requests are answered by hand. */
function desk(value = 'as loaded') {
  const sent: Sent[] = [];
  const save: Save<string> = (it, etag) =>
    new Promise((resolve, reject) => {
      sent.push({ value: it, etag, answer: (next) => resolve({ etag: next }), refuse: reject });
    });
  const saver = new Autosaver(value, 'v1', save, PAUSE, RETRY);
  const states: string[] = [];
  saver.subscribe(() => states.push(saver.getStanding().state));
  return { saver, sent, states, state: () => saver.getStanding().state };
}

const pass = (ms: number) => vi.advanceTimersByTimeAsync(ms);
/** Lets what has been answered be taken in. */
const settle = () => pass(0);

const stale = (etag = '"v7"') =>
  new AppError('stale', 'Maud Ellery saved this first.', [], { etag, savedBy: 'Maud Ellery' });
const brokenLine = () => new TypeError('fetch failed');

describe('while somebody edits', () => {
  test('nothing is sent until they pause, then the newest value once', async () => {
    const { saver, sent, state } = desk();
    for (const value of ['a', 'ab', 'abc']) {
      saver.set(value);
      await pass(PAUSE - 1);
    }
    expect(sent).toHaveLength(0);
    expect(state()).toBe('unsaved');
    await pass(1);
    expect(sent.map(({ value }) => value)).toEqual(['abc']);
    sent[0].answer('v2');
    await settle();
    expect(state()).toBe('saved');
    expect(saver.hasUnsaved).toBe(false);
  });

  test('one request is out at a time, and what came meanwhile goes right after, over the version just made', async () => {
    const { saver, sent, state } = desk();
    saver.set('first');
    await pass(PAUSE);
    saver.set('second');
    saver.set('third');
    await pass(PAUSE * 3);
    expect(sent).toHaveLength(1);
    sent[0].answer('v2');
    await settle();
    expect(sent.map(({ value, etag }) => [value, etag])).toEqual([
      ['first', 'v1'],
      ['third', 'v2'],
    ]);
    expect(state()).toBe('saving');
    sent[1].answer('v3');
    await settle();
    expect(state()).toBe('saved');
  });

  test('an edit taken back before it was sent sends nothing', async () => {
    const { saver, sent, state } = desk('as loaded');
    saver.set('changed');
    saver.set('as loaded');
    await pass(PAUSE * 2);
    expect(sent).toHaveLength(0);
    expect(state()).toBe('saved');
  });

  test('leaving the page sends what is unsaved at once, and the next page waits for the answer', async () => {
    const { saver, sent } = desk();
    saver.set('last words');
    const saved = saver.saveNow();
    expect(sent).toHaveLength(1);
    let loaded = false;
    const next = savesAnswered().then(() => {
      loaded = true;
    });
    await settle();
    expect(loaded).toBe(false);
    sent[0].answer('v2');
    await next;
    expect(await saved).toBe(true);
  });
});

describe('when the line is broken', () => {
  test('it is tried again until it holds, first with what may have arrived, then with the newest value', async () => {
    const { saver, sent, state } = desk();
    saver.set('kept');
    await pass(PAUSE);
    sent[0].refuse(brokenLine());
    await settle();
    expect(state()).toBe('offline');
    await pass(RETRY);
    sent[1].refuse(brokenLine());
    await settle();
    saver.set('kept, and more');
    await pass(PAUSE);
    expect(sent.map(({ value, etag }) => [value, etag])).toEqual([
      ['kept', 'v1'],
      ['kept', 'v1'],
      ['kept', 'v1'],
    ]);
    sent[2].answer('v2');
    await settle();
    expect(sent[3]).toMatchObject({ value: 'kept, and more', etag: 'v2' });
    sent[3].answer('v3');
    await settle();
    expect(state()).toBe('saved');
    await pass(RETRY * 3);
    expect(sent).toHaveLength(4);
  });

  test('a value taken back after its answer was lost is taken back on the server too', async () => {
    const { saver, sent, state } = desk('as loaded');
    saver.set('changed');
    await pass(PAUSE);
    sent[0].refuse(brokenLine());
    await settle();
    saver.set('as loaded');
    expect(saver.hasUnsaved).toBe(true);
    await pass(PAUSE);
    sent[1].answer('v2');
    await settle();
    expect(sent[2]).toMatchObject({ value: 'as loaded', etag: 'v2' });
    sent[2].answer('v3');
    await settle();
    expect(state()).toBe('saved');
  });
});

describe('when the server refuses', () => {
  test('the value stays, the words are there, and the next edit is tried', async () => {
    const { saver, sent } = desk();
    saver.set('too much');
    await pass(PAUSE);
    sent[0].refuse(new AppError('invalid', 'Some values cannot be used.'));
    await settle();
    expect(saver.getStanding()).toMatchObject({ state: 'error', message: 'Some values cannot be used.' });
    expect(saver.hasUnsaved).toBe(true);
    await pass(RETRY * 3);
    expect(sent).toHaveLength(1);
    saver.set('less');
    await pass(PAUSE);
    sent[1].answer('v2');
    await settle();
    expect(saver.getStanding()).toMatchObject({ state: 'saved', message: null });
  });
});

describe('when somebody else was first', () => {
  async function conflict() {
    const it = desk();
    it.saver.set('mine');
    await pass(PAUSE);
    it.sent[0].refuse(stale());
    await settle();
    return it;
  }

  test('it says who, and sends nothing more by itself whatever is edited', async () => {
    const { saver, sent } = await conflict();
    expect(saver.getStanding()).toMatchObject({
      state: 'conflict',
      message: 'Maud Ellery saved this first.',
      winner: { etag: '"v7"', savedBy: 'Maud Ellery' },
    });
    saver.set('mine, and more');
    await pass(RETRY * 3);
    expect(sent).toHaveLength(1);
    expect(saver.getStanding().state).toBe('conflict');
    expect(saver.hasUnsaved).toBe(true);
  });

  test('an edit made while the refusal was on its way is kept and not sent by itself either', async () => {
    const { saver, sent, state } = desk();
    saver.set('mine');
    await pass(PAUSE);
    saver.set('mine, and more');
    sent[0].refuse(stale());
    await pass(RETRY);
    expect(sent).toHaveLength(1);
    expect(state()).toBe('conflict');
    void saver.saveNow({ etag: '"v7"' });
    expect(sent[1]).toMatchObject({ value: 'mine, and more', etag: '"v7"' });
  });

  test('saving mine over theirs sends the newest of mine over the version that won', async () => {
    const { saver, sent, state } = await conflict();
    saver.set('mine, and more');
    const saved = saver.saveNow({ etag: '"v7"' });
    expect(sent[1]).toMatchObject({ value: 'mine, and more', etag: '"v7"' });
    sent[1].answer('"v8"');
    expect(await saved).toBe(true);
    expect(saver.getStanding()).toMatchObject({ state: 'saved', winner: null, message: null });
    saver.set('on from here');
    await pass(PAUSE);
    expect(sent[2]).toMatchObject({ value: 'on from here', etag: '"v8"' });
    expect(state()).toBe('saving');
  });

  test('taking theirs sends nothing, and goes on from theirs', async () => {
    const { saver, sent, state } = await conflict();
    saver.accept('theirs', '"v7"');
    expect(state()).toBe('saved');
    await pass(RETRY);
    expect(sent).toHaveLength(1);
    saver.set('theirs, changed');
    await pass(PAUSE);
    expect(sent[1]).toMatchObject({ value: 'theirs, changed', etag: '"v7"' });
  });

  test('a third person being first again is a conflict again', async () => {
    const { saver, sent } = await conflict();
    const saved = saver.saveNow({ etag: '"v7"' });
    sent[1].refuse(stale('"v8"'));
    expect(await saved).toBe(false);
    expect(saver.getStanding()).toMatchObject({ state: 'conflict', winner: { etag: '"v8"' } });
  });
});

/** What may happen at a desk, in any order. */
const happening = fc.oneof(
  { weight: 4, arbitrary: fc.record({ edit: fc.integer({ min: 0, max: 1e6 }) }) },
  { weight: 3, arbitrary: fc.record({ wait: fc.constantFrom(1, PAUSE, RETRY) }) },
  {
    weight: 3,
    arbitrary: fc.record({
      line: fc.constantFrom('answer', 'lost on the way there', 'lost on the way back', 'refused'),
    }),
  },
);

test('whatever breaks in whatever order, the server ends with the newest value, and never with one it was not sent over', async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(happening, { maxLength: 40 }), async (happenings) => {
      const { saver, sent } = desk('0');
      const server = { value: '0', version: 1 };
      let answered = 0;
      let refusals = 0;
      let newest = '0';
      const reply = async (how: string) => {
        const next = sent[answered];
        if (!next) return;
        answered++;
        const repeats = (it: Sent) => it.value === server.value && it.etag === `v${server.version - 1}`;
        const arrived = how === 'answer' || how === 'lost on the way back';
        if (arrived && !repeats(next) && next.etag !== `v${server.version}`) {
          // Only after a refusal has kept it from finding out what the server has; the person saves over it.
          expect(refusals).toBeGreaterThan(0);
          next.refuse(stale(`v${server.version}`));
          await settle();
          expect(saver.hasUnsaved).toBe(true);
          void saver.saveNow({ etag: `v${server.version}` });
          return;
        }
        if (arrived && !repeats(next)) {
          server.value = next.value;
          server.version++;
        }
        if (how === 'refused') refusals++;
        if (how === 'answer') next.answer(`v${server.version}`);
        else next.refuse(how === 'refused' ? new AppError('invalid', 'No.') : brokenLine());
        await settle();
      };
      for (const it of happenings) {
        if ('edit' in it) {
          newest = String(it.edit);
          saver.set(newest);
        } else if ('wait' in it) await pass(it.wait);
        else await reply(it.line);
        expect(sent.length - answered).toBeLessThanOrEqual(1);
        if (saver.getStanding().state === 'saved')
          expect([saver.hasUnsaved, sent.length - answered]).toEqual([false, 0]);
      }
      void saver.saveNow();
      for (let i = 0; i < 6; i++) await reply('answer');
      expect(server.value).toBe(newest);
      expect(saver.getStanding().state).toBe('saved');
    }),
    seeded(200),
  );
});
