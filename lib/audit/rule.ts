import type { Network, Tangle } from '@/lib/network';
import type { ActivityList } from '@/lib/schedule/activity-list';
import type { Fix } from '@/lib/schedule/edit';
import type { Weight } from '@/lib/schedule/weight';

/** Values put into a message; stored with the finding, so plain JSON. */
export type MessageData = Readonly<
  Record<string, string | number | boolean | null | readonly string[] | readonly number[]>
>;

/** A limit of a rule with its default; a rule book may set another. */
export interface Limit {
  readonly title: string;
  readonly unit: string;
  readonly default: number;
}

export interface RuleMeta {
  readonly weight: Weight;
  /** The defect in a few words, as a heading: "The best case is longer than the likely one". */
  readonly title: string;
  /** What it finds and why it matters, in plain sentences. */
  readonly about: string;
  /** The published source, or "common practice". */
  readonly source: string;
  /** By message id: a plain sentence made from the data. */
  readonly messages: Readonly<Record<string, (data: MessageData) => string>>;
}

/** What a check finds. */
export interface Defect {
  /** What it is about, stable from revision to revision: with the rule it is the finding's key. */
  readonly about: string;
  readonly message: string;
  readonly data: MessageData;
  /** Where this one weighs otherwise than the rule does. */
  readonly weight?: Weight;
  readonly activityId: string | null;
  readonly sheet: string | null;
  readonly row: number | null;
  /** Address, such as G23. */
  readonly cell: string | null;
  readonly fix?: Fix;
  /** Other honest fixes, likeliest first. */
  readonly alternatives?: readonly Fix[];
}

/** What every check is given; made once an audit. */
export interface AuditContext {
  readonly list: ActivityList;
  readonly network: Network;
  /** Strongly connected components with more than one activity, each with a shortest loop and the links to cut. */
  readonly tangles: readonly Tangle[];
  /** Indices of the links into and out of each activity (self-links and unknown IDs included where they have an end here). */
  readonly linksInto: readonly (readonly number[])[];
  readonly linksOutOf: readonly (readonly number[])[];
}

/** A rule of the audit: one file, whose name is its id. */
export interface Rule {
  readonly id: string;
  readonly meta: RuleMeta;
  readonly limits: Readonly<Record<string, Limit>>;
  check(context: AuditContext, limits: Readonly<Record<string, number>>): Defect[];
}

/** What a rule book says of one rule; what it leaves out stays as the rule has it. */
export interface RuleSetting {
  readonly off?: boolean;
  /** A defect that keeps the network from being computed weighs `blocks` whatever the book says. */
  readonly weight?: Weight;
  readonly limits?: Readonly<Record<string, number>>;
}

/** The rules and limits that a project is held to, by rule id. */
export type RuleBook = Readonly<Record<string, RuleSetting>>;

/** A defect with its rule, as it is stored. */
export interface Finding extends Defect {
  readonly rule: string;
  readonly weight: Weight;
  /** rule + what it is about + an ordinal where two are alike. */
  readonly key: string;
}
