import { route } from '@/lib/http/route';
import { getOffice } from '@/lib/services/office/get';

export const GET = route(getOffice);
