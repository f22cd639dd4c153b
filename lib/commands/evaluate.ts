/**
 * npm run evaluate -- FILE.json [--stop-set ID] [--plane Z] [--grid H] [--json]: the figures of a room file's stop set
 * as JSON, indented to be read, or on one line with --json. Exits 1 with words when the file cannot be used.
 */
import { readFileSync } from 'node:fs';
import { parseArgs } from 'node:util';
import { roomFileSchema } from '@/lib/room';
import { fileReferenceFaults } from '@/lib/room/check-references';
import { describeFaults } from '@/lib/room/describe-faults';
import { evaluateStopSet } from './evaluate-stop-set';

const usage =
  'Usage: npm run evaluate -- FILE.json [--stop-set ID] [--plane Z] [--grid H] [--json]\n' +
  '  --plane  height of the plane in metres (0.75)\n  --grid   grid step in metres (0.05)';

function numberOf(
  name: string,
  text: string | undefined,
  fallback: number,
  least: number,
  most: number,
): number {
  if (text === undefined) return fallback;
  const value = Number(text);
  if (text.trim() === '' || !(value >= least && value <= most))
    throw new Error(`--${name} must be a number from ${least} to ${most}, not "${text}".`);
  return value;
}

function readRoomFile(path: string) {
  let text: string;
  try {
    text = readFileSync(path, 'utf8');
  } catch (error) {
    throw new Error(`${path} cannot be read: ${(error as Error).message}`);
  }
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch (error) {
    throw new Error(`${path} is not JSON: ${(error as Error).message}`);
  }
  const parsed = roomFileSchema.safeParse(value);
  const faults = parsed.success ? fileReferenceFaults(parsed.data) : describeFaults(parsed.error);
  if (!parsed.success || faults.length > 0)
    throw new Error(
      [
        `${path} is not a room file that can be used:`,
        ...faults.map((it) => `  ${it.path}: ${it.message}`),
      ].join('\n'),
    );
  return parsed.data;
}

try {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: {
      'stop-set': { type: 'string' },
      plane: { type: 'string' },
      grid: { type: 'string' },
      json: { type: 'boolean' },
    },
  });
  if (positionals.length !== 1) throw new Error(usage);
  const figures = evaluateStopSet(readRoomFile(positionals[0]), {
    stopSet: values['stop-set'],
    plane: numberOf('plane', values.plane, 0.75, 0, 20),
    grid: numberOf('grid', values.grid, 0.05, 0.005, 1),
  });
  console.log(JSON.stringify(figures, null, values.json ? undefined : 2));
} catch (error) {
  console.error((error as Error).message);
  process.exitCode = 1;
}
