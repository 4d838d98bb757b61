import { redirect } from 'next/navigation';
import { OfficeDoor } from '@/components/shell/office-door';
import { getMe } from '@/lib/services/office/me';
import { requireSession } from './require-session';

/** Sends each person on to their office; who has several chooses. */
export default async function StartPage() {
  const { offices } = await getMe(await requireSession('/'));
  const [only] = offices;
  if (only && offices.length === 1) redirect(`/${only.slug}`);
  return <OfficeDoor />;
}
