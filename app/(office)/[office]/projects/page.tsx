import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { ProjectsPage } from '@/components/office/projects-page';

export const metadata: Metadata = { title: 'Projects' };

export default async function Projects({ params }: { params: Promise<{ office: string }> }) {
  const { office } = await params;
  await requireSession(`/${office}/projects`);
  return <ProjectsPage />;
}
