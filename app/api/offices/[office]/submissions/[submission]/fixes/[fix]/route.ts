import { route } from '@/lib/http/route';
import { updateFix } from '@/lib/services/fixes/update';

export const PATCH = route(updateFix);
