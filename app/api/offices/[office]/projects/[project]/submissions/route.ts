import { route } from '@/lib/http/route';
import { createSubmission } from '@/lib/services/submissions/create';
import { listSubmissions } from '@/lib/services/submissions/list';

export const GET = route(listSubmissions);
export const POST = route(createSubmission, { takes: 'form', status: 201 });
