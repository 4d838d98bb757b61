import { RecordPage } from '@/components/record/record-page';

interface Props {
  params: Promise<{ office: string; submission: string }>;
}

export default async function SubmissionRecord({ params }: Props) {
  return <RecordPage {...await params} />;
}
