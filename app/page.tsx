import { requireSession } from './require-session';
import { OfficeDoor } from '@/components/shell/office-door';

/** Sends each person on to their office. */
export default async function StartPage() {
  await requireSession('/');
  return <OfficeDoor />;
}
