import { route } from '@/lib/http/route';
import { createComment } from '@/lib/services/comments/create';
import { listComments } from '@/lib/services/comments/list';

export const GET = route(listComments);
export const POST = route(createComment, { status: 201 });
