import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { RulesPage } from '@/components/office/rule-pages';

export const metadata: Metadata = { title: 'Rules' };

export default async function Rules({ params }: { params: Promise<{ office: string }> }) {
  const { office } = await params;
  await requireSession(`/${office}/rules`);
  return <RulesPage />;
}
