/** One seed for all property tests, so that two runs ask the same; FC_SEED asks something else. */
export const seeded = (numRuns = 100) => ({ seed: Number(process.env.FC_SEED ?? 20261201), numRuns });
