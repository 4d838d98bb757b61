import { route } from '@/lib/http/route';
import { createMember } from '@/lib/services/members/create';
import { listMembers } from '@/lib/services/members/list';

export const GET = route(listMembers);
export const POST = route(createMember, { status: 201 });
