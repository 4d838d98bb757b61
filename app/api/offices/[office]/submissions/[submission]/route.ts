import { route } from '@/lib/http/route';
import { getSubmission } from '@/lib/services/submissions/get';

export const GET = route(getSubmission);
