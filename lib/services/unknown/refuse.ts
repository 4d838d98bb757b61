import { NotFound } from '@/lib/contract/errors';

export function refuseUnknown(): Promise<never> {
  return Promise.reject(
    new NotFound('There is no such address here. /api/openapi.json lists those there are.'),
  );
}
