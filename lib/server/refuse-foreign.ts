import 'server-only';
import { AppError } from '@/lib/errors';

/** `null` for an origin that is no address: browsers send the word `null` from sandboxed and local pages. */
const hostOf = (origin: string): string | null => (URL.canParse(origin) ? new URL(origin).host : null);

/**
 * Requests that change something must come from our own pages: a foreign site's form is refused. Browsers
 * always say where a request comes from; what says nothing is no browser and carries nobody's cookies unasked.
 */
export function refuseForeign(request: Request): void {
  const site = request.headers.get('sec-fetch-site');
  const origin = request.headers.get('origin');
  const host =
    request.headers.get('x-forwarded-host') ?? request.headers.get('host') ?? new URL(request.url).host;
  const foreign = site ? !['same-origin', 'none'].includes(site) : origin !== null && hostOf(origin) !== host;
  if (foreign) throw new AppError('forbidden', 'This request came from another site. Nothing was changed.');
}
