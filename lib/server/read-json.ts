import 'server-only';
import { type ParseError, parse, printParseErrorCode } from 'jsonc-parser';
import { AppError } from '@/lib/errors';

/** Reads a body as text, giving up as soon as it is larger than `limit` bytes. */
async function readText(request: Request, limit: number): Promise<string> {
  const tooLarge = () =>
    new AppError('too_large', `At most ${Math.round(limit / 1000)} kB can be taken. Nothing was changed.`);
  if (Number(request.headers.get('content-length') ?? 0) > limit) throw tooLarge();
  const reader = request.body?.getReader();
  if (!reader) return '';
  const chunks: Uint8Array[] = [];
  let size = 0;
  for (;;) {
    const { done, value } = await reader.read();
    if (done) break;
    size += value.byteLength;
    if (size > limit) {
      await reader.cancel();
      throw tooLarge();
    }
    chunks.push(value);
  }
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(Buffer.concat(chunks));
  } catch {
    throw new AppError('malformed', 'The text is not UTF-8. Nothing was changed.');
  }
}

/** JSON.parse does not say where in every case; this does. */
function whereItBreaks(text: string): string {
  const errors: ParseError[] = [];
  try {
    parse(text, errors, { disallowComments: true });
  } catch {
    return 'it is nested too deeply';
  }
  if (errors.length === 0) return 'it is not valid JSON';
  const before = text.slice(0, errors[0].offset).split('\n');
  const what = printParseErrorCode(errors[0].error)
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .toLowerCase();
  return `line ${before.length}, column ${before[before.length - 1].length + 1}: ${what}`;
}

/** The JSON body of a request, not yet checked against any schema. */
export async function readJson(request: Request, limit: number): Promise<unknown> {
  const type = request.headers.get('content-type')?.split(';')[0].trim();
  if (type !== 'application/json')
    throw new AppError('unsupported', 'Send JSON, with content-type application/json. Nothing was changed.');
  const text = await readText(request, limit);
  try {
    return JSON.parse(text.replace(/^\uFEFF/, ''));
  } catch {
    throw new AppError('malformed', `The JSON cannot be read: ${whereItBreaks(text)}. Nothing was changed.`);
  }
}
