import type { Metadata } from 'next';
import { Door } from '@/components/shell/door';
import { InvitationForm } from '@/components/shell/invitation-form';

// The address holds a secret: it is told to nobody this page links to.
export const metadata: Metadata = { title: 'Set your password', referrer: 'no-referrer' };

export default async function InvitationPage({ params }: { params: Promise<{ token: string }> }) {
  const { token } = await params;
  return (
    <Door title="Set your password">
      <InvitationForm token={token} />
    </Door>
  );
}
