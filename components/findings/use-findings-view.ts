'use client';

import { useSearchParams } from 'next/navigation';
import { useEffect, useEffectEvent, useMemo, useRef, useState } from 'react';
import type { FindingView } from '@/lib/contract/submission';
import { filterFromQuery, filterToQuery, matches, NO_FILTER, type FindingFilter } from './filter';
import { isOrder, keepPlaces, ordered, type FindingOrder } from './order';
import { neighbour, reselect } from './selection';

const DEFAULT_ORDER: FindingOrder = 'costliest';
/** The address follows the page after this; the router need not hear of each key. */
const SETTLED_MS = 300;

/** What of the findings is shown, in which order, and which one is selected; the address remembers it. */
export function useFindingsView(findings: readonly FindingView[]) {
  const query = useSearchParams();
  const [filter, setFilter] = useState(() => filterFromQuery(query));
  const [order, setOrder] = useState(() => orderFrom(query));
  const placed = usePlaced(findings, order);
  const shown = useMemo(() => placed.filter(matches(filter)), [placed, filter]);
  const ids = useMemo(() => shown.map(({ id }) => id), [shown]);
  const linked = query.get('finding');
  const [selected, setSelected] = useSelection(ids, linked);
  useAddress({ filter, order, selected }, linked, (id) => {
    // A link to a finding shows it, whatever was filtered before.
    if (!ids.includes(id)) setFilter(NO_FILTER);
    setSelected(id);
  });

  return {
    filter,
    setFilter,
    order,
    setOrder,
    shown,
    ids,
    selected: useMemo(() => shown.find(({ id }) => id === selected) ?? null, [shown, selected]),
    select: setSelected,
    step: (by: 1 | -1) => setSelected(neighbour(ids, selected, by)),
  };
}

function orderFrom(query: URLSearchParams): FindingOrder {
  const order = query.get('order');
  return isOrder(order) ? order : DEFAULT_ORDER;
}

/** In order as of when that order was chosen; what changes afterwards stays in its place. */
function usePlaced(findings: readonly FindingView[], order: FindingOrder): readonly FindingView[] {
  const [places, setPlaces] = useState(() => placesIn(findings, order));
  if (places.order !== order) setPlaces(placesIn(findings, order));
  return useMemo(() => keepPlaces(findings, places.ids), [findings, places]);
}

function placesIn(findings: readonly FindingView[], order: FindingOrder) {
  return { order, ids: ordered(findings, order).map(({ id }) => id) };
}

/** Follows the list as it changes under it. */
function useSelection(
  ids: readonly string[],
  first: string | null,
): [string | null, (id: string | null) => void] {
  const [selected, setSelected] = useState(first);
  const [seen, setSeen] = useState<readonly string[]>([]);
  if (ids !== seen) {
    setSeen(ids);
    setSelected(reselect(seen, ids, selected));
  }
  return [selected, setSelected];
}

interface Shown {
  readonly filter: FindingFilter;
  readonly order: FindingOrder;
  readonly selected: string | null;
}

/**
 * Writes into the address what is shown, so that it can be reloaded, gone back to and sent to a colleague;
 * calls `follow` where a link leads to another finding.
 */
function useAddress({ filter, order, selected }: Shown, linked: string | null, follow: (id: string) => void) {
  // Our own writing comes back as the address' finding, and is no link.
  const written = useRef(linked);
  const onLink = useEffectEvent((id: string) => follow(id));
  useEffect(() => {
    if (linked !== null && linked !== written.current) onLink(linked);
    written.current = linked;
  }, [linked]);

  useEffect(() => {
    const timer = setTimeout(() => {
      const query = filterToQuery(filter);
      if (order !== DEFAULT_ORDER) query.set('order', order);
      if (selected) query.set('finding', selected);
      const search = query.size > 0 ? `?${query.toString()}` : '';
      if (search === window.location.search) return;
      written.current = selected;
      window.history.replaceState(null, '', window.location.pathname + search);
    }, SETTLED_MS);
    return () => clearTimeout(timer);
  }, [filter, order, selected]);
}
