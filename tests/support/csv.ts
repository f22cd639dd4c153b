/** Reads RFC 4180 CSV into rows of cells; what is not CSV throws. */
export function readCsv(text: string): string[][] {
  const rows: string[][] = [];
  let row: string[] = [];
  const cell = /(?:"((?:[^"]|"")*)"|([^",\r\n]*))(,|\r\n|$)/gy;
  while (cell.lastIndex < text.length) {
    const found = cell.exec(text);
    if (!found) throw new Error(`Not CSV after ${rows.length} rows`);
    row.push(found[1]?.replaceAll('""', '"') ?? found[2]);
    if (found[3] !== ',') {
      rows.push(row);
      row = [];
    }
  }
  return rows;
}
