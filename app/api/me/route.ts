import { personRoute } from '@/lib/http/route';
import { getMe } from '@/lib/services/office/me';

export const GET = personRoute(getMe);
