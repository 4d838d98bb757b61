import type { ReactNode } from 'react';
import { SubmissionFrame } from '@/components/cord/submission-frame';

interface Props {
  params: Promise<{ office: string; submission: string }>;
  children: ReactNode;
}

/** Stays while one moves along the cord, so that the bob can come to rest at the next knot. */
export default async function SubmissionLayout({ params, children }: Props) {
  const { office, submission } = await params;
  return (
    <SubmissionFrame key={submission} office={office} submission={submission}>
      {children}
    </SubmissionFrame>
  );
}
