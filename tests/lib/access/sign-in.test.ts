import { afterEach, expect, it, vi } from 'vitest';
import { closeDatabase } from '@/db/client';
import { authOptions } from '@/lib/access/sign-in';

afterEach(async () => {
  vi.unstubAllEnvs();
  await closeDatabase();
});

it('tells a person nothing of what failed behind the sign-in, and the log all of it', async () => {
  vi.stubEnv('AUTH_SECRET', 'a secret of this test alone');
  vi.stubEnv('DATABASE_URL', 'postgres://nobody@127.0.0.1:1/nowhere');
  const heard: unknown[] = [];
  const [provider] = authOptions((error) => heard.push(error)).providers;
  const { authorize } = provider?.options as unknown as {
    authorize: (sent: object, request: object) => Promise<unknown>;
  };
  await expect(authorize({ email: 'a@b.example', password: 'x' }, {})).rejects.toThrow(
    /^Signing in does not work at the moment\. Try again in a minute\.$/,
  );
  expect(heard).toHaveLength(1);
});
