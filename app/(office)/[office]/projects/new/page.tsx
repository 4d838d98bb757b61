import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { NewProjectPage } from '@/components/office/new-project';

export const metadata: Metadata = { title: 'New project' };

export default async function NewProject({ params }: { params: Promise<{ office: string }> }) {
  const { office } = await params;
  await requireSession(`/${office}/projects/new`);
  return <NewProjectPage />;
}
