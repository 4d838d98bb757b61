'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useEffect } from 'react';
import { ErrorState, Loading } from '@/components/ui/states';
import { useMe } from '@/lib/client/office';
import { Door } from './door';

/** One office: straight into it. Several: a choice. None: a sentence. */
export function OfficeDoor() {
  const me = useMe();
  const router = useRouter();
  const offices = me.data?.offices;
  const only = offices?.length === 1 ? offices[0]?.slug : undefined;
  useEffect(() => {
    if (only) router.replace(`/${only}`);
  }, [only, router]);

  return (
    <Door title={offices && !only ? 'Your offices' : 'Opening your office'}>
      {me.error && <ErrorState error={me.error} retry={() => void me.refetch()} />}
      {!me.error && (!offices || only) && <Loading label="Looking up your office" rows={2} />}
      {offices?.length === 0 && (
        <p>You belong to no office at present. Ask the administrator of your office to add you again.</p>
      )}
      {offices && offices.length > 1 && (
        <ul className="flex flex-col">
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
