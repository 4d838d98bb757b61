import { and, eq, sql } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import {
  comments,
  contractors,
  findings,
  memberships,
  projects,
  recordEntries,
  submissionFiles,
  submissions,
  users,
} from '@/db/schema';
import { type OfficeScope, type Tx, withOffice } from '@/db/scope';
import { testDatabase } from '@/tests/support/database';
import { type OfficeFixture, submissionRow, twoOffices } from '@/tests/support/two-offices';

testDatabase();
let ours: OfficeFixture;
let theirs: OfficeFixture;
beforeAll(async () => {
  [ours, theirs] = await twoOffices();
});

const refused = { cause: { code: '42501' } };
const broken = { cause: { code: '23503' } };
const attempt = (scope: OfficeScope, work: (tx: Tx) => Promise<unknown>) => withOffice(scope, work);

describe('an analyst', () => {
  it('cannot write a row into another office', async () => {
    const other = attempt(ours.analyst, (tx) =>
      tx.insert(contractors).values({ officeId: theirs.id, name: 'X' }),
    );
    await expect(other).rejects.toMatchObject(refused);
  });

  it('cannot hang a row of its own onto another office’s project or submission', async () => {
    const [other] = theirs.contractors;
    const row = submissionRow(ours.analyst, other.id, other.project, 7);
    await expect(attempt(ours.analyst, (tx) => tx.insert(submissions).values(row))).rejects.toMatchObject(
      broken,
    );
    const comment = {
      officeId: ours.id,
      submissionId: other.submission,
      audience: 'inside' as const,
      body: 'Hello',
      authorId: ours.analyst.user,
    };
    await expect(attempt(ours.analyst, (tx) => tx.insert(comments).values(comment))).rejects.toMatchObject(
      broken,
    );
  });

  it('cannot give a submission a contractor that is not the project’s', async () => {
    const [piling, roofing] = ours.contractors;
    const row = submissionRow(ours.analyst, roofing.id, piling.project, 7);
    await expect(attempt(ours.analyst, (tx) => tx.insert(submissions).values(row))).rejects.toMatchObject(
      broken,
    );
  });

  it('changes nothing of another office, however it asks', async () => {
    const changed = await withOffice(ours.analyst, (tx) =>
      tx
        .update(projects)
        .set({ name: 'Taken' })
        .where(eq(projects.id, theirs.contractors[0].project))
        .returning({ id: projects.id }),
    );
    expect(changed).toEqual([]);
  });

  it('invites a person who is not yet known, and cannot set the password for them', async () => {
    const id = '00000000-0000-4000-8000-000000000001';
    await withOffice(ours.analyst, async (tx) => {
      await tx.insert(users).values({ id, email: 'new@person.example', name: 'New' });
      await tx.insert(memberships).values({ officeId: ours.id, userId: id, role: 'reviewer' });
    });
    const seen = (scope: OfficeScope) =>
      withOffice(scope, (tx) => tx.select({ name: users.name }).from(users).where(eq(users.id, id)));
    expect(await seen(ours.analyst)).toEqual([{ name: 'New' }]);
    expect(await seen(theirs.analyst)).toEqual([]);
    await expect(
      attempt(ours.analyst, (tx) =>
        tx.execute(sql`update users set password_hash = 'mine' where id = ${id}`),
      ),
    ).rejects.toMatchObject(refused);
  });
});

