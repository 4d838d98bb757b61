import { route } from '@/lib/http/route';
import { updateMember } from '@/lib/services/members/update';

export const PATCH = route(updateMember);
