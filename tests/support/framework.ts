// The framework gives a handler its cookies and headers through functions; in a test they come from the request at hand.
import { createRequire } from 'node:module';
import { NextRequest } from 'next/server';

interface Jar {
  headers: () => Promise<Headers>;
  cookies: () => Promise<NextRequest['cookies']>;
}

const held = createRequire(import.meta.url)('next/headers') as Jar;

/** Calls a handler that asks the framework for its request, one at a time. */
export async function inFramework<T>(
  request: Request,
  work: (request: NextRequest) => Promise<T>,
): Promise<T> {
  const seen = new NextRequest(request);
  const before = { ...held };
  held.headers = async () => seen.headers;
  held.cookies = async () => seen.cookies;
  try {
    return await work(seen);
  } finally {
    Object.assign(held, before);
  }
}
