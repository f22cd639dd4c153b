import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  cancelGesture,
  canRedo,
  canUndo,
  endGesture,
  openHistory,
  record,
  redo,
  undo,
} from '@/lib/editor/history';

describe('history', () => {
  test('a gesture is one step back', () => {
    let history = openHistory(0);
    for (const value of [1, 2, 3]) history = record(history, value, 'drag');
    history = record(endGesture(history), 4, 'drag');
    expect(undo(history).present).toBe(3);
    expect(undo(undo(history)).present).toBe(0);
  });

  test('a cancelled gesture leaves no trace', () => {
    const before = record(openHistory(0), 1);
    const during = record(record(before, 2, 'drag'), 3, 'drag');
    expect(cancelGesture(during)).toMatchObject({ present: 1, past: [0], future: [] });
  });

  test('a new edit after undo drops what was undone', () => {
    const history = record(undo(record(openHistory(0), 1)), 2);
    expect(canRedo(history)).toBe(false);
    expect(undo(history).present).toBe(0);
  });

  test('an edit that changes nothing is none', () => {
    const history = record(openHistory(5), 5);
    expect(canUndo(history)).toBe(false);
  });

  test('undone all the way and redone all the way, everything is as it was', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.integer(), fc.constantFrom(null, 'a', 'b')), { maxLength: 60 }),
        (edits) => {
          let history = openHistory<number | string>('start');
          for (const [value, gesture] of edits) history = record(history, value, gesture);
          let back = history;
          while (canUndo(back)) back = undo(back);
          expect(back.present).toBe('start');
          while (canRedo(back)) back = redo(back);
          expect(back.present).toBe(history.present);
          expect(back.past).toEqual(history.past);
        },
      ),
      { seed: Number(process.env.FC_SEED ?? 20261201) },
    );
  });
});
