export { ruleById, RULES } from './registry';
export { renderMessage } from './render';
export type {
  AuditContext,
  Defect,
  Finding,
  Limit,
  MessageData,
  Rule,
  RuleBook,
  RuleMeta,
  RuleSetting,
} from './rule';
export { runAudit } from './run';
