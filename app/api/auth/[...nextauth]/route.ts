import NextAuth from 'next-auth';
import type { NextRequest } from 'next/server';
import { authOptions } from '@/lib/access/sign-in';
import { log } from '@/lib/http/log';

interface Next {
  readonly params: Promise<{ nextauth: string[] }>;
}

function handler(request: NextRequest, next: Next): Promise<Response> {
  const options = authOptions((err) => log.error({ err }, 'a sign-in failed'));
  return NextAuth(request, next, options) as Promise<Response>;
}

export { handler as GET, handler as POST };
