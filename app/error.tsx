'use client';

import { Door } from '@/components/shell/door';
import { ErrorState } from '@/components/ui/states';

export default function AppError({
  error,
  reset,
}: {
  error: Error & { digest?: string };
  reset: () => void;
}) {
  return (
    <Door title="Something failed">
      <ErrorState error={error} title="The page could not be opened" retry={reset}>
        {error.digest && <p className="text-slate">To quote when you ask about it: {error.digest}</p>}
      </ErrorState>
    </Door>
  );
}
