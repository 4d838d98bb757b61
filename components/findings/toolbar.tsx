'use client';

import { Search } from 'lucide-react';
import { useMemo, type ReactNode, type Ref } from 'react';
import { Chip } from '@/components/ui/chip';
import { Input, Select } from '@/components/ui/field';
import { useFormat } from '@/components/ui/locale';
import { WeightMark } from '@/components/ui/weight-mark';
import type { FindingView } from '@/lib/contract/submission';
import { FINDING_STATES, type FindingState } from '@/lib/schedule/weight';
import { countFindings, isFiltered, NO_FILTER, toggled, WEIGHT_NAMES, type FindingFilter } from './filter';
import { isOrder, ORDERS, type FindingOrder } from './order';

interface ToolbarProps {
  findings: readonly FindingView[];
  filter: FindingFilter;
  onFilter: (filter: FindingFilter) => void;
  order: FindingOrder;
  onOrder: (order: FindingOrder) => void;
  search: Ref<HTMLInputElement>;
  /** Stands at the right of the first line. */
  aside: ReactNode;
}

/** What is shown and in which order; every choice says how many it would show. */
export function Toolbar({ findings, filter, onFilter, order, onOrder, search, aside }: ToolbarProps) {
  const format = useFormat();
  const counts = useMemo(() => countFindings(findings), [findings]);
  const [rule = ''] = filter.rules;
  const [state = ''] = filter.states;
  return (
    <div role="group" aria-label="Which findings are shown" className="mb-2.5 flex flex-col gap-2">
      <div className="flex flex-wrap items-center gap-2">
        <Chip pressed={!isFiltered(filter)} onClick={() => onFilter(NO_FILTER)}>
          All {format.count(counts.all)}
        </Chip>
        {WEIGHT_NAMES.map((weight) => (
          <Chip
            key={weight}
            pressed={filter.weights.has(weight)}
            disabled={counts.weights[weight] === 0 && !filter.weights.has(weight)}
            onClick={() => onFilter({ ...filter, weights: toggled(filter.weights, weight) })}
          >
            <WeightMark weight={weight} /> {format.count(counts.weights[weight])}
          </Chip>
        ))}
        <div className="sm:ml-auto">{aside}</div>
      </div>
      <div className="flex flex-wrap items-center gap-2">
        <Picker
          label="Rule"
          value={rule}
          onPick={(value) => onFilter({ ...filter, rules: new Set(value === '' ? [] : [value]) })}
          options={[
            ['', 'Every rule'],
            ...counts.rules.map((known) => [known.rule, `${known.rule} (${String(known.count)})`] as const),
          ]}
        />
        <Picker
          label="State"
          value={state}
          onPick={(value) => onFilter({ ...filter, states: new Set(statesNamed(value)) })}
          options={[
            ['', 'Any state'],
            ...FINDING_STATES.filter((known) => counts.states[known] > 0 || filter.states.has(known)).map(
              (known) => [known, `${known} (${String(counts.states[known])})`] as const,
            ),
          ]}
        />
        <Picker
          label="Order"
          value={order}
          onPick={(value) => {
            if (isOrder(value)) onOrder(value);
          }}
          options={Object.entries(ORDERS)}
        />
        <SearchField filter={filter} onFilter={onFilter} field={search} />
      </div>
    </div>
  );
}

interface PickerProps {
  label: string;
  value: string;
  onPick: (value: string) => void;
  /** Value and name. */
  options: readonly (readonly [string, string])[];
}

function Picker({ label, value, onPick, options }: PickerProps) {
  return (
    <Select
      aria-label={label}
      className="min-h-8! w-auto! max-w-56"
      value={value}
      onChange={({ target }) => onPick(target.value)}
    >
      {options.map(([option, name]) => (
        <option key={option} value={option}>
          {name}
        </option>
      ))}
    </Select>
  );
}

function SearchField({
  filter,
  onFilter,
  field,
}: Pick<ToolbarProps, 'filter' | 'onFilter'> & { field: Ref<HTMLInputElement> }) {
  return (
    <div className="relative min-w-32 flex-1 sm:max-w-64">
      <Search aria-hidden="true" size={15} className="absolute top-2 left-2 text-slate" />
      <Input
        ref={field}
        type="search"
        aria-label="Search the findings"
        aria-keyshortcuts="/"
        placeholder="Search the findings"
        className="min-h-8! pl-7"
        value={filter.text}
        onChange={({ target }) => onFilter({ ...filter, text: target.value })}
        onKeyDown={(event) => {
          if (event.key === 'Escape' || event.key === 'Enter') event.currentTarget.blur();
        }}
      />
    </div>
  );
}

function statesNamed(value: string): FindingState[] {
  return FINDING_STATES.filter((state) => state === value);
}
