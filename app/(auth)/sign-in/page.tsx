import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { signedIn } from '@/app/require-session';
import { Door } from '@/components/shell/door';
import { safeNextPath } from '@/components/shell/next-path';
import { SignInForm } from '@/components/shell/sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

interface Props {
  searchParams: Promise<{ next?: string | string[]; callbackUrl?: string | string[] }>;
}

export default async function SignInPage({ searchParams }: Props) {
  const { next } = await searchParams;
  const path = safeNextPath(typeof next === 'string' ? next : null);
  if (await signedIn()) redirect(path);
  return (
    <Door title="Sign in" sub="With the e-mail address your office knows you by.">
      <SignInForm next={path} />
    </Door>
  );
}
