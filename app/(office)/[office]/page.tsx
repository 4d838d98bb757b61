import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { DeskPage } from '@/components/desk/desk-page';

export const metadata: Metadata = { title: 'Desk' };

export default async function Desk({ params }: { params: Promise<{ office: string }> }) {
  const { office } = await params;
  await requireSession(`/${office}`);
  return <DeskPage />;
}
