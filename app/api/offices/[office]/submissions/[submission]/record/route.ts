import { route } from '@/lib/http/route';
import { getRecord } from '@/lib/services/record/get';

export const GET = route(getRecord);
