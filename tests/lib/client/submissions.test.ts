import { QueryClient, QueryObserver } from '@tanstack/react-query';
import { afterEach, expect, it, vi } from 'vitest';
import { keys } from '@/lib/client/keys';
import { invalidateDerived } from '@/lib/client/submissions';

const client = new QueryClient({ defaultOptions: { queries: { retry: false, staleTime: Infinity } } });
afterEach(() => client.clear());

it('does not take what was asked for before a step, and comes after it, for what the step made', async () => {
  const answers: ((value: string) => void)[] = [];
  const observer = new QueryObserver<string>(client, {
    queryKey: keys.submissionPart('demo', 'one', 'corrections'),
    queryFn: () => new Promise<string>((resolve) => answers.push(resolve)),
  });
  const stop = observer.subscribe(() => undefined);
  expect(answers).toHaveLength(1);

  const invalidated = invalidateDerived(client, 'demo', 'one');
  await vi.waitFor(() => expect(answers).toHaveLength(2));
  answers[0]?.('as it was');
  answers[1]?.('as it is');
  await invalidated;
  expect(observer.getCurrentResult().data).toBe('as it is');
  stop();
});
