import 'server-only';
import { z } from 'zod';
import { can, type Permission } from '@/lib/access/permissions';
import { AppError } from '@/lib/errors';
import { etagOf, versionOf } from '@/lib/room/api/etag';
import { describeFaults } from '@/lib/room/describe-faults';
import { type Actor, actorOf, sessionCookie } from './actor';
import { problem } from './problem';
import { readJson } from './read-json';
import { refuseForeign } from './refuse-foreign';

/** What a use case answers: the value, and what the protocol needs to know of it. */
export interface Answer<T> {
  readonly value: T;
  readonly status?: number;
  /** Version of the thing: becomes the ETag. */
  readonly version?: number;
  /** Name to save the answer under. */
  readonly download?: string;
  /** Content type of an answer that is text, not JSON. */
  readonly type?: string;
}

interface RouteSpec<P extends z.ZodType, B extends z.ZodType, A extends z.ZodType> {
  /** `null`: any member may. */
  readonly permission: Permission | null;
  readonly params?: P;
  readonly body?: B;
  /** Bytes; 512 kB unless said. */
  readonly limit?: number;
  readonly answer: A;
  readonly run: (call: {
    readonly actor: Actor;
    readonly params: z.infer<P>;
    readonly body: z.infer<B>;
    /** Version that the caller says it is changing; refused when the route asks for it and it is not there. */
    readonly expected: () => number;
  }) => Promise<Answer<z.input<A>>>;
}

type Context = { params: Promise<Record<string, string>> };

const DEFAULT_LIMIT = 512_000;

function expectedVersion(request: Request): number {
  const given = request.headers.get('if-match');
  if (!given)
    throw new AppError(
      'precondition_required',
      'Send If-Match with the ETag you loaded. Nothing was changed.',
    );
  const version = versionOf(given);
  if (version === null)
    throw new AppError('malformed', 'If-Match must be an ETag as it was given out. Nothing was changed.');
  return version;
}

const cookieOf = (request: Request, name: string): string | undefined =>
  request.headers
    .get('cookie')
    ?.split('; ')
    .find((cookie) => cookie.startsWith(`${name}=`))
    ?.slice(name.length + 1);

function check<S extends z.ZodType>(schema: S, value: unknown, words: string): z.infer<S> {
  const parsed = schema.safeParse(value);
  if (!parsed.success) throw new AppError('invalid', words, describeFaults(parsed.error));
  return parsed.data;
}

function respond({ status = 200, version, download, type }: Answer<unknown>, value: unknown): Response {
  const headers: Record<string, string> = { 'cache-control': 'no-store' };
  if (version !== undefined) headers.etag = etagOf(version);
  if (download) headers['content-disposition'] = `attachment; filename="${download}"`;
  if (status === 204) return new Response(null, { status, headers });
  if (type) return new Response(String(value), { status, headers: { ...headers, 'content-type': type } });
  return Response.json(value, { status, headers });
}

/**
 * The one place where a route's guard stands: signed in, allowed, of our own pages; then parse, one use case,
 * parse the answer. Refusals are problem+json.
 */
export const route =
  <A extends z.ZodType, P extends z.ZodType = z.ZodType<unknown>, B extends z.ZodType = z.ZodType<unknown>>(
    spec: RouteSpec<P, B, A>,
  ) =>
  async (request: Request, context?: Context): Promise<Response> => {
    try {
      const actor = await actorOf(cookieOf(request, sessionCookie()));
      if (!actor) throw new AppError('unauthenticated', 'You are not signed in, or your session has ended.');
      if (spec.permission && !can(actor.role, spec.permission))
        throw new AppError('forbidden', `As ${actor.role} you cannot do this. Nothing was changed.`);
      if (request.method !== 'GET') refuseForeign(request);
      // An address that no id can have is an address of nothing.
      const params = (spec.params ?? z.unknown()).safeParse((await context?.params) ?? {});
      if (!params.success) throw new AppError('not_found', 'There is nothing at this address.');
      const body = spec.body
        ? check(
            spec.body,
            await readJson(request, spec.limit ?? DEFAULT_LIMIT),
            'Some values cannot be used. Nothing was changed.',
          )
        : undefined;
      const result = await spec.run({
        actor,
        params: params.data as z.infer<P>,
        body: body as z.infer<B>,
        expected: () => expectedVersion(request),
      });
      return respond(result, spec.answer.parse(result.value));
    } catch (error) {
      return problem(error);
    }
  };
