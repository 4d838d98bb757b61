import type { Network } from '@/lib/network';
import type { ActivityList } from '@/lib/schedule/activity-list';
import { parseAddress } from '@/lib/schedule/cell';
import { type Weight, WEIGHTS } from '@/lib/schedule/weight';
import { makeContext } from './context';
import { RULES } from './registry';
import type { AuditContext, Defect, Finding, Rule, RuleBook, RuleSetting } from './rule';

function limitsOf(rule: Rule, setting: RuleSetting | undefined): Record<string, number> {
  const defaults = Object.entries(rule.limits).map(([id, limit]) => [id, limit.default]);
  return { ...Object.fromEntries(defaults), ...setting?.limits };
}

/** What keeps the network from being computed does so whatever a rule book says. */
function weightOf(rule: Rule, defect: Defect, setting: RuleSetting | undefined): Weight {
  const own = defect.weight ?? rule.meta.weight;
  return own === 'blocks' ? own : (setting?.weight ?? own);
}

function check(rule: Rule, context: AuditContext, setting: RuleSetting | undefined): Finding[] {
  if (setting?.off) return [];
  const seen = new Map<string, number>();
  return rule.check(context, limitsOf(rule, setting)).map((defect) => {
    const key = `${rule.id}|${defect.about}`;
    const ordinal = (seen.get(key) ?? 0) + 1;
    seen.set(key, ordinal);
    return {
      ...defect,
      rule: rule.id,
      weight: weightOf(rule, defect, setting),
      key: ordinal === 1 ? key : `${key}#${ordinal}`,
    };
  });
}

/** Findings by weight, then as the list runs: sheet, row, column; what is about the whole list comes first. */
function inOrder(list: ActivityList, findings: readonly Finding[]): Finding[] {
  const weights = Object.keys(WEIGHTS);
  const sheets = new Map(list.matching.map(({ sheet }, position) => [sheet, position]));
  const ranked = findings.map((finding) => ({
    finding,
    weight: weights.indexOf(finding.weight),
    sheet: finding.sheet === null ? -1 : (sheets.get(finding.sheet) ?? sheets.size),
    row: finding.row ?? 0,
    column: parseAddress(finding.cell ?? '')?.column ?? -1,
  }));
  ranked.sort(
    (one, other) =>
      one.weight - other.weight ||
      one.sheet - other.sheet ||
      one.row - other.row ||
      one.column - other.column,
  );
  return ranked.map(({ finding }) => finding);
}

/**
 * Audits a list: every rule over the list as it was read, so that a loop stops nothing. Pure, and linear in
 * activities and links but for a sort.
 * @param network the compiled list, where it is at hand
 * @param ruleBook the settings the project is held to; what it leaves out stays as the rules have it
 * @returns findings with keys that stay the same from revision to revision as long as the IDs do
 */
export function runAudit(list: ActivityList, network?: Network, ruleBook: RuleBook = {}): Finding[] {
  const context = makeContext(list, network);
  return inOrder(
    list,
    RULES.flatMap((rule) => check(rule, context, ruleBook[rule.id])),
  );
}
