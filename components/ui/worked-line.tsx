'use client';

import { Popover } from 'radix-ui';
import type { ReactNode } from 'react';

/** How a number comes about, so that it can be checked by hand. */
export interface Working {
  /** What the number is: "Expected finish". */
  title: string;
  /** In symbols: "z = (x − expected) / deviation". */
  formula: ReactNode;
  /** The same with this schedule's figures: "z = (116.5 − 118.0) / 4.98". */
  figures: ReactNode;
  result: ReactNode;
  /** The published source of the method. */
  source: ReactNode;
  note?: ReactNode;
}

/** A number with a dotted underline, which opens to its working. */
export function WorkedLine({ children, working }: { children: ReactNode; working: Working }) {
  return (
    <Popover.Root>
      <Popover.Trigger className="worked inline text-left font-[inherit] hover:border-solid">
        {children}
        <span className="sr-only">, show how it was worked out</span>
      </Popover.Trigger>
      <Popover.Portal>
        <Popover.Content
          sideOffset={6}
          collisionPadding={12}
          aria-label={`${working.title}, worked out`}
          className="z-40 max-h-(--radix-popover-content-available-height) w-96 max-w-[calc(100vw-24px)] overflow-auto border border-t-2 border-hair border-t-ink bg-leaf p-4 text-sm text-ink shadow-lift"
        >
          <WorkingTable working={working} />
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}

/** The working itself, for where it stands open on the page. */
export function WorkingTable({ working }: { working: Working }) {
  return (
    <>
      <p className="mb-2 font-semibold">{working.title}</p>
      <dl className="grid grid-cols-[auto_1fr] gap-x-3 gap-y-1">
        <Row term="Formula">{working.formula}</Row>
        <Row term="Put in">{working.figures}</Row>
        <Row term="Result">
          <span className="font-semibold">{working.result}</span>
        </Row>
        <Row term="Source">{working.source}</Row>
      </dl>
      {working.note && <p className="mt-2 text-slate">{working.note}</p>}
    </>
  );
}

function Row({ term, children }: { term: string; children: ReactNode }) {
  return (
    <>
      <dt className="text-slate">{term}</dt>
      <dd className="min-w-0">{children}</dd>
    </>
  );
}
