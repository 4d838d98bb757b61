import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { RulePage } from '@/components/office/rule-pages';

export const metadata: Metadata = { title: 'Rule' };

export default async function Rule({ params }: { params: Promise<{ office: string; rule: string }> }) {
  const { office, rule } = await params;
  await requireSession(`/${office}/rules/${rule}`);
  return <RulePage id={decodeURIComponent(rule)} />;
}
