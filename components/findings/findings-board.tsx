'use client';

import { useMemo, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { classes } from '@/components/ui/classes';
import { useHotkeys } from '@/components/ui/hotkeys';
import { EmptyState } from '@/components/ui/states';
import { toast } from '@/components/ui/toast';
import type { FindingView, SubmissionView } from '@/lib/contract/submission';
import { AdoptRuleDialog } from './bench/adopt-rule-dialog';
import { Bench } from './bench/bench';
import { BenchFrame } from './bench/bench-frame';
import { adoptable } from './bench/fix-choice';
import { TroubleNote } from './bench/trouble-note';
import { NO_FILTER } from './filter';
import { FindingsGrid } from './grid/findings-grid';
import { haveSeveralSheets } from './place-text';
import { placeOf } from './selection';
import { Toolbar } from './toolbar';
import { useFindingsView } from './use-findings-view';
import { useSteps } from './use-steps';
import { WorkbookLinks } from './workbook-links';

interface FindingsBoardProps {
  office: string;
  view: SubmissionView;
  findings: readonly FindingView[];
}

/** The grid of findings, and the bench with the one that is selected. */
export function FindingsBoard({ office, view: submission, findings }: FindingsBoardProps) {
  const view = useFindingsView(findings);
  const steps = useSteps(office, submission.id);
  const search = useRef<HTMLInputElement>(null);
  const heading = useRef<HTMLHeadingElement>(null);
  const list = useRef<HTMLElement>(null);
  const [sheetOpen, setSheetOpen] = useState(false);
  const [adoptingRule, setAdoptingRule] = useState(false);
  const severalSheets = useMemo(() => haveSeveralSheets(findings), [findings]);
  const { selected } = view;
  const rule = selected?.rule;
  const ofRule = useMemo(() => (rule ? adoptable(findings, rule).length : 0), [findings, rule]);

  const undo = async () => {
    if (await steps.undoLast()) return;
    if (selected?.state === 'corrected') await steps.undoFinding(selected);
    else toast('There is nothing to undo here.');
  };
  useHotkeys('Findings', [
    { key: 'j', does: 'Next finding', repeats: true, run: () => view.step(1) },
    { key: 'k', does: 'Previous finding', repeats: true, run: () => view.step(-1) },
    { key: 'z', does: 'Undo the last step', run: () => void undo() },
    { key: '/', does: 'Search the findings', run: () => search.current?.focus() },
  ]);

  const place = placeOf(view.ids, selected?.id ?? null);
  return (
    <div className="grid items-start gap-5 xl:grid-cols-[minmax(0,1fr)_372px]">
      <section
        ref={list}
        aria-label="Findings"
        className={classes('min-w-0', sheetOpen && 'max-md:pb-[60dvh] md:max-xl:pr-96')}
      >
        <Toolbar
          findings={findings}
          filter={view.filter}
          onFilter={view.setFilter}
          order={view.order}
          onOrder={view.setOrder}
          search={search}
          aside={<WorkbookLinks office={office} view={submission} />}
        />
        {steps.trouble && steps.trouble.finding !== selected?.id && (
          <TroubleNote trouble={steps.trouble} onDismiss={steps.forgetTrouble} />
        )}
        {view.shown.length > 0 ? (
          <FindingsGrid
            findings={view.shown}
            selected={selected?.id ?? null}
            order={view.order}
            severalSheets={severalSheets}
            onSelect={view.select}
            onOpen={(id, by) => {
              view.select(id);
              setSheetOpen(true);
              if (by === 'key') requestAnimationFrame(() => heading.current?.focus());
            }}
            onOrder={view.setOrder}
          />
        ) : (
          <NoneShown onClear={() => view.setFilter(NO_FILTER)} />
        )}
        <p className="sr-only" role="status">
          {place && selected && `Finding ${String(place.at)} of ${String(place.of)}: ${selected.title}.`}
        </p>
        <p className="sr-only" role="status">
          {steps.said}
        </p>
      </section>
      {selected && (
        <BenchFrame
          title={selected.title}
          open={sheetOpen}
          onClose={() => {
            setSheetOpen(false);
            focusSelectedRow(list.current);
          }}
          heading={heading}
        >
          <Bench
            key={selected.id}
            office={office}
            submission={submission}
            finding={selected}
            ofRule={ofRule}
            steps={steps}
            onAdoptRule={() => setAdoptingRule(true)}
          />
        </BenchFrame>
      )}
      {selected && (
        <AdoptRuleDialog
          open={adoptingRule}
          onOpenChange={setAdoptingRule}
          findings={findings}
          rule={selected.rule}
          title={selected.title}
          busy={steps.busy}
          onAdopt={(fixes) => void steps.adoptAll(fixes).then(() => setAdoptingRule(false))}
        />
      )}
    </div>
  );
}

/** From the bench back to the row it belongs to. */
function focusSelectedRow(list: HTMLElement | null) {
  list?.querySelector<HTMLElement>('[role="row"][aria-selected="true"] [role="gridcell"]')?.focus();
}

function NoneShown({ onClear }: { onClear: () => void }) {
  return (
    <EmptyState
      title="No finding is like that"
      action={
        <Button variant="ghost" onClick={onClear}>
          Show all findings
        </Button>
      }
    >
      The filter leaves none over. The findings themselves are still there.
    </EmptyState>
  );
}
