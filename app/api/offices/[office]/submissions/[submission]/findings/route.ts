import { route } from '@/lib/http/route';
import { listFindings } from '@/lib/services/findings/list';

export const GET = route(listFindings);
