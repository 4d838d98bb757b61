import { once } from 'node:events';
import { createServer, type Server } from 'node:net';
import { afterEach, describe, expect, it } from 'vitest';
import { freePort } from '@/db/cluster';
import { requirePort } from '@/lib/commands/serve';

let server: Server | null = null;
const occupy = async (port: number): Promise<void> => {
  server = createServer().listen(port, '127.0.0.1');
  await once(server, 'listening');
};
afterEach(() => server?.close());

describe('requirePort', () => {
  it('is content with a port that nobody has', async () => {
    await expect(requirePort(await freePort(), '127.0.0.1')).resolves.toBeUndefined();
  });

  it('refuses one that is taken, in a sentence that says what to do', async () => {
    const port = await freePort();
    await occupy(port);
    await expect(requirePort(port, '127.0.0.1')).rejects.toThrow(
      `Port ${port} is taken by another program: stop that one, or choose another port (PORT=${port + 1}).`,
    );
  });

  it('waits for one that is being given up', async () => {
    const port = await freePort();
    await occupy(port);
    setTimeout(() => server?.close(), 300);
    await expect(requirePort(port, '127.0.0.1', 5000)).resolves.toBeUndefined();
  });

  it('refuses an address that this machine does not have', async () => {
    await expect(requirePort(await freePort(), '192.0.2.1')).rejects.toThrow(/no such address/);
  });
});
