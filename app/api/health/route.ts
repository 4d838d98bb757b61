import { openRoute } from '@/lib/http/route';
import { getHealth } from '@/lib/services/health/get';

export const GET = openRoute(getHealth);
