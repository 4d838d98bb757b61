import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { ConfidencePlace } from '@/components/confidence/confidence-place';

export const metadata: Metadata = { title: 'Confidence' };

export default async function ConfidencePage({
  params,
}: {
  params: Promise<{ office: string; submission: string }>;
}) {
  const { office, submission } = await params;
  await requireSession(`/${office}/submissions/${submission}/confidence`);
  return <ConfidencePlace office={office} submission={submission} />;
}
