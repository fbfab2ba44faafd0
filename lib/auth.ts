import 'server-only';
import { cookies, headers } from 'next/headers';
import { NextRequest } from 'next/server';
import type { NextAuthOptions } from 'next-auth';
import { getToken } from 'next-auth/jwt';
import CredentialsProvider from 'next-auth/providers/credentials';
import { z } from 'zod';
import { env } from './env';
import { toRequestError } from './errors';
import { signIn, type SignedIn } from './sign-in';

/** Seconds from signing in to the end of the session, unless the browser renews it. */
const SESSION_AGE = 14 * 24 * 3600;

/**
 * next-auth's options. The token says only who; role and workshop are asked of the database at
 * every request (access.ts). A refused sign-in has `error` CredentialsSignin, too-many or
 * unavailable.
 */
export function authOptions(): NextAuthOptions {
  return {
    secret: env().NEXTAUTH_SECRET,
    session: { strategy: 'jwt', maxAge: SESSION_AGE },
    pages: { signIn: '/sign-in', error: '/sign-in' },
    providers: [
      CredentialsProvider({
        name: 'Email and password',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        authorize: async (credentials, request) => {
          try {
            return await signIn(credentials, request.headers ?? {});
          } catch (error) {
            // next-auth shows the message it is given, so it gets a code and nothing else.
            throw new Error(toRequestError(error).code);
          }
        },
      }),
    ],
    callbacks: {
      jwt: ({ token, user }) =>
        user ? { sub: user.id, epoch: (user as Partial<SignedIn>).epoch } : token,
      // The screens ask the server who they are; this answers only until when.
      session: ({ session }) => ({ expires: session.expires, user: {} }),
    },
  };
}

const tokenSchema = z.object({ sub: z.uuid(), epoch: z.number().int() });

/** Whose session the request's cookie holds, and of which epoch; null when there is none. */
export async function signedInUser(): Promise<{ userId: string; epoch: number } | null> {
  const jar = await cookies();
  if (jar.getAll().length === 0) return null;
  // Cookies alone: next-auth would also take a token from an Authorization header.
  const request = new NextRequest(env().NEXTAUTH_URL, {
    headers: { cookie: (await headers()).get('cookie') ?? '' },
  });
  const token = await getToken({ req: request, secret: env().NEXTAUTH_SECRET });
  const held = tokenSchema.safeParse(token).data;
  return held ? { userId: held.sub, epoch: held.epoch } : null;
}
