import { requireSession } from '@/app/require-session';
import { FindingsPage } from '@/components/findings/findings-page';
import { ReadNote } from '@/components/intake/read-note';

interface Props {
  params: Promise<{ office: string; submission: string }>;
}

export default async function SubmissionFindings({ params }: Props) {
  const { office, submission } = await params;
  await requireSession(`/${office}/submissions/${submission}`);
  return (
    <>
      <ReadNote office={office} submission={submission} />
      <FindingsPage office={office} submission={submission} />
    </>
  );
}
