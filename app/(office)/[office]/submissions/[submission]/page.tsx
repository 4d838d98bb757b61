import { FindingsPage } from '@/components/findings/findings-page';

interface Props {
  params: Promise<{ office: string; submission: string }>;
}

export default async function SubmissionFindings({ params }: Props) {
  return <FindingsPage {...await params} />;
}
