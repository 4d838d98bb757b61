import { route } from '@/lib/http/route';
import { inviteMember } from '@/lib/services/members/invite';

export const POST = route(inviteMember, { status: 201 });