describe('a scheduler', () => {
  it('sends its own contractor’s next revision, whole', async () => {
    const { scheduler, id, project } = ours.contractors[0];
    const bytes = await withOffice(scheduler, async (tx) => {
      const row = submissionRow(scheduler, id, project, 1);
      const [made] = await tx.insert(submissions).values(row).returning({ id: submissions.id });
      const own = { officeId: ours.id, submissionId: made?.id ?? '' };
      await tx.insert(submissionFiles).values({ ...own, bytes: Buffer.from('list') });
      const kept = await tx
        .select({ bytes: submissionFiles.bytes })
        .from(submissionFiles)
        .where(eq(submissionFiles.submissionId, own.submissionId));
      return kept[0]?.bytes.toString();
    });
    expect(bytes).toBe('list');
  });

  it('sends none for another contractor', async () => {
    const [{ scheduler }, other] = ours.contractors;
    const row = submissionRow(scheduler, other.id, other.project, 1);
    await expect(attempt(scheduler, (tx) => tx.insert(submissions).values(row))).rejects.toMatchObject(
      refused,
    );
  });

  it('writes nothing beside another contractor’s submission', async () => {
    const [{ scheduler }, other] = ours.contractors;
    const comment = {
      officeId: ours.id,
      submissionId: other.submission,
      audience: 'shared' as const,
      body: 'Hello',
      authorId: scheduler.user,
    };
    await expect(attempt(scheduler, (tx) => tx.insert(comments).values(comment))).rejects.toMatchObject(
      refused,
    );
    const changed = await withOffice(scheduler, (tx) =>
      tx
        .update(findings)
        .set({ state: 'waived' })
        .where(eq(findings.id, other.finding))
        .returning({ id: findings.id }),
    );
    expect(changed).toEqual([]);
  });

  it('writes no comment inside the office', async () => {
    const { scheduler, submission } = ours.contractors[0];
    const comment = {
      officeId: ours.id,
      submissionId: submission,
      audience: 'inside' as const,
      body: 'Hello',
      authorId: scheduler.user,
    };
    await expect(attempt(scheduler, (tx) => tx.insert(comments).values(comment))).rejects.toMatchObject(
      refused,
    );
  });

  it.each(['projects', 'contractors', 'memberships'])('changes no row of %s', async (table) => {
    const { scheduler } = ours.contractors[0];
    const column = table === 'memberships' ? 'disabled_at' : 'name';
    const value = table === 'memberships' ? sql`now()` : sql`'Taken'`;
    const { rowCount } = await withOffice(scheduler, (tx) =>
      tx.execute(sql`update ${sql.identifier(table)} set ${sql.identifier(column)} = ${value}`),
    );
    expect(rowCount).toBe(0);
  });
});

describe('the record', () => {
  it('is appended to by a scheduler who does not see all of it', async () => {
    const { scheduler, submission } = ours.contractors[0];
    const sequences = await withOffice(scheduler, async (tx) => {
      const { rows } = await tx.execute<{ sequence: number; hash: string }>(
        sql`select sequence, hash from record_head(${submission})`,
      );
      const head = rows[0] ?? { sequence: 0, hash: '' };
      await tx.insert(recordEntries).values({
        officeId: ours.id,
        submissionId: submission,
        sequence: head.sequence + 1,
        at: new Date('2027-01-06T09:00:00.456Z'),
        actorId: scheduler.user,
        actorName: 'scheduler',
        verb: 'comment:create',
        data: {},
        previousHash: head.hash,
        hash: 'hash 3',
      });
      return tx
        .select({ sequence: recordEntries.sequence, at: recordEntries.at })
        .from(recordEntries)
        .where(and(eq(recordEntries.submissionId, submission), eq(recordEntries.sequence, 3)));
    });
    expect(sequences).toEqual([{ sequence: 3, at: new Date('2027-01-06T09:00:00.456Z') }]);
  });

  it('tells a stranger nothing of the end of its chain', async () => {
    const { rows } = await withOffice(theirs.analyst, (tx) =>
      tx.execute(sql`select * from record_head(${ours.contractors[0].submission})`),
    );
    expect(rows).toEqual([]);
  });

  it.each(['update record_entries set verb = verb', 'delete from record_entries', 'truncate record_entries'])(
    'is not to be altered: %s',
    async (statement) => {
      await expect(attempt(ours.analyst, (tx) => tx.execute(sql.raw(statement)))).rejects.toMatchObject(
        refused,
      );
    },
  );

  it('has one entry at each place of the office’s own chain', async () => {
    const entry = {
      officeId: ours.id,
      submissionId: null,
      sequence: 1,
      at: new Date('2027-01-06T09:00:00Z'),
      actorId: ours.analyst.user,
      actorName: 'analyst',
      verb: 'project:create',
      data: {},
      previousHash: '',
      hash: 'x',
    };
    const twice = attempt(ours.analyst, (tx) => tx.insert(recordEntries).values([entry, entry]));
    await expect(twice).rejects.toMatchObject({ cause: { code: '23505' } });
  });
});
