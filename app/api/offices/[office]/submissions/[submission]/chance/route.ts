import { route } from '@/lib/http/route';
import { getChance } from '@/lib/services/chance/get';

export const GET = route(getChance);
