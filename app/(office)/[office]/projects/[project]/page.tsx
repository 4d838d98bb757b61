import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { ProjectPage } from '@/components/office/project-page';

export const metadata: Metadata = { title: 'Project' };

export default async function Project({ params }: { params: Promise<{ office: string; project: string }> }) {
  const { office, project } = await params;
  await requireSession(`/${office}/projects/${project}`);
  return <ProjectPage id={project} />;
}
