import { afterEach, beforeAll, describe, expect, it, vi } from 'vitest';
import { notify, type Payload, subscribe } from '@/db/listen';
import { withOffice } from '@/db/scope';
import { testDatabase } from '@/tests/support/database';
import { type OfficeFixture, twoOffices } from '@/tests/support/two-offices';

const db = testDatabase();
let office: OfficeFixture;
beforeAll(async () => {
  [office] = await twoOffices();
});

const stops: (() => void)[] = [];
afterEach(() => {
  for (const stop of stops.splice(0)) stop();
});
const listen = (submission: string) => {
  const heard: Payload[] = [];
  stops.push(subscribe(submission, (payload) => heard.push(payload)));
  return heard;
};
const tell = (submission: string, payload: Payload) =>
  withOffice(office.analyst, (tx) => notify(tx, submission, payload));
const listeners = () =>
  db.asOwner<{ pid: number }>(
    `select pid from pg_stat_activity where application_name = 'plumbrow listener'
        and datname = current_database() and query like 'listen%' and state = 'idle'`,
  );
const listening = () => vi.waitFor(async () => expect(await listeners()).toHaveLength(1), { timeout: 5000 });

describe('subscribe', () => {
  it('hears of its submission and of no other, once the transaction has committed', async () => {
    const [one, other] = office.contractors;
    const heard = listen(one.submission);
    const elsewhere = listen(other.submission);
    await listening();
    await expect(
      withOffice(office.analyst, async (tx) => {
        await notify(tx, one.submission, { kind: 'comment', id: 'rolled back' });
        throw new Error('no');
      }),
    ).rejects.toThrow('no');
    await tell(one.submission, { kind: 'comment', id: 'kept' });
    await vi.waitFor(() => expect(heard).toHaveLength(1), { timeout: 5000 });
    expect(heard).toEqual([{ kind: 'comment', id: 'kept', submission: one.submission }]);
    expect(elsewhere).toEqual([]);
  });

  it('takes the connection up again when it is lost, and says that it was', async () => {
    const [one] = office.contractors;
    const heard = listen(one.submission);
    await listening();
    const [lost] = await listeners();
    await db.asOwner('select pg_terminate_backend($1)', [lost?.pid]);
    await vi.waitFor(() => expect(heard).toContainEqual({ kind: 'reconnected' }), { timeout: 10_000 });
    await tell(one.submission, { kind: 'status' });
    await vi.waitFor(() => expect(heard).toHaveLength(2), { timeout: 5000 });
  });

  it('keeps no connection when nobody listens', async () => {
    const stop = subscribe(office.contractors[0].submission, () => undefined);
    await listening();
    stop();
    await vi.waitFor(async () => expect(await listeners()).toEqual([]), { timeout: 5000 });
  });
});
