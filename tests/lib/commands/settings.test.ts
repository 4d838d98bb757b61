import { mkdtemp, readFile, rm, stat, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import {
  authSecret,
  clusterPasswords,
  publicAddress,
  readSettings,
  rememberDemo,
  rememberedDemo,
} from '@/lib/commands/settings';

describe('readSettings', () => {
  it('has a default for everything', () => {
    expect(readSettings({})).toEqual({
      port: 3000,
      host: '127.0.0.1',
      home: resolve('.plumbrow'),
      databaseUrl: null,
    });
  });

  it.each(['0', '65536', '3000a', '-1', '3.5'])('refuses the port %s', (PORT) => {
    expect(() => readSettings({ PORT })).toThrow(`PORT is ${PORT}`);
  });

  it.each(['mysql://host/name', 'localhost:5432'])('refuses the database %s', (DATABASE_URL) => {
    expect(() => readSettings({ DATABASE_URL })).toThrow(/no address of a PostgreSQL database/);
  });

  it('takes both spellings of a database address', () => {
    expect(readSettings({ DATABASE_URL: 'postgresql://u@h/d' }).databaseUrl).toBe('postgresql://u@h/d');
  });
});

describe('publicAddress', () => {
  const at = (host: string, env = {}) => publicAddress({ ...readSettings({ PORT: '4000' }), host }, env);

  it('is what a browser on this machine opens', () => {
    expect(at('127.0.0.1')).toBe('http://localhost:4000');
    expect(at('0.0.0.0')).toBe('http://localhost:4000');
    expect(at('192.0.2.7')).toBe('http://192.0.2.7:4000');
  });

  it('is NEXTAUTH_URL where that is set', () => {
    expect(at('0.0.0.0', { NEXTAUTH_URL: 'https://plumbrow.example/' })).toBe('https://plumbrow.example');
  });
});

describe('what is kept', () => {
  let home = '';
  beforeEach(async () => {
    home = await mkdtemp(join(tmpdir(), 'plumbrow-settings-'));
  });
  afterEach(() => rm(home, { recursive: true }));

  it('is made once, and readable by its owner alone', async () => {
    const first = await clusterPasswords(home);
    expect(await clusterPasswords(home)).toEqual(first);
    expect(first.owner).not.toBe(first.server);
    expect(first.owner.length).toBeGreaterThanOrEqual(40);
    const { mode } = await stat(join(home, 'passwords.json'));
    expect(mode & 0o777).toBe(0o600);
  });

  it('gives way to a secret from the environment, which is not written down', async () => {
    expect(await authSecret(home, { AUTH_SECRET: 'given' })).toBe('given');
    expect(await authSecret(home, { NEXTAUTH_SECRET: 'older' })).toBe('older');
    const kept = await authSecret(home, {});
    expect(await authSecret(home, {})).toBe(kept);
    expect(await readFile(join(home, 'auth-secret.json'), 'utf8')).not.toMatch(/given|older/);
  });

  it('is never overwritten because it is damaged: the database knows no other password', async () => {
    await writeFile(join(home, 'passwords.json'), '{"owner": "shor');
    await expect(clusterPasswords(home)).rejects.toThrow(/is damaged/);
  });

  it('remembers the demo accounts', async () => {
    expect(await rememberedDemo(home)).toBeNull();
    await rememberDemo(home, { password: 'p', accounts: ['analyst@demo.example'] });
    expect(await rememberedDemo(home)).toEqual({ password: 'p', accounts: ['analyst@demo.example'] });
  });
});
