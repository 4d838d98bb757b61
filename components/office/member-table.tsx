'use client';

import { useState } from 'react';
import { useOfficeView } from '@/components/shell/office-context';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { Table, Td, Th } from '@/components/ui/table';
import { toast } from '@/components/ui/toast';
import { sentenceOf } from '@/lib/client/error';
import { useInviteMember, useUpdateMember } from '@/lib/client/members';
import type { InvitationView, MemberView } from '@/lib/contract/office';

interface Props {
  members: readonly MemberView[];
  onInvited: (invitation: InvitationView) => void;
}

export function MemberTable({ members, onInvited }: Props) {
  const [leaving, setLeaving] = useState<MemberView | null>(null);
  return (
    <>
      <Table label="People" className="border border-hair">
        <thead>
          <tr>
            <Th>Person</Th>
            <Th>Role</Th>
            <Th>State</Th>
            <Th>
              <span className="sr-only">What can be done</span>
            </Th>
          </tr>
        </thead>
        <tbody>
          {members.map((member) => (
            <MemberRow
              key={member.id}
              member={member}
              onInvited={onInvited}
              onLeaving={() => setLeaving(member)}
            />
          ))}
        </tbody>
      </Table>
      {leaving && <LeavingDialog member={leaving} onClose={() => setLeaving(null)} />}
    </>
  );
}

function MemberRow({
  member,
  onInvited,
  onLeaving,
}: {
  member: MemberView;
  onInvited: Props['onInvited'];
  onLeaving: () => void;
}) {
  const { slug, me } = useOfficeView();
  const invite = useInviteMember(slug);
  const update = useUpdateMember(slug);
  const fail = (error: unknown) => toast({ text: sentenceOf(error), tone: 'trouble' });
  const own = member.email === me.email;
  return (
    <tr>
      <Td>
        <span className="font-semibold">{member.name}</span>
        {own && <span className="text-slate"> (you)</span>}
        <span className="block break-all text-slate">{member.email}</span>
      </Td>
      <Td>
        {member.role}
        {member.contractor && <span className="block text-slate">{member.contractor.name}</span>}
      </Td>
      <Td>{stateOf(member)}</Td>
      <Td>
        <div className="flex flex-wrap justify-end gap-1">
          {member.disabled ? (
            <Button
              variant="quiet"
              busy={update.isPending}
              aria-label={`Let ${member.name} in again`}
              onClick={() => update.mutate({ member: member.id, disabled: false }, { onError: fail })}
            >
              Let in again
            </Button>
          ) : (
            <>
              <Button
                variant="quiet"
                busy={invite.isPending}
                aria-label={`New link for ${member.name}`}
                onClick={() => invite.mutate(member.id, { onSuccess: onInvited, onError: fail })}
              >
                New link
              </Button>
              {!own && (
                <Button
                  variant="quiet"
                  aria-label={`Take away the access of ${member.name}`}
                  onClick={onLeaving}
                >
                  Take away
                </Button>
              )}
            </>
          )}
        </div>
      </Td>
    </tr>
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
