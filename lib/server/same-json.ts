import 'server-only';

/** Do two values make the same document? As stored: JSON has no −0 and drops what is undefined. */
export const sameJson = (one: unknown, two: unknown): boolean => JSON.stringify(one) === JSON.stringify(two);
