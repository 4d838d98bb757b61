'use client';

import { Page } from '@/components/shell/page';
import { ErrorState } from '@/components/ui/states';

export default function OfficeError({
  error,
  reset,
}: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  return (
    <Page title="This page failed" narrow>
      <ErrorState error={error} title="The page could not be drawn" retry={reset}>
        <p>What you did before is kept.</p>
        {error.digest && <p className="text-slate">To quote when you ask about it: {error.digest}</p>}
      </ErrorState>
    </Page>
  );
}
