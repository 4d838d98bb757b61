'use client';

import Link from 'next/link';
import { Crumbs } from '@/components/shell/crumbs';
import { useOfficeView } from '@/components/shell/office-context';
import { Page } from '@/components/shell/page';
import { Panel } from '@/components/ui/panel';
import { EmptyState, ErrorState, Loading } from '@/components/ui/states';
import { WeightMark } from '@/components/ui/weight-mark';
import { useRules } from '@/lib/client/rules';
import type { RuleView } from '@/lib/contract/rule';
import { WEIGHTS, type Weight } from '@/lib/schedule/weight';

const ORDER = Object.keys(WEIGHTS) as Weight[];

/** What the audit looks for, by weight. */
export function RulesPage() {
  const { slug } = useOfficeView();
  const rules = useRules(slug);
  return (
    <Page
      title="Rules of the audit"
      sub="Each activity list is held against these. A finding names the rule, and the rule names its published source."
      narrow
    >
      <Crumbs trail={[{ label: 'Rules' }]} />
      {rules.isPending && <Loading label="Fetching the rules" rows={6} />}
      {rules.error && !rules.data && <ErrorState error={rules.error} retry={() => void rules.refetch()} />}
      {rules.data?.length === 0 && <EmptyState title="No rule is in force." />}
      <div className="flex flex-col gap-4">
        {ORDER.map((weight) => {
          const held = rules.data?.filter((rule) => rule.weight === weight) ?? [];
          return held.length > 0 && <RuleGroup key={weight} weight={weight} rules={held} />;
        })}
      </div>
    </Page>
  );
}

function RuleGroup({ weight, rules }: { weight: Weight; rules: readonly RuleView[] }) {
  const { slug } = useOfficeView();
  return (
    <Panel title={<WeightMark weight={weight} />} sub={`What they find means: ${WEIGHTS[weight]}.`}>
      <ul>
        {rules.map((rule) => (
          <li key={rule.id} className="border-t border-hair py-2">
            <Link href={`/${slug}/rules/${rule.id}`} className="font-semibold">
              {rule.title}
            </Link>
            <span className="text-slate"> · {rule.id}</span>
          </li>
        ))}
      </ul>
    </Panel>
  );
}

/** One rule: what it finds, why that matters, where it comes from, its limits. */
export function RulePage({ id }: { id: string }) {
  const { slug } = useOfficeView();
  const rules = useRules(slug);
  const rule = rules.data?.find((candidate) => candidate.id === id);
  const trail = [{ label: 'Rules', href: `/${slug}/rules` }, { label: rule?.title ?? id }];
  return (
    <Page title={rule?.title ?? id} sub={rule && <RuleHead rule={rule} />} narrow>
      <Crumbs trail={trail} />
      {rules.isPending && <Loading label="Fetching the rule" />}
      {rules.error && !rules.data && <ErrorState error={rules.error} retry={() => void rules.refetch()} />}
      {rules.data && !rule && (
        <EmptyState
          title={`There is no rule “${id}”.`}
          action={<Link href={`/${slug}/rules`}>See all the rules</Link>}
        />
      )}
      {rule && <RuleText rule={rule} />}
    </Page>
  );
}

function RuleHead({ rule }: { rule: RuleView }) {
  return (
    <p>
      <WeightMark weight={rule.weight} />: {WEIGHTS[rule.weight]} · {rule.id}
    </p>
  );
}

function RuleText({ rule }: { rule: RuleView }) {
  return (
    <Panel bench>
      <div className="flex max-w-prose flex-col gap-4 text-base">
        {rule.about.split(/\n{2,}/).map((paragraph) => (
          <p key={paragraph}>{paragraph}</p>
        ))}
        <div>
          <h2 className="text-sm font-semibold text-slate">Source</h2>
          <p>{rule.source}</p>
        </div>
        {rule.limits.length > 0 && (
          <div>
            <h2 className="text-sm font-semibold text-slate">Limits</h2>
            <ul>
              {rule.limits.map(({ id, title, unit, value }) => (
                <li key={id}>
                  {title}: {value} {unit}
                </li>
              ))}
            </ul>
          </div>
        )}
      </div>
    </Panel>
  );
}
