/** Milliseconds of one piece of work, over repeated runs after warming up. */
export interface Timing {
  readonly min: number;
  readonly mean: number;
  /** Standard deviation. */
  readonly sd: number;
  readonly runs: number;
}

/** Times `work`, whose answer is added up so that no compiler leaves it out. */
export function time(work: () => number, { runs = 12, warmUps = 3 } = {}): Timing {
  let consumed = 0;
  for (let i = 0; i < warmUps; i++) consumed += work();
  const times: number[] = [];
  for (let i = 0; i < runs; i++) {
    const start = performance.now();
    consumed += work();
    times.push(performance.now() - start);
  }
  if (Number.isNaN(consumed)) throw new Error('The timed work answered no number.');
  const mean = times.reduce((sum, value) => sum + value, 0) / runs;
  const sd = Math.sqrt(times.reduce((sum, value) => sum + (value - mean) ** 2, 0) / runs);
  return { min: Math.min(...times), mean, sd, runs };
}
