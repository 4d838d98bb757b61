import { route } from '@/lib/http/route';
import { undoCorrection } from '@/lib/services/corrections/undo';

export const DELETE = route(undoCorrection);
