import { route } from '@/lib/http/route';
import { getAnalysis } from '@/lib/services/analysis/get';

export const GET = route(getAnalysis);
