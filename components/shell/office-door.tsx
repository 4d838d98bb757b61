'use client';

import Link from 'next/link';
import { ErrorState, Loading } from '@/components/ui/states';
import { useMe } from '@/lib/client/office';
import { Door } from './door';

/** For who belongs to several offices, or to none. */
export function OfficeDoor() {
  const me = useMe();
  const offices = me.data?.offices;
  return (
    <Door title="Your offices">
      {me.error && !offices && <ErrorState error={me.error} retry={() => void me.refetch()} />}
      {me.isPending && <Loading label="Looking up your offices" rows={2} />}
      {offices?.length === 0 && (
        <p>You belong to no office at present. Ask the administrator of your office to add you again.</p>
      )}
      {offices && offices.length > 0 && (
        <ul>
          {offices.map(({ slug, name, role }) => (
            <li key={slug} className="border-b border-hair py-2 last:border-0">
              <Link href={`/${slug}`} className="font-semibold">
                {name}
              </Link>
              <span className="text-slate"> · you are its {role}</span>
            </li>
          ))}
        </ul>
      )}
    </Door>
  );
}
