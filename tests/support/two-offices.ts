import { randomUUID } from 'node:crypto';
import { withOwner } from '@/db/owner';
import {
  activities,
  apiTokens,
  comments,
  contractors,
  corrections,
  findings,
  fixes,
  invitations,
  memberships,
  offices,
  projects,
  recordEntries,
  submissionFiles,
  submissions,
  users,
} from '@/db/schema';
import type { OfficeScope, Tx } from '@/db/scope';
import type { Figures } from '@/lib/contract/submission';

export interface ContractorFixture {
  readonly id: string;
  readonly scheduler: OfficeScope;
  readonly project: string;
  readonly submission: string;
  readonly finding: string;
  readonly fix: string;
}
export interface OfficeFixture {
  readonly id: string;
  readonly slug: string;
  readonly analyst: OfficeScope;
  readonly analystEmail: string;
  readonly contractors: readonly [ContractorFixture, ContractorFixture];
}

/** Two offices alike, with two contractors each, and a row in every table for each contractor. */
export function twoOffices(): Promise<readonly [OfficeFixture, OfficeFixture]> {
  return withOwner(
    async (tx) => [await makeOffice(tx, 'quayside'), await makeOffice(tx, 'hillside')] as const,
  );
}

async function makeOffice(tx: Tx, slug: string): Promise<OfficeFixture> {
  const id = randomUUID();
  await tx.insert(offices).values({ id, slug, name: `${slug} office` });
  const analystEmail = `analyst@${slug}.example`;
  const analyst = await makePerson(tx, id, analystEmail, 'analyst', null);
  const scope = { office: id, user: analyst.user, contractor: null };
  return {
    id,
    slug,
    analyst: scope,
    analystEmail,
    contractors: [
      await makeContractor(tx, scope, `${slug} piling`),
      await makeContractor(tx, scope, `${slug} roofing`),
    ],
  };
}

async function makePerson(
  tx: Tx,
  office: string,
  email: string,
  role: 'analyst' | 'scheduler',
  contractor: string | null,
): Promise<{ user: string; membership: string }> {
  const user = randomUUID();
  const membership = randomUUID();
  await tx
    .insert(users)
    .values({ id: user, email, name: email.split('@')[0] ?? email, passwordHash: 'secret' });
  await tx
    .insert(memberships)
    .values({ id: membership, officeId: office, userId: user, role, contractorId: contractor });
  await tx
    .insert(apiTokens)
    .values({ officeId: office, membershipId: membership, name: 'a token', tokenHash: email });
  await tx.insert(invitations).values({
    officeId: office,
    userId: user,
    tokenHash: `invitation of ${email}`,
    expiresAt: new Date('2030-01-01T00:00:00Z'),
    createdBy: user,
  });
  return { user, membership };
}

async function makeContractor(tx: Tx, analyst: OfficeScope, name: string): Promise<ContractorFixture> {
  const officeId = analyst.office;
  const id = randomUUID();
  await tx.insert(contractors).values({ id, officeId, name });
  const email = `scheduler@${name.replaceAll(' ', '-')}.example`;
  const { user } = await makePerson(tx, officeId, email, 'scheduler', id);
  const project = randomUUID();
  await tx.insert(projects).values({
    id: project,
    officeId,
    contractorId: id,
    code: name,
    name,
    start: '2027-01-04',
    holidays: ['2027-04-02', '2027-04-05'],
    createdBy: analyst.user,
  });
  const submission = await makeSubmission(tx, analyst, id, project);
  return { id, project, ...submission, scheduler: { office: officeId, user, contractor: id } };
}

const uncomputed = (state: Figures['state']): Figures => ({
  state,
  computable: false,
  expectedDuration: null,
  finish: null,
  variance: null,
  standardDeviation: null,
  chanceOfTarget: null,
});

/** A row of submissions that satisfies every constraint. */
export function submissionRow(scope: OfficeScope, contractorId: string, projectId: string, revision: number) {
  return {
    officeId: scope.office,
    projectId,
    contractorId,
    revision,
    fileName: 'list.csv',
    fileSha256: 'ab'.repeat(32),
    fileBytes: 3,
    matching: [],
    reading: { unit: null, hoursPerDay: 8, daysPerWeek: 5 },
    rows: {
      counts: { read: 1, activities: 1, headings: 0, continued: 0, blank: 0, notes: 0, refused: 0 },
      refused: [],
    },
    summary: { received: uncomputed('received'), corrected: uncomputed('corrected'), proposed: null },
    receivedBy: scope.user,
  };
}

async function makeSubmission(tx: Tx, analyst: OfficeScope, contractor: string, project: string) {
  const own = { officeId: analyst.office, submissionId: randomUUID() };
  const [finding, fix] = [randomUUID(), randomUUID()];
  await tx
    .insert(submissions)
    .values({ id: own.submissionId, ...submissionRow(analyst, contractor, project, 0) });
  await tx.insert(submissionFiles).values({ ...own, bytes: Buffer.from([1, 2, 3]) });
  const place = { position: 0, activityId: 'A', sheet: 'List', row: 2 };
  await tx.insert(activities).values({
    ...own,
    ...place,
    name: 'Set out',
    data: { optimistic: 1, likely: 2, pessimistic: 3, predecessors: [], cells: { id: 'A2' } },
  });
  const about = { key: 'self-link A', rule: 'self-link', messageId: 'self', data: { id: 'A' } };
  await tx.insert(findings).values({ id: finding, ...own, ...place, ...about, weight: 'blocks' });
  await tx
    .insert(fixes)
    .values({ id: fix, ...own, findingId: finding, reason: 'It waits for itself.', edits: [] });
  const byAnalyst = { createdBy: analyst.user, batch: randomUUID() };
  await tx
    .insert(corrections)
    .values({ ...own, ...byAnalyst, sequence: 1, fixId: fix, findingId: finding, edits: [] });
  for (const [index, audience] of (['shared', 'inside'] as const).entries()) {
    await tx
      .insert(comments)
      .values({ ...own, audience, body: audience, authorId: analyst.user, findingId: finding });
    await tx.insert(recordEntries).values({
      ...own,
      sequence: index + 1,
      at: new Date('2027-01-05T09:00:00.123Z'),
      actorId: analyst.user,
      actorName: 'analyst',
      verb: 'comment:create',
      data: {},
      audience,
      previousHash: index === 0 ? '' : 'hash 1',
      hash: `hash ${index + 1}`,
    });
  }
  return { submission: own.submissionId, finding, fix };
}
