'use client';

import { Button } from '@/components/ui/button';
import { CopyButton } from '@/components/ui/copy-button';
import { DateText } from '@/components/ui/date-text';
import { Dialog } from '@/components/ui/dialog';
import type { InvitationView } from '@/lib/contract/office';

interface Props {
  invitation: InvitationView | null;
  onClose: () => void;
}

/** The one-time link: shown now and never again. */
export function InvitationDialog({ invitation, onClose }: Props) {
  if (!invitation) return null;
  const { member, link, expires } = invitation;
  const address = absolute(link);
  const known = address.endsWith('/sign-in');
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title={`A link for ${member.name}`}
      description={
        known ? (
          <>{member.name} has a password from another office already, and signs in with it at this address.</>
        ) : (
          <>
            Send it to {member.email}. It lets {member.name} set a password, works once, and holds until{' '}
            <DateText value={expires} time />. It is shown only now: once this is closed, it can only be
            replaced by a new one.
          </>
        )
      }
      footer={
        <>
          <CopyButton text={address}>Copy the link</CopyButton>
          <Button variant="quiet" onClick={onClose}>
            Done
          </Button>
        </>
      }
    >
      <p className="border border-hair bg-lime p-3 break-all select-all">{address}</p>
    </Dialog>
  );
}

function absolute(link: string): string {
  return new URL(link, window.location.origin).href;
}
