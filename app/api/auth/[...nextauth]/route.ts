import NextAuth from 'next-auth';
import { authOptions } from '@/lib/server/auth-options';

// Built on request, not on load: the build has no secrets.
const handler = (request: Request, context: { params: Promise<{ nextauth: string[] }> }) =>
  NextAuth(authOptions())(request, context);

export { handler as GET, handler as POST };
