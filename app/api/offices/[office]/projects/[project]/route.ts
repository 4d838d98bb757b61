import { route } from '@/lib/http/route';
import { getProject } from '@/lib/services/projects/get';
import { updateProject } from '@/lib/services/projects/update';

export const GET = route(getProject);
export const PATCH = route(updateProject);
