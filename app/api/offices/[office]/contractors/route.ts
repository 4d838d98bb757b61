import { route } from '@/lib/http/route';
import { createContractor } from '@/lib/services/contractors/create';
import { listContractors } from '@/lib/services/contractors/list';

export const GET = route(listContractors);
export const POST = route(createContractor, { status: 201 });
