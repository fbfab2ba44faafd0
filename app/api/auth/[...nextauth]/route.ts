import NextAuth from 'next-auth';
import type { NextRequest } from 'next/server';
import { authOptions } from '@/lib/auth';

type Context = { params: Promise<{ nextauth: string[] }> };

// Options per request: they need the environment, which a build does not have.
const handler = (request: NextRequest, context: Context): Promise<Response> =>
  NextAuth(request as never, context as never, authOptions());

export { handler as GET, handler as POST };
