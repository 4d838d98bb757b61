import { route } from '@/lib/http/route';
import { createCorrections } from '@/lib/services/corrections/create';
import { listCorrections } from '@/lib/services/corrections/list';

export const GET = route(listCorrections);
export const POST = route(createCorrections, { status: 201 });
