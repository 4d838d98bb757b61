import type { OfficeContext } from '@/lib/access/context';
import { createComment } from '@/lib/services/comments/create';
import { createCorrections } from '@/lib/services/corrections/create';
import { listFindings } from '@/lib/services/findings/list';
import { createProject } from '@/lib/services/projects/create';
import { createSubmission } from '@/lib/services/submissions/create';
import { toCsv, toWorkbook } from './files';
import { makeOffice } from './people';
import { intakeScreens } from './scenario/intake-screens';
import { pumpingStation } from './scenario/pumping-station';
import { telemetryRev0, telemetryRev1 } from './scenario/telemetry';

/**
 * Makes the demo office the way people would: three contractors, one submission with each kind of finding, one that
 * is clean, one with a revision. An invented scenario with invented names.
 */
export async function seedDemo(
  log: (line: string) => void,
): Promise<{ password: string; accounts: string[] }> {
  const office = await makeOffice();
  const analyst = office.contextOf('analyst');
  const [civils = '', pumps = '', controls = ''] = office.contractors;

  log('Upper Tarnbeck pumping station, with each kind of finding');
  const station = await createProject(analyst, {
    body: {
      code: 'UT-1',
      name: 'Upper Tarnbeck pumping station',
      contractor: civils,
      start: '2027-03-01',
      targetFinish: '2027-11-19',
      calendar: { workingDays: [1, 2, 3, 4, 5], holidays: ['2027-03-26', '2027-03-29', '2027-05-03'] },
    },
  });
  const first = await submit(
    analyst,
    station.id,
    'upper-tarnbeck-issue-1.xlsx',
    await toWorkbook(pumpingStation),
  );
  await discuss(office.contextOf, first);

  log('Millrace intake screens, clean');
  const screens = await createProject(analyst, {
    body: {
      code: 'MI-2',
      name: 'Millrace intake screens',
      contractor: pumps,
      start: '2027-02-01',
      targetFinish: '2027-05-19',
    },
  });
  await submit(analyst, screens.id, 'millrace-issue-a.xlsx', await toWorkbook(intakeScreens));

  log('Telemetry changeover, with a revision');
  const telemetry = await createProject(analyst, {
    body: {
      code: 'TC-3',
      name: 'Telemetry changeover',
      contractor: controls,
      start: '2027-04-05',
      targetFinish: '2027-08-27',
      unit: 'day',
    },
  });
  await adoptFixes(analyst, await submit(analyst, telemetry.id, 'telemetry.csv', toCsv(telemetryRev0)));
  await submit(office.contextOf('scheduler3'), telemetry.id, 'telemetry-rev1.csv', toCsv(telemetryRev1));
  return { password: office.password, accounts: office.accounts };
}

async function submit(ctx: OfficeContext, project: string, name: string, bytes: Uint8Array): Promise<string> {
  const form = { file: { name, bytes }, fields: {} };
  return (await createSubmission(ctx, { path: { project }, form })).id;
}

/** What the analyst asked of the first issue, so that the next one can be compared with it. */
async function adoptFixes(ctx: OfficeContext, submission: string): Promise<void> {
  const path = { submission };
  const { items } = await listFindings(ctx, { path });
  const fixes = items.flatMap(({ fix }) => (fix ? [fix.id] : []));
  await createCorrections(ctx, { path, body: { version: 0, fixes } });
}

/** A first exchange about two of the rows in question. */
async function discuss(contextOf: (account: string) => OfficeContext, submission: string): Promise<void> {
  const { items } = await listFindings(contextOf('analyst'), { path: { submission } });
  const about = (rule: string) => items.find((finding) => finding.rule === rule)?.id;
  const say = (account: string, finding: string | undefined, audience: 'inside' | 'shared', body: string) =>
    createComment(contextOf(account), { path: { submission }, body: { finding, audience, body } });
  const trench = about('likely-below-optimistic');
  await say(
    'reviewer',
    trench,
    'inside',
    'The trench was let by the metre. Ask for the ground report before we agree.',
  );
  await say(
    'reviewer',
    trench,
    'shared',
    'Which of the two is meant: 8 as the best case, or 12 as the likely one?',
  );
  await say('scheduler', trench, 'shared', 'The two were typed in the wrong columns: 8 at best, 12 likely.');
  await say(
    'reviewer',
    about('loop'),
    'shared',
    'The slab waits for the falsework, and the falsework for the slab. Which link falls away?',
  );
}
