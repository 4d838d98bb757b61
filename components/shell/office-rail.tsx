'use client';

import Link from 'next/link';
import { useSelectedLayoutSegments } from 'next/navigation';
import { useMay, useOfficeView } from './office-context';
import { PLACES } from './places';

/** The places of the office hang from the masthead; the bob hangs at the present one. */
export function OfficeRail() {
  const { slug } = useOfficeView();
  const may = useMay();
  const [current = null] = useSelectedLayoutSegments();
  // A submission has its own cord.
  if (current === 'submissions') return null;
  return (
    <nav aria-label="Places of the office" className="px-4 sm:px-6 print:hidden">
      <ul className="flex flex-wrap gap-x-5 sm:gap-x-7">
        {PLACES.filter(({ permission }) => may(permission)).map(({ segment, label }) => {
          const here = segment === current;
          return (
            <li key={label}>
              <Link
                href={segment ? `/${slug}/${segment}` : `/${slug}`}
                aria-current={here ? 'page' : undefined}
                className={`flex min-h-9 items-end gap-2 pb-1 no-underline hover:underline ${here ? 'font-semibold text-cord' : 'text-ink'}`}
              >
                <Hanging here={here} />
                {label}
              </Link>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}

function Hanging({ here }: { here: boolean }) {
  return (
    <svg width="12" height="32" viewBox="0 0 12 32" aria-hidden="true" className="-mb-1 shrink-0 self-start">
      {here ? (
        <>
          <path d="M6 0v15" stroke="var(--ink)" strokeWidth="1.5" />
          <path d="M1 14h10l-1.6 6L6 28l-3.4-8z" fill="var(--cord)" />
        </>
      ) : (
        <>
          <path d="M6 0v17" stroke="var(--hair)" strokeWidth="1.5" />
          <circle cx="6" cy="21" r="3.25" fill="var(--lime)" stroke="var(--slate)" strokeWidth="1.5" />
        </>
      )}
    </svg>
  );
}
