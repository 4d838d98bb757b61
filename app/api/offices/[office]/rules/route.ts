import { route } from '@/lib/http/route';
import { listRules } from '@/lib/services/rules/list';

export const GET = route(listRules);
