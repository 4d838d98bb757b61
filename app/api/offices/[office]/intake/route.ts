import { route } from '@/lib/http/route';
import { createIntake } from '@/lib/services/intake/create';

export const POST = route(createIntake, { takes: 'form' });
