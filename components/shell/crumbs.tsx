'use client';

import Link from 'next/link';
import { createContext, use, useEffect, useMemo, useState, type ReactNode } from 'react';

export interface Crumb {
  readonly label: string;
  /** Absent at the last one, where the reader is. */
  readonly href?: string;
}

const TrailContext = createContext<readonly Crumb[]>([]);
const SetTrailContext = createContext<(trail: readonly Crumb[]) => void>(() => undefined);

export function CrumbsProvider({ children }: { children: ReactNode }) {
  const [trail, setTrail] = useState<readonly Crumb[]>([]);
  return (
    <SetTrailContext value={setTrail}>
      <TrailContext value={trail}>{children}</TrailContext>
    </SetTrailContext>
  );
}

/**
 * Says where a page stands, below its office: the masthead shows it, and the window's title names it from
 * the page outwards. Rendered once by each page or by the layout of several.
 */
export function Crumbs({ trail }: { trail: readonly Crumb[] }) {
  const setTrail = use(SetTrailContext);
  const text = JSON.stringify(trail);
  const stable = useMemo(() => JSON.parse(text) as readonly Crumb[], [text]);
  useEffect(() => {
    setTrail(stable);
    document.title = [...stable.map(({ label }) => label).reverse(), 'Plumbrow'].join(' · ');
    return () => setTrail([]);
  }, [stable, setTrail]);
  return null;
}

/** The trail as it stands in the masthead. On a narrow screen the office gives way to what is nearer. */
export function CrumbTrail({ office }: { office: Crumb }) {
  const trail = [office, ...use(TrailContext)];
  return (
    <nav aria-label="Where you are" className="min-w-0 flex-1">
      <ol className="flex min-w-0 items-center text-slate">
        {trail.map(({ label, href }, index) => {
          const last = index === trail.length - 1;
          const near = index >= trail.length - 2;
          return (
            <li
              key={`${String(index)} ${label}`}
              className={`items-center ${near ? 'flex min-w-0' : 'hidden min-w-0 md:flex'} ${last ? 'max-w-[72%] shrink-0 md:max-w-full' : ''}`}
            >
              {index > 0 && (
                <span
                  aria-hidden="true"
                  className={`px-2 ${near && index === trail.length - 2 ? 'max-md:hidden' : ''}`}
                >
                  /
                </span>
              )}
              {last || !href ? (
                <span aria-current={last ? 'page' : undefined} className="truncate font-semibold text-ink">
                  {label}
                </span>
              ) : (
                <Link
                  href={href}
                  className="truncate text-slate no-underline hover:text-cord hover:underline"
                >
                  {label}
                </Link>
              )}
            </li>
          );
        })}
      </ol>
    </nav>
  );
}
