import { listPlaces } from '@/db/queries/identity';
import { withIdentity } from '@/db/scope';
import type { Identity } from '@/lib/access/context';
import type { MeView } from '@/lib/contract/office';

/** The offices of the person who asks; a token shows the one it is for. */
export async function getMe(identity: Identity): Promise<MeView> {
  const places = await withIdentity((tx) => listPlaces(tx, identity.user.id));
  const offices = places.filter((place) => identity.office === null || place.slug === identity.office);
  return { ...identity.user, offices };
}
