import 'server-only';
import { AppError, errorTable } from '@/lib/errors';

/** A refusal as problem+json (RFC 9457). What broke inside is logged, never sent. */
export function problem(error: unknown): Response {
  const known = error instanceof AppError ? error : null;
  if (!known) console.error(error);
  const code = known?.code ?? 'internal';
  const { status, title } = errorTable[code];
  return Response.json(
    {
      ...known?.extra,
      type: `urn:leeside:problem:${code}`,
      title,
      status,
      code,
      detail:
        known?.message ??
        'Your last change may not be saved. Try again; if it happens again, tell whoever runs Leeside for you.',
      ...(known?.faults.length ? { faults: known.faults } : {}),
    },
    { status, headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store' } },
  );
}
