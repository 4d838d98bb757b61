import NextAuth from 'next-auth';
import { authOptions } from '@/lib/access/sign-in';

const handler = (request: Request, context: object): Promise<Response> =>
  NextAuth(request, context, authOptions());

export { handler as GET, handler as POST };
