import { route } from '@/lib/http/route';
import { getWorkbook } from '@/lib/services/workbook/get';

export const GET = route(getWorkbook);
