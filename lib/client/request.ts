import type { z } from 'zod';
import { AppError, type ErrorCode, errorTable } from '@/lib/errors';
import { problemSchema } from '@/lib/room/api/resources';

const isCode = (code: string): code is ErrorCode => Object.hasOwn(errorTable, code);

/** The refusal in a problem+json answer. An answer that is none becomes a plain Error: the line, not the request. */
async function refusal(response: Response): Promise<Error> {
  const body: unknown = await response.json().catch(() => null);
  const parsed = problemSchema.safeParse(body);
  if (!parsed.success || !isCode(parsed.data.code))
    return new TypeError(`The server answered ${response.status}. Try again in a moment.`);
  const { code, detail, faults } = parsed.data;
  return new AppError(code, detail, faults ?? [], body as Record<string, unknown>);
}

interface Options {
  readonly method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  readonly body?: unknown;
  /** A body that is JSON text already, sent as it is. */
  readonly text?: string;
  readonly etag?: string;
}

/**
 * One request to our own API; the answer is checked against its schema. Throws AppError for a refusal and
 * TypeError when the line is broken.
 */
export async function request<S extends z.ZodType>(
  path: string,
  schema: S,
  { method = 'GET', body, text, etag }: Options = {},
): Promise<z.infer<S> & { etag: string }> {
  const content = text ?? (body === undefined ? undefined : JSON.stringify(body));
  const response = await fetch(path, {
    method,
    body: content,
    headers: {
      ...(content === undefined ? {} : { 'content-type': 'application/json' }),
      ...(etag ? { 'if-match': etag } : {}),
    },
  });
  if (!response.ok) throw await refusal(response);
  const value: unknown = response.status === 204 ? {} : await response.json();
  return { ...(schema.parse(value) as object), etag: response.headers.get('etag') ?? '' } as z.infer<S> & {
    etag: string;
  };
}
