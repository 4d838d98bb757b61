import { z } from 'zod';
import { weight } from './shared';

/** GET /rules: what the audit looks for, for the pages that explain it. */
export const ruleView = z.object({
  id: z.string(),
  title: z.string(),
  weight,
  /** What it finds and why it matters. */
  about: z.string(),
  /** The published source, or "common practice". */
  source: z.string(),
  limits: z.array(z.object({ id: z.string(), title: z.string(), unit: z.string(), value: z.number() })),
});
export type RuleView = z.infer<typeof ruleView>;
