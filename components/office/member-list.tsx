'use client';

import { useState } from 'react';
import { useOfficeView } from '@/components/shell/office-context';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { toast } from '@/components/ui/toast';
import { sentenceOf } from '@/lib/client/error';
import { useInviteMember, useUpdateMember } from '@/lib/client/members';
import type { InvitationView, MemberView } from '@/lib/contract/office';

interface Props {
  members: readonly MemberView[];
  onInvited: (invitation: InvitationView) => void;
}

export function MemberList({ members, onInvited }: Props) {
  const [leaving, setLeaving] = useState<MemberView | null>(null);
  return (
    <>
      <ul className="border border-hair bg-leaf">
        {members.map((member) => (
          <MemberRow
            key={member.id}
            member={member}
            onInvited={onInvited}
            onLeaving={() => setLeaving(member)}
          />
        ))}
      </ul>
      {leaving && <LeavingDialog member={leaving} onClose={() => setLeaving(null)} />}
    </>
  );
}

interface RowProps {
  member: MemberView;
  onInvited: Props['onInvited'];
  onLeaving: () => void;
}

function MemberRow({ member, onInvited, onLeaving }: RowProps) {
  const { me } = useOfficeView();
  return (
    <li className="grid items-start gap-x-6 gap-y-1 border-b border-hair p-3 last:border-0 sm:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_13rem]">
      <div className="min-w-0">
        <span className="font-semibold">{member.name}</span>
        {member.email === me.email && <span className="text-slate"> (you)</span>}
        <span className="block wrap-anywhere text-slate">{member.email}</span>
      </div>
      <div>
        {member.role}
        {member.contractor && `, ${member.contractor.name}`}
        <span className="block text-slate">{stateOf(member)}</span>
      </div>
      <MemberActions member={member} onInvited={onInvited} onLeaving={onLeaving} />
    </li>
  );
}

function MemberActions({ member, onInvited, onLeaving }: RowProps) {
  const { slug, me } = useOfficeView();
  const invite = useInviteMember(slug);
  const update = useUpdateMember(slug);
  const fail = (error: unknown) => toast({ text: sentenceOf(error), tone: 'trouble' });
  if (member.disabled) {
    return (
      <Button
        variant="quiet"
        className="justify-self-start max-sm:-ml-3"
        busy={update.isPending}
        aria-label={`Let in again: ${member.name}`}
        onClick={() => update.mutate({ member: member.id, disabled: false }, { onError: fail })}
      >
        Let in again
      </Button>
    );
  }
  return (
    <div className="flex flex-wrap gap-1 max-sm:-ml-3">
      <Button
        variant="quiet"
        busy={invite.isPending}
        aria-label={`New link for ${member.name}`}
        onClick={() => invite.mutate(member.id, { onSuccess: onInvited, onError: fail })}
      >
        New link
      </Button>
      {member.email !== me.email && (
        <Button variant="quiet" aria-label={`Take away the access of ${member.name}`} onClick={onLeaving}>
          Take away
        </Button>
      )}
    </div>
  );
}

function LeavingDialog({ member, onClose }: { member: MemberView; onClose: () => void }) {
  const { slug } = useOfficeView();
  const update = useUpdateMember(slug);
  const confirm = () =>
    update.mutate(
      { member: member.id, disabled: true },
      {
        onSuccess: () => {
          toast(`${member.name} can no longer come in.`);
          onClose();
        },
      },
    );
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title={`Take away the access of ${member.name}?`}
      description="They can no longer sign in to this office, and their API tokens stop working. What they did stays on record, and you can let them in again."
      footer={
        <>
          <Button busy={update.isPending} onClick={confirm}>
            Take it away
          </Button>
          <Button variant="quiet" onClick={onClose}>
            Leave it
          </Button>
        </>
      }
    >
      {update.error && (
        <p role="alert" className="border-l-4 border-umber py-1 pl-3 font-semibold">
          {sentenceOf(update.error)}
        </p>
      )}
    </Dialog>
  );
}

function stateOf(member: MemberView): string {
  if (member.disabled) return 'access taken away';
  return member.active ? 'active' : 'has not set a password yet';
}
