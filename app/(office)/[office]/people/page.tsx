import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { PeoplePage } from '@/components/office/people-page';

export const metadata: Metadata = { title: 'People' };

export default async function People({ params }: { params: Promise<{ office: string }> }) {
  const { office } = await params;
  await requireSession(`/${office}/people`);
  return <PeoplePage />;
}
