'use client';

import { useId, useState, type FormEvent, type KeyboardEvent, type Ref } from 'react';
import { useOfficeView } from '@/components/shell/office-context';
import { Button } from '@/components/ui/button';
import { classes } from '@/components/ui/classes';
import { Textarea } from '@/components/ui/field';
import { Kbd } from '@/components/ui/kbd';
import { useAddComment, type Audience } from '@/lib/client/comments';
import { ClientError, sentenceOf } from '@/lib/client/error';
import { AUDIENCES, audiencesFor } from './audience';
import { useDraft } from './drafts';

interface ComposerProps {
  office: string;
  submission: string;
  finding: string;
  field: Ref<HTMLTextAreaElement>;
}

/** Writes a comment on a finding, for the office alone or for the contractor as well. */
export function Composer({ office, submission, finding, field }: ComposerProps) {
  const { me } = useOfficeView();
  const audiences = audiencesFor(me.role);
  const [audience, setAudience] = useState<Audience>(audiences[0] ?? 'shared');
  const draft = useDraft(`${submission}/${finding}`);
  const add = useAddComment(office, submission);
  const label = useId();

  const send = () => {
    const { text } = draft;
    if (add.isPending || text.trim() === '') return;
    add.mutate({ body: text.trim(), finding, audience }, { onSuccess: () => draft.sent(text) });
  };
  const onKey = (event: KeyboardEvent<HTMLTextAreaElement>) => {
    if (event.key === 'Escape') event.currentTarget.blur();
    if (event.key === 'Enter' && (event.ctrlKey || event.metaKey)) send();
  };
  return (
    <form
      className="mt-3 flex flex-col gap-2"
      onSubmit={(event: FormEvent) => {
        event.preventDefault();
        send();
      }}
    >
      <label id={label} htmlFor={`${label}-text`} className="flex items-center gap-2">
        Write a comment <Kbd inherit>c</Kbd>
      </label>
      <Textarea
        id={`${label}-text`}
        ref={field}
        value={draft.text}
        maxLength={5000}
        onChange={(event) => draft.write(event.target.value)}
        onKeyDown={onKey}
        aria-keyshortcuts="c"
      />
      <AudienceChoice audiences={audiences} audience={audience} onAudience={setAudience} />
      {add.error && (
        <p role="alert" className="border-l-4 border-umber py-1 pl-3">
          {messageOf(add.error)} What you wrote is still here.
        </p>
      )}
      <Button type="submit" variant="ghost" busy={add.isPending} className="self-start">
        {add.isPending ? 'Sending …' : 'Add the comment'}
      </Button>
    </form>
  );
}

function messageOf(error: Error): string {
  const byField = error instanceof ClientError ? error.fieldErrors.body : undefined;
  return byField ?? sentenceOf(error);
}

function AudienceChoice({
  audiences,
  audience,
  onAudience,
}: {
  audiences: readonly Audience[];
  audience: Audience;
  onAudience: (audience: Audience) => void;
}) {
  const group = useId();
  if (audiences.length === 1) return <p className="text-slate">Your comments are shared with the office.</p>;
  return (
    <fieldset className="flex flex-wrap gap-x-4 gap-y-1">
      <legend className="sr-only">Who reads it</legend>
      {audiences.map((value) => (
        <label key={value} className="flex items-center gap-1.5" title={AUDIENCES[value].explained}>
          <input
            type="radio"
            name={group}
            checked={audience === value}
            onChange={() => onAudience(value)}
            className="accent-cord"
          />
          <span className={classes(audience === value && 'font-semibold')}>{AUDIENCES[value].name}</span>
        </label>
      ))}
    </fieldset>
  );
}
