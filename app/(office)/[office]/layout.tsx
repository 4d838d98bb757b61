import type { ReactNode } from 'react';
import { requireSession } from '@/app/require-session';
import { OfficeShell } from '@/components/shell/office-shell';

interface Props {
  params: Promise<{ office: string }>;
  children: ReactNode;
}

export default async function OfficeLayout({ params, children }: Props) {
  const { office } = await params;
  await requireSession(`/${office}`);
  return <OfficeShell slug={office}>{children}</OfficeShell>;
}
