import { openRoute } from '@/lib/http/route';
import { refuseUnknown } from '@/lib/services/unknown/refuse';

/** Any path that no other handler answers: a problem document in place of a page. */
const handler = openRoute(refuseUnknown);

export { handler as GET, handler as POST, handler as PUT, handler as PATCH, handler as DELETE };
