import { ruleById } from './registry';
import type { MessageData } from './rule';

/**
 * The sentence of a finding, from its rule, its message id and its data: the one place where sentences are
 * made. A finding of a rule that is no more says so.
 */
export function renderMessage(rule: string, message: string, data: MessageData): string {
  const template = ruleById(rule)?.meta.messages[message];
  return template ? template(data) : `This was found by the rule “${rule}”, which is no longer in use.`;
}
