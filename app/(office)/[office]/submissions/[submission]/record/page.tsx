import { requireSession } from '@/app/require-session';
import { RecordPage } from '@/components/record/record-page';

interface Props {
  params: Promise<{ office: string; submission: string }>;
}

export default async function SubmissionRecord({ params }: Props) {
  const { office, submission } = await params;
  await requireSession(`/${office}/submissions/${submission}/record`);
  return <RecordPage office={office} submission={submission} />;
}
