import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { ComparePage } from '@/components/compare/compare-page';

export const metadata: Metadata = { title: 'Compare' };

interface Props {
  params: Promise<{ office: string; submission: string }>;
}

export default async function SubmissionComparison({ params }: Props) {
  const { office, submission } = await params;
  await requireSession(`/${office}/submissions/${submission}/compare`);
  return <ComparePage office={office} submission={submission} />;
}
