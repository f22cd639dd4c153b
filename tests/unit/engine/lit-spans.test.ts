import fc from 'fast-check';
import { expect, test } from 'vitest';
import { LitSpans } from '@/lib/engine/lit-spans';
import { seed } from '../../support/scenes';

test('taking stretches out leaves just the columns that none of them held', () => {
  const stretch = fc.tuple(fc.integer({ min: -3, max: 43 }), fc.integer({ min: -3, max: 43 }));
  fc.assert(
    fc.property(fc.array(stretch, { maxLength: 30 }), (stretches) => {
      const lit = new LitSpans(40);
      lit.reset(0, 40);
      const left = new Set(Array.from({ length: 40 }, (_, i) => i));
      for (const [lo, hi] of stretches) {
        lit.remove(lo, hi);
        for (let i = lo; i < hi; i++) left.delete(i);
      }
      const spans: number[] = [];
      for (let n = 0; n < lit.count; n++) {
        expect(lit.from[n]).toBeLessThan(lit.to[n]);
        if (n > 0) expect(lit.from[n]).toBeGreaterThan(lit.to[n - 1]);
        for (let i = lit.from[n]; i < lit.to[n]; i++) spans.push(i);
      }
      expect(spans).toEqual([...left]);
    }),
    { seed },
  );
});
