import type { Rule } from './rule';
import { rule as ambiguousNumber } from './rules/ambiguous-number';
import { rule as copiedSpread } from './rules/copied-spread';
import { rule as detachedGroup } from './rules/detached-group';
import { rule as errorCell } from './rules/error-cell';
import { rule as headingLink } from './rules/heading-link';
import { rule as hiddenRow } from './rules/hidden-row';
import { rule as likelyBelowOptimistic } from './rules/likely-below-optimistic';
import { rule as loop } from './rules/loop';
import { rule as milestoneWithDuration } from './rules/milestone-with-duration';
import { rule as missingEstimate } from './rules/missing-estimate';
import { rule as missingId } from './rules/missing-id';
import { rule as missingName } from './rules/missing-name';
import { rule as negativeEstimate } from './rules/negative-estimate';
import { rule as noSpread } from './rules/no-spread';
import { rule as openFinish } from './rules/open-finish';
import { rule as openStart } from './rules/open-start';
import { rule as pessimisticBelowLikely } from './rules/pessimistic-below-likely';
import { rule as refusedRow } from './rules/refused-row';
import { rule as repeatedId } from './rules/repeated-id';
import { rule as repeatedLink } from './rules/repeated-link';
import { rule as repeatedName } from './rules/repeated-name';
import { rule as selfLink } from './rules/self-link';
import { rule as unitAssumed } from './rules/unit-assumed';
import { rule as unknownPredecessor } from './rules/unknown-predecessor';
import { rule as unreadableEstimate } from './rules/unreadable-estimate';
import { rule as unreadablePredecessor } from './rules/unreadable-predecessor';

/** Every rule, in the order in which findings of one weight and one row are listed. */
export const RULES: readonly Rule[] = [
  repeatedId,
  missingId,
  unknownPredecessor,
  unreadablePredecessor,
  selfLink,
  loop,
  repeatedLink,
  openStart,
  openFinish,
  detachedGroup,
  missingEstimate,
  unreadableEstimate,
  negativeEstimate,
  likelyBelowOptimistic,
  pessimisticBelowLikely,
  noSpread,
  copiedSpread,
  errorCell,
  ambiguousNumber,
  unitAssumed,
  hiddenRow,
  headingLink,
  milestoneWithDuration,
  missingName,
  repeatedName,
  refusedRow,
];

const BY_ID = new Map(RULES.map((rule) => [rule.id, rule]));

export const ruleById = (id: string) => BY_ID.get(id);
