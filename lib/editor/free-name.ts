/** The first of `base`, `base 2`, `base 3`, … that is not taken. */
export function freeName(base: string, taken: Iterable<string>): string {
  const names = new Set(taken);
  let name = base;
  for (let number = 2; names.has(name); number += 1) name = `${base} ${number}`;
  return name;
}
