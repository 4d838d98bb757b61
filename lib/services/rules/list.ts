import { RULES } from '@/lib/audit';
import type { OfficeContext } from '@/lib/access/context';
import { requirePermission } from '@/lib/access/permissions';
import type { RuleView } from '@/lib/contract/rule';

export async function listRules(ctx: OfficeContext): Promise<{ items: RuleView[] }> {
  requirePermission(ctx, 'rules:read');
  const items = RULES.map(({ id, meta, limits }) => {
    const { title, weight, about, source } = meta;
    const values = Object.entries(limits).map(([limit, { title: named, unit, default: value }]) => ({
      id: limit,
      title: named,
      unit,
      value,
    }));
    return { id, title, weight, about, source, limits: values };
  });
  return { items };
}
