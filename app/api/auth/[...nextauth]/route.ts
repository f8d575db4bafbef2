import NextAuth from 'next-auth';
import type { NextRequest } from 'next/server';
import { authOptions } from '@/lib/server/auth/auth-options';

/** next-auth's own endpoints; it brings its own checks (CSRF token, no state change by GET). */
function handler(
  request: NextRequest,
  context: { params: Promise<{ nextauth: string[] }> },
): Promise<Response> {
  return NextAuth(request, context, authOptions()) as Promise<Response>;
}

export { handler as GET, handler as POST };
