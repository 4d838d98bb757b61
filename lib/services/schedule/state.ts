import { setImmediate } from 'node:timers/promises';
import { type Finding, runAudit } from '@/lib/audit';
import { analyse, compile, type Analysis, type Network } from '@/lib/network';
import type { ActivityList, ReadingOptions } from '@/lib/schedule/activity-list';
import type { Matching } from '@/lib/schedule/field';
import type { Sheet } from '@/lib/schedule/sheet';
import { refusing } from '@/lib/services/intake/upload';
import { readActivityList } from '@/parsers';

/** A submission's list in one of its states, read and computed. */
export interface ReadState {
  readonly sheets: readonly Sheet[];
  readonly list: ActivityList;
  readonly network: Network;
  readonly findings: readonly Finding[];
  /** Whatever the findings say: see `computed`. */
  readonly analysis: Analysis;
}

/** How a submission's sheets are read. */
export interface Reading {
  readonly matching: Matching;
  readonly reading: ReadingOptions;
}

/** Reads, audits and computes; lets other requests in between the steps. */
export async function readState(sheets: readonly Sheet[], how: Reading): Promise<ReadState> {
  const list = refusing(() => readActivityList(sheets, how.matching, how.reading));
  await setImmediate();
  const network = compile(list);
  const findings = runAudit(list, network);
  await setImmediate();
  return { sheets, list, network, findings, analysis: analyse(network) };
}

export function blockingOf(state: ReadState): readonly Finding[] {
  return state.findings.filter((finding) => finding.weight === 'blocks');
}

/** The analysis where no finding stands in its way; else null. */
export function computed(state: ReadState): Extract<Analysis, { computable: true }> | null {
  return state.analysis.computable && blockingOf(state).length === 0 ? state.analysis : null;
}

/** Loops by the IDs of their activities. */
export function loopsOf({ analysis, list }: ReadState): string[][] {
  if (analysis.computable) return [];
  return analysis.tangles.map(({ loop }) => loop.map((index) => list.activities[index]?.id ?? ''));
}
