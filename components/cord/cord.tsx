'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { useEffect, useRef } from 'react';
import type { SubmissionView } from '@/lib/contract/submission';
import { classes } from '@/components/ui/classes';
import { useFormat } from '@/components/ui/locale';
import { STOP_NAMES, STOPS, stopAt, stopNote, stopPath } from './stops';

/** From the masthead's edge to the first knot, and from knot to knot; px. */
const FIRST = 50;
const STEP = 76;
const HEIGHT = FIRST + STEP * (STOPS.length - 1);

interface CordProps {
  office: string;
  submission: string;
  /** Null while it is being fetched: the places are there already. */
  view: SubmissionView | null;
}

/** The plumb line with its five places; the bob hangs at the present one. On a narrow screen it lies along the top. */
export function Cord({ office, submission, view }: CordProps) {
  const { locale } = useFormat();
  const here = stopAt(usePathname());
  const nav = useRef<HTMLElement>(null);
  useEffect(() => showPresent(nav.current), [here]);
  return (
    <nav
      ref={nav}
      aria-label="Places of this submission"
      className="relative [scrollbar-width:none] max-lg:overflow-x-auto max-lg:border-b max-lg:border-hair lg:w-33 lg:shrink-0 lg:pl-6 print:hidden"
    >
      <PlumbLine at={STOPS.indexOf(here)} />
      <ol className="relative flex w-max min-w-full px-4 sm:px-6 lg:block lg:w-auto lg:min-w-0 lg:px-0 lg:pt-7 lg:pl-7">
        {STOPS.map((stop) => (
          <li key={stop} className="lg:h-19 lg:pt-2.5">
            <Link
              href={stopPath(office, submission, stop)}
              aria-current={stop === here ? 'page' : undefined}
              className="group relative block min-h-11 py-1 pr-5 no-underline max-lg:pt-6 lg:pr-0"
            >
              <LyingKnot here={stop === here} first={stop === STOPS[0]} />
              <span
                className={classes(
                  'block font-semibold group-hover:underline',
                  stop === here ? 'text-cord' : 'text-ink',
                )}
              >
                {STOP_NAMES[stop]}
              </span>
              <span className="block whitespace-nowrap text-slate">
                {view ? stopNote(stop, view, locale) : '…'}
              </span>
            </Link>
          </li>
        ))}
      </ol>
    </nav>
  );
}

/** Where the cord lies along the top and is longer than the screen, the present place is brought into it. */
function showPresent(nav: HTMLElement | null) {
  const place = nav?.querySelector<HTMLElement>('[aria-current]')?.closest('li');
  if (!nav || !place) return;
  const { offsetLeft, offsetWidth } = place;
  if (offsetLeft < nav.scrollLeft || offsetLeft + offsetWidth > nav.scrollLeft + nav.clientWidth) {
    nav.scrollLeft = offsetLeft - (nav.clientWidth - offsetWidth) / 2;
  }
}

/** The line from the masthead down to the bob is drawn in ink, what lies below it as a hair. */
function PlumbLine({ at }: { at: number }) {
  const bob = FIRST + STEP * at;
  return (
    <svg
      width="24"
      height={HEIGHT + 40}
      viewBox={`0 0 24 ${String(HEIGHT + 40)}`}
      aria-hidden="true"
      className="absolute top-0 left-6 max-lg:hidden"
    >
      <path d={`M11 0V${String(HEIGHT)}`} stroke="var(--hair)" strokeWidth="1.5" />
      {STOPS.map((stop, index) => (
        <circle
          key={stop}
          cx="11"
          cy={FIRST + STEP * index}
          r="4"
          fill="var(--lime)"
          stroke="var(--slate)"
          strokeWidth="1.5"
        />
      ))}
      <path
        d="M11 0V1"
        stroke="var(--ink)"
        strokeWidth="1.5"
        className="transition-transform duration-200 ease-out motion-reduce:transition-none"
        style={{ transform: `scaleY(${String(bob - 6)})` }}
        vectorEffect="non-scaling-stroke"
      />
      <g
        className="transition-transform duration-200 ease-out motion-reduce:transition-none"
        style={{ transform: `translateY(${String(bob)}px)` }}
      >
        <path d="M4 -8h14l-2 9-5 11-5-11z" fill="var(--cord)" stroke="var(--lime)" strokeWidth="1.5" />
      </g>
    </svg>
  );
}

/** A place on the line as it lies along the top: a knot, or the bob hanging from it. */
function LyingKnot({ here, first }: { here: boolean; first: boolean }) {
  return (
    <svg
      aria-hidden="true"
      className="absolute top-0 left-0 h-6 w-full overflow-visible lg:hidden"
      preserveAspectRatio="none"
    >
      <line x1={first ? 8 : 0} y1="8" x2="100%" y2="8" stroke="var(--hair)" strokeWidth="1.5" />
      {here ? (
        <path d="M1 7h14l-2 6-5 9-5-9z" fill="var(--cord)" />
      ) : (
        <circle cx="8" cy="8" r="4" fill="var(--lime)" stroke="var(--slate)" strokeWidth="1.5" />
      )}
    </svg>
  );
}
