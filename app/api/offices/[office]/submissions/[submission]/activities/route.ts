import { route } from '@/lib/http/route';
import { listActivities } from '@/lib/services/activities/list';

export const GET = route(listActivities);
