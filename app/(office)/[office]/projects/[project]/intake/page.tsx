import type { Metadata } from 'next';
import { requireSession } from '@/app/require-session';
import { IntakePage } from '@/components/intake/intake-page';

export const metadata: Metadata = { title: 'Hand in a revision' };

interface Props {
  params: Promise<{ office: string; project: string }>;
  searchParams: Promise<{ again?: string | string[] }>;
}

export default async function Intake({ params, searchParams }: Props) {
  const { office, project } = await params;
  const { again } = await searchParams;
  await requireSession(`/${office}/projects/${project}/intake`);
  return <IntakePage project={project} again={again !== undefined} />;
}
