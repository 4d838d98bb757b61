import NextAuth from 'next-auth';
import type { NextRequest } from 'next/server';
import { authOptions } from '@/lib/access/sign-in';

interface Next {
  readonly params: Promise<{ nextauth: string[] }>;
}

function handler(request: NextRequest, next: Next): Promise<Response> {
  return NextAuth(request, next, authOptions()) as Promise<Response>;
}

export { handler as GET, handler as POST };
