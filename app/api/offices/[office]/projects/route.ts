import { route } from '@/lib/http/route';
import { createProject } from '@/lib/services/projects/create';
import { listProjects } from '@/lib/services/projects/list';

export const GET = route(listProjects);
export const POST = route(createProject, { status: 201 });
