import { route } from '@/lib/http/route';
import { getSheetRows } from '@/lib/services/sheet-rows/get';

export const GET = route(getSheetRows);
