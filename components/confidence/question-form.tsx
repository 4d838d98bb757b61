'use client';

import { useState, type FormEvent } from 'react';
import { Button } from '@/components/ui/button';
import { DateText } from '@/components/ui/date-text';
import { Chip } from '@/components/ui/chip';
import { Field, Input } from '@/components/ui/field';
import { readQuestion, WAYS, type Asked, type Way } from './question';

const LABEL: Record<Way, string> = {
  date: 'Finished by the end of',
  days: 'Finished within so many working days',
  confidence: 'The date that is kept with a confidence of (%)',
};

/** Asks one of three questions; the answer changes with Enter or the button, not at every key. */
export function QuestionForm({ asked, onAsk }: { asked: Asked; onAsk: (asked: Asked) => void }) {
  const [draft, setDraft] = useState(asked);
  const [error, setError] = useState<string>();
  const ask = (event: FormEvent) => {
    event.preventDefault();
    const question = readQuestion(draft);
    setError(typeof question === 'string' ? question : undefined);
    if (typeof question !== 'string') onAsk(draft);
  };
  const choose = (way: Way) => {
    setError(undefined);
    setDraft({ way, value: way === asked.way ? asked.value : '' });
  };
  return (
    <form onSubmit={ask} noValidate className="flex flex-col gap-3">
      <div role="group" aria-label="What is asked" className="flex flex-wrap gap-2">
        {(Object.keys(WAYS) as Way[]).map((way) => (
          <Chip key={way} pressed={way === draft.way} onClick={() => choose(way)}>
            {WAYS[way]}
          </Chip>
        ))}
      </div>
      <Field label={LABEL[draft.way]} error={error} required>
        {(aria) => (
          <div className="flex flex-wrap items-center gap-2">
            <Input
              {...aria}
              key={draft.way}
              type={draft.way === 'date' ? 'date' : 'text'}
              inputMode={draft.way === 'date' ? undefined : 'decimal'}
              value={draft.value}
              onChange={(event) => setDraft({ ...draft, value: event.target.value })}
              className="max-w-56"
            />
            {draft.way === 'date' && <DateText value={draft.value} />}
            <Button type="submit">Answer</Button>
          </div>
        )}
      </Field>
    </form>
  );
}
