import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { PathPlace } from '@/components/path/path-place';

export const metadata: Metadata = { title: 'Path' };

export default async function PathPage({
  params,
}: {
  params: Promise<{ office: string; submission: string }>;
}) {
  const { office, submission } = await params;
  await requireSession(`/${office}/submissions/${submission}/path`);
  return <PathPlace office={office} submission={submission} />;
}
