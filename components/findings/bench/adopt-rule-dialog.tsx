'use client';

import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { useFormat, type Format } from '@/components/ui/locale';
import type { FindingView, FixView } from '@/lib/contract/submission';
import { fixText } from '../grid/texts';
import { effectRange } from '../outcome';
import { adoptable } from './fix-choice';

interface AdoptRuleDialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  findings: readonly FindingView[];
  rule: string;
  title: string;
  busy: boolean;
  onAdopt: (fixes: readonly string[]) => void;
}

/** As many as are listed one by one. */
const LISTED = 50;

/** What "adopt all of this rule" would do, before it does it. */
export function AdoptRuleDialog(props: AdoptRuleDialogProps) {
  const { open, onOpenChange, findings, rule, title, busy, onAdopt } = props;
  const format = useFormat();
  if (!open) return null;
  const fixes = adoptable(findings, rule);
  const chosen = new Set(fixes.map(({ id }) => id));
  const listed = findings.filter(({ fix }) => fix && chosen.has(fix.id));
  return (
    <Dialog
      open
      onOpenChange={onOpenChange}
      title={`Adopt ${format.plural(fixes.length, 'fix', 'fixes')} of one rule`}
      description={`${title} (${rule}). ${jointEffect(fixes, format)}`}
      footer={
        <>
          <Button busy={busy} disabled={fixes.length === 0} onClick={() => onAdopt([...chosen])}>
            {busy ? 'Adopting …' : `Adopt all ${format.count(fixes.length)}`}
          </Button>
          <Button variant="ghost" onClick={() => onOpenChange(false)}>
            Leave them
          </Button>
        </>
      }
    >
      <ul className="flex flex-col">
        {listed.slice(0, LISTED).map((finding) => (
          <li key={finding.id} className="flex gap-3 border-b border-hair py-1">
            <span className="w-16 shrink-0 text-slate">{finding.cell ?? '–'}</span>
            <span className="min-w-0 flex-1 truncate">
              {finding.activityName ?? finding.activityId ?? ''}
            </span>
            <span className="max-w-[50%] break-words">{fixText(finding)}</span>
          </li>
        ))}
      </ul>
      {listed.length > LISTED && (
        <p className="mt-2 text-slate">and {format.count(listed.length - LISTED)} more.</p>
      )}
    </Dialog>
  );
}

function jointEffect(fixes: readonly FixView[], format: Format): string {
  const one = 'They are adopted in one step, and can be undone in one.';
  const [only] = fixes;
  const range = effectRange(fixes);
  if (fixes.length === 1 && only?.effect) {
    return `The expected finish moves by ${format.dayDifference(only.effect.expectedDuration)}.`;
  }
  if (!range) return `What they do to the finish can be told once it can be computed. ${one}`;
  if (range.least === 0 && range.most === 0) return `None of them by itself moves the finish. ${one}`;
  return (
    `One by one they move the expected finish by ${format.dayDifference(range.least)} to ` +
    `${format.dayDifference(range.most)}; together they may do less or more, which the head shows at once. ${one}`
  );
}
