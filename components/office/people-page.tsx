'use client';

import { useState } from 'react';
import { Crumbs } from '@/components/shell/crumbs';
import { useMay, useOfficeView } from '@/components/shell/office-context';
import { Page } from '@/components/shell/page';
import { EmptyState, ErrorState, Loading } from '@/components/ui/states';
import { useMembers } from '@/lib/client/members';
import type { InvitationView } from '@/lib/contract/office';
import { InvitationDialog } from './invitation-dialog';
import { MemberList } from './member-list';
import { NewMember } from './new-member';

/** Who belongs to the office, and a new person with a one-time link. */
export function PeoplePage() {
  const may = useMay();
  return (
    <Page title="People" sub="Who may come in, and what each may do here." narrow>
      <Crumbs trail={[{ label: 'People' }]} />
      {may('members:read') ? (
        <People />
      ) : (
        <EmptyState title="Your role does not look after people.">
          The administrator of the office does.
        </EmptyState>
      )}
    </Page>
  );
}

function People() {
  const { slug } = useOfficeView();
  const members = useMembers(slug);
  const [invitation, setInvitation] = useState<InvitationView | null>(null);
  return (
    <div className="flex flex-col gap-5">
      {members.isPending && <Loading label="Fetching the people" rows={4} />}
      {members.error && !members.data && (
        <ErrorState error={members.error} retry={() => void members.refetch()} />
      )}
      {members.data && (
        <>
          <MemberList members={members.data} onInvited={setInvitation} />
          <NewMember onInvited={setInvitation} />
        </>
      )}
      <InvitationDialog invitation={invitation} onClose={() => setInvitation(null)} />
    </div>
  );
}
