import { openRoute } from '@/lib/http/route';
import { acceptInvitation } from '@/lib/services/invitations/accept';
import { getInvitation } from '@/lib/services/invitations/get';

export const GET = openRoute(getInvitation);
export const POST = openRoute(acceptInvitation, { status: 204 });
