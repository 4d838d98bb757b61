import { route } from '@/lib/http/route';
import { streamEvents } from '@/lib/services/events/stream';

export const GET = route(streamEvents);
