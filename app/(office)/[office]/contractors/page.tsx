import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { ContractorsPage } from '@/components/office/contractors-page';

export const metadata: Metadata = { title: 'Contractors' };

export default async function Contractors({ params }: { params: Promise<{ office: string }> }) {
  const { office } = await params;
  await requireSession(`/${office}/contractors`);
  return <ContractorsPage />;
}
