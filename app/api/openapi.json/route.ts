import { openApiDocument } from '@/lib/http/openapi/document';

export const dynamic = 'force-static';

export function GET(): Response {
  return Response.json(openApiDocument());
}
