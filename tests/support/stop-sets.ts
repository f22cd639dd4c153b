import type { StopSet } from '@/lib/room';

/** A draft of one stop and one pass, that stands in the two-bed bay. */
export const aStopSet = (id: string, change: Partial<StopSet> = {}): StopSet => ({
  id,
  name: 'Two of a kind',
  emitter: 'tower',
  target: { name: 'Vegetative bacteria', dose: 170, source: 'The organisation’s own' },
  margin: 1.5,
  stops: [{ id: 'a', name: '1', at: [2.75, 2.7], heading: 0, dwell: 600, emitter: null }],
  passes: [
    {
      id: 'b',
      name: 'P1',
      path: [
        [1, 2.7],
        [4, 2.7],
      ],
      speed: 0.05,
      heading: null,
      emitter: null,
    },
  ],
  ...change,
});
