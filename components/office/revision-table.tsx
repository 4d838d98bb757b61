'use client';

import Link from 'next/link';
import { OpenCounts } from '@/components/desk/open-counts';
import { useOfficeView } from '@/components/shell/office-context';
import { DateText } from '@/components/ui/date-text';
import { useFormat } from '@/components/ui/locale';
import { StateWord } from '@/components/ui/state-word';
import { Table, Td, Th } from '@/components/ui/table';
import type { Figures, SubmissionView } from '@/lib/contract/submission';

/** Revision by revision: findings, and the figures as received → as corrected. */
export function RevisionTable({ revisions }: { revisions: readonly SubmissionView[] }) {
  return (
    <Table label="Table of the revisions">
      <thead>
        <tr>
          <Th>Revision</Th>
          <Th>Came in</Th>
          <Th numeric>Activities</Th>
          <Th>Findings open</Th>
          <Th numeric>Expected finish</Th>
          <Th numeric>Chance of target</Th>
        </tr>
      </thead>
      <tbody>
        {revisions.map((revision) => (
          <RevisionRow key={revision.id} revision={revision} />
        ))}
      </tbody>
    </Table>
  );
}

function RevisionRow({ revision }: { revision: SubmissionView }) {
  const { slug } = useOfficeView();
  const format = useFormat();
  const { received, corrected } = revision.figures;
  const days = (figures: Figures) =>
    figures.expectedDuration === null ? null : format.days(figures.expectedDuration);
  const chance = (figures: Figures) =>
    figures.chanceOfTarget === null ? null : format.percent(figures.chanceOfTarget);
  return (
    <tr>
      <Td>
        <Link href={`/${slug}/submissions/${revision.id}`} className="font-semibold whitespace-nowrap">
          Rev {revision.revision}
        </Link>
        <span className="block">
          <StateWord state={revision.status} />
        </span>
      </Td>
      <Td>
        <DateText value={revision.receivedAt.slice(0, 10)} />
        <span className="block text-slate">{revision.receivedBy}</span>
      </Td>
      <Td numeric>{format.count(revision.rows.activities)}</Td>
      <Td>
        <OpenCounts open={revision.open} />
      </Td>
      <Td numeric>
        <TwoStates received={days(received)} corrected={days(corrected)} />
        {corrected.finish && (
          <span className="block text-slate">
            <DateText value={corrected.finish} />
          </span>
        )}
      </Td>
      <Td numeric>
        <TwoStates received={chance(received)} corrected={chance(corrected)} none="–" />
      </Td>
    </tr>
  );
}

/** The two states in a table's cell: one value where they agree. */
function TwoStates({
  received,
  corrected,
  none = 'not computable',
}: {
  received: string | null;
  corrected: string | null;
  none?: string;
}) {
  if (received === corrected) return <>{corrected ?? none}</>;
  return (
    <>
      <span className="sr-only">As received </span>
      <del className="was">{received ?? none}</del>
      <span aria-hidden="true"> → </span>
      <span className="sr-only">, as corrected </span>
      <ins className="now no-underline">{corrected ?? none}</ins>
    </>
  );
}
